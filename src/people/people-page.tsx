import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { Person } from '../../shared/people/people.schema.ts';
import { paths } from '../paths.ts';
import { printDay } from '../ui/day.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { SearchBox } from '../ui/search-box.tsx';
import { peopleQuery } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) => {
    const { page, q } = readListAddress(request.url);
    return client.query(peopleQuery(page, q));
  };

export function Component() {
  const [search] = useSearchParams();
  const { page, q } = readListAddress(`?${search.toString()}`);
  const { data } = useSuspenseQuery(peopleQuery(page, q));
  const isNobody = data.total === 0 && q === '';
  return (
    <>
      <PageHeading
        title="People"
        actions={!isNobody && <ButtonLink to={paths.newPerson}>Add a person</ButtonLink>}
      />
      {isNobody ? (
        <NobodyYet />
      ) : (
        <div className="mt-7">
          <SearchBox label="Find by name" />
          <p role="status" className="mt-6 mb-2 text-note text-ink-2">
            {countWords(data.total, q)}
          </p>
          {data.items.length > 0 && (
            <ul className="border-t border-rule">
              {data.items.map((person) => (
                <PersonRow key={person.id} person={person} />
              ))}
            </ul>
          )}
          <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
        </div>
      )}
    </>
  );
}

function countWords(total: number, q: string): string {
  const people = total === 0 ? 'Nobody' : total === 1 ? '1 person' : `${total} people`;
  return q === '' ? people : `${people} with “${q}” in the name`;
}

function PersonRow({ person }: { person: Person }) {
  const { latestTakenOn, latestSetId, setCount } = person;
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-8 border-b border-rule py-3 md:flex-nowrap">
      <div className="min-w-0 basis-full md:basis-auto">
        <Link
          to={paths.person(person.id)}
          className="inline-flex min-h-11 items-center text-lead font-semibold break-words decoration-1 underline-offset-4 hover:text-woad hover:underline"
        >
          {person.name}
        </Link>
        <p className="text-note text-ink-2">
          {latestTakenOn === null
            ? 'Not measured yet'
            : `Measured ${printDay(latestTakenOn)}${setCount > 1 ? `, ${setCount} times in all` : ''}`}
        </p>
      </div>
      <div className="flex shrink-0 gap-x-7">
        <ButtonLink kind="quiet" to={paths.measure(person.id)} aria-label={`Measure ${person.name}`}>
          {latestSetId === null ? 'Measure' : 'Measure again'}
        </ButtonLink>
        {latestSetId !== null && (
          <ButtonLink
            kind="quiet"
            to={`${paths.fit}?set=${latestSetId}`}
            aria-label={`Start a plan for ${person.name}`}
          >
            Start a plan
          </ButtonLink>
        )}
      </div>
    </li>
  );
}

function NobodyYet() {
  return (
    <EmptyState
      title="Begin with whoever the next garment is for"
      action={
        <ButtonLink kind="primary" to={paths.newPerson}>
          Add a person
        </ButtonLink>
      }
    >
      <p>
        Yourself, family, a friend, a client. Each keeps their own dated measurements, so that you can see
        what has changed since the last garment.
      </p>
      <p>
        Four girths are enough to begin: waist, upper bust, bust or chest, and hip. Leeway shows where each is
        taken. Only you see what you write here.
      </p>
    </EmptyState>
  );
}
