import type { AdminReference } from '../../shared/admin/reference.schema.ts';
import { demoAstmTable, demoJisTable } from '../../shared/demo/published-tables.ts';
import { GARMENT_KINDS } from '../../shared/fit/fit-words.ts';
import { wearingEase } from '../../shared/fit/wearing-ease.ts';
import { POINT_IDS } from '../../shared/points/point-ids.ts';

/** The published body tables and the wearing ease that this version carries, each with its source. */
export function carriedReference(): AdminReference {
  return {
    bodyTables: [demoAstmTable, demoJisTable].map(({ details, unit, sizes, chart }) => ({
      title: details.title,
      maker: details.maker,
      number: details.number,
      source: details.notes,
      unit,
      sizes: [...sizes],
      points: POINT_IDS.filter((point) => chart[point] !== undefined),
    })),
    wearingEase: GARMENT_KINDS.flatMap((kind) =>
      POINT_IDS.flatMap((point) => {
        const ease = wearingEase(kind, point);
        return ease === null ? [] : [{ kind, point, ...ease }];
      }),
    ),
  };
}
