import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { saySizes } from './pattern-words.ts';
import { patternQuery, revisionQuery } from './queries.ts';
import { RevisionTables } from './revision-tables.tsx';
import { TakeAway } from './take-away.tsx';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    Promise.all([
      client.query(patternQuery(param(params, 'patternId'))),
      client.query(revisionQuery(param(params, 'revisionId'))),
    ]);

export function Component() {
  const params = useParams();
  const patternId = param(params, 'patternId');
  const { data: pattern } = useSuspenseQuery(patternQuery(patternId));
  const { data: revision } = useSuspenseQuery(revisionQuery(param(params, 'revisionId')));
  const isLatest = revision.id === pattern.latestRevisionId;
  return (
    <>
      <PageHeading
        title={`${pattern.title}, revision ${revision.number}`}
        above={<TextLink to={paths.pattern(patternId)}>{pattern.title}</TextLink>}
        actions={<ButtonLink to={`${paths.fit}?revision=${revision.id}`}>Plan with this revision</ButtonLink>}
      />
      <p className="mt-3 text-ink-2">
        {(revision.chartFile ?? revision.finishedFile) ? 'Brought in' : 'Kept, without a file,'}{' '}
        {printMoment(revision.createdAt)}. {saySizes(revision.table.sizes)}.
      </p>
      {!isLatest && (
        <Notice className="mt-5 max-w-[42rem]">
          <p>
            These tables were replaced since. Plans that were saved with them keep them.{' '}
            <TextLink to={paths.pattern(patternId)}>
              See the latest, revision {pattern.latestRevisionNumber}
            </TextLink>
          </p>
        </Notice>
      )}
      <RevisionTables table={revision.table} />
      <TakeAway revision={revision} />
    </>
  );
}
