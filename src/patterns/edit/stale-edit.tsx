import { useEffect, useRef, useState } from 'react';
import { compareTables } from '../../../shared/patterns/compare-tables.ts';
import type { CellDifference } from '../../../shared/patterns/comparison.schema.ts';
import { pairSizes } from '../../../shared/patterns/pair-sizes.ts';
import type { PatternRevision, PatternTable } from '../../../shared/patterns/patterns.schema.ts';
import { paths } from '../../paths.ts';
import { AlertDialog } from '../../ui/alert-dialog.tsx';
import { Button } from '../../ui/button.tsx';
import { ButtonLink } from '../../ui/link.tsx';
import { printMoment } from '../../ui/moment.ts';
import { DifferenceList } from '../difference-list.tsx';
import { sayDifference } from '../difference-words.ts';
import { VersionTable } from '../version-table.tsx';

interface StaleEditProps {
  base: PatternRevision;
  yours: PatternTable;
  theirs: PatternRevision;
  onLayOver: () => void;
  onLetGo: () => void;
}

/** A newer revision was saved since this edit began: both versions, what differs, and the ways on. Nothing typed is lost. */
export function StaleEdit({ base, yours, theirs, onLayOver, onLetGo }: StaleEditProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  const [isAsking, setAsking] = useState(false);
  useEffect(() => heading.current?.focus(), []);
  const difference = compareTables(theirs.table, yours);
  const newer = `Revision ${theirs.number}`;
  return (
    <section aria-labelledby="stale" className="mt-8 border-l-4 border-dashed border-ink pl-4 md:pl-6">
      <h2 ref={heading} id="stale" tabIndex={-1} className="text-section font-semibold">
        {newer} was saved meanwhile
      </h2>
      <p className="mt-1 max-w-[44rem]">
        You began from revision {base.number}. {newer} was saved {printMoment(theirs.createdAt)}, so yours was
        not written over it. What you typed is still here. {sayDifference(difference)}
      </p>
      <DifferenceList
        difference={difference}
        names={{ from: newer, to: 'Yours' }}
        about={{ title: 'Changed', say: (cell) => sayWho(cell, base.table, theirs.table, newer) }}
      />
      <div className="mt-6 flex flex-wrap items-center gap-x-6 gap-y-3">
        <Button kind="primary" onClick={onLayOver}>
          Lay my changes over revision {theirs.number}
        </Button>
        <ButtonLink kind="quiet" to={paths.pattern(theirs.patternId)}>
          Leave it for now
        </ButtonLink>
        <Button kind="quiet" onClick={() => setAsking(true)}>
          Let mine go
        </Button>
      </div>
      <p className="mt-2 max-w-[44rem] text-note text-ink-2">
        Laid over, your cells stand where you changed them and revision {theirs.number}’s everywhere else. You
        look it over before you save. Left for now, it stays in this tab.
      </p>
      <div className="mt-7 grid gap-x-10 gap-y-8 xl:grid-cols-2">
        <VersionTable title={newer} table={theirs.table} difference={difference} side="from" />
        <VersionTable title="Yours" table={yours} difference={difference} side="to" />
      </div>
      <AlertDialog
        isOpen={isAsking}
        title="Let what you typed go?"
        confirm="Let it go"
        onConfirm={onLetGo}
        onCancel={() => setAsking(false)}
      >
        <p>You go on with revision {theirs.number} as it was saved. It cannot be undone.</p>
      </AlertDialog>
    </section>
  );
}

/** Who changed a cell since the revision both began from. */
function sayWho(
  { role, point, size, from, to }: CellDifference,
  base: PatternTable,
  theirs: PatternTable,
  newer: string,
): string {
  const pair = pairSizes(base, theirs).find((found) => theirs.sizes[found.to] === size.from);
  const known: readonly { point: string; unit: string; typed: string[] }[] = base[role];
  const column = known.find((each) => each.point === point);
  const before = column && pair ? `${column.typed[pair.from] ?? ''} ${column.unit}` : null;
  const isTheirs = before !== `${from.typed} ${from.unit}`;
  const isYours = before !== `${to.typed} ${to.unit}`;
  if (isTheirs && isYours) return 'by both; laid over, yours stands';
  return isYours ? 'by you' : `in ${newer.toLowerCase()}`;
}
