import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { personInputSchema, type PersonInput } from '../../shared/people/people.schema.ts';
import { Button } from '../ui/button.tsx';
import { RadioGroup } from '../ui/choice.tsx';
import { TextArea, TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';

const FIELDS = [
  { name: 'name', label: 'Name' },
  { name: 'stage', label: 'Adult or child' },
  { name: 'chestWord', label: 'Bust or chest' },
  { name: 'unit', label: 'Unit' },
  { name: 'notes', label: 'Notes' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

interface PersonFormProps {
  start: PersonInput;
  submitWord: string;
  cancelTo: string;
  save: (input: PersonInput) => Promise<void>;
}

/** What is written about a person, new or known. */
export function PersonForm({ start, submitWord, cancelTo, save }: PersonFormProps) {
  const form = useForm({
    resolver: zodResolver(personInputSchema),
    defaultValues: start,
    shouldFocusError: false,
  });
  const { errors, submitCount, isSubmitting } = form.formState;
  const server = useServerErrors(form, NAMES);
  const submit = form.handleSubmit(async (values) => {
    server.clear();
    await save(values).catch(server.place);
  });
  return (
    <form noValidate className="mt-7 max-w-[34rem] space-y-7" onSubmit={(event) => void submit(event)}>
      <FormErrors items={summaryOf(errors, FIELDS, server.rest)} attempt={isSubmitting ? 0 : submitCount} />
      <TextField
        {...form.register('name')}
        id="name"
        label="Name"
        hint="How you will find this person; a first name will do."
        autoComplete="off"
        error={errors.name?.message}
      />
      <RadioGroup
        {...form.register('stage')}
        id="stage"
        label="Adult or child"
        choices={[
          { value: 'adult', label: 'Adult' },
          { value: 'child', label: 'Child' },
        ]}
        error={errors.stage?.message}
      />
      <RadioGroup
        {...form.register('chestWord')}
        id="chestWord"
        label="Their word"
        hint="For the fullest level of the upper body; every page uses it."
        choices={[
          { value: 'bust', label: 'Bust' },
          { value: 'chest', label: 'Chest' },
        ]}
        error={errors.chestWord?.message}
      />
      <RadioGroup
        {...form.register('unit')}
        id="unit"
        label="Unit"
        hint="What a number means when no unit is written beside it. The two can be mixed at any time."
        choices={[
          { value: 'cm', label: 'Centimetres' },
          { value: 'in', label: 'Inches' },
          { value: 'mm', label: 'Millimetres' },
        ]}
        error={errors.unit?.message}
      />
      <TextArea
        {...form.register('notes')}
        id="notes"
        label="Notes"
        hint="For you alone: what they like, how they stand, which shoes."
        error={errors.notes?.message}
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <Button type="submit" kind="primary" pending={isSubmitting}>
          {isSubmitting ? 'Saving' : submitWord}
        </Button>
        <ButtonLink kind="quiet" to={cancelTo}>
          Leave it
        </ButtonLink>
      </div>
    </form>
  );
}
