import { describe, expect, it } from 'vitest';
import { ProblemError } from '../../../../src/api/problem-error.ts';
import { failureWords, messageAt, summaryOf } from '../../../../src/ui/use-server-errors.ts';

describe('the summary of a form’s errors', () => {
  it('lists them as the form shows its fields, then what belongs to none', () => {
    const errors = { b: { type: 'x', message: 'B is wrong' }, a: { type: 'x', message: 'A is wrong' } };
    const fields = [
      { name: 'a' as const, label: 'A' },
      { name: 'b' as const, label: 'B', id: 'b-field' },
    ];
    expect(summaryOf<{ a: string; b: string }>(errors, fields, ['The rest.'])).toEqual([
      { label: 'A', message: 'A is wrong', fieldId: 'a' },
      { label: 'B', message: 'B is wrong', fieldId: 'b-field' },
      { message: 'The rest.' },
    ]);
  });

  it('finds the message of a field within others, and none where there is none', () => {
    expect(messageAt({ typed: { hip: { message: 'No length' } } }, 'typed.hip')).toBe('No length');
    expect(messageAt({ typed: {} }, 'typed.hip')).toBeUndefined();
    expect(messageAt({}, 'typed.hip')).toBeUndefined();
  });
});

describe('a failure in words', () => {
  const problem = (status: number, more: object = {}) =>
    new ProblemError({ type: '/problems/x', title: 'It failed', status, ...more });

  it('says the detail, or else the title', () => {
    expect(failureWords(problem(409, { detail: 'A plan uses it.' }))).toBe('A plan uses it.');
    expect(failureWords(problem(409))).toBe('It failed.');
  });

  it('names the request where the fault is the server’s', () => {
    expect(failureWords(problem(500, { requestId: 'r-1' }))).toContain('r-1');
    expect(failureWords(problem(422, { requestId: 'r-1' }))).not.toContain('r-1');
  });

  it('sends to another tab where the session has ended, so that nothing typed is lost', () => {
    expect(failureWords(problem(401))).toContain('another tab');
  });

  it('shows nothing of an error it does not know', () => {
    expect(failureWords(new Error('secret'))).not.toContain('secret');
  });
});
