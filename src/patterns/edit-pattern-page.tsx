import { zodResolver } from '@hookform/resolvers/zod';
import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useNavigate, useParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { Pattern } from '../../shared/patterns/patterns.schema.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { DetailsFields } from './details-fields.tsx';
import { DETAILS_FIELDS, detailsErrors, toValues, wholeDetails } from './details-values.ts';
import { patternQuery, useUpdatePattern } from './queries.ts';

const NAMES = DETAILS_FIELDS.map(({ name }) => name);

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    client.query(patternQuery(param(params, 'patternId')));

export function Component() {
  const patternId = param(useParams(), 'patternId');
  const { data: pattern } = useSuspenseQuery(patternQuery(patternId));
  return (
    <>
      <PageHeading
        title={`Change what is written about ${pattern.title}`}
        above={<TextLink to={paths.pattern(patternId)}>{pattern.title}</TextLink>}
      />
      <p className="mt-3 mb-8 max-w-[40rem] text-ink-2">
        The tables stay as they are. Plans that were saved keep what they were made with.
      </p>
      <EditForm pattern={pattern} />
    </>
  );
}

function EditForm({ pattern }: { pattern: Pattern }) {
  const navigate = useNavigate();
  const update = useUpdatePattern(pattern.id);
  const form = useForm({
    resolver: zodResolver(wholeDetails(pattern), detailsErrors),
    defaultValues: toValues(pattern),
    shouldFocusError: false,
  });
  const { errors, submitCount, isSubmitting } = form.formState;
  const server = useServerErrors(form, NAMES);
  const submit = form.handleSubmit(async (details) => {
    server.clear();
    try {
      await update.mutateAsync(details);
    } catch (error) {
      server.place(error);
      return;
    }
    await navigate(paths.pattern(pattern.id), { replace: true });
  });
  return (
    <form noValidate className="max-w-[44rem] xl:max-w-[68rem]" onSubmit={(event) => void submit(event)}>
      <FormErrors
        items={summaryOf(errors, DETAILS_FIELDS, server.rest)}
        attempt={isSubmitting ? 0 : submitCount}
      />
      <DetailsFields form={form} />
      <div className="mt-9 flex flex-wrap items-center gap-x-6 gap-y-3">
        <Button type="submit" kind="primary" pending={isSubmitting}>
          {isSubmitting ? 'Saving' : 'Save'}
        </Button>
        <ButtonLink kind="quiet" to={paths.pattern(pattern.id)}>
          Leave it
        </ButtonLink>
      </div>
    </form>
  );
}
