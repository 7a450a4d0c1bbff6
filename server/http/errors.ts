import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { describeDatabaseError, ERRNO, errnoOf } from '../db/errors.ts';
import { Problem } from './problem.ts';

/** Answers every thrown thing as `application/problem+json`; what nobody foresaw is logged and answered bare. */
export function handleErrors(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, _next) => {
    // Who walks away in the middle of a download has broken nothing, and hears nothing more.
    if (response.destroyed && isCutShort(error)) return;
    const problem = toProblem(error);
    const requestId = requestIdOf(request.id);
    if (problem.status >= 500) log.error({ requestId, ...describe(error) }, 'a request failed');
    if (response.headersSent) {
      // Too late for an answer: a broken connection is honest, and Express's own handler would print the message.
      response.destroy();
      return;
    }
    response
      .status(problem.status)
      .type('application/problem+json')
      .send(JSON.stringify(problem.toBody(requestId)));
  };
}

const isCutShort = (error: unknown): boolean =>
  error instanceof Error && 'code' in error && error.code === 'ERR_STREAM_PREMATURE_CLOSE';

/** Nothing is mounted at this address. */
export const noSuchAddress: RequestHandler = () => {
  throw new Problem('notFound', { detail: 'There is nothing at this address.' });
};

function toProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  return fromDatabase(error) ?? fromParser(error) ?? new Problem('failed', { cause: error });
}

function fromDatabase(error: unknown): Problem | null {
  switch (errnoOf(error)) {
    case ERRNO.stillReferred:
      return new Problem('conflict', { detail: 'Something else still refers to this.', cause: error });
    case ERRNO.noSuchReference:
      return new Problem('conflict', {
        detail: 'Something this belongs to was deleted in the meantime.',
        cause: error,
      });
    case ERRNO.deadlock:
    case ERRNO.lockWait:
    case ERRNO.changedSinceRead:
      return new Problem('unavailable', { detail: 'The database is busy. Try again.', cause: error });
    default:
      return isUnreachable(error)
        ? new Problem('unavailable', { detail: 'The database does not answer just now.', cause: error })
        : null;
  }
}

const UNREACHABLE = new Set(['ECONNREFUSED', 'ECONNRESET', 'ENOENT', 'PROTOCOL_CONNECTION_LOST']);

function isUnreachable(error: unknown): boolean {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    // `syscall: connect` or the driver's own code: a missing file of ours is ENOENT too and is no such thing.
    const isConnection = ('syscall' in at && at.syscall === 'connect') || 'fatal' in at;
    if (isConnection && 'code' in at && UNREACHABLE.has(String(at.code))) return true;
  }
  return false;
}

/** What the body and address parsers throw: they say which by `type` (body-parser), `code` (multer) or status. */
function fromParser(error: unknown): Problem | null {
  if (!(error instanceof Error)) return null;
  const type = 'type' in error ? String(error.type) : '';
  const code = 'code' in error ? String(error.code) : '';
  const status = 'status' in error ? error.status : undefined;
  if (type === 'entity.too.large' || code === 'LIMIT_FILE_SIZE') {
    return new Problem('tooLarge', { detail: 'Send less at once.', cause: error });
  }
  if (status === 415) return new Problem('unsupported', { cause: error });
  if (type === 'entity.parse.failed') {
    return new Problem('malformed', { detail: 'The body is not a JSON object.', cause: error });
  }
  if (status === 400 || error.name === 'MulterError') return new Problem('malformed', { cause: error });
  return null;
}

/** What is written down of an error. A database error's message holds people's values: only its number is. */
function describe(error: unknown): Record<string, unknown> {
  const database = describeDatabaseError(error);
  if (!(error instanceof Error)) return { thrown: typeof error };
  const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
  // Whatever went wrong below it, a closed pool or a lost connection too: its message is the query with its values.
  const isQuery = database !== null || ('query' in error && 'params' in error);
  return {
    error: error.name,
    ...(isQuery ? { database: database ?? codeBelow(error) } : { message: error.message }),
    at: frames.slice(0, 12).map((line) => line.trim()),
  };
}

/** What the driver or the network calls it; never a message. */
function codeBelow(error: Error): { code: string } {
  for (let at: unknown = error.cause; at instanceof Error; at = at.cause) {
    if ('code' in at && typeof at.code === 'string' && /^[A-Z_0-9]{1,40}$/.test(at.code))
      return { code: at.code };
  }
  return { code: 'unknown' };
}

const requestIdOf = (id: unknown): string | undefined => (typeof id === 'string' ? id : undefined);
