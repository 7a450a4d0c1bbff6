// Locks that vanish with their holder: abstract sockets. Needs no node_modules.
import { statSync } from 'node:fs';
import { createServer } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { step } from './steps.mjs';

/**
 * Takes the lock on a folder, or answers null where another process holds it. The name is the folder's own
 * number, so that two ways of writing its path are one lock. The kernel frees it when the holder ends.
 */
export function lockFolder(folder, purpose) {
  const { dev, ino } = statSync(folder);
  const server = createServer((socket) => socket.destroy());
  return new Promise((resolve, reject) => {
    server.once('error', (error) => (error.code === 'EADDRINUSE' ? resolve(null) : reject(error)));
    server.listen(`\0leeway-${purpose}-${dev}-${ino}`, () => {
      server.unref();
      resolve({ release: () => new Promise((done) => server.close(done)) });
    });
  });
}

/** Holds the lock on a folder while the work is done, waiting for whoever has it. */
export async function whileLocked(folder, purpose, work) {
  const lock =
    (await lockFolder(folder, purpose)) ??
    (await step('Waiting for another start in this folder', () => waitForLock(folder, purpose)));
  try {
    return await work();
  } finally {
    await lock.release();
  }
}

async function waitForLock(folder, purpose) {
  for (;;) {
    await wait(100);
    const lock = await lockFolder(folder, purpose);
    if (lock !== null) return lock;
  }
}
