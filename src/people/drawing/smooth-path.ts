/** A place on the drawing: x to the right, y down, in its own units. */
export type Place = readonly [x: number, y: number];

/** The SVG path of a smooth line through the places: a Catmull–Rom spline, written as cubic Béziers. */
export function smoothPath(places: readonly Place[]): string {
  const at = (index: number): Place => places[Math.max(0, Math.min(places.length - 1, index))] ?? [0, 0];
  const start = at(0);
  let path = `M${start[0]} ${start[1]}`;
  for (let index = 0; index < places.length - 1; index += 1) {
    const [before, from, to, after] = [at(index - 1), at(index), at(index + 1), at(index + 2)];
    const out = [from[0] + (to[0] - before[0]) / 6, from[1] + (to[1] - before[1]) / 6];
    const into = [to[0] - (after[0] - from[0]) / 6, to[1] - (after[1] - from[1]) / 6];
    path += `C${[...out, ...into, ...to].map((value) => Math.round(value * 10) / 10).join(' ')}`;
  }
  return path;
}
