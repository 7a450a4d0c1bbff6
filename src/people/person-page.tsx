import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useNavigate, useParams, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { Person } from '../../shared/people/people.schema.ts';
import { paths } from '../paths.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading, SectionHeading } from '../ui/page-heading.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { param } from '../ui/param.ts';
import { DeleteButton } from './delete-button.tsx';
import { LatestMeasurements } from './latest-measurements.tsx';
import { measurementSetQuery, measurementSetsQuery, personQuery, useDeletePerson } from './queries.ts';
import { SetList } from './set-list.tsx';

export const loader =
  (client: QueryClient) =>
  async ({ params, request }: LoaderFunctionArgs) => {
    const personId = param(params, 'personId');
    const { page } = readListAddress(request.url);
    const [person] = await Promise.all([
      client.query(personQuery(personId)),
      client.query(measurementSetsQuery(personId, page)),
    ]);
    if (person.latestSetId !== null) await client.query(measurementSetQuery(person.latestSetId));
    return null;
  };

export function Component() {
  const personId = param(useParams(), 'personId');
  const { data: person } = useSuspenseQuery(personQuery(personId));
  return (
    <>
      <PageHeading
        title={person.name}
        above={<TextLink to={paths.people}>People</TextLink>}
        actions={
          person.latestSetId !== null && (
            <>
              <ButtonLink to={paths.measure(personId)}>Measure again</ButtonLink>
              <ButtonLink kind="primary" to={`${paths.fit}?set=${person.latestSetId}`}>
                Start a plan
              </ButtonLink>
            </>
          )
        }
      />
      {person.notes !== '' && (
        <p className="mt-4 max-w-[44rem] whitespace-pre-line text-ink-2">{person.notes}</p>
      )}
      {person.latestSetId === null ? (
        <EmptyState
          title={`${person.name} has not been measured yet`}
          action={
            <ButtonLink kind="primary" to={paths.measure(personId)}>
              Measure {person.name}
            </ButtonLink>
          }
        >
          <p>
            You need a tape, a narrow elastic for the waist, and five minutes. Every point shows where the
            tape goes, and you write what you read: in centimetres, or in inches with fractions.
          </p>
        </EmptyState>
      ) : (
        <>
          <LatestMeasurements person={person} setId={person.latestSetId} />
          <AllSets personId={personId} />
        </>
      )}
      <WhatElse person={person} />
    </>
  );
}

function AllSets({ personId }: { personId: string }) {
  const [search] = useSearchParams();
  const { page } = readListAddress(`?${search.toString()}`);
  const { data } = useSuspenseQuery(measurementSetsQuery(personId, page));
  return (
    <section aria-labelledby="sets" className="mt-12 max-w-[44rem]">
      <SectionHeading id="sets">Every time measured</SectionHeading>
      <SetList personId={personId} sets={data.items} />
      <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
    </section>
  );
}

function WhatElse({ person }: { person: Person }) {
  const navigate = useNavigate();
  const remove = useDeletePerson();
  const sets = person.setCount === 1 ? 'the one measurement set' : `${person.setCount} measurement sets`;
  return (
    <div className="mt-12 flex flex-wrap gap-x-7 border-t border-rule pt-4 print:hidden">
      <ButtonLink kind="quiet" to={paths.editPerson(person.id)}>
        Change name, word or unit
      </ButtonLink>
      <DeleteButton
        word={`Delete ${person.name}`}
        title={`Delete ${person.name}?`}
        confirm="Delete for good"
        mutation={remove}
        id={person.id}
        onDone={() => void navigate(paths.people, { replace: true })}
      >
        <p>
          {person.setCount === 0
            ? 'Their name and notes go.'
            : `With the name and notes go ${sets} and every plan saved from them.`}
        </p>
        <p>It cannot be undone.</p>
      </DeleteButton>
    </div>
  );
}
