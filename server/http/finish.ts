import type { Server } from 'node:http';

/**
 * Prepares a server for its end. The answer: takes no new connection, lets every request under way come to its answer,
 * and cuts off what still hangs after `patienceMs`.
 */
export function finisher(server: Server, patienceMs: number): () => Promise<void> {
  let isFinishing = false;
  server.on('request', (_request, response) => {
    // A connection kept open for another request would otherwise hold the end up until its own time is over.
    response.once('close', () => {
      if (isFinishing) setImmediate(() => server.closeIdleConnections());
    });
  });
  return () =>
    new Promise((resolve) => {
      isFinishing = true;
      const late = setTimeout(() => server.closeAllConnections(), patienceMs);
      server.close(() => {
        clearTimeout(late);
        resolve();
      });
      server.closeIdleConnections();
    });
}
