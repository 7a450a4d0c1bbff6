import { z } from 'zod';
import { zonesOf } from '../../shared/fit/garments.ts';
import { draftDetailsSchema, type DraftDetails } from '../../shared/patterns/imports.schema.ts';
import { patternInputSchema, type PatternInput } from '../../shared/patterns/patterns.schema.ts';
import type { PointId } from '../../shared/points/point-ids.ts';

/** The levels at which a form asks for the seam edges: a change in girth is shared over them. */
export const SEAM_LEVELS = ['bust', 'waist', 'hip'] as const;
export type SeamLevel = (typeof SEAM_LEVELS)[number];

/** Front and back at either side: what most garments have (common practice). */
const TWO_SIDE_SEAMS = '4';

/** The details as a form holds them: every field a text, '' where nothing is chosen yet. */
export interface DetailsValues {
  title: string;
  maker: string;
  number: string;
  kind: PatternInput['kind'] | '';
  silhouette: PatternInput['silhouette'] | '';
  structure: PatternInput['structure'] | '';
  cloth: string;
  worn: PatternInput['worn'];
  seamEdges: Record<SeamLevel, string>;
  notes: string;
}

/** The fields in the order in which the form shows them, with the words a summary calls them by. */
export const DETAILS_FIELDS = [
  { name: 'title', label: 'Title' },
  { name: 'maker', label: 'Maker' },
  { name: 'number', label: 'Number' },
  { name: 'kind', label: 'Kind of garment' },
  { name: 'structure', label: 'Woven or knit' },
  { name: 'cloth', label: 'Cloth it is meant for' },
  { name: 'silhouette', label: 'Silhouette' },
  { name: 'worn', label: 'Worn' },
  { name: 'seamEdges.bust', label: 'Seam edges at the bust' },
  { name: 'seamEdges.waist', label: 'Seam edges at the waist' },
  { name: 'seamEdges.hip', label: 'Seam edges at the hip' },
  { name: 'notes', label: 'Notes' },
] as const;

/** The levels that a garment of this kind has: trousers have no bust. All of them while the kind is not chosen. */
export function seamLevels(kind: DetailsValues['kind']): readonly SeamLevel[] {
  if (kind === '') return SEAM_LEVELS;
  const zones = zonesOf(kind);
  return SEAM_LEVELS.filter((level) => zones.includes(level));
}

/** The form's beginning: what is known, and what most patterns are where nothing is. */
export function toValues(details: DraftDetails): DetailsValues {
  const edges = (level: SeamLevel) => {
    const known = details.seamEdges?.[level];
    return known === undefined ? TWO_SIDE_SEAMS : String(known);
  };
  return {
    title: details.title ?? '',
    maker: details.maker ?? '',
    number: details.number ?? '',
    kind: details.kind ?? '',
    silhouette: details.silhouette ?? '',
    structure: details.structure ?? '',
    cloth: details.cloth ?? '',
    worn: details.worn ?? 'closed',
    seamEdges: { bust: edges('bust'), waist: edges('waist'), hip: edges('hip') },
    notes: details.notes ?? '',
  };
}

/** What the form does not ask for and must not lose: seam edges at other levels, and where a point is held against another. */
export type KeptDetails = Pick<DraftDetails, 'seamEdges' | 'compareAs'>;

/** The values as the schemas want them: what is not chosen is absent, a level without a number is absent. */
function toCandidate(values: DetailsValues, kept: KeptDetails): Record<string, unknown> {
  const { kind, silhouette, structure, seamEdges, ...texts } = values;
  const edges: Partial<Record<PointId, number>> = { ...kept.seamEdges };
  const levels = seamLevels(kind);
  for (const level of SEAM_LEVELS) {
    const text = seamEdges[level].trim();
    if (text === '' || !levels.includes(level)) Reflect.deleteProperty(edges, level);
    else edges[level] = Number(text);
  }
  const chosen = Object.entries({ kind, silhouette, structure }).filter(([, value]) => value !== '');
  return { ...texts, ...Object.fromEntries(chosen), seamEdges: edges, compareAs: kept.compareAs ?? {} };
}

const WORDS: Record<string, string> = {
  kind: 'Choose what kind of garment it makes.',
  silhouette: 'Choose the silhouette: the envelope’s drawing or description shows it.',
  structure: 'Choose whether it is meant for a woven or a knit.',
  seamEdges: 'Write a whole number from 1 to 24, such as 4.',
};

/** What would be right, where the schema does not say it in words of its own. */
function sayIssue(issue: z.core.$ZodRawIssue): string {
  const words = WORDS[String(issue.path?.[0])];
  if (words !== undefined) return words;
  if (issue.code === 'too_big') return `Use at most ${String(issue.maximum)} characters.`;
  return 'This cannot be used as it is.';
}

const values = z.custom<DetailsValues>();

/** A form's values to a whole pattern's details. */
export const wholeDetails = (kept: KeptDetails) =>
  values.transform((value): unknown => toCandidate(value, kept)).pipe(patternInputSchema);

/** A form's values to a draft's details, where anything may still be missing. */
export const draftDetails = (kept: KeptDetails) =>
  values.transform((value): unknown => toCandidate(value, kept)).pipe(draftDetailsSchema);

/** For a resolver: the words of what a schema refuses. */
export const detailsErrors = { error: sayIssue };

/**
 * What of a form's values can be kept now: everything but the fields that are not right yet. Those are absent, so that
 * what was kept of them before stands; `isAll` is false where there are any.
 */
export function savableDetails(
  typed: DetailsValues,
  kept: KeptDetails,
): { details: DraftDetails; isAll: boolean } {
  const candidate = toCandidate(typed, kept);
  const result = draftDetailsSchema.safeParse(candidate);
  if (result.success) return { details: result.data, isAll: true };
  const wrong = new Set(result.error.issues.map((issue) => String(issue.path[0])));
  const right = Object.entries(candidate).filter(([name]) => !wrong.has(name));
  const parsed = Object.entries(draftDetailsSchema.parse(Object.fromEntries(right)));
  // A schema's default would fill in what was left out.
  return { details: Object.fromEntries(parsed.filter(([name]) => !wrong.has(name))), isAll: false };
}

/** What is still missing or not right before a pattern can be kept, by field. */
export function missingDetails(typed: DetailsValues, kept: KeptDetails): { name: string; words: string }[] {
  const result = patternInputSchema.safeParse(toCandidate(typed, kept), detailsErrors);
  return (result.error?.issues ?? []).map((issue) => ({ name: issue.path.join('.'), words: issue.message }));
}
