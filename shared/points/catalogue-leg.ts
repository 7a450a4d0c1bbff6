import { oneSide, type CataloguePoint } from './catalogue-point.ts';

const thigh: CataloguePoint = {
  name: 'Thigh girth',
  shortName: 'Thigh',
  nameFrom: 'ISO 8559',
  otherNames: ['thigh', 'upper thigh', 'thigh circumference', 'upper leg', 'around thigh', 'full thigh'],
  howTo:
    'Stand with the feet slightly apart and the weight on both. Pass the tape level round the fullest part of the thigh, close under the seat.',
  group: 'leg',
};

/** The girths of the leg, from the top down: what the catalogue says of them. */
export const LEG_POINTS = {
  thigh,
  thighLeft: oneSide(thigh, 'left'),
  thighRight: oneSide(thigh, 'right'),
  knee: {
    name: 'Knee girth',
    shortName: 'Knee',
    nameFrom: 'ISO 8559',
    otherNames: ['knee', 'knee circumference', 'around knee'],
    howTo:
      'Pass the tape round over the middle of the knee cap. For trousers, bend the knee and take it again: use the larger.',
    group: 'leg',
  },
  calf: {
    name: 'Calf girth',
    shortName: 'Calf',
    nameFrom: 'ISO 8559',
    otherNames: ['calf', 'calf circumference', 'around calf', 'calves'],
    howTo: 'Stand with the weight on both feet and pass the tape level round the fullest part of the calf.',
    group: 'leg',
  },
  ankle: {
    name: 'Ankle girth',
    shortName: 'Ankle',
    nameFrom: 'ISO 8559',
    otherNames: ['ankle', 'ankle circumference', 'around ankle'],
    howTo: 'Pass the tape round the ankle over the bones at its sides.',
    group: 'leg',
  },
  instepHeel: {
    name: 'Girth over instep and heel',
    shortName: 'Instep and heel',
    nameFrom: 'trade',
    otherNames: [
      'instep heel',
      'heel instep',
      'instep and heel',
      'heel and instep',
      'heel to instep',
      'instep',
      'long heel girth',
      'around heel',
      'heel',
    ],
    howTo:
      'Point the toes and pass the tape round under the heel and over the instep: what must go through a narrow trouser leg.',
    group: 'leg',
  },
} as const satisfies Record<string, CataloguePoint>;
