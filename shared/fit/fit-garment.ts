import { MEASURES } from '../points/measures.ts';
import type { MeasureKind } from '../points/measures.ts';
import type { PointId } from '../points/point-ids.ts';
import {
  SHARE_OF_HANGING,
  SHARE_OF_WIDTHS,
  WEIGHT_FITTED,
  WEIGHT_GOVERNING,
  WEIGHT_LOOSE,
} from './constants.ts';
import type { GarmentKind, Silhouette, ZoneId } from './fit-words.ts';
import { garmentPoints, joinLimits, zonesOf, zoneTree } from './garments.ts';
import type { PointRole } from './garments.ts';
import { defaultSeamEdges } from './seam-edges.ts';
import { targetEase, targetEaseMm } from './target-ease.ts';
import { wearingEase } from './wearing-ease.ts';

/** A garment point with every figure that does not depend on the pattern or the body. Lengths in mm, NaN where none. */
export interface FitPoint {
  point: PointId;
  zone: ZoneId;
  /** The zone's place in `FitGarment.zones`. */
  zoneAt: number;
  role: PointRole;
  /** What its deviation weighs. */
  weight: number;
  /** What its floor, and its pull where it is loose, are multiplied by. */
  share: number;
  measure: MeasureKind;
  wearingMm: number;
  targetMm: number;
  edges: number;
  /** At bust, waist and hip of a garment worn open nothing closes round the body: the floor does not bind. */
  floorBinds: boolean;
}

/** A garment kind in a silhouette, ready to be reckoned with. */
export interface FitGarment {
  /** Parents before children. */
  zones: readonly ZoneId[];
  /** The places in `zones` from neck to hem, as they are shown. */
  shown: readonly number[];
  /** Each zone's parent by index; -1 for the first. */
  parents: readonly number[];
  /** The most sizes a zone may lie from its parent. */
  limits: readonly number[];
  /** What each zone and its join to its parent weigh: neck and sleeve, where they do not govern, only hang on. */
  weights: readonly number[];
  /** From neck to hem. */
  points: readonly FitPoint[];
}

const WEIGHTS: Record<PointRole, number> = {
  governing: WEIGHT_GOVERNING,
  fitted: WEIGHT_FITTED,
  loose: WEIGHT_LOOSE,
};
const LEAVES = new Set<ZoneId>(['neck', 'sleeve']);
const OPEN_ZONES = new Set<ZoneId>(['bust', 'waist', 'hip']);

// The handbook does not change while the program runs, so each combination is worked out once.
const known = new Map<string, FitGarment>();

/** The garment's tree, points and handbook figures for a silhouette, worn closed or open (closed where not said). */
export function fitGarment(
  kind: GarmentKind,
  silhouette: Silhouette | undefined,
  worn: 'closed' | 'open' = 'closed',
): FitGarment {
  const key = `${kind} ${silhouette ?? ''} ${worn}`;
  const found = known.get(key);
  if (found) return found;
  const made = makeGarment(kind, silhouette, worn);
  known.set(key, made);
  return made;
}

function makeGarment(
  kind: GarmentKind,
  silhouette: Silhouette | undefined,
  worn: 'closed' | 'open',
): FitGarment {
  const tree = zoneTree(kind);
  const zones = tree.map((node) => node.zone);
  const joins = joinLimits(kind);
  const governed = garmentPoints(kind).filter(({ role }) => role === 'governing');
  const weights = zones.map((zone) =>
    LEAVES.has(zone) && !governed.some((point) => point.zone === zone) ? SHARE_OF_HANGING : 1,
  );
  return {
    zones,
    weights,
    shown: zonesOf(kind).map((zone) => zones.indexOf(zone)),
    parents: tree.map((node) => (node.parent === null ? -1 : zones.indexOf(node.parent))),
    limits: zones.map((zone) => joins.find((join) => join.to === zone)?.limit ?? 0),
    points: garmentPoints(kind, silhouette, worn).map(({ point, zone, role }) => {
      const target = targetEase(kind, silhouette, point);
      const { kind: measure } = MEASURES[point];
      const zoneAt = zones.indexOf(zone);
      const isWidth = measure === 'width' && role === 'fitted';
      const share = (weights[zoneAt] ?? 1) * (isWidth ? SHARE_OF_WIDTHS : 1);
      return {
        point,
        zone,
        zoneAt,
        role,
        weight: WEIGHTS[role] * share,
        share,
        measure,
        wearingMm: wearingEase(kind, point)?.lowMm ?? NaN,
        targetMm: target ? targetEaseMm(target) : NaN,
        edges: defaultSeamEdges(point, zone),
        floorBinds: !(worn === 'open' && OPEN_ZONES.has(zone)),
      };
    }),
  };
}
