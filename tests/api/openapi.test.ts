import { Validator } from '@seriousme/openapi-schema-validator';
import { Router } from 'express';
import { beforeAll, describe, expect, it } from 'vitest';
import { describedNouns } from '../../server/described-routes.ts';
import { tableOfRoutes } from '../../server/http/describe.ts';
import { describeInterface, type InterfaceDocument, type Operation } from '../../server/openapi/document.ts';
import { PROBLEMS } from '../../shared/problem.ts';
import { TOKEN_SCOPES } from '../../shared/tokens/tokens.schema.ts';
import { testApp, type TestApp } from '../support/app.ts';
import { registeredRoutes } from '../support/registered-routes.ts';

let test: TestApp;
let document: InterfaceDocument;
let operations: [key: string, operation: Operation][];
beforeAll(async () => {
  test = await testApp();
  document = (await test.anonymous().get('/api/openapi.json').expect(200)).body;
  operations = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]): [string, Operation] => [
      `${method.toUpperCase()} ${path}`,
      operation,
    ]),
  );
});

const asExpress = (key: string) => key.replace(/\{(\w+)\}/g, ':$1');

/** Which records an address is about. */
const RECORDS: Record<string, string> = {
  people: 'people',
  'measurement-sets': 'people',
  patterns: 'patterns',
  'pattern-revisions': 'patterns',
  imports: 'patterns',
  files: 'patterns',
  plans: 'plans',
  fit: 'plans',
};

/** What a token needs: to read for what changes nothing, to write for the rest. */
function scopesFor(key: string): string[] {
  const records = RECORDS[/^\w+ \/api\/([a-z-]+)/.exec(key)?.[1] ?? ''];
  const isReading = key.startsWith('GET ') || key === 'POST /api/fit';
  return records === undefined ? [] : [`${records}:${isReading ? 'read' : 'write'}`];
}

describe('the description of the interface', () => {
  it('is valid OpenAPI 3.1', async () => {
    const validator = new Validator();
    const result = await validator.validate(structuredClone(document));
    expect(result.errors).toBeUndefined();
    expect(result.valid).toBe(true);
    expect(validator.version).toBe('3.1');
  });

  it('would not be valid with a word misspelt: the judge judges', async () => {
    const spoilt = structuredClone(document) as unknown as { paths: Record<string, { get: object }> };
    spoilt.paths['/api/people']!.get = { ...spoilt.paths['/api/people']!.get, respnses: {}, responses: 1 };
    expect((await new Validator().validate(spoilt)).valid).toBe(false);
  });

  it('has every route that the server answers, and no other', () => {
    const registered = registeredRoutes(test.app);
    expect(registered.length).toBeGreaterThan(30);
    expect(operations.map(([key]) => asExpress(key)).sort()).toEqual([...registered].sort());
  });

  it('registers no route twice: the second would never answer', () => {
    const registered = registeredRoutes(test.app);
    expect(registered).toEqual([...new Set(registered)]);
  });

  it('finds a route that nobody described, wherever in the server it hides', () => {
    const hidden = Router();
    const within = Router();
    within.get('/api/hidden', (_request, reply) => void reply.end());
    hidden.use(within);
    test.app.use(hidden);
    expect(registeredRoutes(test.app)).toContain('GET /api/hidden');
    test.app.router.stack.pop();
    expect(registeredRoutes(test.app)).not.toContain('GET /api/hidden');
  });

  it('names every operation once', () => {
    const names = operations.map(([, { operationId }]) => operationId);
    expect(names).toEqual([...new Set(names)]);
  });

  it('lets tokens do what the address and the method say, and nothing of accounts, tokens and administration', () => {
    for (const [key, { security }] of operations) {
      const scopes = security.flatMap((way) => way['token'] ?? []);
      expect([key, scopes]).toEqual([key, scopesFor(key)]);
    }
    const all = operations.flatMap(([, { security }]) => security.flatMap((way) => way['token'] ?? []));
    expect([...new Set(all)].sort()).toEqual([...TOKEN_SCOPES].sort());
  });

  it('gives only known problems as refusals', () => {
    const types = Object.keys(PROBLEMS).map((name) => `/problems/${name}`);
    for (const [key, { responses }] of operations) {
      const text = JSON.stringify(responses);
      const named = [...text.matchAll(/\/problems\/\w+/g)].map(([type]) => type);
      expect(named.length, key).toBeGreaterThan(0);
      expect(
        named.filter((type) => !types.includes(type)),
        key,
      ).toEqual([]);
    }
  });

  it('refers to nothing that it does not hold', () => {
    const text = JSON.stringify(document);
    const { schemas } = document['components'] as { schemas: Record<string, unknown> };
    const referred = new Set(
      [...text.matchAll(/"#\/components\/schemas\/([^"]+)"/g)].map(([, name]) => name),
    );
    expect([...referred].sort()).toEqual(Object.keys(schemas).sort());
  });

  it('tells both forms of a schema whose defaults may be left out when it is sent', () => {
    const nouns = [{ noun: 'Any', schemas: {}, routes: {} }];
    expect(describeInterface(nouns, { version: '1', cookie: 'c' }).paths).toEqual({});
    const { schemas } = document['components'] as { schemas: Record<string, { required?: string[] }> };
    expect(schemas['PersonInput']?.required).not.toContain('notes');
    expect(schemas['Person']?.required).toContain('notes');
  });

  it('refuses to describe a route twice', () => {
    expect(() => tableOfRoutes([...describedNouns, describedNouns[0]!])).toThrow(/described twice/);
  });
});
