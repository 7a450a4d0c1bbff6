/** The closed lists of words the engine answers in: codes, never sentences. They need no parsing library. */

/** Where a garment must fit, as the trade groups the points. */
export const ZONE_IDS = [
  'neck',
  'shoulder',
  'sleeve',
  'bust',
  'waist',
  'hip',
  'thigh',
  'knee',
  'hem',
] as const;
export type ZoneId = (typeof ZONE_IDS)[number];

/** What kind of garment a pattern makes. */
export const GARMENT_KINDS = [
  'shirt',
  'knitTop',
  'sweatshirt',
  'dress',
  'skirt',
  'fullSkirt',
  'trousers',
  'shorts',
  'leggings',
  'waistcoat',
  'cardigan',
  'jacket',
  'coat',
  'cape',
  'wrap',
  'jumpsuit',
  'dungarees',
  'robe',
  'nightwear',
  'swimwear',
  'bonedBodice',
] as const;
export type GarmentKind = (typeof GARMENT_KINDS)[number];

/** The five silhouettes of the trade's ease charts. */
export const SILHOUETTES = ['close', 'fitted', 'semiFitted', 'loose', 'veryLoose'] as const;
export type Silhouette = (typeof SILHOUETTES)[number];

/** What a point is at a size. `belowFloor` in words: less than wearing ease. */
export const VERDICTS = ['belowFloor', 'closer', 'asDrafted', 'looser', 'unknown'] as const;
export type Verdict = (typeof VERDICTS)[number];

/** Why the plan is what it is. */
export const REASON_CODES = [
  /** The point that decided the zone's size. */
  'governs',
  /** The floor asked for a larger size than the deviation alone. */
  'floorDecides',
  /** A join between neighbouring zones kept the sizes closer together than the points wanted. */
  'joinHolds',
  /** One size is kept though another would be nearer at this zone: the blend is not worth its cost. */
  'oneSizeIsEnough',
  /** The zone has no measured point and follows its neighbour. */
  'followsNeighbour',
  /** The zone's size was fixed by the person. */
  'held',
  /** Two sizes were equally near and the larger was taken, as is usual in a woven. */
  'tieToLarger',
] as const;
export type ReasonCode = (typeof REASON_CODES)[number];

/** What to know before cutting, what is missing, and what is not reckoned yet. */
export const CAUTION_CODES = [
  /** No point is both measured on the person and given by the pattern. */
  'nothingShared',
  /** The pattern gives this governing or fitted point and the person has not measured it. */
  'notMeasured',
  /** The chart's values fall from one size to a larger one: the point abstains. */
  'chartFalls',
  /** The pattern gives this point at some sizes only: the point abstains. */
  'givenAtSomeSizes',
  /** Nothing opens, and the opening is smaller than what must pass through it. */
  'doesNotPass',
  /** Only the chart is published here: the ease is the drafter's secret. */
  'easeUnknown',
  /** Only finished measurements are published and the handbook has no target ease: only the floor acts. */
  'noTarget',
  /** The draft gives less than the handbook's wearing ease. */
  'belowHandbook',
  /** Less than wearing ease at the planned size. */
  'belowFloor',
  /** The body is larger than the last size is drafted for. */
  'beyondLargest',
  /** The body is smaller than the first size is drafted for. */
  'beyondSmallest',
  /** The cutting line would run at more than 15 degrees to the lines it joins. */
  'steep',
  /** Under 6 mm an edge: it may be left. */
  'slight',
  /** A blend between hip and thigh: keep the whole crotch curve in one size. */
  'crotchCurve',
  /** Not reckoned yet: knit or stretch cloth, shrinkage, layers. */
  'knitNotReckoned',
  'shrinkageNotReckoned',
  'layersNotReckoned',
  'leanNotReckoned',
] as const;
export type CautionCode = (typeof CAUTION_CODES)[number];
