import type { DemoPattern } from './demo-shapes.ts';

/** Two published body tables, carried as size charts to start from where a pattern gives none. */

const bodyTable = {
  kind: 'dress',
  silhouette: 'fitted',
  structure: 'woven',
  cloth: '',
  worn: 'closed',
  seamEdges: {},
  compareAs: {},
} as const;

/**
 * ASTM D5585-11e1, Standard Tables of Body Measurements for Adult Female Misses Figure Type, Size Range 00–20,
 * Table 1, curvy waist, inches; the rows that were legible in the copy read (hip and below were not).
 */
export const demoAstmTable: DemoPattern = {
  details: {
    ...bodyTable,
    title: 'Body table 00–20 (ASTM D5585-11e1)',
    maker: 'ASTM International',
    number: 'D5585-11e1',
    notes:
      'Source: ASTM D5585-11e1, Table 1, curvy waist, inches. Hip and below are not carried here. At 00 to 2 the upper chest exceeds the bust, as printed. A published table is an average.',
  },
  unit: 'in',
  sizes: ['00', '0', '2', '4', '6', '8', '10', '12', '14', '16', '18', '20'],
  chart: {
    head: [21.25, 21.25, 21.5, 21.5, 21.75, 21.75, 22, 22, 22.25, 22.25, 22.5, 22.5],
    neckBase: [13.25, 13.5, 13.75, 14, 14.25, 14.625, 14.875, 15.125, 15.5, 15.75, 16, 16.375],
    neck: [12.375, 12.625, 12.875, 13.125, 13.375, 13.625, 13.875, 14.25, 14.625, 15, 15.5, 16],
    upperBust: [31.75, 32.25, 33.25, 34.125, 35, 35.875, 36.75, 38, 39.25, 40.625, 42.25, 43.875],
    bust: [31.125, 31.75, 33, 34.125, 35.25, 36.25, 37.25, 38.75, 40.375, 42.125, 44, 46],
    underbust: [25.75, 26.5, 27.25, 28, 29, 30, 31, 32.5, 34, 35.75, 37.625, 39.625],
    waist: [23.875, 24.625, 25.375, 26.125, 27, 28, 29, 30.75, 32.5, 34.5, 36.75, 39],
  },
  finished: {},
};

/**
 * JIS L 4005 (adult women), body type A, regular height, cm: worked out from the rules that two published summaries
 * quote (9AR = bust 83, hip 91, height 158; bust in 3 cm steps from 74 to 92, then 4 cm; hip in 2 cm steps). The
 * standard itself was not opened; its waist varies with age and is left out.
 */
export const demoJisTable: DemoPattern = {
  details: {
    ...bodyTable,
    title: 'Body table 3AR–21AR (JIS L 4005)',
    maker: 'Japanese Standards Association',
    number: 'L 4005',
    notes:
      'Body type A, regular height, cm. Worked out from the rules two published summaries quote; the standard itself was not opened. The waist varies with age there and is left out. A published table is an average.',
  },
  unit: 'cm',
  sizes: ['3AR', '5AR', '7AR', '9AR', '11AR', '13AR', '15AR', '17AR', '19AR', '21AR'],
  chart: {
    bust: [74, 77, 80, 83, 86, 89, 92, 96, 100, 104],
    hip: [85, 87, 89, 91, 93, 95, 97, 99, 101, 103],
    height: [158, 158, 158, 158, 158, 158, 158, 158, 158, 158],
  },
  finished: {},
};
