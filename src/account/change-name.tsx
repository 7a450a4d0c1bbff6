import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { accountChangeSchema } from '../../shared/account.ts';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { useChangeName } from './account-queries.ts';

const FIELDS = [{ name: 'name', label: 'Name' }] as const;

export function ChangeName({ name, onDone }: { name: string; onDone: (words: string) => void }) {
  const change = useChangeName();
  const form = useForm({
    resolver: zodResolver(accountChangeSchema),
    defaultValues: { name },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['name']);
  const send = form.handleSubmit((values) => {
    server.clear();
    change.mutate(values, {
      onSuccess: (account) => onDone(`From now on we call you ${account.name}.`),
      onError: server.place,
    });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, FIELDS, server.rest)}
        attempt={submitCount + change.failureCount}
      />
      <TextField
        {...form.register('name')}
        id="name"
        label="Name"
        hint="What we should call you."
        autoComplete="name"
        error={errors.name?.message}
      />
      <Button type="submit" kind="primary" pending={change.isPending}>
        Change the name
      </Button>
    </form>
  );
}
