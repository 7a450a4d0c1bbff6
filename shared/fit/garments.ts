import type { PointId } from '../points/point-ids.ts';
import { GARMENT_KINDS, ZONE_IDS } from './fit-words.ts';
import type { GarmentKind, Silhouette, ZoneId } from './fit-words.ts';

/**
 * How much a point has to say. Governing: it chooses the size; fitted: it must fit; loose: it only speaks up far
 * from the draft.
 */
export type PointRole = 'governing' | 'fitted' | 'loose';

/** A zone and the zone that it hangs on; null for the first. */
export interface ZoneNode {
  zone: ZoneId;
  parent: ZoneId | null;
}

/** A seam run between two neighbouring zones, and by how many sizes they may differ. */
export interface ZoneJoin {
  from: ZoneId;
  to: ZoneId;
  limit: number;
}

/** A point that a garment is held against, and where. */
export interface GarmentPoint {
  point: PointId;
  zone: ZoneId;
  role: PointRole;
}

type ZonePoints = Partial<Record<PointId, PointRole>>;
type Spec = Partial<Record<ZoneId, ZonePoints>>;

/** Which zone hangs on which; the nearest that the garment has is taken (a skirt's waist is its first). */
const PARENTS: Record<ZoneId, readonly ZoneId[]> = {
  shoulder: [],
  neck: ['shoulder'],
  sleeve: ['shoulder'],
  bust: ['shoulder'],
  waist: ['bust'],
  hip: ['waist'],
  thigh: ['hip'],
  knee: ['thigh'],
  hem: ['knee', 'thigh', 'hip'],
};

/** Parents before children, so that one pass up and one pass down settle the tree. */
const TREE_ORDER: readonly ZoneId[] = [
  'shoulder',
  'neck',
  'sleeve',
  'bust',
  'waist',
  'hip',
  'thigh',
  'knee',
  'hem',
];

/** Judgement: a join of more than two sizes leaves the grain of the draft; these differ for their reasons. */
const LIMITS: Partial<Record<`${ZoneId}-${ZoneId}`, number>> = {
  // A side seam from waist to hip is long and already curved: three sizes still run smoothly.
  'waist-hip': 3,
  // Within one armhole: more than one size and sleeve and armhole no longer meet.
  'shoulder-bust': 1,
  'shoulder-sleeve': 1,
  'shoulder-neck': 2,
};
const LIMIT_ELSEWHERE = 2;

const NECK: ZonePoints = { neck: 'fitted', neckBase: 'fitted' };
// Shoulder length is altered, not chosen by (its grade, some 3 mm, is smaller than the tape's error): loose.
const SHOULDER: ZonePoints = {
  upperBust: 'governing',
  shoulderWidth: 'fitted',
  backWidth: 'fitted',
  frontWidth: 'fitted',
  armscye: 'loose',
  shoulderLength: 'loose',
};
const SLEEVE: ZonePoints = { upperArm: 'fitted', elbow: 'loose', wrist: 'loose' };
const BUST: ZonePoints = {
  bust: 'governing',
  underbust: 'loose',
  bustPointSpan: 'loose',
  bustFrontArc: 'loose',
  bustBackArc: 'loose',
};
const HIP: ZonePoints = {
  hip: 'fitted',
  highHip: 'fitted',
  abdomen: 'loose',
  hipFrontArc: 'loose',
  hipBackArc: 'loose',
};
// Lower garments are chosen by the hip: Carlson, EC 742, Oregon State Univ. Extension, 1969.
const SEAT: ZonePoints = { ...HIP, hip: 'governing' };
const THIGH: ZonePoints = { thigh: 'fitted' };
const KNEE: ZonePoints = { knee: 'loose', calf: 'loose' };

const loose = (points: ZonePoints): ZonePoints =>
  Object.fromEntries(Object.keys(points).map((point) => [point, 'loose']));

const TOP: Spec = {
  neck: NECK,
  shoulder: SHOULDER,
  sleeve: SLEEVE,
  bust: BUST,
  waist: { waist: 'fitted' },
  hip: HIP,
  hem: {},
};
const EASY_TOP: Spec = { ...TOP, waist: { waist: 'loose' }, hip: loose(HIP) };
// Neck and shoulder carry a cape; its girths hang free (common practice: sized by shoulder and neck).
const HUNG: Spec = {
  neck: { neck: 'governing', neckBase: 'governing' },
  shoulder: { ...SHOULDER, shoulderWidth: 'governing' },
  bust: loose(BUST),
  waist: { waist: 'loose' },
  hip: loose(HIP),
  hem: {},
};
const TROUSERS: Spec = { waist: { waist: 'fitted' }, hip: SEAT, thigh: THIGH, knee: KNEE, hem: {} };

