import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { answer } from '../../../../server/http/answer.ts';

describe('what may leave', () => {
  it('is what the schema names and nothing more', () => {
    const row = { id: 1, ownerId: 'secret' };
    expect(answer(z.object({ id: z.number() }), row)).toEqual({ id: 1 });
  });

  it('is nothing where a value does not fit, and the failure does not repeat the value', () => {
    const row = { hip: 'ninety nine' } as unknown as { hip: number };
    expect(() => answer(z.object({ hip: z.number() }), row)).toThrow('hip (invalid_type)');
    expect(() => answer(z.object({ hip: z.number() }), row)).not.toThrow(/ninety/);
  });
});
