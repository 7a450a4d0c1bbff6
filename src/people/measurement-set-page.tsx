import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useNavigate, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { printDay } from '../ui/day.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { CompareTable } from './compare-table.tsx';
import { DeleteButton } from './delete-button.tsx';
import {
  measurementSetQuery,
  measurementSetsQuery,
  personQuery,
  useDeleteMeasurementSet,
} from './queries.ts';
import { takenByWords } from './set-list.tsx';

export const loader =
  (client: QueryClient) =>
  async ({ params }: LoaderFunctionArgs) => {
    const personId = param(params, 'personId');
    await Promise.all([
      client.query(personQuery(personId)),
      client.query(measurementSetQuery(param(params, 'setId'))),
      client.query(measurementSetsQuery(personId)),
    ]);
    return null;
  };

export function Component() {
  const params = useParams();
  const personId = param(params, 'personId');
  const { data: person } = useSuspenseQuery(personQuery(personId));
  const { data: set } = useSuspenseQuery(measurementSetQuery(param(params, 'setId')));
  const { data: sets } = useSuspenseQuery(measurementSetsQuery(personId));
  const navigate = useNavigate();
  const remove = useDeleteMeasurementSet();
  const index = sets.items.findIndex(({ id }) => id === set.id);
  const before = index === -1 ? undefined : sets.items[index + 1];
  const day = printDay(set.takenOn);
  return (
    <>
      <PageHeading
        title={`${person.name}, measured ${day}`}
        above={
          <>
            <TextLink to={paths.people}>People</TextLink> /{' '}
            <TextLink to={paths.person(personId)}>{person.name}</TextLink>
          </>
        }
        actions={
          <ButtonLink kind="primary" to={`${paths.fit}?set=${set.id}`}>
            Start a plan
          </ButtonLink>
        }
      />
      <p className="mt-2 text-ink-2">
        {Object.keys(set.values).length} points, {takenByWords(set.takenBy)}.
        {before ? ` Beside it what was measured ${printDay(before.takenOn)}.` : ' There is no earlier set.'}
      </p>
      <div className="mt-7 max-w-[54rem]">
        <CompareTable set={set} before={before ?? null} chestWord={person.chestWord} />
      </div>
      {set.notes !== '' && <p className="mt-5 max-w-[44rem] whitespace-pre-line">{set.notes}</p>}
      <p className="mt-6 max-w-[44rem] text-note text-ink-2">
        A set is never changed: what is measured anew becomes a new set, and a plan made from this one stays
        as it is.
      </p>
      <div className="mt-10 border-t border-rule pt-4 print:hidden">
        <DeleteButton
          word="Delete this set"
          title={`Delete the set of ${day}?`}
          confirm="Delete for good"
          mutation={remove}
          id={set.id}
          onDone={() => void navigate(paths.person(personId), { replace: true })}
        >
          <p>
            Its {Object.keys(set.values).length} measurements go; the other sets stay. It cannot be undone.
          </p>
        </DeleteButton>
      </div>
    </>
  );
}
