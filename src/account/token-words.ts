import { TOKEN_SCOPES, type TokenScope } from '../../shared/tokens/tokens.schema.ts';

const WORDS: Record<TokenScope, { label: string; hint: string }> = {
  'people:read': { label: 'Read people', hint: 'Names, notes and every measurement set.' },
  'people:write': { label: 'Change people', hint: 'Add, change and delete people and measurement sets.' },
  'patterns:read': { label: 'Read patterns', hint: 'Size charts, finished measurements and files.' },
  'patterns:write': { label: 'Change patterns', hint: 'Import, change and delete patterns.' },
  'plans:read': { label: 'Read plans', hint: 'Saved plans, and plans reckoned on the spot.' },
  'plans:write': { label: 'Change plans', hint: 'Save, rename and delete plans.' },
};

export const SCOPE_BOXES = TOKEN_SCOPES.map((value) => ({ value, ...WORDS[value] }));

/** “Reads people and patterns, changes plans”: what a token may do, in one breath. */
export function sayScopes(scopes: readonly TokenScope[]): string {
  const nouns = (verb: 'read' | 'write') =>
    TOKEN_SCOPES.filter((scope) => scopes.includes(scope) && scope.endsWith(`:${verb}`)).map(
      (scope) => scope.split(':')[0] ?? '',
    );
  const [read, written] = [nouns('read'), nouns('write')];
  const parts = [
    ...(read.length > 0 ? [`reads ${joined(read)}`] : []),
    ...(written.length > 0 ? [`changes ${joined(written)}`] : []),
  ];
  const words = parts.join(', ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

const joined = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1) ?? ''}`;

/** How long a token may live, in days; null without an end. */
export const LIFETIMES = [
  { value: '30', label: '30 days' },
  { value: '90', label: '90 days' },
  { value: '365', label: 'A year' },
  { value: 'never', label: 'Until I withdraw it' },
] as const;

/** The moment that many days from now, in ISO 8601; null for anything that is no number of days. */
export function endAfter(lifetime: string, now: Date): string | null {
  const days = Number(lifetime);
  if (lifetime === '' || !Number.isFinite(days)) return null;
  return new Date(now.getTime() + days * 86_400_000).toISOString();
}
