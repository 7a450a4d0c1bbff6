import { beforeAll, describe, expect, it } from 'vitest';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

const send = (path: string, text: string) => ada.agent.post(path).type('json').send(text);
const person = '{"name":"N","stage":"adult","chestWord":"bust","unit":"cm"';

describe('odd input', () => {
  it.each([
    ['a key that a prototype has', `${person},"__proto__":{"name":"x"},"constructor":1}`, 201],
    ['a NUL and a lone surrogate', person.replace('"N"', '"a\\u0000b\\ud800"') + '}', 201],
    ['nothing', 'null', 400],
    ['a list', '[]', 422],
    ['a number too large to be one', `${person},"notes":1e999}`, 422],
    ['thousands of levels', `${person},"notes":${'['.repeat(5000)}${']'.repeat(5000)}}`, 422],
    ['a byte order mark and nothing after it', '\ufeff', 422],
  ])('is refused or kept, and never a failure: %s', async (_name, text, status) => {
    const answer = await send('/api/people', text);
    expect([answer.status, answer.body.errors]).toEqual([
      status,
      status === 422 ? expect.any(Array) : undefined,
    ]);
  });

  it('points at a measured point that no catalogue has, whatever its name', async () => {
    const { body } = await send('/api/people', `${person}}`).expect(201);
    const answer = await send(
      `/api/people/${(body as { id: string }).id}/measurement-sets`,
      '{"takenOn":"2025-01-31","takenBy":"self","unit":"cm","typed":{"__proto__":"5","constructor":"6","hip":"99"}}',
    );
    expect(answer.status).toBe(422);
    const pointers = (answer.body.errors as { pointer: string }[]).map((error) => error.pointer);
    expect(pointers).toContain('/typed/constructor');
  });

  it('changes no method: a body is never read as one', async () => {
    const { body } = await send('/api/people', `${person}}`).expect(201);
    const at = `/api/people/${(body as { id: string }).id}`;
    await ada.agent.post(at).set('X-HTTP-Method-Override', 'DELETE').send({ _method: 'DELETE' }).expect(404);
    await ada.agent.get(at).expect(200);
  });
});
