import { useNavigate } from 'react-router-dom';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { PersonForm } from './person-form.tsx';
import { useCreatePerson } from './queries.ts';

const START = { name: '', stage: 'adult', chestWord: 'bust', unit: 'cm', notes: '' } as const;

export function Component() {
  const navigate = useNavigate();
  const create = useCreatePerson();
  return (
    <>
      <PageHeading title="Add a person" above={<TextLink to={paths.people}>People</TextLink>} />
      <PersonForm
        start={START}
        submitWord="Add and measure"
        cancelTo={paths.people}
        save={async (input) => {
          const person = await create.mutateAsync(input);
          await navigate(paths.measure(person.id), { replace: true });
        }}
      />
    </>
  );
}
