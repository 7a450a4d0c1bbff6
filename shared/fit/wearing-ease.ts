import type { PointId } from '../points/point-ids.ts';
import type { GarmentKind } from './fit-words.ts';

/** How well a figure is founded: read in a publication, told by sewing teachers, or remembered. */
export type Standing = 'published' | 'commonPractice' | 'fromMemory';

/** Movement ease over the body in a rigid woven, in mm; sources differ, so it is a range (`highMm` null: no upper figure). */
export interface WearingEase {
  lowMm: number;
  highMm: number | null;
  source: string;
  standing: Standing;
}

const KREIFELS =
  "Kreifels & Speece, Sewing Women's Pants and Shorts, EC73-455, Univ. of Nebraska Extension, 1973";
const C209 = 'Measurements for Fitting Pants, Guide C-209, New Mexico State Univ. Extension';
const ROBINSON =
  'Robinson, on-line costume textbook, ch. 16 Ease in Clothing and ch. 17 Pattern Alterations, Central Washington Univ.';
const MCCUNN = 'McCunn, How to Make Sewing Patterns';
const THREADS = 'Threads magazine, Set-in Sleeve Solutions, 2021';
const PRACTICE = 'common practice (sewing teachers), no published source';

const inches = (low: number, high: number | null, source: string, standing: Standing = 'published') => ({
  lowMm: low * 25.4,
  highMm: high === null ? null : high * 25.4,
  source,
  standing,
});

type Eases = Partial<Record<PointId, WearingEase>>;

// Where two sources name the same garment the range spans both, and each says which end is its own.
const UPPER_ARM = inches(2, null, THREADS);
const HIP_ALL = inches(2, 2.75, ROBINSON);
const HIGH_HIP = inches(0.5, 1, KREIFELS);
const BUST_GENERAL = inches(2, 4, PRACTICE, 'commonPractice');
const WAIST_GENERAL = inches(0.5, 2, PRACTICE, 'commonPractice');
const BUST_BODICE = inches(1.5, 4, `${ROBINSON} (bodice, from 1.5); ${MCCUNN} (sleeved bodice, 4)`);

const BODICE: Eases = {
  bust: BUST_BODICE,
  waist: inches(0.75, 2, `${ROBINSON} (dress, from 0.75); ${PRACTICE} (dresses, up to 2)`),
  hip: HIP_ALL,
  upperArm: UPPER_ARM,
};
const SHIRT: Eases = {
  bust: inches(1.5, 3, `${ROBINSON} (fitted shirt, from 1.5; classic shirt, up to 3)`),
  waist: inches(1, 2, `${PRACTICE} (tops, from 1); ${MCCUNN} (blouse or shirt, 2)`, 'commonPractice'),
  hip: HIP_ALL,
  upperArm: UPPER_ARM,
};
/** What is worn over other clothes: the body's movement only, never the whole ease of a coat. */
const OUTER: Eases = { bust: BUST_GENERAL, waist: WAIST_GENERAL, hip: HIP_ALL, upperArm: UPPER_ARM };
const HUNG: Eases = { bust: BUST_GENERAL, waist: WAIST_GENERAL, hip: HIP_ALL };
const SKIRT: Eases = {
  waist: inches(0.5, 1, `${ROBINSON} (skirt, from 0.5); ${MCCUNN} (skirt, 1)`),
  hip: HIP_ALL,
};
const LEG: Eases = {
  thigh: inches(1, 2, `${KREIFELS}; ${C209}`),
  knee: inches(1, 2, KREIFELS),
  calf: inches(1, 2, KREIFELS),
};
const TROUSERS: Eases = {
  ...LEG,
  waist: inches(0, 1, `${C209} (up to 1); ${KREIFELS} (0.5 to 1)`),
  abdomen: inches(0, 2, C209),
  highHip: HIGH_HIP,
  hip: inches(1, 4, `${KREIFELS} (from 1); ${C209} (2 to 4)`),
};

/**
 * Swimwear has no figure: it is drafted below the body in cloth that stretches. A boned bodice has the bodice's; a
 * draft that means less overrides it.
 */
const EASES: Record<GarmentKind, Eases> = {
  shirt: SHIRT,
  knitTop: OUTER,
  sweatshirt: OUTER,
  dress: BODICE,
  skirt: SKIRT,
  fullSkirt: SKIRT,
  trousers: TROUSERS,
  shorts: TROUSERS,
  leggings: TROUSERS,
  waistcoat: {
    bust: inches(1.5, 2, `${ROBINSON} (bodice, from 1.5); ${MCCUNN} (sleeveless bodice, 2)`),
    waist: WAIST_GENERAL,
    hip: HIP_ALL,
  },
  cardigan: OUTER,
  jacket: OUTER,
  coat: OUTER,
  cape: HUNG,
  wrap: HUNG,
  jumpsuit: { ...BODICE, ...LEG },
  dungarees: { ...LEG, waist: WAIST_GENERAL, highHip: HIGH_HIP, hip: HIP_ALL },
  robe: OUTER,
  nightwear: OUTER,
  swimwear: {},
  bonedBodice: {
    bust: inches(1.5, 2, ROBINSON),
    waist: inches(1, 1, `${PRACTICE} (fitted garment)`, 'commonPractice'),
    hip: HIP_ALL,
  },
};

/**
 * The wearing ease of a garment kind at a point, in mm, with its source; null where the handbook has no figure, and
 * then the point has no floor.
 */
export function wearingEase(kind: GarmentKind, point: PointId): WearingEase | null {
  return EASES[kind][point] ?? null;
}
