import { Link } from 'react-router-dom';
import type { MeasurementSet } from '../../shared/people/people.schema.ts';
import { paths } from '../paths.ts';
import { printDay } from '../ui/day.ts';

/** A person's dated sets, the newest first. */
export function SetList({ personId, sets }: { personId: string; sets: readonly MeasurementSet[] }) {
  return (
    <ul className="mt-3 border-t border-rule">
      {sets.map((set) => {
        const count = Object.keys(set.values).length;
        return (
          <li
            key={set.id}
            className="flex flex-wrap items-center justify-between gap-x-6 border-b border-rule py-1.5"
          >
            <Link
              to={paths.measurementSet(personId, set.id)}
              className="inline-flex min-h-11 items-center font-semibold text-woad underline decoration-1 underline-offset-4 hover:decoration-2"
            >
              {printDay(set.takenOn)}
            </Link>
            <span className="text-note text-ink-2">
              {count === 1 ? '1 point' : `${count} points`}, {takenByWords(set.takenBy)}
            </span>
          </li>
        );
      })}
    </ul>
  );
}

/** Who held the tape. */
export const takenByWords = (takenBy: MeasurementSet['takenBy']): string =>
  takenBy === 'self' ? 'taken by oneself' : 'taken by another';
