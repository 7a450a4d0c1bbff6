import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { CopyPattern } from './copy-pattern.tsx';
import { DeletePattern } from './delete-pattern.tsx';
import { PatternFacts } from './pattern-facts.tsx';
import { sayMaker } from './pattern-words.ts';
import { patternQuery } from './queries.ts';
import { RevisionList } from './revision-list.tsx';
import { RevisionTables } from './revision-tables.tsx';
import { TakeAway } from './take-away.tsx';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    client.query(patternQuery(param(params, 'patternId')));

export function Component() {
  const patternId = param(useParams(), 'patternId');
  const { data: pattern } = useSuspenseQuery(patternQuery(patternId));
  const maker = sayMaker(pattern);
  return (
    <>
      <PageHeading
        title={pattern.title}
        above={
          <>
            <TextLink to={paths.patterns}>Patterns</TextLink>
            {maker !== '' && <> · {maker}</>}
          </>
        }
        actions={
          <ButtonLink kind="primary" to={`${paths.fit}?revision=${pattern.latestRevisionId}`}>
            Plan with this pattern
          </ButtonLink>
        }
      />
      <PatternFacts pattern={pattern} />
      <RevisionTables table={pattern.revision.table} />
      <TakeAway revision={pattern.revision} />
      <RevisionList patternId={patternId} latestId={pattern.latestRevisionId} />
      <div className="mt-12 flex flex-wrap gap-x-7 border-t border-rule pt-4 print:hidden">
        <ButtonLink kind="quiet" to={paths.editTable(patternId)}>
          Edit the tables
        </ButtonLink>
        <ButtonLink kind="quiet" to={paths.editPattern(patternId)}>
          Change title, kind or notes
        </ButtonLink>
        <ButtonLink kind="quiet" to={`${paths.newImport}?pattern=${patternId}`}>
          Bring in new tables
        </ButtonLink>
        <CopyPattern patternId={patternId} />
        <DeletePattern pattern={pattern} />
      </div>
    </>
  );
}
