import { placesPerSize } from '../fit/between-lines.ts';
import { zonesOf } from '../fit/garments.ts';
import type { PatternInput, PatternTable } from '../patterns/patterns.schema.ts';
import type { FieldProblem } from '../problem.ts';
import type { PlanOptions } from './plans.schema.ts';

/**
 * Every option that cannot be honoured yet or not in this pattern, with its JSON pointer and a sentence; none where
 * all can. Nothing is quietly ignored: an answer that left an option out would pretend to have reckoned it.
 */
export function refuseOptions(
  options: PlanOptions,
  pattern: Pick<PatternInput, 'structure' | 'kind'>,
  table: Pick<PatternTable, 'sizes'>,
): FieldProblem[] {
  return [
    ...refuseFabric(options.fabric, pattern),
    ...refuse(
      options.layers !== undefined && options.layers.length > 0,
      '/options/layers',
      'Layers worn underneath are not reckoned yet: leave them out.',
    ),
    ...refuse(
      options.lean !== undefined,
      '/options/lean',
      'Closer or roomier than drafted is not reckoned yet: leave it out.',
    ),
    ...refuseHeld(options, zonesOf(pattern.kind), table.sizes.length),
  ];
}

function refuseFabric(
  fabric: PlanOptions['fabric'],
  pattern: Pick<PatternInput, 'structure'>,
): FieldProblem[] {
  if (fabric === undefined) return [];
  const at = '/options/fabric';
  const isOther = fabric.structure !== pattern.structure;
  return [
    ...refuse(
      isOther && fabric.structure === 'knit',
      `${at}/structure`,
      'Knit cloth is not reckoned yet: plan a woven in this pattern.',
    ),
    ...refuse(
      isOther && fabric.structure === 'woven',
      `${at}/structure`,
      'This pattern is drafted for a knit: a woven in it is not reckoned yet.',
    ),
    ...refuse(
      (fabric.stretch ?? 0) > 0,
      `${at}/stretch`,
      'Stretch is not reckoned yet: leave it out, or give 0.',
    ),
    ...(['shrinkLengthwise', 'shrinkCrosswise'] as const).flatMap((way) =>
      refuse(
        (fabric[way] ?? 0) !== 0,
        `${at}/${way}`,
        'Shrinkage is not reckoned yet: wash the cloth before cutting, and leave this out.',
      ),
    ),
  ];
}

function refuseHeld(options: PlanOptions, zones: readonly string[], sizes: number): FieldProblem[] {
  const { held, cutBetweenLines } = options;
  const perSize = placesPerSize({ cutBetweenLines });
  return Object.entries(held ?? {}).flatMap(([zone, position]) => [
    ...refuse(
      !zones.includes(zone),
      `/options/held/${zone}`,
      'This garment is not fitted there: leave it out.',
    ),
    ...refuse(
      !Number.isInteger(position * perSize),
      `/options/held/${zone}`,
      perSize === 1
        ? 'The plan keeps to the lines: give a whole number, or let it cut between them.'
        : 'Give a size, or the place half-way between two: a whole number, or one with a half.',
    ),
    ...refuse(
      position > sizes - 1,
      `/options/held/${zone}`,
      `Give a size of this pattern: 0 is its first and ${sizes - 1} its last.`,
    ),
  ]);
}

function refuse(when: boolean, pointer: string, detail: string): FieldProblem[] {
  return when ? [{ pointer, detail }] : [];
}
