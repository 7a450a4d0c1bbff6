import type { z } from 'zod';
import type { Role } from '../../shared/me.ts';
import type { ProblemName } from '../../shared/problem.ts';
import type { TokenScope } from '../../shared/tokens/tokens.schema.ts';

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
/** A route as Express knows it: `GET /api/people/:id`. */
export type RouteKey = `${Method} /api/${string}`;

/** An answer's body: a schema, nothing, or the media type of what is no JSON. */
export type AnswerBody = z.core.$ZodType | 'nothing' | { mediaType: string };

/**
 * What a route is: the interface's description is written from it, and `requireUser` obeys it. A route without one
 * takes no token, and the tests fail.
 */
export interface RouteDescription {
  /** One line, beginning with a verb. */
  summary: string;
  /** The least that somebody must be. */
  who: 'anyone' | Role;
  /** What a token must be allowed; null where only a signed-in browser may ask. */
  scope: TokenScope | null;
  /** Parts of the address; a part that is not named here is an id. */
  params?: Record<string, z.ZodType>;
  query?: z.ZodObject;
  /** A JSON body, or one uploaded file in a multipart form's field. */
  body?: z.ZodType | { fileField: string };
  /** By status. */
  answers: Record<number, AnswerBody>;
  /** Refusals that do not follow from the rest: 401, 403, 404 of an id and 422 of a body need not be named. */
  problems?: readonly ProblemName[];
  /** What one of its refusals tells beside what every problem does. */
  extensions?: Partial<Record<ProblemName, z.ZodType>>;
}

/** What one noun's routes are, and the schemas that deserve a name of their own in the description. */
export interface NounDescription {
  /** The heading its routes stand under. */
  noun: string;
  routes: Record<RouteKey, RouteDescription>;
  schemas?: Record<string, z.core.$ZodType>;
}

/** Every route of the server by its key. */
export type RouteTable = ReadonlyMap<string, RouteDescription>;

/** Gathers the nouns' descriptions; a route described twice is a mistake of ours. */
export function tableOfRoutes(nouns: readonly NounDescription[]): RouteTable {
  const table = new Map<string, RouteDescription>();
  for (const { routes } of nouns) {
    for (const [key, description] of Object.entries(routes)) {
      if (table.has(key)) throw new Error(`${key} is described twice.`);
      table.set(key, description);
    }
  }
  return table;
}
