import type { ImportDraft, TableRole } from '../../../shared/patterns/imports.schema.ts';
import { DETAILS_FIELDS, missingDetails, type DetailsValues, type KeptDetails } from '../details-values.ts';
import { TABLE_NAMES } from '../table-names.ts';
import { noteIssues } from './notes.ts';
import { dropId } from './table-file.tsx';

/** One thing that still stands in the way, and where it is mended. */
export interface Obstacle {
  words: string;
  targetId: string | null;
}

/** Everything that keeps a draft from being kept, in the order of the page. */
export function obstaclesOf(draft: ImportDraft, typed: DetailsValues, kept: KeptDetails): Obstacle[] {
  const details = missingDetails(typed, kept).map(({ name, words }): Obstacle => {
    const field = DETAILS_FIELDS.find((known) => known.name === name);
    return { words: field ? `${field.label}: ${words}` : words, targetId: field ? field.name : null };
  });
  return [
    ...details,
    ...(['chart', 'finished'] as const).flatMap((role) => tableObstacles(draft, role)),
    ...draftObstacles(draft),
  ];
}

function tableObstacles(draft: ImportDraft, role: TableRole): Obstacle[] {
  const table = draft[role];
  if (!table) return [];
  const errors = noteIssues(table, role).filter(({ issue }) => issue.severity === 'error');
  const [first] = errors;
  if (!first) return [];
  const words =
    errors.length === 1
      ? `One error in ${TABLE_NAMES[role]}: ${first.issue.words}`
      : `${errors.length} errors in ${TABLE_NAMES[role]}, the first: ${first.issue.words}`;
  return [{ words, targetId: first.id }];
}

/** What is wrong between the parts. Missing details are told by the form, which knows what was typed a moment ago. */
function draftObstacles(draft: ImportDraft): Obstacle[] {
  return draft.issues
    .filter((issue) => issue.severity === 'error' && !issue.code.endsWith('Missing'))
    .map((issue) => ({
      words: issue.words,
      targetId: issue.code === 'noTable' ? dropId('chart') : draft.finished ? dropId('finished') : null,
    }));
}
