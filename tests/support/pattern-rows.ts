import { pattern, patternRevision } from '../../server/patterns/patterns.table.ts';
import type { Db } from '../../server/db/client.ts';
import { newId } from '../../server/db/columns.ts';
import type { PatternTable } from '../../shared/patterns/patterns.schema.ts';

const column = <T extends number | { low: number; high: number }>(
  point: 'bust' | 'waist' | 'hip',
  mm: T[],
) => ({
  point,
  heading: point,
  unit: 'mm' as const,
  mm,
  typed: mm.map((value) => (typeof value === 'number' ? String(value) : `${value.low}–${value.high}`)),
});

/** Four sizes of an invented skirted dress, 40 mm apart, 60 to 80 mm of ease. */
export const DRESS_TABLE: PatternTable = {
  sizes: ['10', '12', '14', '16'],
  chart: [
    column('bust', [880, 920, 960, 1000]),
    column('waist', [700, 740, 780, 820]),
    column('hip', [940, 980, 1020, 1060]),
  ],
  finished: [
    column('bust', [960, 1000, 1040, 1080]),
    column('waist', [760, 800, 840, 880]),
    column('hip', [1010, 1050, 1090, 1130]),
  ],
};

/** A pattern with one revision, straight into the tables: for tests of what is built on patterns. */
export async function insertPattern(
  db: Db,
  ownerId: string,
  more: Partial<typeof pattern.$inferInsert> & { table?: PatternTable } = {},
): Promise<{ patternId: string; revisionId: string }> {
  const { table = DRESS_TABLE, ...columns } = more;
  const patternId = newId();
  const revisionId = newId();
  const now = new Date();
  await db.insert(pattern).values({
    id: patternId,
    ownerId,
    title: 'Skirted dress',
    maker: 'Nobody',
    number: '1',
    kind: 'dress',
    silhouette: 'fitted',
    structure: 'woven',
    cloth: '',
    worn: 'closed',
    seamEdges: {},
    compareAs: {},
    notes: '',
    latestRevisionId: revisionId,
    createdAt: now,
    updatedAt: now,
    ...columns,
  });
  await db.insert(patternRevision).values({ id: revisionId, patternId, number: 1, table, createdAt: now });
  return { patternId, revisionId };
}
