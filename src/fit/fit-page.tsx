import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { measurementSetQuery, measurementSetsQuery, peopleQuery, personQuery } from '../people/queries.ts';
import { patternQuery, patternsQuery, revisionQuery } from '../patterns/queries.ts';
import { paths } from '../paths.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { ChooseFirst } from './choose-first.tsx';
import { Desk } from './desk.tsx';
import { readFitAddress } from './fit-address.ts';

export const loader =
  (client: QueryClient) =>
  async ({ request }: LoaderFunctionArgs) => {
    const { setId, revisionId } = readFitAddress(new URL(request.url).searchParams);
    await Promise.all([
      client.query(peopleQuery()),
      client.query(patternsQuery()),
      setId === null ? null : readPerson(client, setId),
      revisionId === null ? null : readPattern(client, revisionId),
    ]);
    return null;
  };

async function readPerson(client: QueryClient, setId: string) {
  const { personId } = await client.query(measurementSetQuery(setId));
  await Promise.all([client.query(personQuery(personId)), client.query(measurementSetsQuery(personId))]);
}

async function readPattern(client: QueryClient, revisionId: string) {
  const { patternId } = await client.query(revisionQuery(revisionId));
  await client.query(patternQuery(patternId));
}

/** The fit view of somebody in a pattern; everything that is chosen stands in the address. */
export function Component() {
  const [search] = useSearchParams();
  const { data: people } = useSuspenseQuery(peopleQuery());
  const { data: patterns } = useSuspenseQuery(patternsQuery());
  const { setId, revisionId, silhouette, isBetween, hold } = readFitAddress(search);
  if (people.total === 0) return <NobodyYet />;
  if (patterns.total === 0) return <NoPatternYet />;
  if (setId === null || revisionId === null) return <ChooseFirst setId={setId} revisionId={revisionId} />;
  return (
    <Desk
      // Another person, pattern, silhouette or way to cut is another plan: nothing stays held from the one before.
      key={`${setId} ${revisionId} ${silhouette ?? ''} ${isBetween}`}
      setId={setId}
      revisionId={revisionId}
      silhouette={silhouette}
      isBetween={isBetween}
      hold={hold}
    />
  );
}

function NobodyYet() {
  return (
    <>
      <PageHeading title="A new plan" />
      <EmptyState
        title="Begin with whoever it is for"
        action={
          <ButtonLink kind="primary" to={paths.newPerson}>
            Add a person
          </ButtonLink>
        }
      >
        <p>A plan holds somebody’s measurements against a pattern’s tables. Nobody is here yet.</p>
      </EmptyState>
    </>
  );
}

function NoPatternYet() {
  return (
    <>
      <PageHeading title="A new plan" />
      <EmptyState
        title="Then the pattern"
        action={
          <ButtonLink kind="primary" to={paths.newImport}>
            Bring a pattern’s tables
          </ButtonLink>
        }
      >
        <p>
          Its size chart, its finished measurements, or both: a CSV file from the maker’s page or your own.
        </p>
      </EmptyState>
    </>
  );
}
