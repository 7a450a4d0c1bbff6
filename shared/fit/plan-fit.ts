import { blendsOf } from './blends.ts';
import {
  blendCautions,
  endCautions,
  passCautions,
  pointCautions,
  refusals,
  tableCautions,
} from './cautions.ts';
import { checkInput, checkPositions } from './check-input.ts';
import { TIE } from './constants.ts';
import type { Caution, FitInput, FitOption, FitPlan, PointResult, ZonePlan } from './fit.schema.ts';
import type { ZoneId } from './fit-words.ts';
import { governors, idOf, pointCost } from './governors.ts';
import { pointResults, sizeChoice } from './point-results.ts';
import { reasonsFor } from './reasons.ts';
import { reckon } from './reckon.ts';
import type { ReckonedPoint, Reckoning } from './reckoning.ts';
import { chooseZones } from './zone-choice.ts';
import type { ZoneChoice } from './zone-choice.ts';
import { joinCost, zoneCosts } from './zone-costs.ts';
import type { ZoneCosts } from './zone-costs.ts';

/** The version of the engine, kept beside every answer. */
export const ENGINE_VERSION = '1.1.0';

/**
 * Plans which size to cut where: the best single size and the best blend, cheapest first, and the plan is the cheapest.
 * All lengths in mm. Misuse (no size, a negative length, a size held beyond the pattern's) throws a RangeError that
 * names the field; what is missing or not reckoned yet is answered as `notEnough` with its cautions. Cut between the
 * lines too, sizes are planned by halves: position 3.5 lies half-way between the fourth size and the fifth.
 */
export function planFit(input: FitInput): FitPlan {
  checkInput(input);
  const refused = refusals(input);
  if (refused.length > 0) return notEnough(refused);
  const reckoning = reckon(input);
  const cautions = tableCautions(reckoning);
  if (!reckoning.points.some((point) => point.chooses)) return notEnough(cautions);
  const zones = zoneCosts(reckoning);
  const drafts = draftOptions(reckoning, zones, input.held);
  const best = drafts[0];
  if (!best) return notEnough(cautions);
  const options = drafts.map((draft) => tellOption(input, reckoning, draft));
  const { zones: planned = [], points = [], blends = [] } = options[0] ?? {};
  const ends = endCautions(input, reckoning);
  const { places, governing } = best;
  return {
    status: ends.isOutOfRange ? 'outOfRange' : 'planned',
    zones: planned,
    points,
    options,
    blends,
    alterations: [],
    certainty: null,
    reasons: reasonsFor(input, reckoning, zones, places, governing),
    cautions: [
      ...cautions,
      ...ends.cautions,
      ...pointCautions(reckoning, places),
      ...passCautions(input, reckoning, places),
      ...blendCautions(blends),
    ],
  };
}

/**
 * Every point at the sizes held by hand, from neck to hem: a position for each zone (0 is the first size, 0.5 half-way
 * to the second where it is cut between the lines too); a zone without one is left out. Others throw a RangeError; what `planFit` refuses gives no points.
 */
export function evaluateAt(input: FitInput, positions: Partial<Record<ZoneId, number>>): PointResult[] {
  checkInput(input);
  checkPositions('positions', positions, input);
  if (refusals(input).length > 0) return [];
  const reckoning = reckon(input);
  return pointResults(
    input,
    reckoning,
    reckoning.garment.zones.map((zone) => {
      const position = positions[zone];
      return position === undefined ? undefined : position * reckoning.perSize;
    }),
  );
}

/** Every point at every whole size, in grade order: one table a size. Bad input throws as in `planFit`; what it refuses is empty. */
export function easeProfile(input: FitInput): PointResult[][] {
  checkInput(input);
  if (refusals(input).length > 0) return input.sizes.map(() => []);
  const reckoning = reckon(input, 1);
  return input.sizes.map((_, place) =>
    pointResults(
      input,
      reckoning,
      reckoning.garment.zones.map(() => place),
    ),
  );
}

function notEnough(cautions: Caution[]): FitPlan {
  return {
    status: 'notEnough',
    zones: [],
    points: [],
    options: [],
    blends: [],
    alterations: [],
    certainty: null,
    reasons: [],
    cautions,
  };
}

/** An option before it is told: places by the garment's zone order. */
interface Draft {
  kind: 'oneSize' | 'blend';
  places: number[];
  governing: (ReckonedPoint | null)[];
  cost: number;
}

function draftOptions(reckoning: Reckoning, zones: ZoneCosts, held: FitInput['held']): Draft[] {
  const { oneSize, blend } = chooseZones(reckoning, zones, held);
  const draft = (kind: Draft['kind'], { places }: ZoneChoice): Draft => ({
    kind,
    places,
    governing: governors(reckoning, zones, places),
    cost: costOf(reckoning, places),
  });
  if (!oneSize) return blend ? [draft('blend', blend)] : [];
  const single = draft('oneSize', oneSize);
  // A blend that brings no point nearer is no advice.
  if (!blend || pointsCost(reckoning, blend.places) >= single.cost - TIE) return [single];
  const blended = draft('blend', blend);
  return blend.cost < oneSize.cost - TIE ? [blended, single] : [single, blended];
}

function tellOption(input: FitInput, reckoning: Reckoning, draft: Draft): FitOption {
  const { kind, places, governing, cost } = draft;
  const zones: ZonePlan[] = [];
  for (const zoneAt of reckoning.garment.shown) {
    const zone = reckoning.garment.zones[zoneAt];
    if (zone === undefined) continue;
    zones.push({
      zone,
      size: sizeChoice(reckoning, places[zoneAt] ?? 0),
      governedBy: idOf(governing[zoneAt]),
    });
  }
  return {
    kind,
    zones,
    points: pointResults(input, reckoning, places),
    alterations: [],
    blends: blendsOf(input, reckoning, places, governing),
    cost,
  };
}

function pointsCost(reckoning: Reckoning, places: readonly number[]): number {
  let cost = 0;
  for (const point of reckoning.points) cost += pointCost(reckoning, point, places[point.spec.zoneAt] ?? 0);
  return cost;
}

function costOf(reckoning: Reckoning, places: readonly number[]): number {
  const { parents, weights } = reckoning.garment;
  let cost = pointsCost(reckoning, places);
  for (let zone = 1; zone < places.length; zone++) {
    const apart = Math.abs((places[zone] ?? 0) - (places[parents[zone] ?? 0] ?? 0)) / reckoning.perSize;
    cost += (weights[zone] ?? 1) * joinCost(apart);
  }
  return cost;
}
