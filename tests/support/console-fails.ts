import { afterEach, beforeEach, expect, vi } from 'vitest';

const METHODS = ['debug', 'error', 'info', 'log', 'trace', 'warn'] as const;
let said: string[] = [];

beforeEach(() => {
  said = [];
  for (const method of METHODS) {
    vi.spyOn(console, method).mockImplementation((...values: unknown[]) => {
      said.push(`console.${method}: ${values.map(String).join(' ')}`);
    });
  }
});

/** A test that prints hides what the next one prints: whoever expects a message mocks the console itself. */
afterEach(() => {
  vi.restoreAllMocks();
  expect(said, 'a test must not print').toEqual([]);
});
