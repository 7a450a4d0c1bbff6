import type { z } from 'zod';

type RawIssue = Parameters<z.core.$ZodErrorMap>[0];

const KINDS: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  object: 'an object',
  record: 'an object',
  array: 'a list',
};

const FORMATS: Record<string, string> = {
  uuid: 'an id as this server gave it',
  date: 'a day as year-month-day, such as 2025-03-31',
  datetime: 'a moment as 2025-03-31T12:00:00Z',
  email: 'an e-mail address, such as name@example.org',
};

/** What would be right, for the issues whose schema does not say it in its own words. */
export function sayIssue(issue: RawIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return `${issue.input === undefined ? 'This is missing: give' : 'Give'} ${KINDS[issue.expected] ?? issue.expected}.`;
    case 'invalid_value':
      return `Give ${sayChoice(issue.values.map(String))}.`;
    case 'invalid_format':
      return `Give ${FORMATS[issue.format] ?? `text in the form ${issue.format}`}.`;
    case 'too_big':
      return sayBound(issue.origin, Number(issue.maximum), 'most');
    case 'too_small':
      return sayBound(issue.origin, Number(issue.minimum), 'least', issue.inclusive === false);
    case 'unrecognized_keys':
    case 'invalid_key':
      return 'Leave this out: it is not known here.';
    case 'invalid_union':
      return 'None of the forms this may take was given.';
    default:
      return 'This cannot be used as it is.';
  }
}

function sayChoice(values: string[]): string {
  const last = values.at(-1) ?? '';
  return values.length < 2 ? last : `${values.slice(0, -1).join(', ')} or ${last}`;
}

function sayBound(origin: string, bound: number, end: 'most' | 'least', excluded = false): string {
  if (origin === 'string') return `Use at ${end} ${bound} ${bound === 1 ? 'character' : 'characters'}.`;
  if (origin === 'array' || origin === 'set') return `Give at ${end} ${bound} of these.`;
  return excluded ? `Give more than ${bound}.` : `Give at ${end} ${bound}.`;
}
