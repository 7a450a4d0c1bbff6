import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { useNavigate, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { ENGINE_VERSION } from '../../shared/fit/plan-fit.ts';
import { SILHOUETTE_WORDS } from '../../shared/fit/say-words.ts';
import type { Pattern } from '../../shared/patterns/patterns.schema.ts';
import type { Person } from '../../shared/people/people.schema.ts';
import type { SavedPlan } from '../../shared/plans/plans.schema.ts';
import { FitView } from '../fit/parts/fit-view.tsx';
import { groundOf } from '../fit/parts/fitting.ts';
import { ProfileSection } from '../fit/parts/profile-section.tsx';
import { Fast, Setting } from '../fit/parts/setting.tsx';
import { patternQuery } from '../patterns/queries.ts';
import { personQuery } from '../people/queries.ts';
import { paths } from '../paths.ts';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { printDay } from '../ui/day.ts';
import { TextLink } from '../ui/link.tsx';
import { param } from '../ui/param.ts';
import { failureWords } from '../ui/use-server-errors.ts';
import { NameForm } from './parts/name-form.tsx';
import { planQuery, useDeletePlan, useRenamePlan } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  async ({ params }: LoaderFunctionArgs) => {
    const plan = await client.query(planQuery(param(params, 'planId')));
    await Promise.all([client.query(personQuery(plan.personId)), client.query(patternQuery(plan.patternId))]);
    return null;
  };

/** A saved plan as it was saved: its numbers come from the record, whatever has changed since. */
export function Component() {
  const { data: saved } = useSuspenseQuery(planQuery(param(useParams(), 'planId')));
  const { data: person } = useSuspenseQuery(personQuery(saved.personId));
  const { data: pattern } = useSuspenseQuery(patternQuery(saved.patternId));
  const ground = useMemo(
    () => groundOf(saved.input, { unit: person.unit, chestWord: person.chestWord }, saved.plan),
    [saved, person.unit, person.chestWord],
  );
  return (
    <>
      <title>{`${saved.name} · Leeway`}</title>
      <Name saved={saved} />
      <div className="mt-5">
        <Setting>
          <Fast>{saved.personName}</Fast>, measured <Fast>{printDay(saved.takenOn)}</Fast>, in the{' '}
          <Fast>{saved.patternTitle}</Fast>
          {saved.input.garment.silhouette && (
            <>
              , <Fast>{SILHOUETTE_WORDS[saved.input.garment.silhouette]}</Fast>
            </>
          )}
          , of <Fast>{saved.input.fabric.structure === 'woven' ? 'woven cloth' : 'a knit'}</Fast>
          {saved.input.cutBetweenLines === true && (
            <>
              , cut <Fast>also between the lines</Fast>
            </>
          )}
        </Setting>
      </div>
      <FitView
        ground={ground}
        plan={saved.plan}
        held={saved.options.held ?? {}}
        headingLevel={2}
        actions={<Since saved={saved} person={person} pattern={pattern} />}
      />
      <ProfileSection ground={ground} plan={saved.plan} />
    </>
  );
}

function Name({ saved }: { saved: SavedPlan }) {
  const [isRenaming, setRenaming] = useState(false);
  const rename = useRenamePlan(saved.id);
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-3">
      {isRenaming ? (
        <NameForm
          label="Name of the plan"
          name={saved.name}
          confirm="Rename"
          cancel="Keep the name"
          isPending={rename.isPending}
          error={rename.error}
          onName={(name) => rename.mutate({ name }, { onSuccess: () => setRenaming(false) })}
          onCancel={() => {
            setRenaming(false);
            rename.reset();
          }}
        />
      ) : (
        <div className="min-w-0">
          <p className="text-note text-ink-2 print:hidden">
            <TextLink to={paths.plans}>Plans</TextLink>
          </p>
          <h1 tabIndex={-1} className="text-section font-semibold break-words">
            {saved.name}
          </h1>
        </div>
      )}
      <div className="flex flex-wrap items-center gap-x-7 print:hidden">
        <Button kind="quiet" onClick={() => window.print()}>
          Print
        </Button>
        {!isRenaming && (
          <Button kind="quiet" onClick={() => setRenaming(true)}>
            Rename
          </Button>
        )}
        <Delete saved={saved} />
      </div>
    </div>
  );
}

function Delete({ saved }: { saved: SavedPlan }) {
  const [isOpen, setOpen] = useState(false);
  const remove = useDeletePlan();
  const navigate = useNavigate();
  return (
    <>
      <Button kind="quiet" onClick={() => setOpen(true)}>
        Delete
      </Button>
      <AlertDialog
        isOpen={isOpen}
        title={`Delete “${saved.name}”?`}
        confirm="Delete the plan"
        pending={remove.isPending}
        error={remove.isError ? failureWords(remove.error) : undefined}
        onConfirm={() => remove.mutate(saved.id, { onSuccess: () => void navigate(paths.plans) })}
        onCancel={() => {
          setOpen(false);
          remove.reset();
        }}
      >
        <p>The plan is gone for good. The measurements and the pattern stay.</p>
      </AlertDialog>
    </>
  );
}

/** When it was saved and by what, and what has changed since: a plan never changes by itself. */
function Since({ saved, person, pattern }: { saved: SavedPlan; person: Person; pattern: Pattern }) {
  const setId = person.latestSetId ?? saved.measurementSetId;
  const newer = [
    ...(setId === saved.measurementSetId
      ? []
      : [
          `${person.name} has been measured since${person.latestTakenOn === null ? '' : `, on ${printDay(person.latestTakenOn)}`}`,
        ]),
    ...(pattern.latestRevisionId === saved.revisionId
      ? []
      : [
          `the pattern’s tables are at revision ${pattern.latestRevisionNumber}, this plan at ${saved.revisionNumber}`,
        ]),
  ];
  const search = new URLSearchParams({ set: setId, revision: pattern.latestRevisionId });
  if (saved.input.cutBetweenLines === true) search.set('cut', 'between');
  return (
    <div className="text-note text-ink-2">
      <p>
        Saved {printDay(saved.createdAt.slice(0, 10))}, by engine {saved.engine}
        {saved.engine === ENGINE_VERSION ? '' : ` (today’s is ${ENGINE_VERSION})`}. It stays as it was.
      </p>
      {newer.length > 0 && (
        <p className="mt-2 border-l-2 border-woad pl-4 text-ink">
          {`${newer.join('; ').replace(/^./, (letter) => letter.toUpperCase())}. `}
          <TextLink to={`${paths.fit}?${search.toString()}`} className="print:hidden">
            Plan it anew
          </TextLink>
        </p>
      )}
    </div>
  );
}
