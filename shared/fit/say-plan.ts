import { printLengthWithUnit } from '../units.ts';
import type { Caution, FitPlan, SizeChoice, ZonePlan } from './fit.schema.ts';
import { ZONE_IDS, type Verdict, type ZoneId } from './fit-words.ts';
import {
  listWords,
  sayInSize,
  sayPoint,
  saySize,
  sayVerdict,
  sayZone,
  type SayContext,
} from './say-words.ts';

/** Zones that leave the trunk of a garment instead of continuing down it. */
const BRANCHES: readonly ZoneId[] = ['neck', 'sleeve'];

/** Neighbouring zones of the trunk that are cut in the same size. */
interface Run {
  size: SizeChoice;
  zones: ZoneId[];
}

/**
 * The answer as one sentence: which size to cut where, what to measure first, or where the pattern's sizes end.
 * Lengths are in the person's unit. A plan without zones says what is missing.
 */
export function sayPlan(plan: FitPlan, context: SayContext): string {
  if (plan.status === 'notEnough' || plan.zones.length === 0) return sayNotEnough(plan, context);
  const cut = sayZones(plan.zones, context);
  if (plan.status === 'outOfRange') return sayBeyond(plan, context, cut);
  if (context.sizes.length === 1) return `There is one size, ${context.sizes[0] ?? ''}: cut it as it is.`;
  return `Cut ${cut}.`;
}

/** The sizes of some zones as a phrase: `16 to the bust, then run out to 18 from the waist down`. */
export function sayZones(zones: readonly ZonePlan[], context: SayContext): string {
  const runs = trunkRuns(zones);
  const branches = branchesApart(zones);
  const first = runs[0];
  if (!first) return listWords(branches.map((branch) => `the ${branch.zone} ${sayInSize(branch.size)}`));
  const apart = branches.map(
    (branch) => `the ${sayZone(branch.zone, context.chestWord)} ${sayInSize(branch.size)}`,
  );
  const trunk =
    runs.length === 1 ? sayOneSize(first, apart.length > 0) : sayRuns(first, runs.slice(1), context);
  return apart.length === 0 ? trunk : `${trunk}, with ${listWords(apart)}`;
}

function sayOneSize(run: Run, hasBranches: boolean): string {
  return hasBranches ? saySize(run.size) : `${saySize(run.size)} throughout`;
}

function sayRuns(first: Run, rest: readonly Run[], context: SayContext): string {
  const zoneWord = (zone: ZoneId | undefined) => (zone ? sayZone(zone, context.chestWord) : '');
  const start =
    first.zones.length === 1
      ? `${saySize(first.size)} at the ${zoneWord(first.zones[0])}`
      : `${saySize(first.size)} to the ${zoneWord(first.zones.at(-1))}`;
  // Steps in the same direction share their verb: run out to 14 at the waist and 16 from the hip down.
  const steps: { verb: string; places: string[] }[] = [];
  rest.forEach((run, index) => {
    const before = rest[index - 1] ?? first;
    const verb = run.size.position > before.size.position ? 'run out' : 'come in';
    const place = `${saySize(run.size)} ${sayPlace(run, index === rest.length - 1, zoneWord)}`;
    const last = steps.at(-1);
    if (last?.verb === verb) last.places.push(place);
    else steps.push({ verb, places: [place] });
  });
  const said = steps.map(({ verb, places }) => `${verb} to ${listWords(places)}`);
  const end = said.pop() ?? '';
  return `${[start, ...said].join(', ')}, then ${end}`;
}

function sayPlace(run: Run, isLast: boolean, zoneWord: (zone: ZoneId | undefined) => string): string {
  const from = zoneWord(run.zones[0]);
  if (isLast) return run.zones[0] === 'hem' ? 'at the hem' : `from the ${from} down`;
  return run.zones.length === 1 ? `at the ${from}` : `from the ${from} to the ${zoneWord(run.zones.at(-1))}`;
}

function inBodyOrder(zones: readonly ZonePlan[]): ZonePlan[] {
  return [...zones].sort((a, b) => ZONE_IDS.indexOf(a.zone) - ZONE_IDS.indexOf(b.zone));
}

