import { useQuery } from '@tanstack/react-query';
import type { PatternRevision } from '../../shared/patterns/patterns.schema.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { SectionHeading } from '../ui/page-heading.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { saySizes } from './pattern-words.ts';
import { revisionsQuery } from './queries.ts';

/** Every set of tables a pattern has had, the newest first. It is read after the page: most people never look. */
export function RevisionList({ patternId, latestId }: { patternId: string; latestId: string }) {
  const { data, error, isPending, refetch } = useQuery(revisionsQuery(patternId));
  return (
    <section aria-labelledby="revisions" className="mt-12">
      <SectionHeading id="revisions">Revisions of the tables</SectionHeading>
      {isPending && (
        <p role="status" className="come-in-late mt-2 text-ink-2">
          Loading the revisions
        </p>
      )}
      {error && !data && (
        <div role="alert" className="mt-3">
          <Notice kind="error">
            <p>{failureWords(error)}</p>
            <Button kind="quiet" onClick={() => void refetch()}>
              Try again
            </Button>
          </Notice>
        </div>
      )}
      {data && (
        <>
          <ul className="mt-2 max-w-[44rem] border-t border-rule">
            {data.items.map((revision) => (
              <RevisionRow
                key={revision.id}
                revision={revision}
                isLatest={revision.id === latestId}
                latestId={latestId}
              />
            ))}
          </ul>
          {data.total > 1 && (
            <p className="mt-3">
              <TextLink to={paths.compareRevisions(patternId)}>See what changed between revisions</TextLink>
            </p>
          )}
          {data.total > data.items.length && (
            <p className="mt-2 text-note text-ink-2">
              The newest {data.items.length} of {data.total}.
            </p>
          )}
        </>
      )}
    </section>
  );
}

function RevisionRow({
  revision,
  isLatest,
  latestId,
}: {
  revision: PatternRevision;
  isLatest: boolean;
  latestId: string;
}) {
  const compared = new URLSearchParams({ from: revision.id, to: latestId }).toString();
  const name = `Revision ${revision.number}`;
  return (
    <li className="flex flex-wrap items-baseline gap-x-5 border-b border-rule py-2.5">
      {isLatest ? (
        <span className="font-semibold">{name}, shown here</span>
      ) : (
        <TextLink to={paths.revision(revision.patternId, revision.id)} className="font-semibold">
          {name}
        </TextLink>
      )}
      <span className="text-note text-ink-2">
        {printMoment(revision.createdAt)} · {saySizes(revision.table.sizes)}
        {revision.chartFile === null && revision.finishedFile === null && ' · without a file'}
      </span>
      {!isLatest && (
        <TextLink to={`${paths.compareRevisions(revision.patternId)}?${compared}`} className="text-note">
          Compare with the latest<span className="sr-only">: {name}</span>
        </TextLink>
      )}
    </li>
  );
}
