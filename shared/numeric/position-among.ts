/** A known place on a scale: at `position` the value is `value`. */
export interface ScaleKnot {
  value: number;
  position: number;
}

/**
 * Where a value lies on a scale given by knots in rising order: straight lines between them, the first and last drawn
 * on beyond the ends. Where knots share the value it is the middle of their positions. Fewer than two different values,
 * values that fall and NaN give null.
 */
export function positionAmong(knots: readonly ScaleKnot[], value: number): number | null {
  const first = knots[0];
  const last = knots[knots.length - 1];
  if (!first || !last || !(last.value > first.value) || Number.isNaN(value)) return null;
  let before: ScaleKnot | null = null;
  let after: ScaleKnot | null = null;
  let equalFrom: number | null = null;
  let equalTo = 0;
  for (let k = 0; k < knots.length; k++) {
    const knot = knots[k];
    if (!knot || !(knot.value >= (knots[k - 1]?.value ?? -Infinity))) return null;
    if (knot.value < value) before = knot;
    else if (knot.value > value) after ??= knot;
    else {
      equalFrom ??= knot.position;
      equalTo = knot.position;
    }
  }
  if (equalFrom !== null) return (equalFrom + equalTo) / 2;
  if (before && after) return along(before, after, value);
  return before === null ? outwards(knots, value) : outwards([...knots].reverse(), value);
}

/** Beyond an end: the nearest stretch that has a slope is drawn on. */
function outwards(fromEnd: readonly ScaleKnot[], value: number): number | null {
  const end = fromEnd[0];
  const inner = fromEnd.find((knot) => knot.value !== end?.value);
  return end && inner ? along(end, inner, value) : null;
}

function along(a: ScaleKnot, b: ScaleKnot, value: number): number {
  return a.position + ((value - a.value) / (b.value - a.value)) * (b.position - a.position);
}
