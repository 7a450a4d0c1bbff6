import type { PatternInput } from '../patterns/patterns.schema.ts';
import type { PersonInput } from '../people/people.schema.ts';
import type { PointId } from '../points/point-ids.ts';
import type { LengthUnit } from '../units.ts';

/** A made-up person with dated measurements, as they would be typed. */
export interface DemoPerson {
  details: PersonInput;
  sets: {
    takenOn: string;
    takenBy: 'self' | 'another';
    notes: string;
    typed: Partial<Record<PointId, string>>;
  }[];
}

/** A cell of a demo table in its pattern's unit: one number, or the lowest and highest body a size is for. */
export type DemoCell = number | readonly [number, number];

/** A pattern with its tables, a list of cells a point, one cell a size; lengths are in `unit`. */
export interface DemoPattern {
  details: PatternInput;
  unit: LengthUnit;
  sizes: readonly string[];
  chart: Partial<Record<PointId, readonly DemoCell[]>>;
  finished: Partial<Record<PointId, readonly number[]>>;
}
