import type { PointId } from '../../../shared/points/point-ids.ts';
import type { Place } from './smooth-path.ts';

/** Where the tape lies: round the body as a loop seen a little from above, or along it as a line. */
export type BodyMark = { view: 'front' | 'back' } & (
  | { kind: 'loop'; at: Place; rx: number; ry: number; tilt?: number }
  | { kind: 'line'; through: readonly Place[]; smooth?: boolean }
);

const loop = (x: number, y: number, rx: number, ry = rx * 0.17, tilt = 0): BodyMark => ({
  view: 'front',
  kind: 'loop',
  at: [x, y],
  rx,
  ry,
  tilt,
});
const line = (view: 'front' | 'back', ...through: Place[]): BodyMark => ({ view, kind: 'line', through });
const curve = (view: 'front' | 'back', ...through: Place[]): BodyMark => ({
  view,
  kind: 'line',
  through,
  smooth: true,
});
const mirrored = (mark: BodyMark): BodyMark => {
  const over = ([x, y]: Place): Place => [160 - x, y];
  return mark.kind === 'loop'
    ? { ...mark, at: over(mark.at), tilt: -(mark.tilt ?? 0) }
    : { ...mark, through: mark.through.map(over) };
};

const NECK_SIDE: Place = [90, 60];
const SHOULDER_BONE: Place = [116, 72.5];
const NAPE: Place = [80, 61];

const upperArm = loop(121, 108, 7.5, 2, 10);
const thigh = loop(98.5, 243, 14.5, 2.8);
const shoulderLength = curve('front', NECK_SIDE, [97, 64.5], [106, 67.5], SHOULDER_BONE);
const armLength = curve('back', SHOULDER_BONE, [126, 108], [133.5, 150], [142, 203]);
const shoulderSlope = line('front', [90, 60], [122, 60], [122, 73]);

/**
 * Where each point of the body is taken, on the figure of body-outline.ts; placed by the catalogue's how-to. What is
 * picture-right on the front is the person's left.
 */
export const BODY_MARKS: Partial<Record<PointId, BodyMark>> = {
  head: loop(80, 21, 17, 3.5),
  neck: loop(80, 53, 9.5, 2.2),
  neckBase: loop(80, 62, 13, 3.4),
  upperBust: { view: 'front', kind: 'loop', at: [80, 95], rx: 32, ry: 4.5 },
  bust: loop(80, 115, 30.5, 5),
  underbust: loop(80, 128, 28.5, 4.6),
  waist: loop(80, 157, 23.5, 4),
  abdomen: loop(80, 176, 27.5, 4.6),
  highHip: loop(80, 184, 29.5, 5),
  hip: loop(80, 206, 34, 5.6),
  trunk: loop(93, 147, 11, 84, 9),
  thigh,
  thighLeft: thigh,
  thighRight: mirrored(thigh),
  knee: loop(96.3, 297, 9.5, 2),
  calf: loop(95.3, 324, 10.8, 2.2),
  ankle: loop(91.8, 378, 5.5, 1.6),
  instepHeel: loop(94, 389, 8, 3, 35),
  armscye: loop(113.5, 87, 5.5, 15, -6),
  upperArm,
  upperArmLeft: upperArm,
  upperArmRight: mirrored(upperArm),
  elbow: loop(128.8, 152, 7.3, 2, 14),
  wrist: loop(139.3, 203, 5, 1.5, 12),
  hand: loop(142.8, 219, 6, 1.8, 8),
  shoulderLength,
  shoulderLengthLeft: shoulderLength,
  shoulderLengthRight: mirrored(shoulderLength),
  shoulderSlope,
  shoulderSlopeLeft: shoulderSlope,
  shoulderSlopeRight: mirrored(shoulderSlope),
  shoulderWidth: curve('back', [44, 72.5], [62, 68], NAPE, [98, 68], SHOULDER_BONE),
  backWidth: line('back', [50, 90], [110, 90]),
  frontWidth: line('front', [51, 90], [109, 90]),
  bustPointSpan: line('front', [66, 115], [94, 115]),
  bustFrontArc: curve('front', [50, 114], [65, 118.5], [95, 118.5], [110, 114]),
  bustBackArc: curve('back', [50, 114], [65, 118.5], [95, 118.5], [110, 114]),
  hipFrontArc: curve('front', [47, 205], [64, 210.5], [96, 210.5], [113, 205]),
  hipBackArc: curve('back', [47, 205], [64, 210.5], [96, 210.5], [113, 205]),
  backWaistLength: line('back', NAPE, [80, 157]),
  frontWaistLength: curve('front', NECK_SIDE, [94, 90], [95, 115], [94, 157]),
  bustPointDepth: curve('front', NECK_SIDE, [93, 88], [94, 115]),
  scyeDepth: line('back', NAPE, [80, 101]),
  armLength,
  armLengthLeft: mirrored(armLength),
  armLengthRight: armLength,
  waistToHip: curve('front', [103, 157], [108, 180], [113.5, 205]),
  waistToKnee: curve('front', [103, 157], [113.5, 205], [111, 262], [105.5, 297]),
  outsideLeg: curve('front', [103, 157], [113.5, 205], [114, 260], [112, 399]),
  insideLeg: line('front', [80, 231], [80, 399]),
  bodyRise: curve('front', [103, 157], [109, 185], [113, 222]),
  crotchLength: line('front', [80, 157], [80, 229]),
  crotchLengthFront: line('front', [80, 157], [80, 229]),
  crotchLengthBack: line('back', [80, 157], [80, 229]),
  height: line('front', [152, 5], [152, 399]),
  cervicalHeight: curve('back', NAPE, [80, 157], [80, 229], [80, 399]),
  waistHeight: line('front', [120, 157], [120, 399]),
  hipHeight: line('front', [120, 206], [120, 399]),
  kneeHeight: line('front', [112, 297], [112, 399]),
};
