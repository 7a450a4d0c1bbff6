import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { tokenInputSchema, type NewToken, type TokenScope } from '../../shared/tokens/tokens.schema.ts';
import { Button } from '../ui/button.tsx';
import { ChoiceList } from '../ui/choice-list.tsx';
import { SelectField, TextField } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { useMakeToken } from './token-queries.ts';
import { endAfter, LIFETIMES, SCOPE_BOXES } from './token-words.ts';

const formSchema = tokenInputSchema.pick({ name: true, scopes: true }).extend({ lifetime: z.string() });

const FIELDS = [
  { name: 'name', label: 'What it is for' },
  { name: 'scopes', label: 'What it may do' },
  { name: 'lifetime', label: 'How long it works' },
] as const;
const NAMES = FIELDS.map(({ name }) => name);

interface TokenFormProps {
  onMade: (token: NewToken) => void;
  onCancel: () => void;
}

export function TokenForm({ onMade, onCancel }: TokenFormProps) {
  const make = useMakeToken();
  const form = useForm({
    resolver: zodResolver(formSchema),
    defaultValues: { name: '', scopes: [] as TokenScope[], lifetime: '90' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, NAMES);
  const send = form.handleSubmit(({ lifetime, ...values }) => {
    server.clear();
    const body = { ...values, expiresAt: endAfter(lifetime, new Date()) };
    make.mutate(body, { onSuccess: onMade, onError: server.place });
  });
  return (
    <form noValidate className="space-y-6" onSubmit={(event) => void send(event)}>
      <FormErrors items={summaryOf(errors, FIELDS, server.rest)} attempt={submitCount + make.failureCount} />
      <TextField
        {...form.register('name')}
        id="name"
        label="What it is for"
        hint="So that you know it again: “the class’s spreadsheet”."
        autoComplete="off"
        error={errors.name?.message}
      />
      <ChoiceList
        isMany
        {...form.register('scopes')}
        id="scopes"
        label="What it may do"
        hint="Changing does not include reading."
        choices={SCOPE_BOXES}
        error={errors.scopes?.message}
      />
      <SelectField
        {...form.register('lifetime')}
        id="lifetime"
        label="How long it works"
        options={LIFETIMES}
        error={errors.lifetime?.message}
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-3">
        <Button type="submit" kind="primary" pending={make.isPending}>
          Make the token
        </Button>
        <Button kind="quiet" onClick={onCancel}>
          Leave it
        </Button>
      </div>
    </form>
  );
}
