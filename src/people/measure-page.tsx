import { useQueryClient, useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useNavigate, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { MeasurementSetInput } from '../../shared/people/people.schema.ts';
import { paths } from '../paths.ts';
import { AFTER_SAVING } from '../ui/leave-guard.tsx';
import { TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { dropDraft } from './measure-draft.ts';
import { MeasureForm } from './measure-form.tsx';
import { measurementSetsQuery, personQuery, useTakeMeasurements } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    const personId = param(params, 'personId');
    return Promise.all([client.query(personQuery(personId)), client.query(measurementSetsQuery(personId))]);
  };

export function Component() {
  const personId = param(useParams(), 'personId');
  const { data: person } = useSuspenseQuery(personQuery(personId));
  const { data: sets } = useSuspenseQuery(measurementSetsQuery(personId));
  const client = useQueryClient();
  const navigate = useNavigate();
  const take = useTakeMeasurements(personId);
  const save = async (input: MeasurementSetInput) => {
    const set = await take.mutateAsync(input);
    dropDraft(personId);
    client.setQueryData(['people', 'set', set.id], set);
    await navigate(paths.person(personId), { state: AFTER_SAVING });
  };
  return (
    <>
      <PageHeading
        title={`Measure ${person.name}`}
        above={<TextLink to={paths.person(personId)}>{person.name}</TextLink>}
      />
      <MeasureForm key={personId} person={person} last={sets.items[0] ?? null} save={save} />
    </>
  );
}
