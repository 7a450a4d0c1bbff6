import { randomUUID } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import type { Logger } from 'pino';

declare module 'node:http' {
  interface IncomingMessage {
    /** The request's id, which every answer to it carries. */
    id?: string;
  }
}

/** What an id from a proxy may look like: nothing in it can break a line or a header. */
const REQUEST_ID = /^[\w.-]{8,64}$/;
/** A part of an address that is one of ours or an id; anything else was typed by somebody, or is a secret. */
const OWN_PART = /^(?:[a-z]+(?:-[a-z]+)*|[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}|)$/;

/**
 * One line a request: method, path, status, time. No body, header, network address or query string: measurements,
 * names and sessions stay out of the log. Every answer carries its request's id: the proxy's where one is trusted
 * and gives one, else our own.
 */
export function logRequests(log: Logger): RequestHandler {
  return (request, response, next) => {
    const began = performance.now();
    const id = idFromProxy(request) ?? randomUUID();
    request.id = id;
    response.setHeader('x-request-id', id);
    response.once('close', () => {
      const level = response.statusCode >= 500 ? 'warn' : 'debug';
      // Nearly every line is below the level that is kept: nothing is put together for those.
      if (!log.isLevelEnabled(level)) return;
      const req = { id, method: request.method, path: pathOf(request.originalUrl) };
      const responseTime = Math.round(performance.now() - began);
      const message = response.writableFinished ? 'request completed' : 'request aborted';
      log[level]({ req, res: { status: response.statusCode }, responseTime }, message);
    });
    next();
  };
}

/** Anybody may send the header: only a proxy that the configuration trusts is believed. */
function idFromProxy(request: Request): string | null {
  const given = request.get('x-request-id');
  if (given === undefined || !REQUEST_ID.test(given)) return null;
  const isTrusted = request.app.get('trust proxy fn') as (
    address: string | undefined,
    hop: number,
  ) => boolean;
  return isTrusted(request.socket.remoteAddress, 0) ? given : null;
}

const pathOf = (url: string): string =>
  (url.split('?', 1)[0] ?? '')
    .split('/')
    .map((part) => (OWN_PART.test(part) ? part : '…'))
    .join('/');
