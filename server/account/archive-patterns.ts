import { TABLE_ROLES, type TableRole } from '../../shared/patterns/imports.schema.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';
import { csvEntry, jsonEntry, withoutOwner, type Entry } from './archive-entries.ts';
import type { Belongings } from './archive.store.ts';

/** Writes one table of a revision as CSV that can be imported again. */
export type WriteTable = (table: PatternTable, role: TableRole) => string;

const TABLE_NAMES: Record<TableRole, string> = { chart: 'size chart', finished: 'finished measurements' };
const NAME_MAX = 80;

export function patternFiles(all: Belongings, writeTable: WriteTable): Entry[] {
  const { patterns, revisions, drafts, files } = all;
  const revisionsOf = (id: string) => revisions.filter(({ patternId }) => patternId === id);
  const whole = patterns.map((row) => ({ ...withoutOwner(row), revisions: revisionsOf(row.id) }));
  const rows = patterns.map((row) => [
    row.title,
    row.maker,
    row.number,
    row.kind,
    row.silhouette,
    row.structure,
    row.cloth,
    revisionsOf(row.id).length,
    row.notes,
    row.createdAt,
  ]);
  const paths = new Map(uploadEntries(all).map(({ id, path }) => [id, path]));
  return [
    jsonEntry('patterns.json', whole),
    csvEntry(
      'patterns.csv',
      [
        'title',
        'maker',
        'number',
        'kind',
        'silhouette',
        'structure',
        'cloth',
        'revisions',
        'notes',
        'created',
      ],
      rows,
    ),
    ...whole.flatMap((pattern, at) => tablesOf(pattern, at, writeTable)),
    jsonEntry('drafts.json', drafts.map(withoutOwner)),
    jsonEntry(
      'files.json',
      files.map((row) => ({ ...withoutOwner(row), path: paths.get(row.id) })),
    ),
  ];
}

type WholePattern = { title: string; revisions: Belongings['revisions'] };

function tablesOf({ title, revisions }: WholePattern, at: number, writeTable: WriteTable): Entry[] {
  return revisions.flatMap(({ number, table }) =>
    TABLE_ROLES.filter((role) => table[role].length > 0).map((role) => ({
      path: `patterns/${numbered(at, title)}/revision ${number}, ${TABLE_NAMES[role]}.csv`,
      text: writeTable(table, role),
    })),
  );
}

/** Where each uploaded file lies in the archive. */
export function uploadEntries({ files }: Pick<Belongings, 'files'>): { id: string; path: string }[] {
  return files.map(({ id, name }, at) => ({ id, path: `files/${numbered(at, name)}` }));
}

/** A number keeps two of the same name apart; of the name only what every file system takes. */
function numbered(at: number, name: string): string {
  const plain = name
    .normalize('NFC')
    .replace(/[^\p{L}\p{N} ._()-]/gu, '-')
    .replace(/[. ]+$/, '');
  return `${String(at + 1).padStart(3, '0')} ${plain.length > NAME_MAX ? plain.slice(-NAME_MAX) : plain}`;
}
