import type { FitPlan, PointResult, SizeChoice, ZonePlan } from '../../../shared/fit/fit.schema.ts';
import { ZONE_IDS, type ZoneId } from '../../../shared/fit/fit-words.ts';
import { POINT_IDS, type PointId } from '../../../shared/points/point-ids.ts';

/** One line of the instrument: a point, or a zone in which nothing is measured. */
export interface FitRow {
  key: string;
  zone: ZoneId;
  /** Null where the zone has no measured point and follows its neighbour. */
  result: PointResult | null;
  /** The zone's one handle stands in this row. */
  hasNode: boolean;
  isBranch: boolean;
  position: number;
  size: SizeChoice;
  /** The zone that a zone without a measured point takes its size from; null where it has a point. */
  follows: ZoneId | null;
}

/** Zones that are sewn to the shoulder and leave the trunk there. */
export const isBranchZone = (zone: ZoneId) => zone === 'neck' || zone === 'sleeve';

/** From neck to hem, then the sleeve: it is cut after the body, and its line would otherwise run across the body's. */
const ZONE_ORDER: readonly ZoneId[] = [...ZONE_IDS.filter((zone) => zone !== 'sleeve'), 'sleeve'];

/** Points in the order in which they lie on a body; what is not here keeps the catalogue's order behind them. */
const DOWN_THE_BODY: readonly PointId[] = [
  'shoulderLength',
  'shoulderWidth',
  'upperBust',
  'frontWidth',
  'backWidth',
  'armscye',
];

/**
 * The rows of a plan from neck to hem. A zone without a point keeps a row of its own, so that it can be held too.
 * `unheld` are the zones with nothing held: the handle stays in their governing row, lest it leaves the hand that moves it.
 */
export function rowsInOrder(
  { zones, points }: Pick<FitPlan, 'zones' | 'points'>,
  unheld: readonly ZonePlan[] = zones,
): FitRow[] {
  return ZONE_ORDER.flatMap((zone): FitRow[] => {
    const plan = zones.find((candidate) => candidate.zone === zone);
    if (!plan) return [];
    const { governedBy } = unheld.find((candidate) => candidate.zone === zone) ?? plan;
    const own = points.filter((result) => result.zone === zone).sort(byHeight);
    const base = {
      zone,
      isBranch: isBranchZone(zone),
      position: plan.size.position,
      size: plan.size,
      follows: null,
    };
    if (own.length === 0) {
      return [
        { ...base, key: zone, result: null, hasNode: true, follows: nearestMeasured(zone, zones, points) },
      ];
    }
    const handle = own.find((result) => result.point === governedBy) ?? own[0];
    return own.map((result) => ({ ...base, key: result.point, result, hasNode: result === handle }));
  });
}

function byHeight(a: PointResult, b: PointResult): number {
  return heightRank(a.point) - heightRank(b.point);
}

function heightRank(point: PointId): number {
  const known = DOWN_THE_BODY.indexOf(point);
  return known === -1 ? DOWN_THE_BODY.length + POINT_IDS.indexOf(point) : known;
}

/** Up the body first, as the size is carried down from there; a branch hangs on the shoulder. */
function nearestMeasured(
  zone: ZoneId,
  zones: readonly ZonePlan[],
  points: readonly PointResult[],
): ZoneId | null {
  const trunk = ZONE_IDS.filter((each) => !isBranchZone(each) && zones.some((plan) => plan.zone === each));
  if (isBranchZone(zone)) return trunk[0] ?? null;
  const at = trunk.indexOf(zone);
  const isMeasured = (each: ZoneId) => points.some((result) => result.zone === each);
  return trunk.slice(0, at).reverse().find(isMeasured) ?? trunk.slice(at + 1).find(isMeasured) ?? null;
}
