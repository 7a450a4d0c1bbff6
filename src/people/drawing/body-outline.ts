import { smoothPath, type Place } from './smooth-path.ts';

/**
 * A standing figure, drawn by hand for this page: a schema to point at, of nobody in particular. The half at the
 * right of the picture, on a sheet 160 wide and 404 high with the middle at 80; the other half is its mirror image.
 */
export const SHEET = { width: 160, height: 404, middle: 80 } as const;

const HEAD: Place[] = [
  [80, 5],
  [90.5, 8.5],
  [96, 19],
  [95, 33],
  [89.5, 45],
  [80, 50.5],
];

const SHOULDER_AND_ARM: Place[] = [
  [88.3, 46],
  [88.6, 56],
  [93, 62.5],
  [106, 67],
  [117, 73],
  [123, 86],
  [127, 108],
  [130.5, 130],
  [135, 152],
  [140, 178],
  [143, 203],
  [147.5, 218],
  [147, 232],
  [142.5, 241],
  [138.5, 238],
  [138, 222],
  [135.5, 204],
  [129, 178],
  [122.5, 153],
  [117.5, 130],
  [111, 100],
];

const SIDE_AND_LEG: Place[] = [
  [111, 100],
  [109.5, 116],
  [106, 136],
  [102.5, 157],
  [107, 180],
  [112.5, 204],
  [113, 228],
  [110, 262],
  [104.5, 296],
  [105, 322],
  [100.5, 352],
  [96, 378],
  [99, 390],
  [103, 397],
  [94, 399.5],
  [87, 396],
  [87.5, 378],
  [87, 350],
  [85.5, 324],
  [88, 298],
  [86.5, 266],
  [83, 240],
  [80, 229],
];

/** The lines of the figure's right half, as paths. */
export const HALF_OUTLINE: readonly string[] = [HEAD, SHOULDER_AND_ARM, SIDE_AND_LEG].map(smoothPath);

/** What tells the front from the back: the collar bones, or the bone at the nape and the spine. */
export const FRONT_LINES: readonly string[] = [
  smoothPath([
    [84, 68.5],
    [92, 66.5],
    [103, 68.5],
  ]),
];
export const BACK_LINES: readonly string[] = [
  smoothPath([
    [96, 84],
    [98.5, 94],
    [95, 103],
  ]),
];
