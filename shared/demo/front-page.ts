import type { MeasurementSet } from '../people/people.schema.ts';
import type { PatternInput, PatternTable } from '../patterns/patterns.schema.ts';
import { parseLength, type LengthUnit } from '../units.ts';
import { demoDress } from './demo-dress.ts';
import { demoPeople } from './demo-people.ts';
import type { DemoPerson } from './demo-shapes.ts';
import { demoCape, demoShirt } from './demo-shirt-and-cape.ts';
import { demoTable } from './demo-table.ts';
import { demoTrousers } from './demo-trousers.ts';

/** Somebody whose plan the front page can show, with the latest measurements read into mm. */
export interface FrontPagePerson {
  name: string;
  chestWord: 'bust' | 'chest';
  unit: LengthUnit;
  takenOn: string;
  takenBy: 'self' | 'another';
  values: MeasurementSet['values'];
}

/** A pattern the front page can plan. */
export interface FrontPagePattern {
  title: string;
  pattern: PatternInput;
  table: PatternTable;
}

/** The invented people of the front page. */
export const frontPagePeople: readonly FrontPagePerson[] = demoPeople.map((person) => {
  const latest = latestSet(person);
  return {
    name: person.details.name,
    chestWord: person.details.chestWord,
    unit: person.details.unit,
    takenOn: latest.takenOn,
    takenBy: latest.takenBy,
    values: readValues(latest.typed, person.details.unit),
  };
});

/** The invented patterns of the front page. */
export const frontPagePatterns: readonly FrontPagePattern[] = [
  demoDress,
  demoTrousers,
  demoShirt,
  demoCape,
].map((pattern) => ({ title: pattern.details.title, pattern: pattern.details, table: demoTable(pattern) }));

function latestSet(person: DemoPerson): DemoPerson['sets'][number] {
  const latest = [...person.sets].sort((a, b) => a.takenOn.localeCompare(b.takenOn)).at(-1);
  if (!latest) throw new RangeError('demoPeople: every person has at least one set');
  return latest;
}

function readValues(typed: DemoPerson['sets'][number]['typed'], unit: LengthUnit): MeasurementSet['values'] {
  const values: Record<string, { typed: string; unit: LengthUnit; mm: number }> = {};
  for (const [point, text] of Object.entries(typed)) {
    const read = parseLength(text, unit);
    if (!read.ok) throw new RangeError(`demoPeople: ${point} is not a length`);
    values[point] = { typed: text, unit: read.unit, mm: read.mm };
  }
  return values;
}
