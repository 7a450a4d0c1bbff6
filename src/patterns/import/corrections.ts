import { useState } from 'react';
import type { ImportCorrections, ImportTable, TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { useChangeImport } from '../queries.ts';

/** What a person has chosen for a table so far, read off the table itself. */
function correctionsOf(table: ImportTable): ImportCorrections {
  const chosen = table.columns.filter((column) => column.sureness === 'chosen');
  return {
    unit: table.unitFrom === 'chosen' ? table.unit : null,
    points: Object.fromEntries(chosen.map(({ column, point }) => [String(column), point])),
  };
}

/**
 * Choosing what a column is, or the unit. The choice shows at once; the server reads the table again and answers how
 * it then stands. Where that fails, the table is shown as the server still has it.
 */
export function useCorrections(draftId: string, role: TableRole, table: ImportTable) {
  const change = useChangeImport(draftId);
  const [asked, setAsked] = useState<ImportCorrections | null>(null);
  const corrections = asked ?? correctionsOf(table);
  const send = (next: ImportCorrections) => {
    setAsked(next);
    change.mutate(
      { [role]: next },
      {
        // Only the last of several answers ends the waiting.
        onSettled: () => setAsked(null),
      },
    );
  };
  return {
    pointOf: (column: number, read: PointId | null) => {
      const chosen = corrections.points[String(column)];
      return chosen === undefined ? read : chosen;
    },
    unit: corrections.unit ?? table.unit,
    choosePoint: (column: number, point: PointId | null) =>
      send({ ...corrections, points: { ...corrections.points, [String(column)]: point } }),
    chooseUnit: (unit: LengthUnit | null) => send({ ...corrections, unit }),
    isReading: change.isPending,
    error: change.error,
  };
}
