import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/**
 * One line a request: method, path, status, time. No body, header, network address or query string: measurements,
 * names and sessions stay out of the log. Every answer carries its request's id.
 */
export function logRequests(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('x-request-id', id);
      return id;
    },
    serializers: {
      req: (request: { id: unknown; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        path: request.url.split('?', 1)[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
      // The error handler writes failures down, without people's values.
      err: () => undefined,
    },
    customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'warn' : 'debug'),
  });
}
