import { fromNodeHeaders } from 'better-auth/node';
import type { Request, Response as Reply } from 'express';
import { z } from 'zod';
import { ADDRESS_HEADER, type Auth } from '../auth.ts';
import type { Db } from '../db/client.ts';
import { inAmbient } from '../db/ambient.ts';
import { Problem } from '../http/problem.ts';
import { fromAuth, type FieldNames } from './auth-problem.ts';

/** What the sign-in library answered to something that it did. */
export interface Answered {
  body: unknown;
  cookies: string[];
  status: number;
}

interface Question {
  method: 'GET' | 'POST';
  /** Below /api/auth, with a query where there is one. */
  path: string;
  body?: object;
  /** Asked for nobody in particular: whoever is signed in does not matter. */
  withoutSession?: boolean;
  /** What the form calls the fields that the library names otherwise. */
  fields?: FieldNames;
}

/** A refusal of the library's own, as against ours: what it has written down, such as a failed attempt, is to stay. */
class LibraryRefusal extends Problem {
  constructor({ problem, detail, errors }: Problem) {
    super(problem, {
      ...(detail === undefined ? {} : { detail }),
      ...(errors === undefined ? {} : { errors }),
    });
  }
}

const refusalSchema = z.object({ code: z.string().optional() });

/** Asks the sign-in library, and throws what it refuses in our own form. */
export async function ask(auth: Auth, request: Request, question: Question): Promise<Answered> {
  const { method, path, body, withoutSession = false, fields } = question;
  const headers = fromNodeHeaders(request.headers);
  for (const name of ['content-length', 'transfer-encoding', 'content-encoding']) headers.delete(name);
  if (withoutSession) headers.delete('cookie');
  headers.set(ADDRESS_HEADER, request.ip ?? '');
  const sent = body === undefined ? {} : { body: JSON.stringify(body) };
  if (body !== undefined) headers.set('content-type', 'application/json');
  const url = new URL(`/api/auth${path}`, auth.options.baseURL);
  const response = await auth.handler(new globalThis.Request(url, { method, headers, ...sent }));
  const answered = readJson(await response.text());
  const retryAfter = response.headers.get('x-retry-after');
  if (!response.ok) {
    const code = refusalSchema.safeParse(answered).data?.code;
    if (retryAfter !== null) request.res?.set('retry-after', retryAfter);
    throw new LibraryRefusal(
      fromAuth({ status: response.status, code, retryAfter, ...(fields ? { fields } : {}) }),
    );
  }
  return { body: answered, cookies: response.headers.getSetCookie(), status: response.status };
}

/**
 * Runs work that asks the library in one transaction with all that we add: both happen or neither. What the library itself
 * refuses is committed with its count of attempts; what we refuse afterwards undoes what it did.
 */
export async function inAuthTransaction<T>(db: Db, work: (tx: Db) => Promise<T>): Promise<T> {
  const outcome = await inAmbient(db, async (tx) => {
    try {
      return { value: await work(tx) };
    } catch (error) {
      if (error instanceof LibraryRefusal && error.status < 500) return { refused: error };
      throw error;
    }
  });
  if ('refused' in outcome) throw outcome.refused;
  return outcome.value;
}

/** Hands on the cookies that came with an answer. */
export function setCookies(reply: Reply, { cookies }: Answered): void {
  for (const cookie of cookies) reply.append('set-cookie', cookie);
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return null;
  }
}
