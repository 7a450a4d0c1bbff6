import type { DraftDetails, ImportIssue, ImportTable } from '../../../shared/patterns/imports.schema.ts';
import { listed, quote } from '../../../shared/patterns/quote.ts';
import { errorAt } from './issues.ts';

/** What a pattern must have beside its tables, and what is said where it is missing. */
const NEEDED = {
  title: 'Write the title printed on the pattern.',
  kind: 'Choose what kind of garment the pattern makes.',
  silhouette: 'Choose the silhouette: how close the garment is meant to sit.',
  structure: 'Choose whether the pattern is meant for woven or for knit cloth.',
} as const satisfies Partial<Record<keyof DraftDetails, string>>;

/** A field of the details that must be filled in. */
export type NeededDetail = keyof typeof NEEDED;

/** What is missing among the details. */
export function missingDetails(details: DraftDetails): { field: NeededDetail; words: string }[] {
  return (Object.keys(NEEDED) as NeededDetail[])
    .filter((field) => details[field] === undefined || details[field] === '')
    .map((field) => ({ field, words: NEEDED[field] }));
}

/** What stands in the way of a draft as a whole, beside what stands in its tables. */
export function checkDraft(
  details: DraftDetails,
  chart: ImportTable | null,
  finished: ImportTable | null,
): ImportIssue[] {
  const issues = missingDetails(details).map(({ field, words }) => errorAt({}, `${field}Missing`, words));
  if (chart === null && finished === null) {
    issues.push(errorAt({}, 'noTable', 'Bring a size chart, finished measurements, or both.'));
  }
  return chart && finished ? [...issues, ...compareSizes(chart, finished)] : issues;
}

/** True where nothing is left to mend. */
export function isReady(issues: readonly ImportIssue[], tables: readonly (ImportTable | null)[]): boolean {
  const all = [...issues, ...tables.flatMap((table) => table?.issues ?? [])];
  return all.every((issue) => issue.severity !== 'error');
}

function compareSizes(chart: ImportTable, finished: ImportTable): ImportIssue[] {
  const inChart = chart.rows.map((row) => row.label);
  const inFinished = finished.rows.map((row) => row.label);
  if (inChart.length === 0 || inFinished.length === 0) return [];
  const missing = inChart.filter((label) => !inFinished.includes(label));
  const extra = inFinished.filter((label) => !inChart.includes(label));
  if (missing.length + extra.length > 0) {
    const parts = [
      ...(missing.length > 0 ? [`${labels(missing)} in the size chart only`] : []),
      ...(extra.length > 0 ? [`${labels(extra)} in the finished measurements only`] : []),
    ];
    const words = `Both tables need the same sizes under the same names: ${listed(parts)}.`;
    return [errorAt({}, 'sizesDiffer', words)];
  }
  const at = inChart.findIndex((label, place) => label !== inFinished[place]);
  if (at === -1) return [];
  const words = `Both tables need the sizes in the same order: size ${String(at + 1)} is ${quote(inChart[at] ?? '')} in the size chart and ${quote(inFinished[at] ?? '')} in the finished measurements.`;
  return [errorAt({}, 'sizeOrderDiffers', words)];
}

function labels(names: readonly string[]): string {
  const shown = names.slice(0, 8).map(quote);
  return listed(names.length > 8 ? [...shown, `${names.length - 8} more`] : shown);
}
