import { ARM_POINTS } from './catalogue-arm.ts';
import { GARMENT_POINTS } from './catalogue-garment.ts';
import { LEG_POINTS } from './catalogue-leg.ts';
import { LENGTH_POINTS } from './catalogue-lengths.ts';
import type { CataloguePoint, ChestWord, PointGroup } from './catalogue-point.ts';
import { TORSO_POINTS } from './catalogue-torso.ts';
import { WIDTH_POINTS } from './catalogue-widths.ts';
import type { PointId } from './point-ids.ts';

/** Every point of measure: its names, how to take it and where it is looked for. Sources: see `CataloguePoint`. */
export const CATALOGUE: Readonly<Record<PointId, CataloguePoint>> = {
  ...TORSO_POINTS,
  ...WIDTH_POINTS,
  ...ARM_POINTS,
  ...LEG_POINTS,
  ...LENGTH_POINTS,
  ...GARMENT_POINTS,
};

/** The words for the groups, as headings on the screen. */
export const POINT_GROUP_NAMES: Readonly<Record<PointGroup, string>> = {
  headAndNeck: 'Head and neck',
  torso: 'Torso',
  arm: 'Arm',
  leg: 'Leg',
  lengths: 'Lengths',
  garment: 'On the garment',
};

/**
 * The points of a body in a good order for taking them: the waist first, since its elastic stays on and other points
 * start there; then round the torso, across it, down it, the arm, the leg. *Common practice*. Garment points are left out.
 */
export const MEASURING_ORDER: readonly PointId[] = [
  ...(['waist', 'upperBust', 'bust', 'underbust', 'abdomen', 'highHip', 'hip', 'trunk'] as const),
  ...(['neck', 'neckBase', 'head'] as const),
  ...(['shoulderLength', 'shoulderLengthLeft', 'shoulderLengthRight', 'shoulderWidth'] as const),
  ...(['shoulderSlope', 'shoulderSlopeLeft', 'shoulderSlopeRight', 'backWidth', 'frontWidth'] as const),
  ...(['bustPointSpan', 'bustFrontArc', 'bustBackArc', 'hipFrontArc', 'hipBackArc'] as const),
  ...(['upperArm', 'upperArmLeft', 'upperArmRight', 'armscye', 'elbow', 'wrist', 'hand'] as const),
  ...(['armLength', 'armLengthLeft', 'armLengthRight'] as const),
  ...(['thigh', 'thighLeft', 'thighRight', 'knee', 'calf', 'ankle', 'instepHeel'] as const),
  ...([
    'backWaistLength',
    'frontWaistLength',
    'bustPointDepth',
    'scyeDepth',
    'waistToHip',
    'waistToKnee',
  ] as const),
  ...([
    'outsideLeg',
    'insideLeg',
    'bodyRise',
    'crotchLength',
    'crotchLengthFront',
    'crotchLengthBack',
  ] as const),
  ...(['height', 'cervicalHeight', 'waistHeight', 'hipHeight', 'kneeHeight'] as const),
];

/** A point's full name with the person's word: “Bust girth” or “Chest girth”. */
export function pointName(point: PointId, chestWord: ChestWord = 'bust'): string {
  const entry = CATALOGUE[point];
  return chestWord === 'chest' ? (entry.chestName ?? entry.name) : entry.name;
}

/** A point's short name, for a label beside a drawing, with the person's word: “Bust”, “Chest”, “Hip”. */
export function shortPointName(point: PointId, chestWord: ChestWord = 'bust'): string {
  const entry = CATALOGUE[point];
  return chestWord === 'chest' ? (entry.shortChestName ?? entry.shortName) : entry.shortName;
}

/** How a point is taken, in one to three sentences, with the person's word. */
export function howToTake(point: PointId, chestWord: ChestWord = 'bust'): string {
  return CATALOGUE[point].howTo.replaceAll('{bust}', chestWord);
}

/** The other names that the trade gives a point, for showing beside its own. */
export function otherNames(point: PointId): readonly string[] {
  return CATALOGUE[point].otherNames;
}

/** True for a point that only a garment has: a body cannot be measured there. */
export function isGarmentPoint(point: PointId): boolean {
  return CATALOGUE[point].group === 'garment';
}
