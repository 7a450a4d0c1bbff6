import { oneSide, type CataloguePoint } from './catalogue-point.ts';

const upperArm: CataloguePoint = {
  name: 'Upper arm girth',
  shortName: 'Upper arm',
  nameFrom: 'ISO 8559',
  otherNames: [
    'upper arm',
    'upperarm',
    'bicep',
    'biceps',
    'bicep girth',
    'biceps girth',
    'bicep circumference',
    'biceps circumference',
    'upper arm circumference',
    'arm circumference',
    'arm girth',
    'top arm',
  ],
  howTo:
    'Let the arm hang and pass the tape round its fullest part between shoulder and elbow. Do not tense the arm.',
  group: 'arm',
};

const armLength: CataloguePoint = {
  name: 'Arm length',
  shortName: 'Arm length',
  nameFrom: 'ISO 8559',
  otherNames: ['shoulder to wrist', 'arm length shoulder to wrist', 'outer arm length', 'outer arm'],
  howTo:
    'Bend the arm a little, hand on the hip. Measure from the shoulder bone over the elbow to the far side of the wrist bone.',
  group: 'arm',
};

/** Armhole, arm and hand: what the catalogue says of them. */
export const ARM_POINTS = {
  armscye: {
    name: 'Armscye girth',
    shortName: 'Armscye',
    nameFrom: 'ISO 8559',
    otherNames: [
      'armscye',
      'arm scye',
      'armhole',
      'arm hole',
      'scye',
      'armhole girth',
      'armhole circumference',
    ],
    howTo:
      'Pass the tape from the shoulder bone down in front of the arm, under the armpit and up behind to where you started, with the arm hanging.',
    group: 'arm',
  },
  upperArm,
  upperArmLeft: oneSide(upperArm, 'left'),
  upperArmRight: oneSide(upperArm, 'right'),
  elbow: {
    name: 'Elbow girth',
    shortName: 'Elbow',
    nameFrom: 'ISO 8559',
    otherNames: ['elbow', 'elbow circumference', 'around elbow'],
    howTo: 'Bend the arm to a right angle and pass the tape round over the point of the elbow.',
    group: 'arm',
  },
  wrist: {
    name: 'Wrist girth',
    shortName: 'Wrist',
    nameFrom: 'ISO 8559',
    otherNames: ['wrist', 'wrist circumference', 'around wrist'],
    howTo: 'Pass the tape round the wrist over the wrist bone.',
    group: 'arm',
  },
  hand: {
    name: 'Hand girth',
    shortName: 'Hand',
    nameFrom: 'ISO 8559',
    otherNames: ['hand', 'hand circumference', 'around hand', 'palm', 'palm girth'],
    howTo: 'Tuck the thumb into the palm, as if slipping into a cuff, and pass the tape round the knuckles.',
    group: 'arm',
  },
  armLength,
  armLengthLeft: oneSide(armLength, 'left'),
  armLengthRight: oneSide(armLength, 'right'),
} as const satisfies Record<string, CataloguePoint>;
