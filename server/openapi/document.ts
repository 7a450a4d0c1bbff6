import type { z } from 'zod';
import { PROBLEMS, problemSchema, type ProblemName } from '../../shared/problem.ts';
import { TOKEN_SCOPES } from '../../shared/tokens/tokens.schema.ts';
import type { AnswerBody, NounDescription, RouteDescription } from '../http/describe.ts';
import { jsonSchemas, type JsonSchema, type JsonSchemas } from './json-schemas.ts';
import { problemsOf } from './problems-of.ts';

/** The interface as OpenAPI 3.1, from the descriptions that stand beside the routes. */
export interface InterfaceDocument {
  openapi: '3.1.1';
  paths: Record<string, Record<string, Operation>>;
  [part: string]: unknown;
}

export interface Operation {
  operationId: string;
  summary: string;
  tags: string[];
  security: Record<string, string[]>[];
  responses: Record<string, JsonSchema>;
  parameters?: JsonSchema[];
  requestBody?: JsonSchema;
}

interface About {
  version: string;
  /** The session cookie's name, as the sign-in library sets it. */
  cookie: string;
}

export function describeInterface(nouns: readonly NounDescription[], about: About): InterfaceDocument {
  const named = Object.assign(
    { Problem: problemSchema },
    ...nouns.map(({ schemas }) => schemas ?? {}),
  ) as Record<string, z.core.$ZodType>;
  const schemas = jsonSchemas(named);
  const paths: InterfaceDocument['paths'] = {};
  for (const { noun, routes } of nouns) {
    for (const [key, route] of Object.entries(routes)) {
      const [method = '', path = ''] = key.split(' ');
      const item = (paths[path.replace(/:(\w+)/g, '{$1}')] ??= {});
      item[method.toLowerCase()] = operation(method, path, noun, route, schemas);
    }
  }
  const settled = schemas.settle(paths);
  return {
    openapi: '3.1.1',
    info: {
      title: 'Leeway',
      version: about.version,
      summary: 'How a sewing pattern will fit, before cloth is cut.',
      description: INTRODUCTION,
    },
    servers: [{ url: '/' }],
    tags: nouns.map(({ noun }) => ({ name: noun })),
    paths: settled.value,
    components: { schemas: settled.components, securitySchemes: securitySchemes(about.cookie) },
  };
}

const INTRODUCTION = [
  'Lengths are millimetres; moments are UTC, written as in RFC 3339; ids are UUIDs.',
  'Another’s record answers 404, as if it did not exist. Every refusal is `application/problem+json` (RFC 9457), and 422 names each field at fault by its JSON pointer (RFC 6901).',
  'A script sends `Authorization: Bearer` with a personal access token. A browser’s session is a cookie, and whatever changes something must then carry our own `Origin`.',
].join('\n\n');

function securitySchemes(cookie: string): JsonSchema {
  return {
    session: { type: 'apiKey', in: 'cookie', name: cookie, description: 'Set by signing in.' },
    token: {
      type: 'http',
      scheme: 'bearer',
      description: `A personal access token. Its scopes are among ${TOKEN_SCOPES.join(', ')}; writing does not include reading.`,
    },
  };
}

function operation(
  method: string,
  path: string,
  noun: string,
  route: RouteDescription,
  schemas: JsonSchemas,
): Operation {
  const parameters = [...inAddress(path, route, schemas), ...inQuery(route, schemas)];
  return {
    operationId: operationId(method, path),
    summary: route.summary,
    tags: [noun],
    security: security(route),
    'x-who': route.who,
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(route.body === undefined ? {} : { requestBody: requestBody(route.body, schemas) }),
    responses: { ...answers(route, schemas), ...refusals(problemsOf(method, path, route), route, schemas) },
  } as Operation;
}

/** `GET /api/people/:id/measurement-sets` is `getPeopleByIdMeasurementSets`. */
function operationId(method: string, path: string): string {
  const words = path
    .replace(/^\/api\//, '')
    .replace(/:(\w+)/g, 'by-$1')
    .split(/[^a-zA-Z0-9]+/);
  return [method.toLowerCase(), ...words.map((word) => word.charAt(0).toUpperCase() + word.slice(1))].join(
    '',
  );
}

function security({ who, scope }: RouteDescription): Record<string, string[]>[] {
  if (who === 'anyone') return [];
  return [{ session: [] }, ...(scope === null ? [] : [{ token: [scope] }])];
}

function inAddress(path: string, { params = {} }: RouteDescription, schemas: JsonSchemas): JsonSchema[] {
  return [...path.matchAll(/:(\w+)/g)].map(([, name = '']) => {
    const own = params[name];
    const schema = own === undefined ? { type: 'string', format: 'uuid' } : schemas.of(own, 'sent');
    return { name, in: 'path', required: true, schema };
  });
}

function inQuery({ query }: RouteDescription, schemas: JsonSchemas): JsonSchema[] {
  const fields: Record<string, z.ZodType> = query?.shape ?? {};
  return Object.entries(fields).map(([name, schema]) => ({
    name,
    in: 'query',
    required: !schema.safeParse(undefined).success,
    schema: schemas.of(schema, 'sent'),
  }));
}

function requestBody(body: NonNullable<RouteDescription['body']>, schemas: JsonSchemas): JsonSchema {
  if (!('fileField' in body)) {
    const required = !body.safeParse(undefined).success;
    return { required, content: { 'application/json': { schema: schemas.of(body, 'sent') } } };
  }
  // In 3.1 a file in a form is a part without a schema of its own.
  const schema = { type: 'object', required: [body.fileField], properties: { [body.fileField]: {} } };
  return { required: true, content: { 'multipart/form-data': { schema } } };
}

function answers({ answers: bodies }: RouteDescription, schemas: JsonSchemas): Record<string, JsonSchema> {
  return Object.fromEntries(
    Object.entries(bodies).map(([status, body]) => [
      status,
      { description: DONE[status] ?? 'Done.', ...content(body, schemas) },
    ]),
  );
}

const DONE: Record<string, string> = {
  201: 'Made.',
  202: 'Taken up; it is done in a while.',
  204: 'Done; there is nothing to tell.',
  503: 'Not ready just now.',
};

function content(body: AnswerBody, schemas: JsonSchemas): JsonSchema {
  if (body === 'nothing') return {};
  if ('mediaType' in body) return { content: { [body.mediaType]: {} } };
  return { content: { 'application/json': { schema: schemas.of(body, 'answered') } } };
}

/** Beside members of its own an extension stands with a problem's. */
function openObject({ additionalProperties: _closed, ...schema }: JsonSchema): JsonSchema {
  return schema;
}

/** One entry a status: several problems may share it. */
function refusals(
  names: ProblemName[],
  { extensions = {} }: RouteDescription,
  schemas: JsonSchemas,
): Record<string, JsonSchema> {
  const byStatus = new Map<number, string[]>();
  const more = new Map<number, JsonSchema>();
  for (const name of names) {
    const { status, title } = PROBLEMS[name];
    byStatus.set(status, [...(byStatus.get(status) ?? []), `${title} (\`/problems/${name}\`).`]);
    const extension = extensions[name];
    if (extension !== undefined) more.set(status, openObject(schemas.of(extension, 'answered')));
  }
  const problem = schemas.of(problemSchema, 'answered');
  return Object.fromEntries(
    [...byStatus].map(([status, titles]) => {
      const extension = more.get(status);
      const schema = extension === undefined ? problem : { allOf: [problem, extension] };
      const content = { 'application/problem+json': { schema } };
      return [status, { description: titles.join(' '), content }];
    }),
  );
}
