import type { DemoPattern } from './demo-shapes.ts';

/** Trousers drafted in inches, both tables published. Invented. */
export const demoTrousers: DemoPattern = {
  details: {
    title: 'Towpath trousers',
    maker: 'Narrowcut Works',
    number: 'NW 07',
    kind: 'trousers',
    silhouette: 'semiFitted',
    structure: 'woven',
    cloth: 'twill, gabardine, heavier linen',
    worn: 'closed',
    seamEdges: { waist: 4, highHip: 4, hip: 4, thigh: 4, knee: 4 },
    compareAs: {},
    notes: 'Straight leg, fly front, waistband at the natural waist.',
  },
  unit: 'in',
  sizes: ['1', '2', '3', '4', '5', '6', '7', '8', '9', '10', '11', '12'],
  chart: {
    waist: [25, 26, 27, 28, 29.5, 31, 32.5, 34.5, 36.5, 38.5, 40.75, 43],
    highHip: [32.5, 33.5, 34.5, 35.5, 37, 38.5, 40, 41.75, 43.5, 45.5, 47.5, 49.5],
    hip: [35.5, 36.5, 37.5, 38.5, 40, 41.5, 43, 44.75, 46.5, 48.25, 50.25, 52.25],
    thigh: [20.75, 21.375, 22, 22.625, 23.5, 24.375, 25.25, 26.25, 27.25, 28.25, 29.375, 30.5],
    bodyRise: [10, 10.125, 10.25, 10.375, 10.625, 10.875, 11.125, 11.375, 11.625, 11.875, 12.125, 12.375],
  },
  finished: {
    waist: [26, 27, 28, 29, 30.5, 32, 33.5, 35.5, 37.5, 39.5, 41.75, 44],
    highHip: [34.5, 35.5, 36.5, 37.5, 39, 40.5, 42, 43.75, 45.5, 47.5, 49.5, 51.5],
    hip: [38.5, 39.5, 40.5, 41.5, 43, 44.5, 46, 47.75, 49.5, 51.25, 53.25, 55.25],
    thigh: [24.25, 24.875, 25.5, 26.125, 27, 27.875, 28.75, 29.75, 30.75, 31.75, 32.875, 34],
    knee: [18, 18.375, 18.75, 19.125, 19.625, 20.125, 20.625, 21.25, 21.875, 22.5, 23.125, 23.75],
    hemGirth: [17, 17.25, 17.5, 17.75, 18.125, 18.5, 18.875, 19.375, 19.875, 20.375, 20.875, 21.375],
    insideLeg: [30.5, 30.5, 30.5, 30.5, 30.75, 30.75, 30.75, 31, 31, 31, 31.25, 31.25],
  },
};