const SPECS: Record<GarmentKind, Spec> = {
  shirt: TOP,
  knitTop: TOP,
  sweatshirt: EASY_TOP,
  dress: TOP,
  skirt: { waist: { waist: 'fitted' }, hip: SEAT, hem: {} },
  // Where the hip is not fitted a skirt is chosen by the waist: common practice.
  fullSkirt: { waist: { waist: 'governing' }, hip: loose(HIP), hem: {} },
  trousers: TROUSERS,
  shorts: { waist: { waist: 'fitted' }, hip: SEAT, thigh: THIGH, hem: {} },
  leggings: { ...TROUSERS, knee: { knee: 'fitted', calf: 'fitted' }, hem: { ankle: 'fitted' } },
  waistcoat: { neck: NECK, shoulder: SHOULDER, bust: BUST, waist: { waist: 'fitted' }, hip: HIP, hem: {} },
  cardigan: EASY_TOP,
  jacket: TOP,
  coat: TOP,
  cape: HUNG,
  wrap: HUNG,
  jumpsuit: { ...TOP, hip: SEAT, thigh: THIGH, knee: KNEE },
  // The straps of a bib adjust, so nothing above the bib is held against the body.
  dungarees: { bust: loose(BUST), ...TROUSERS },
  robe: EASY_TOP,
  nightwear: EASY_TOP,
  swimwear: {
    shoulder: SHOULDER,
    bust: { ...BUST, underbust: 'fitted' },
    waist: { waist: 'fitted' },
    hip: SEAT,
    thigh: { thigh: 'loose' },
  },
  bonedBodice: {
    shoulder: SHOULDER,
    bust: { ...BUST, underbust: 'fitted' },
    waist: { waist: 'governing' },
    hip: HIP,
    hem: {},
  },
};

/** A waistband sits on the waist whatever hangs below it, so a loose silhouette does not loosen it. */
const WAISTBANDED = new Set<GarmentKind>(['skirt', 'fullSkirt', 'trousers', 'shorts', 'leggings']);

/** Whether a garment of this kind hangs from a waistband, which fits the waist in every silhouette. */
export function hasWaistband(kind: GarmentKind): boolean {
  return WAISTBANDED.has(kind);
}

/** The zones of a garment kind, from neck to hem. */
export function zonesOf(kind: GarmentKind): readonly ZoneId[] {
  const spec = SPECS[kind];
  return ZONE_IDS.filter((zone) => spec[zone] !== undefined);
}

/** The zones of a garment kind as a tree, each with the zone it hangs on; parents stand before children. */
export function zoneTree(kind: GarmentKind): readonly ZoneNode[] {
  const spec = SPECS[kind];
  return TREE_ORDER.filter((zone) => spec[zone] !== undefined).map((zone) => ({
    zone,
    parent: PARENTS[zone].find((parent) => spec[parent] !== undefined) ?? null,
  }));
}

/** The joins between neighbouring zones of a garment kind, each with the most sizes it may span (judgement). */
export function joinLimits(kind: GarmentKind): readonly ZoneJoin[] {
  return zoneTree(kind).flatMap(({ zone, parent }) =>
    parent === null
      ? []
      : [{ from: parent, to: zone, limit: LIMITS[`${parent}-${zone}`] ?? LIMIT_ELSEWHERE }],
  );
}

/**
 * The points a garment is held against, from neck to hem, each with its role. A loose or very loose silhouette, and
 * a garment worn open, make bust, waist and hip loose; a waistband stays fitted.
 */
export function garmentPoints(
  kind: GarmentKind,
  silhouette?: Silhouette,
  worn?: 'closed' | 'open',
): readonly GarmentPoint[] {
  const isLoose = silhouette === 'loose' || silhouette === 'veryLoose' || worn === 'open';
  const spec = SPECS[kind];
  return zonesOf(kind).flatMap((zone) =>
    Object.entries(spec[zone] ?? {}).map(([point, role]) => ({
      point: point as PointId,
      zone,
      role: isLoose && loosens(kind, zone) ? 'loose' : role,
    })),
  );
}

/** Whether this text names a garment kind. */
export function isGarmentKind(kind: string): kind is GarmentKind {
  return (GARMENT_KINDS as readonly string[]).includes(kind);
}

function loosens(kind: GarmentKind, zone: ZoneId): boolean {
  return zone === 'bust' || zone === 'hip' || (zone === 'waist' && !WAISTBANDED.has(kind));
}
