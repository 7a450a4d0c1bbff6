import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Silhouette } from '../../shared/fit/fit-words.ts';
import type { FitAnswer, PlanOptions } from '../../shared/plans/plans.schema.ts';
import { measurementSetQuery, personQuery } from '../people/queries.ts';
import { patternQuery, revisionQuery } from '../patterns/queries.ts';
import { fitQuery } from '../plans/queries.ts';
import { paths } from '../paths.ts';
import { ButtonLink } from '../ui/link.tsx';
import { Notice } from '../ui/notice.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { Skeleton } from '../ui/skeleton.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { Confirmation } from './confirmation.tsx';
import { readHeld, writeHeld } from './fit-address.ts';
import { FitView } from './parts/fit-view.tsx';
import { groundOf, planHeld, type Held } from './parts/fitting.ts';
import { ProfileSection } from './parts/profile-section.tsx';
import { Fast, LinesWord, Setting, SilhouetteWord, WithComma } from './parts/setting.tsx';
import { SavePlan } from './save-plan.tsx';
import { saysTheSame } from './same-plan.ts';
import { MeasuredWord, PatternWord, PersonWord, useSettingChange } from './setting-choosers.tsx';

interface DeskProps {
  setId: string;
  revisionId: string;
  silhouette: Silhouette | null;
  isBetween: boolean;
  hold: readonly string[];
}

/** One setting and its answer. The browser reckons at once; the server's answer is the one that counts. */
export function Desk({ setId, revisionId, silhouette, isBetween, hold }: DeskProps) {
  const { data: set } = useSuspenseQuery(measurementSetQuery(setId));
  const { data: person } = useSuspenseQuery(personQuery(set.personId));
  const { data: revision } = useSuspenseQuery(revisionQuery(revisionId));
  const { data: pattern } = useSuspenseQuery(patternQuery(revision.patternId));
  const options: PlanOptions = {
    ...(silhouette !== null && { silhouette }),
    ...(isBetween && { cutBetweenLines: true }),
  };
  const fit = useQuery(fitQuery({ measurementSetId: setId, revisionId, options }));
  const change = useSettingChange();
  return (
    <>
      <Setting>
        <WithComma>
          <PersonWord person={person} />
        </WithComma>{' '}
        measured{' '}
        <WithComma>
          <MeasuredWord set={set} />
        </WithComma>{' '}
        in the{' '}
        <WithComma>
          <PatternWord pattern={pattern} />
        </WithComma>{' '}
        <WithComma>
          <SilhouetteWord
            value={silhouette ?? pattern.silhouette}
            drafted={pattern.silhouette}
            onChange={(next) => change({ silhouette: next === pattern.silhouette ? null : next })}
          />
        </WithComma>{' '}
        of{' '}
        <WithComma>
          <Fast>{pattern.structure === 'knit' ? 'a knit' : 'woven cloth'}</Fast>
        </WithComma>{' '}
        <LinesWord isBetween={isBetween} onChange={(next) => change({ cut: next ? 'between' : null })} />
      </Setting>
      {revision.id !== pattern.latestRevisionId && (
        <p className="mt-2 text-note text-ink-2">
          By its tables as they were in revision {revision.number}; there is a newer one.
        </p>
      )}
      {fit.data ? (
        <Reckoned
          answer={fit.data}
          request={{ measurementSetId: setId, revisionId, options }}
          speech={{ unit: person.unit, chestWord: person.chestWord }}
          hold={hold}
          name={`${person.name}, ${pattern.title}`}
          cloth={pattern.cloth}
        />
      ) : (
        <Unanswered error={fit.error} onRetry={() => void fit.refetch()} />
      )}
      {fit.data?.plan.status === 'notEnough' && pattern.structure === 'woven' && (
        <p className="mt-6">
          <ButtonLink kind="primary" to={paths.measure(person.id)}>
            Measure {person.name}
          </ButtonLink>
        </p>
      )}
    </>
  );
}

function Unanswered({ error, onRetry }: { error: Error | null; onRetry: () => void }) {
  if (!error) return <Skeleton word="Reckoning" />;
  return (
    <div className="mt-6 max-w-[40rem]">
      <PageHeading title="No plan just now" />
      <Notice kind="error" className="mt-4">
        <p>{failureWords(error)}</p>
        <button
          type="button"
          className="inline-flex min-h-11 items-center font-semibold text-woad"
          onClick={onRetry}
        >
          <span className="changeable leading-tight">Try again</span>
        </button>
      </Notice>
    </div>
  );
}

interface ReckonedProps {
  answer: FitAnswer;
  request: { measurementSetId: string; revisionId: string; options: PlanOptions };
  speech: Parameters<typeof groundOf>[1];
  hold: readonly string[];
  name: string;
  /** What the pattern says it is meant for. */
  cloth: string;
}

function Reckoned({ answer, request, speech, hold, name, cloth }: ReckonedProps) {
  const { unit, chestWord } = speech;
  const ground = useMemo(() => groundOf(answer.input, { unit, chestWord }), [answer.input, unit, chestWord]);
  const zones = ground.plan.zones.map(({ zone }) => zone);
  const [held, setHeld] = useState<Held>(() =>
    readHeld(hold, ground.context.sizes, zones, ground.perSize > 1),
  );
  const settled = useSettled(held, 400);
  useHeldInAddress(settled, ground.context.sizes);
  const isHeld = Object.keys(settled).length > 0;
  const options = { ...request.options, ...(isHeld && { held: settled }) };
  const server = useQuery({ ...fitQuery({ ...request, options }), enabled: ground.plan.zones.length > 0 });
  const reckoned = useMemo(() => planHeld(ground, held), [ground, held]);
  const isCurrent = server.data !== undefined && settled === held;
  const differs = isCurrent && !saysTheSame(server.data.plan, reckoned);
  const plan = differs ? server.data.plan : reckoned;
  const state = server.isError ? 'failed' : !isCurrent ? 'asking' : differs ? 'differs' : 'same';
  return (
    <>
      <FitView
        ground={ground}
        plan={plan}
        held={held}
        onHeld={setHeld}
        headingLevel={1}
        isPage
        cloth={cloth}
        actions={
          plan.zones.length > 0 && (
            <div className="flex flex-wrap items-start gap-x-6 gap-y-2 print:hidden">
              <Confirmation state={state} engine={answer.engine} onRetry={() => void server.refetch()} />
              <SavePlan request={{ ...request, options }} name={name} isReady={isCurrent} />
            </div>
          )
        }
      />
      <ProfileSection ground={ground} plan={plan} />
    </>
  );
}

/** A value once it has stood still: a drag asks the server at its end, not at each size on the way. */
function useSettled<T>(value: T, afterMs: number): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), afterMs);
    return () => clearTimeout(timer);
  }, [value, afterMs]);
  return settled;
}

/** What is held stands in the address, so that it can be sent and comes back after a reload. */
function useHeldInAddress(held: Held, sizes: readonly string[]) {
  const [search, setSearch] = useSearchParams();
  useEffect(() => {
    const next = writeHeld(search, held, sizes);
    if (next.toString() === search.toString()) return;
    setSearch(next, { replace: true, preventScrollReset: true });
  }, [held, sizes, search, setSearch]);
}
