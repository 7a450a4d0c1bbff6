import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useNavigate, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { PersonForm } from './person-form.tsx';
import { personQuery, useUpdatePerson } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    client.query(personQuery(param(params, 'personId')));

export function Component() {
  const personId = param(useParams(), 'personId');
  const { data: person } = useSuspenseQuery(personQuery(personId));
  const navigate = useNavigate();
  const update = useUpdatePerson(personId);
  const { name, stage, chestWord, unit, notes } = person;
  return (
    <>
      <PageHeading
        title={`Change what is written about ${name}`}
        above={<TextLink to={paths.person(personId)}>{name}</TextLink>}
      />
      <PersonForm
        start={{ name, stage, chestWord, unit, notes }}
        submitWord="Save"
        cancelTo={paths.person(personId)}
        save={async (input) => {
          await update.mutateAsync(input);
          await navigate(paths.person(personId), { replace: true });
        }}
      />
    </>
  );
}
