import type { DemoPattern } from './demo-shapes.ts';

/** A shirt whose drafter publishes finished measurements only. Invented. */
export const demoShirt: DemoPattern = {
  details: {
    title: 'Lockkeeper shirt',
    maker: 'Halfpenny Bend',
    number: '3',
    kind: 'shirt',
    silhouette: 'semiFitted',
    structure: 'woven',
    cloth: 'chambray, poplin, brushed cotton',
    worn: 'closed',
    seamEdges: { bust: 4, waist: 4, hip: 4, upperArm: 2 },
    compareAs: {},
    notes: 'Straight sides, yoke, collar on a stand. No size chart is given, only the finished shirt.',
  },
  unit: 'cm',
  sizes: ['XS', 'S', 'M', 'L', 'XL', '2XL', '3XL', '4XL'],
  chart: {},
  finished: {
    neck: [37, 38.5, 40, 41.5, 43, 45, 47, 49],
    bust: [96, 102, 108, 114, 121, 129, 137, 145],
    waist: [94, 100, 106, 112, 119, 127, 135, 143],
    hip: [97, 103, 109, 115, 122, 130, 138, 146],
    shoulderWidth: [42, 43.5, 45, 46.5, 48.2, 50.2, 52.2, 54.2],
    upperArm: [35, 36.8, 38.6, 40.4, 42.6, 45.2, 47.8, 50.4],
    sleeveLength: [60, 61.5, 63, 64.5, 65.5, 66.5, 67, 67.5],
    garmentLength: [72, 73.5, 75, 76.5, 78, 79.5, 81, 82],
  },
};

/**
 * A loose cape worn open, with about 4 in of ease at the bust and 12 in at the hip (common practice for the kind:
 * it is sized by neck and shoulder). Invented.
 */
export const demoCape: DemoPattern = {
  details: {
    title: 'Weir cape',
    maker: 'Halfpenny Bend',
    number: '8',
    kind: 'cape',
    silhouette: 'loose',
    structure: 'woven',
    cloth: 'melton, boiled wool, double-faced coating',
    worn: 'open',
    seamEdges: { bust: 4, hip: 4 },
    compareAs: {},
    notes: 'Barely overlaps at the front; over a long-sleeved top or a light sweater.',
  },
  unit: 'in',
  sizes: ['8', '10', '12', '14', '16', '18', '20', '22'],
  chart: {
    neck: [13, 13.25, 13.5, 14, 14.5, 15, 15.5, 16],
    shoulderLength: [4.625, 4.75, 4.75, 4.875, 4.875, 5, 5.125, 5.25],
    bust: [31.5, 32.5, 34, 36, 38, 40, 42, 44],
    waist: [24, 25, 26.5, 28, 30, 32, 34, 37],
    hip: [33.5, 34.5, 36, 38, 40, 42, 44, 46],
  },
  finished: {
    neck: [15.5, 15.75, 16, 16.5, 17, 17.5, 18, 18.5],
    bust: [35.5, 36.5, 38, 40, 42, 44, 46, 48],
    waist: [33, 34, 35.5, 37, 39, 41, 43, 46],
    hip: [45.5, 46.5, 48, 50, 52, 54, 56, 58],
    garmentLength: [30, 30, 30.25, 30.25, 30.5, 30.5, 30.75, 30.75],
  },
};
