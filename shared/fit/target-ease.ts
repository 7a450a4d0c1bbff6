import type { PointId } from '../points/point-ids.ts';
import { hasWaistband } from './garments.ts';
import type { GarmentKind, Silhouette } from './fit-words.ts';
import { wearingEase } from './wearing-ease.ts';
import type { Standing } from './wearing-ease.ts';

/** The ease a silhouette is usually drafted with, in mm (`highMm` null: and more). */
export interface TargetEase {
  lowMm: number;
  highMm: number | null;
  source: string;
  standing: Standing;
}

const CHART = 'five-silhouette ease chart reprinted in sewing textbooks: from memory';
const CAPE = 'a loose cape has about 4 in at the bust and 12 in at the hip: common practice';
const WAISTBAND = 'a waistband is drafted to its wearing ease in every silhouette: common practice';

type Chart = Partial<Record<Silhouette, readonly [lowInches: number, highInches: number | null]>>;

const TOPS: Chart = {
  close: [0, 2.875],
  fitted: [3, 4],
  semiFitted: [4.125, 5],
  loose: [5.125, 8],
  veryLoose: [8, null],
};
const JACKETS: Chart = {
  fitted: [3.75, 4.25],
  semiFitted: [4.375, 5.75],
  loose: [5.875, 10],
  veryLoose: [10, null],
};
const COATS: Chart = {
  fitted: [5.25, 6.75],
  semiFitted: [6.875, 8],
  loose: [8.125, 12],
  veryLoose: [12, null],
};
const SEATS: Chart = { fitted: [2, 3], semiFitted: [3.125, 4], loose: [4.125, 6], veryLoose: [6, null] };
const CAPE_BUST: Chart = { loose: [4, 4] };
const CAPE_HIP: Chart = { loose: [12, 12] };

/**
 * The chart names dress, blouse, shirt, top and vest; jacket; coat; skirt, trousers, shorts and culottes. Beside these
 * a cardigan is read as a jacket, a robe as a coat, and a jumpsuit, nightwear and a boned bodice as tops (common practice).
 */
const BUST: Partial<Record<GarmentKind, Chart>> = {
  shirt: TOPS,
  knitTop: TOPS,
  sweatshirt: TOPS,
  dress: TOPS,
  waistcoat: TOPS,
  jumpsuit: TOPS,
  nightwear: TOPS,
  bonedBodice: TOPS,
  cardigan: JACKETS,
  jacket: JACKETS,
  coat: COATS,
  robe: COATS,
  cape: CAPE_BUST,
};
const HIP: Partial<Record<GarmentKind, Chart>> = {
  skirt: SEATS,
  trousers: SEATS,
  shorts: SEATS,
  leggings: SEATS,
  jumpsuit: SEATS,
  dungarees: SEATS,
  cape: CAPE_HIP,
};

/**
 * The handbook's target ease of a garment kind at a point for a silhouette, in mm, with its source; null where it has
 * none (the waist of a boxy shirt) or no silhouette is given.
 */
export function targetEase(
  kind: GarmentKind,
  silhouette: Silhouette | undefined,
  point: PointId,
): TargetEase | null {
  if (point === 'waist' && hasWaistband(kind)) {
    const band = wearingEase(kind, point);
    return band && { lowMm: band.lowMm, highMm: band.highMm, source: WAISTBAND, standing: 'commonPractice' };
  }
  const chart = point === 'bust' ? BUST[kind] : point === 'hip' ? HIP[kind] : undefined;
  const range = silhouette && chart?.[silhouette];
  if (!range) return null;
  const [low, high] = range;
  return {
    lowMm: low * 25.4,
    highMm: high === null ? null : high * 25.4,
    source: kind === 'cape' ? CAPE : CHART,
    standing: kind === 'cape' ? 'commonPractice' : 'fromMemory',
  };
}

/** The one figure reckoned with, in mm: the middle of the range, or its low end where it has no upper figure. */
export function targetEaseMm(target: Pick<TargetEase, 'lowMm' | 'highMm'>): number {
  return target.highMm === null ? target.lowMm : (target.lowMm + target.highMm) / 2;
}
