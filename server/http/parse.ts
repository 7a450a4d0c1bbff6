import type { Request } from 'express';
import { z } from 'zod';
import type { FieldProblem } from '../../shared/problem.ts';
import { pointerTo } from './pointer.ts';
import { invalid, notFound, Problem } from './problem.ts';
import { sayIssue } from './say-issue.ts';

/** What a schema cannot say; it is asked even where the schema has failed, so that all is told at once. */
type Check = (value: unknown) => FieldProblem[];

/** Parses what came from outside, or throws 422 with every issue at its JSON pointer. */
export function parse<T extends z.ZodType>(schema: T, value: unknown, check?: Check): z.output<T> {
  const result = schema.safeParse(value, { error: sayIssue });
  const problems = [...(result.error?.issues.flatMap(toFieldProblems) ?? []), ...(check?.(value) ?? [])];
  if (!result.success || problems.length > 0) throw invalid(problems);
  return result.data;
}

/** Parses a JSON body. */
export function parseBody<T extends z.ZodType>(schema: T, request: Request, check?: Check): z.output<T> {
  return parse(schema, jsonBody(request), check);
}

/**
 * Parses a partial change: only the keys that were sent come out. (A schema's default fills in a key that was
 * not sent, `partial()` or not, and would quietly empty the field.)
 */
export function parsePatch<T extends z.ZodObject>(schema: T, request: Request): Partial<z.output<T>> {
  const body = jsonBody(request);
  const parsed = parse(schema.partial(), body) as Record<string, unknown>;
  const sent = Object.entries(parsed).filter(([key]) => Object.hasOwn(body as object, key));
  return Object.fromEntries(sent) as Partial<z.output<T>>;
}

/** Parses the query string. */
export function parseQuery<T extends z.ZodType>(schema: T, request: Request): z.output<T> {
  return parse(schema, request.query);
}

/** The id in the address; anything that is no id is nothing that could be here. */
export function parseId(request: Request, thing: string, name = 'id'): string {
  const result = z.uuid().safeParse(request.params[name]);
  if (!result.success) throw notFound(thing);
  return result.data;
}

function jsonBody(request: Request): unknown {
  const hasOtherType = request.get('content-type') !== undefined && request.is('json') === false;
  if (hasOtherType) {
    throw new Problem('unsupported', { detail: 'Send JSON, with content-type application/json.' });
  }
  return request.body as unknown;
}

function toFieldProblems(issue: z.core.$ZodIssue): FieldProblem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ pointer: pointerTo([...issue.path, key]), detail: issue.message }));
  }
  return [{ pointer: pointerTo(issue.path), detail: issue.message }];
}
