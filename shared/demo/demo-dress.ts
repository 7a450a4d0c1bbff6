import type { DemoPattern } from './demo-shapes.ts';

/** A fitted dress of a woven cloth in fourteen sizes, both tables published. Invented. */
export const demoDress: DemoPattern = {
  details: {
    title: 'Sluice dress',
    maker: 'Narrowcut Works',
    number: 'NW 11',
    kind: 'dress',
    silhouette: 'fitted',
    structure: 'woven',
    cloth: 'washed linen, cotton poplin, light wool',
    worn: 'closed',
    seamEdges: { bust: 4, waist: 4, highHip: 4, hip: 4, upperArm: 2 },
    compareAs: {},
    notes: 'Side seams and a centre back zip; set-in sleeve to the elbow.',
  },
  unit: 'cm',
  sizes: ['6', '8', '10', '12', '14', '16', '18', '20', '22', '24', '26', '28', '30', '32'],
  chart: {
    upperBust: [77, 80.5, 84, 87.5, 91, 94.5, 98, 102.5, 107, 112, 117, 122, 127, 132],
    bust: [80, 84, 88, 92, 96, 100, 104, 109, 114, 120, 126, 132, 138, 144],
    waist: [61, 65, 69, 73, 77, 81, 85.5, 91, 97, 103.5, 110, 116.5, 123, 129.5],
    highHip: [78, 82, 86, 90, 94, 98, 102.5, 107.5, 112.5, 118.5, 124.5, 130.5, 136.5, 142.5],
    hip: [86, 90, 94, 98, 102, 106, 110, 114.5, 119, 124.5, 130, 135.5, 141, 146.5],
    upperArm: [25.5, 26.3, 27.2, 28.1, 29, 29.9, 30.9, 32.3, 33.7, 35.3, 36.9, 38.5, 40.1, 41.7],
    backWaistLength: [39.8, 40.2, 40.6, 41, 41.4, 41.8, 42.2, 42.6, 43, 43.4, 43.8, 44.2, 44.6, 45],
  },
  finished: {
    upperBust: [81.5, 85, 88.5, 92, 95.5, 99, 102.5, 107, 111.5, 116.5, 121.5, 126.5, 131.5, 136.5],
    bust: [88, 92, 96, 100, 104, 108, 112, 117, 122, 128, 134, 140, 146, 152],
    waist: [66, 70, 74, 78, 82, 86, 90.5, 96, 102, 108.5, 115, 121.5, 128, 134.5],
    highHip: [84.5, 88.5, 92.5, 96.5, 100.5, 104.5, 109, 114, 119, 125, 131, 137, 143, 149],
    hip: [93, 97, 101, 105, 109, 113, 117, 121.5, 126, 131.5, 137, 142.5, 148, 153.5],
    upperArm: [31, 31.8, 32.7, 33.6, 34.5, 35.4, 36.4, 37.8, 39.2, 40.8, 42.4, 44, 45.6, 47.2],
    backWaistLength: [40.4, 40.8, 41.2, 41.6, 42, 42.4, 42.8, 43.2, 43.6, 44, 44.4, 44.8, 45.2, 45.6],
    garmentLength: [98, 98.6, 99.2, 99.8, 100.4, 101, 101.6, 102.2, 102.8, 103.4, 104, 104.6, 105.2, 105.8],
  },
};
