import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';

/**
 * Between which lengths, in mm, a point lies on nearly every body and garment, from a small child to the largest published
 * sizes, and, second, on most grown people. Used only to tell inches from centimetres where nobody wrote the unit, with a
 * caution always. Judgement, wide on purpose, not data (*from memory*); points not named here have no say.
 */
const PLAUSIBLE: Partial<Record<PointId, { all: [number, number]; most: [number, number] }>> = {
  head: { all: [350, 700], most: [520, 640] },
  neck: { all: [190, 620], most: [300, 480] },
  neckBase: { all: [190, 700], most: [330, 520] },
  upperBust: { all: [380, 1900], most: [740, 1350] },
  bust: { all: [380, 2100], most: [760, 1450] },
  underbust: { all: [360, 1800], most: [640, 1250] },
  waist: { all: [360, 2000], most: [560, 1350] },
  abdomen: { all: [380, 2000], most: [640, 1400] },
  highHip: { all: [380, 2100], most: [700, 1400] },
  hip: { all: [380, 2200], most: [800, 1500] },
  trunk: { all: [700, 2300], most: [1300, 1900] },
  thigh: { all: [200, 1100], most: [420, 850] },
  knee: { all: [170, 800], most: [320, 560] },
  calf: { all: [140, 700], most: [300, 520] },
  ankle: { all: [110, 600], most: [200, 330] },
  upperArm: { all: [120, 800], most: [230, 480] },
  elbow: { all: [120, 600], most: [230, 400] },
  wrist: { all: [90, 400], most: [140, 220] },
  armscye: { all: [180, 900], most: [350, 600] },
  shoulderLength: { all: [45, 260], most: [100, 180] },
  shoulderWidth: { all: [200, 700], most: [330, 520] },
  backWidth: { all: [170, 700], most: [300, 480] },
  frontWidth: { all: [160, 700], most: [280, 460] },
  backWaistLength: { all: [170, 620], most: [360, 500] },
  frontWaistLength: { all: [180, 680], most: [380, 560] },
  armLength: { all: [200, 900], most: [520, 700] },
  waistToHip: { all: [70, 350], most: [160, 260] },
  insideLeg: { all: [200, 1050], most: [650, 900] },
  outsideLeg: { all: [300, 1350], most: [900, 1200] },
  bodyRise: { all: [120, 500], most: [220, 360] },
  crotchLength: { all: [300, 1300], most: [560, 900] },
  height: { all: [450, 2300], most: [1450, 2000] },
  garmentLength: { all: [150, 1800], most: [380, 1400] },
  sleeveLength: { all: [60, 900], most: [150, 700] },
  hemGirth: { all: [300, 4000], most: [800, 2600] },
};

/** How much longer than a body's a garment's length may be: a cape or a full skirt at the hip. */
const GARMENT_SHARE = 1.6;

/**
 * How well lengths in mm suit a point: the share that could be, and half as much again for those usual in grown people; null
 * where nothing is known.
 */
export function howPlausible(
  point: PointId,
  lengths: readonly number[],
  role: TableRole,
): { share: number; score: number } | null {
  const range = PLAUSIBLE[point];
  if (!range || lengths.length === 0) return null;
  const most = role === 'finished' ? GARMENT_SHARE : 1;
  const within = ([low, high]: [number, number]) =>
    lengths.filter((mm) => mm >= low && mm <= high * most).length;
  const share = within(range.all) / lengths.length;
  return { share, score: share + within(range.most) / lengths.length / 2 };
}
