import { describe, expect, it } from 'vitest';
import type { z } from 'zod';
import { describedNouns } from '../../../../server/described-routes.ts';
import { describeInterface } from '../../../../server/openapi/document.ts';
import { curlOf } from '../../../../src/interface/curl-of.ts';
import { documentSchema } from '../../../../src/interface/document.schema.ts';
import { exampleOf } from '../../../../src/interface/example-of.ts';
import { groupRoutes } from '../../../../src/interface/routes-of.ts';
import { objectIn, sayKind, shapesIn } from '../../../../src/interface/say-schema.ts';

const document = documentSchema.parse(
  JSON.parse(JSON.stringify(describeInterface(describedNouns, { version: '1', cookie: 'session' }))),
);
const routes = groupRoutes(document).flatMap((group) => group.routes);
const route = (method: string, path: string) =>
  routes.find((one) => one.method === method && one.path === path)!;

describe('the description as the page reads it', () => {
  it('keeps every route, with its scope', () => {
    const described = describedNouns.flatMap((noun) => Object.entries(noun.routes));
    expect(routes).toHaveLength(described.length);
    for (const [key, { scope, who }] of described) {
      const [method = '', path = ''] = key.replace(/:(\w+)/g, '{$1}').split(' ');
      expect(route(method, path).scope, key).toBe(who === 'anyone' ? null : scope);
      expect(route(method, path)['x-who'], key).toBe(who);
    }
  });

  it('finds routes that have every word, in any order', () => {
    const found = groupRoutes(document, 'DELETE sets').flatMap((group) => group.routes);
    expect(found.map(({ method, path }) => `${method} ${path}`)).toContain(
      'DELETE /api/measurement-sets/{id}',
    );
    expect(groupRoutes(document, 'no such words')).toEqual([]);
  });
});

describe('examples', () => {
  const bodies = describedNouns.flatMap((noun) =>
    Object.entries(noun.routes).flatMap(([key, { body }]) =>
      body === undefined || 'fileField' in body ? [] : [[key, body] as const],
    ),
  );
  // What a schema says in words of its own (a pattern, two fields that must agree) no example can know.
  const shapeOnly = (error: z.ZodError) => error.issues.filter(({ code }) => code === 'invalid_type');

  it.each(bodies)('%s: what is shown to be sent has the shape of what is taken', (key, body) => {
    const [method = '', path = ''] = key.replace(/:(\w+)/g, '{$1}').split(' ');
    const schema = route(method, path).requestBody?.content['application/json']?.schema ?? {};
    const parsed = body.safeParse(exampleOf(schema, document.components.schemas));
    expect(parsed.success ? [] : shapeOnly(parsed.error)).toEqual([]);
  });
});

describe('curl', () => {
  it('sends the token, and a body as JSON that a shell leaves alone', () => {
    const text = curlOf(route('POST', '/api/people'), document.components.schemas, 'http://here') ?? '';
    expect(text).toContain("curl -X POST 'http://here/api/people'");
    expect(text).toContain('-H "Authorization: Bearer $LEEWAY_TOKEN"');
    const body = / -d '(.*)'$/m.exec(text)?.[1] ?? '';
    expect(JSON.parse(body)).toHaveProperty('name');
  });
  it('sends a file as a form', () => {
    const upload = routes.find(
      ({ requestBody }) => requestBody?.content['multipart/form-data'] !== undefined,
    )!;
    expect(curlOf(upload, {}, 'http://here')).toMatch(/-F 'file=@/);
  });
  it('is not shown where a token is refused', () => {
    expect(curlOf(route('DELETE', '/api/account'), {}, 'http://here')).toBeNull();
  });
});

describe('kinds in words', () => {
  it.each([
    [{ type: 'string', format: 'uuid' }, 'id'],
    [{ type: 'string', minLength: 1, maxLength: 80 }, 'text (1 to 80 characters)'],
    [{ type: 'integer', minimum: 1 }, 'whole number (from 1)'],
    [{ anyOf: [{ type: 'string' }, { type: 'null' }] }, 'text or null'],
    [{ type: ['string', 'null'] }, 'text or null'],
    [{ enum: ['cm', 'in'] }, '"cm" or "in"'],
    [{ type: 'array', items: { $ref: '#/components/schemas/Person' } }, 'list of Person'],
    [{ type: 'object', additionalProperties: { type: 'number' } }, 'number by name'],
    [{}, 'anything'],
  ])('%j is %s', (schema, words) => {
    expect(sayKind(schema)).toBe(words);
  });
  it('names each shape within once', () => {
    const ref = { $ref: '#/components/schemas/Person' };
    expect(shapesIn({ anyOf: [ref, { type: 'array', items: ref }] })).toEqual(['Person']);
  });
  it('tells the fields of a list’s objects', () => {
    const inner = { type: 'object', properties: { id: { type: 'string' } } };
    expect(objectIn({ type: 'array', items: inner })).toBe(inner);
    expect(objectIn({ type: 'string' })).toBeNull();
  });
});
