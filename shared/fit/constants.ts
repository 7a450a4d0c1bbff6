/**
 * The engine's judgement, in one place: none of these is measured, each has its reason, and the fitter's cases in
 * tests/published say when one is wrong.
 */

/** A point that chooses counts twice a point that must merely fit: the hip of trousers before their waist. */
export const WEIGHT_GOVERNING = 2;
/** A point that must fit. */
export const WEIGHT_FITTED = 1;
/** A loose point speaks up only outside the draft's own tolerance, and then softly. */
export const WEIGHT_LOOSE = 0.25;

/** Less than wearing ease by a whole grade step weighs as much as three sizes off at a governing point. */
export const WEIGHT_FLOOR = 20;

/** A close draft is not forgiving because its floor is negative: of the body, a floor counts for no less than this. */
export const FLOOR_SHARE_OF_BODY = -0.05;

/** Crossing to another line at all: the trouble of one blend, a bit more than half a size off at a fitted point. */
export const JOIN_FIXED = 0.6;
/** Each further size of a crossing bends the seam more: it grows with the square. */
export const JOIN_SQUARE = 0.2;
/** Only where sizes held by hand leave no allowed join is one exceeded, and then by as little as can be. */
export const JOIN_OVER_LIMIT = 1e6;

/** Where one size is all there is, the grade a girth usually has (common practice: 2 in), in mm. */
export const STEP_ONE_SIZE_GIRTH_MM = 50;
/** Where one size is all there is, the grade of a width or length, in mm (common practice: 3/8 in). */
export const STEP_ONE_SIZE_WIDTH_MM = 10;
/** Sizes that differ by less than the tape's error cannot be told apart: a step is at least so many errors. */
export const STEP_LEAST_TAPE_ERRORS = 2;

/**
 * A back or shoulder that is broad is altered rather than chosen by, and no tape is less sure than one held across
 * one's own back: a width's vote counts a tenth, so that three centimetres of it never outweigh a chest on its own row.
 */
export const SHARE_OF_WIDTHS = 0.1;
/**
 * The chest rules the shoulder. Neck and sleeve hang on it: they take the size that is best for them within their join
 * (points and join weigh alike, so nothing changes there), but in the whole their say is so small that it tips a tie
 * and moves nothing else, be the neck ten sizes from the chest.
 */
export const SHARE_OF_HANGING = 1e-3;

/**
 * Among sizes at which a loose point costs nothing, the nearest is wanted: weighed so lightly that no blend is ever
 * made for it, and left out of every cost that is told.
 */
export const NEARNESS = 1e-3;
/**
 * Where a size's own line and one between the lines would be as good, the size's is wanted: it is printed on the tissue,
 * and the other has to be drawn. Like nearness it tips a tie only, is weighed a hundredth of it, and is left out of
 * every cost that is told. A hanging zone's must still be more than a tie.
 */
export const BETWEEN_LINES = 1e-5;
/** Costs closer than this are equal: the larger size is then taken, as is usual in a woven (common practice). */
export const TIE = 1e-9;

/** Up to this change at each seam edge, in mm, the last size with an alteration is still a plan. */
export const BEYOND_PER_EDGE_MM = 20;

/** A cutting line steeper than this against the lines it joins shows as a corner in the seam, in degrees. */
export const STEEP_DEGREES = 15;
/** Under this change at a seam edge, in mm (about 1/4 in), the blend is within what sewing takes up. */
export const SLIGHT_MM = 6;

/** Another person's tape is off by about half of one's own. */
export const ERROR_SHARE_BY_ANOTHER = 0.5;
/** A leeway smaller than so many tape errors may be there or not. */
export const BORDERLINE_TAPE_ERRORS = 2;
