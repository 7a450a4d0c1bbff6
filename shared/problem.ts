import * as z from 'zod/mini';

/**
 * The closed list of problem types (RFC 9457). A type's URI is `/problems/<name>`; its title is fixed, its
 * detail says what happened this time, and `errors` points at fields with JSON pointers (RFC 6901).
 */
export const PROBLEMS = {
  invalid: { status: 422, title: 'Some of what was sent cannot be used' },
  malformed: { status: 400, title: 'The request could not be read' },
  signedOut: { status: 401, title: 'Sign in first' },
  foreignOrigin: { status: 403, title: 'The request came from another site' },
  forbidden: { status: 403, title: 'This needs another role' },
  outsideScope: { status: 403, title: 'This token is not allowed to do that' },
  notFound: { status: 404, title: 'There is nothing here' },
  conflict: { status: 409, title: 'This cannot be done as things stand' },
  tooLarge: { status: 413, title: 'This is larger than allowed' },
  unsupported: { status: 415, title: 'This kind of content is not accepted' },
  tooMany: { status: 429, title: 'Too many requests' },
  failed: { status: 500, title: 'Something went wrong on our side' },
  unavailable: { status: 503, title: 'Not ready just now' },
} as const;

/** The name of a problem type. */
export type ProblemName = keyof typeof PROBLEMS;

/** One field at fault: a JSON pointer into what was sent, and a sentence saying what would be right. */
export const fieldProblemSchema = z.object({ pointer: z.string(), detail: z.string() });

/**
 * The body of every `application/problem+json` answer. Written with zod's small form, since every page may have to
 * read one and the front page is to stay light. Members it does not name stay: a page that knows them parses them.
 */
export const problemSchema = z.looseObject({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.optional(z.string()),
  errors: z.optional(z.array(fieldProblemSchema)),
  requestId: z.optional(z.string()),
});

/** One field at fault. */
export type FieldProblem = z.infer<typeof fieldProblemSchema>;
/** The body of a problem answer. */
export type ProblemBody = z.infer<typeof problemSchema>;