function trunkRuns(zones: readonly ZonePlan[]): Run[] {
  const runs: Run[] = [];
  for (const { zone, size } of inBodyOrder(zones)) {
    if (BRANCHES.includes(zone)) continue;
    const last = runs.at(-1);
    if (last?.size.position === size.position) last.zones.push(zone);
    else runs.push({ size, zones: [zone] });
  }
  return runs;
}

/** Branches cut in another size than the shoulder they leave; the others go without saying. */
function branchesApart(zones: readonly ZonePlan[]): ZonePlan[] {
  const root =
    zones.find((plan) => plan.zone === 'shoulder') ??
    inBodyOrder(zones).find((plan) => !BRANCHES.includes(plan.zone));
  return inBodyOrder(zones)
    .filter((plan) => BRANCHES.includes(plan.zone) && plan.size.position !== root?.size.position)
    .reverse();
}

function sayBeyond(plan: FitPlan, context: SayContext, cut: string): string {
  const largest = plan.cautions.filter((caution) => caution.code === 'beyondLargest');
  const smallest = plan.cautions.filter((caution) => caution.code === 'beyondSmallest');
  const parts = [
    ...(largest.length > 0
      ? [
          `This pattern’s sizes end at ${context.sizes.at(-1) ?? ''}; ${sayAmounts(largest, 'beyond it', context)}`,
        ]
      : []),
    ...(smallest.length > 0
      ? [
          `This pattern’s sizes begin at ${context.sizes[0] ?? ''}; ${sayAmounts(smallest, 'before it', context)}`,
        ]
      : []),
  ];
  if (parts.length === 0) return `This pattern’s sizes end before this body; the nearest is ${cut}.`;
  const [only, ...others] = new Set(plan.zones.map((zone) => saySize(zone.size)));
  const beyond = parts.join('. ');
  if (only !== undefined && others.length === 0) return `${beyond}: the nearest is ${only}.`;
  return `${beyond}. Nearest: cut ${cut}.`;
}

function sayAmounts(cautions: readonly Caution[], place: string, context: SayContext): string {
  const said = cautions.flatMap(({ point, amountMm }) => {
    if (!point) return [];
    const name = `the ${sayPoint(point, context.chestWord)}`;
    if (amountMm === undefined) return [`${name} is`];
    return [`${name} is ${printLengthWithUnit(Math.abs(amountMm), context.unit)}`];
  });
  return said.length === 0 ? `this body is ${place}` : `${listWords(said)} ${place}`;
}

function sayNotEnough(plan: FitPlan, context: SayContext): string {
  const has = (code: Caution['code']) => plan.cautions.some((caution) => caution.code === code);
  if (has('knitNotReckoned'))
    return 'This pattern is drafted for a knit, and Leeway cannot reckon a knit yet.';
  const missing = plan.cautions
    .filter((caution) => caution.code === 'notMeasured')
    .flatMap(({ point }) => (point ? [sayPoint(point, context.chestWord)] : []));
  if (missing.length === 0) return 'There is nothing yet to choose a size by.';
  return `Measure the ${listWords([...new Set(missing)].slice(0, 4), 'or')} first: ${
    missing.length === 1 ? 'nothing else chooses a size here' : 'any one of them lets a size be chosen'
  }.`;
}

/** What a zone's node stands for. */
export interface NodeChoice {
  size: SizeChoice;
  zone: ZoneId;
  /** Null where the zone has nothing to compare. */
  result: { easeMm: number | null; verdict: Verdict; leewayMm: number | null } | null;
  isHeld: boolean;
}

/** One zone's choice as a screen reader should say it: `16, hip: ease 6.0 cm, as drafted`. */
export function sayNode({ size, zone, result, isHeld }: NodeChoice, context: SayContext): string {
  const held = isHeld ? ', held' : '';
  const start = `${saySize(size)}, ${sayZone(zone, context.chestWord)}`;
  if (!result) return `${start}: nothing to compare${held}`;
  const ease =
    result.easeMm === null
      ? 'ease not published'
      : `ease ${printLengthWithUnit(result.easeMm, context.unit)}`;
  return `${start}: ${ease}, ${sayVerdict(result)}${held}`;
}
