import { memo, type ReactNode } from 'react';
import type { TableRole } from '../../../shared/patterns/imports.schema.ts';
import { CATALOGUE, POINT_GROUP_NAMES } from '../../../shared/points/catalogue.ts';
import { POINT_GROUPS } from '../../../shared/points/catalogue-point.ts';
import { POINT_IDS, type PointId } from '../../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { JumpLink } from '../../ui/jump-link.tsx';
import { STICKY_SIDE } from '../../ui/wide-table.tsx';
import { UNIT_OPTIONS, UNIT_WORDS } from '../unit-words.ts';
import { cellId, type FindingNote } from './finding-notes.ts';

const GROUPS = POINT_GROUPS.map((group) => ({
  name: POINT_GROUP_NAMES[group],
  points: POINT_IDS.filter((point) => CATALOGUE[point].group === group),
}));

interface LineHeadProps {
  role: TableRole;
  line: number;
  point: PointId | null;
  unit: LengthUnit;
  /** Points that have another line already: each is used once. */
  used: readonly (PointId | null)[];
  notes: readonly FindingNote[] | undefined;
  isAtHand: boolean;
  onPoint: (line: number, point: PointId) => void;
  onUnit: (line: number, unit: LengthUnit) => void;
}

const OVER = 'peer absolute inset-x-0 -inset-y-1 w-full cursor-pointer text-base text-ink opacity-0';

/** Which point a line is and what it is written in. Enter goes to the choosers, Escape comes back. */
export const LineHead = memo(function LineHead(props: LineHeadProps) {
  const { role, line, point, unit, used, notes, isAtHand, onPoint, onUnit } = props;
  const id = cellId(role, { line, size: -1 });
  const name = point === null ? `line ${line + 1}` : CATALOGUE[point].name;
  return (
    <th
      id={id}
      scope="row"
      role="rowheader"
      data-line={line}
      data-size={-1}
      tabIndex={isAtHand ? 0 : -1}
      className={`${STICKY_SIDE} z-1 w-36 min-w-36 border-b border-rule py-1.5 pr-2 align-top font-normal focus-visible:-outline-offset-2 md:w-56 md:min-w-56`}
    >
      <InPlace word={point === null ? 'Choose the point' : name} isOpen={point === null}>
        <select
          tabIndex={-1}
          aria-label={`Point of line ${line + 1}`}
          value={point ?? ''}
          onChange={(event) => {
            const next = POINT_IDS.find((known) => known === event.target.value);
            if (next) onPoint(line, next);
          }}
          className={OVER}
        >
          {point === null && <option value="">Choose the point</option>}
          {GROUPS.map((group) => (
            <optgroup key={group.name} label={group.name}>
              {group.points
                .filter((each) => each === point || !used.includes(each))
                .map((each) => (
                  <option key={each} value={each}>
                    {CATALOGUE[each].name}
                  </option>
                ))}
            </optgroup>
          ))}
        </select>
      </InPlace>
      <span className="mt-1.5 flex flex-wrap items-center gap-x-2 text-small text-ink-2">
        <InPlace word={`in ${UNIT_WORDS[unit]}`}>
          <select
            tabIndex={-1}
            aria-label={`Unit of ${name}`}
            value={unit}
            onChange={(event) => {
              const next = UNIT_OPTIONS.find(({ value }) => value === event.target.value);
              if (next) onUnit(line, next.value);
            }}
            className={OVER}
          >
            {UNIT_OPTIONS.map(({ value }) => (
              <option key={value} value={value}>
                in {UNIT_WORDS[value]}
              </option>
            ))}
          </select>
        </InPlace>
        {notes?.map((note) => (
          <JumpLink
            key={note.id}
            to={note.id}
            tabIndex={-1}
            className={`font-semibold ${note.severity === 'error' ? 'text-madder' : 'text-ink'}`}
          >
            {note.severity === 'error' ? 'Error' : 'Look'} {note.number}
          </JumpLink>
        ))}
      </span>
    </th>
  );
});

/** A chooser drawn as its word: the platform's list lies over it unseen, so that a long name may run on to a second line. */
function InPlace({
  word,
  isOpen = false,
  children,
}: {
  word: string;
  isOpen?: boolean;
  children: ReactNode;
}) {
  const isUnit = word.startsWith('in ');
  return (
    <span className="group relative inline-block max-w-full leading-snug">
      {children}
      <span
        aria-hidden="true"
        className={`border-dashed border-woad group-hover:border-solid peer-focus-visible:outline-3 peer-focus-visible:outline-woad ${
          isUnit ? 'border-b' : 'border-b-2 font-semibold'
        } ${isOpen ? 'text-ink-2' : ''}`}
      >
        {word}
      </span>
    </span>
  );
}
