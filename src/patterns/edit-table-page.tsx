import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { PatternRevision } from '../../shared/patterns/patterns.schema.ts';
import { isSameTyping, typedOf } from '../../shared/patterns/tables-as-typed.ts';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { EditSession, type Session } from './edit/edit-session.tsx';
import { beginEdit, typedTable } from './edit/edited-table.ts';
import { beginHistory, stepOn } from './edit/history.ts';
import { forgetEdit, readKeptEdit } from './edit/kept-edit.ts';
import { layOver } from './edit/lay-over.ts';
import { patternQuery, revisionQuery } from './queries.ts';

/** Whoever is about to write on a table sees the newest one, and what was kept in this tab with the revision it began from. */
export const loader =
  (client: QueryClient) =>
  async ({ params }: LoaderFunctionArgs) => {
    const patternId = param(params, 'patternId');
    const basedOn = readKeptEdit(patternId)?.basedOn;
    await Promise.all([
      client.query({ ...patternQuery(patternId), staleTime: 0 }),
      basedOn ? client.query(revisionQuery(basedOn)) : null,
    ]);
    return basedOn ?? null;
  };

export function Component() {
  const patternId = param(useParams(), 'patternId');
  const { data: pattern } = useSuspenseQuery(patternQuery(patternId));
  const [kept] = useState(() => readKeptEdit(patternId));
  const { data: keptBase } = useSuspenseQuery(revisionQuery(kept?.basedOn ?? pattern.latestRevisionId));
  const [latest] = useState(pattern.revision);
  const [session, setSession] = useState<Session>(() => firstSession(kept, keptBase, latest));
  const { base } = session;
  const startAgain = (revision: PatternRevision) => {
    forgetEdit(patternId);
    setSession({ ...freshSession(revision), turn: session.turn + 1 });
  };
  return (
    <>
      <PageHeading
        title={`${pattern.title}: the tables`}
        above={<TextLink to={paths.pattern(patternId)}>{pattern.title}</TextLink>}
      />
      <p className="mt-3 max-w-[44rem] text-ink-2">
        You write on revision {base.number}, kept {printMoment(base.createdAt)}. What you save becomes the
        next revision; this one stays, and so do the plans made with it.
      </p>
      <EditSession
        key={session.turn}
        session={session}
        onStale={(theirs) => setSession((now) => ({ ...now, theirs }))}
        onLayOver={(yours, theirs) => {
          const table = layOver(base.table, yours, theirs.table);
          const start = beginHistory(beginEdit(typedOf(theirs.table)));
          const words = `Your changes laid over revision ${theirs.number}.`;
          const history = stepOn(start, table, words);
          setSession({
            base: theirs,
            history,
            theirs: null,
            isKept: false,
            said: words,
            turn: session.turn + 1,
          });
        }}
        onStartAgain={startAgain}
      />
    </>
  );
}

function freshSession(base: PatternRevision): Session {
  const history = beginHistory(beginEdit(typedOf(base.table)));
  return { base, history, theirs: null, isKept: false, said: '', turn: 0 };
}

/** What was kept in this tab is taken up again, and is stale from the first where a newer revision was saved since. */
function firstSession(
  kept: ReturnType<typeof readKeptEdit>,
  keptBase: PatternRevision,
  latest: PatternRevision,
): Session {
  if (kept === null || isSameTyping(typedTable(kept.table), typedOf(keptBase.table)))
    return freshSession(latest);
  const start = beginHistory(beginEdit(typedOf(keptBase.table)));
  const history = stepOn(start, kept.table, 'What you had typed before.');
  const theirs = keptBase.id === latest.id ? null : latest;
  return { base: keptBase, history, theirs, isKept: true, said: '', turn: 0 };
}
