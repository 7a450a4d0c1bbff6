import { GARMENT_KINDS, SILHOUETTES, type Silhouette } from '../../shared/fit/fit-words.ts';
import { capital, KIND_WORDS, SILHOUETTE_WORDS } from '../../shared/fit/say-words.ts';
import type { PatternSummary } from '../../shared/patterns/patterns.schema.ts';

/** What each silhouette means in ease, in one sentence. Common practice. */
const SILHOUETTE_MEANINGS: Record<Silhouette, string> = {
  close: 'Follows the body: little or no more room than wearing it takes.',
  fitted: 'Shaped to the body, with a little room beyond what wearing takes.',
  semiFitted: 'Shaped at the waist, with room that shows.',
  loose: 'Hangs away from the body: room you can gather in a hand.',
  veryLoose: 'Mostly room: the body hardly shapes it.',
};

export const SILHOUETTE_CHOICES = SILHOUETTES.map((value) => ({
  value,
  label: capital(SILHOUETTE_WORDS[value]),
  hint: SILHOUETTE_MEANINGS[value],
}));

export const KIND_OPTIONS = GARMENT_KINDS.map((value) => ({ value, label: capital(KIND_WORDS[value]) }));

/** “Narrowcut Works, NW 11”, or as much of it as is known. */
export function sayMaker({
  maker,
  number,
}: {
  maker?: string | undefined;
  number?: string | undefined;
}): string {
  return [maker, number].filter((part) => part !== undefined && part !== '').join(', ');
}

/** “fitted dress, woven”: what it makes, in the order one says it. */
export function sayKind(pattern: Pick<PatternSummary, 'kind' | 'silhouette' | 'structure'>): string {
  return `${SILHOUETTE_WORDS[pattern.silhouette]} ${KIND_WORDS[pattern.kind]}, ${pattern.structure}`;
}

/** “14 sizes, 6 to 32”, “one size, M”. */
export function saySizes(sizes: readonly string[]): string {
  const first = sizes[0] ?? '';
  if (sizes.length < 2) return first === '' ? 'no sizes' : `one size, ${first}`;
  return `${sizes.length} sizes, ${first} to ${sizes[sizes.length - 1] ?? ''}`;
}

/** Which of the two tables a pattern publishes. */
export function sayPublished({ hasChart, hasFinished }: { hasChart: boolean; hasFinished: boolean }): string {
  if (hasChart && hasFinished) return 'Size chart and finished measurements';
  return hasChart ? 'Size chart only' : 'Finished measurements only';
}

/** What follows from that for whoever plans with it. */
export function sayPublishedMeaning({
  hasChart,
  hasFinished,
}: {
  hasChart: boolean;
  hasFinished: boolean;
}): string {
  if (hasChart && hasFinished) {
    return 'Both tables are known, so the room the draft gives is known at every point that stands in both.';
  }
  return hasChart
    ? 'Only the bodies are known that its sizes are drafted for: the ease the draft gives stays the drafter’s secret.'
    : 'Only the sewn garment is known: a plan compares it with a person directly, and takes the drafted ease from the handbook where there is one.';
}
