import * as z from 'zod/mini';
import { problemSchema } from '../../shared/problem.ts';
import { ProblemError } from './problem-error.ts';

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';
  /** Sent as JSON, or as it is where it is form data. */
  body?: unknown;
  signal?: AbortSignal | undefined;
}

/** Asks the server and parses the answer: nothing unparsed is trusted. Throws `ProblemError` for anything else. */
export async function request<T extends z.core.$ZodType>(
  path: string,
  schema: T,
  options: RequestOptions = {},
): Promise<z.output<T>> {
  const response = await send(path, options);
  return z.parse(schema, await response.json());
}

/** As `request`, for answers without a body (204). */
export async function requestNothing(path: string, options: RequestOptions): Promise<void> {
  await send(path, options);
}

/** As `request`, for a file that is made when it is asked for: its bytes, and the name the server gives it. */
export async function requestFile(
  path: string,
  options: RequestOptions,
): Promise<{ bytes: Blob; name: string | null }> {
  const response = await send(path, options);
  const disposition = response.headers.get('content-disposition') ?? '';
  return { bytes: await response.blob(), name: /filename="?([\w.-]+)"?/.exec(disposition)?.[1] ?? null };
}

async function send(path: string, options: RequestOptions): Promise<Response> {
  const isForm = options.body instanceof FormData;
  let response: Response;
  try {
    response = await fetch(path, {
      method: options.method ?? 'GET',
      credentials: 'same-origin',
      headers: options.body === undefined || isForm ? {} : { 'content-type': 'application/json' },
      ...(options.body === undefined
        ? {}
        : { body: isForm ? (options.body as FormData) : JSON.stringify(options.body) }),
      ...(options.signal ? { signal: options.signal } : {}),
    });
  } catch (cause) {
    if (options.signal?.aborted === true) throw cause;
    throw new ProblemError({
      type: '/problems/unavailable',
      title: 'The server cannot be reached',
      status: 0,
      detail: 'The server cannot be reached just now. What you typed is still here; try again in a moment.',
    });
  }
  if (response.ok) return response;
  throw new ProblemError(await readProblem(response));
}

async function readProblem(response: Response) {
  const parsed = problemSchema.safeParse(await response.json().catch(() => null));
  if (parsed.success) return parsed.data;
  return { type: 'about:blank', title: response.statusText || 'The request failed', status: response.status };
}
