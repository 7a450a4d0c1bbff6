import type { Request } from 'express';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { parse, parsePatch } from '../../../../server/http/parse.ts';
import { Problem } from '../../../../server/http/problem.ts';

function errorsOf(work: () => unknown) {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error.errors;
    throw error;
  }
  throw new Error('nothing was refused');
}

const jsonRequest = (body: unknown) =>
  ({ body, is: () => 'json', get: () => 'application/json' }) as unknown as Request;

describe('parsing what came from outside', () => {
  it('points into lists, and escapes ~ and / in a key as RFC 6901 says', () => {
    const schema = z.object({ 'a/b~c': z.array(z.object({ mm: z.number() })) });
    expect(errorsOf(() => parse(schema, { 'a/b~c': [{ mm: 1 }, { mm: 'x' }] }))).toEqual([
      { pointer: '/a~1b~0c/1/mm', detail: 'Give a number.' },
    ]);
  });

  it.each([
    [z.string(), undefined, 'This is missing: give text.'],
    [z.string(), 4, 'Give text.'],
    [z.number(), Number.NaN, 'Give a number.'],
    [z.number().max(5), 6, 'Give at most 5.'],
    [z.number().positive(), 0, 'Give more than 0.'],
    [z.number().int(), 1.5, 'Give a whole number.'],
    [z.string().min(1), '', 'Use at least 1 character.'],
    [z.string().max(2), 'abc', 'Use at most 2 characters.'],
    [z.array(z.string()).max(1), ['a', 'b'], 'Give at most 1 of these.'],
    [z.enum(['cm', 'mm', 'in']), 'ell', 'Give cm, mm or in.'],
    [z.literal('only'), 'other', 'Give only.'],
    [z.uuid(), 'x', 'Give an id as this server gave it.'],
    [z.iso.date(), 'x', 'Give a day as year-month-day, such as 2025-03-31.'],
    [z.union([z.number(), z.boolean()]), 'x', 'None of the forms this may take was given.'],
    [z.string().min(3, 'Own words.'), 'x', 'Own words.'],
  ])('says what would be right (%#)', (schema, value, detail) => {
    expect(errorsOf(() => parse(schema, value))).toEqual([{ pointer: '', detail }]);
  });

  it('names every unknown key of a strict object at its own place', () => {
    expect(errorsOf(() => parse(z.strictObject({ a: z.number() }), { a: 1, b: 2, c: 3 }))).toEqual([
      { pointer: '/b', detail: 'Leave this out: it is not known here.' },
      { pointer: '/c', detail: 'Leave this out: it is not known here.' },
    ]);
  });

  it('asks the further check even where the schema has failed', () => {
    const check = () => [{ pointer: '/more', detail: 'Another thing.' }];
    expect(errorsOf(() => parse(z.object({ a: z.string() }), {}, check))).toHaveLength(2);
    expect(errorsOf(() => parse(z.object({ a: z.string() }), { a: '' }, check))).toHaveLength(1);
  });
});

describe('parsing a change', () => {
  const schema = z.object({ name: z.string(), notes: z.string().default('') });

  it('leaves out what was not sent, though the schema has a default for it', () => {
    expect(parsePatch(schema, jsonRequest({ name: 'x' }))).toEqual({ name: 'x' });
    expect(parsePatch(schema, jsonRequest({ notes: '' }))).toEqual({ notes: '' });
    expect(parsePatch(schema, jsonRequest({}))).toEqual({});
  });

  it('leaves out keys it does not know', () => {
    expect(parsePatch(schema, jsonRequest({ ownerId: 'x' }))).toEqual({});
  });

  it('refuses what is no object', () => {
    for (const body of [undefined, null, [], 'x']) {
      expect(errorsOf(() => parsePatch(schema, jsonRequest(body)))).toMatchObject([{ pointer: '' }]);
    }
  });
});
