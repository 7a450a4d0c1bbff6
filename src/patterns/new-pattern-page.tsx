import { zodResolver } from '@hookform/resolvers/zod';
import { useRef, useState } from 'react';
import { useForm } from 'react-hook-form';
import type { PatternInput } from '../../shared/patterns/patterns.schema.ts';
import { useNavigate } from 'react-router-dom';
import type { TypedTable } from '../../shared/patterns/typed-cells.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { AFTER_SAVING, LeaveGuard } from '../ui/leave-guard.tsx';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { summaryOf } from '../ui/use-server-errors.ts';
import { DetailsFields } from './details-fields.tsx';
import { DETAILS_FIELDS, detailsErrors, toValues, wholeDetails } from './details-values.ts';
import { beginEdit, typedTable } from './edit/edited-table.ts';
import { beginHistory, stepOn } from './edit/history.ts';
import { forgetEdit, readKeptEdit } from './edit/kept-edit.ts';
import { SaveTrouble } from './edit/save-trouble.tsx';
import { sendable } from './edit/sendable.ts';
import { TableEditor } from './edit/table-editor.tsx';
import { useTableEdit } from './edit/use-table-edit.ts';
import { forgetTyping, keepTyping, withKeptTyping } from './import/kept-typing.ts';
import { useTypePattern } from './queries.ts';

const NAME = 'new pattern';
/** The points nearly every envelope has, and room for a few sizes: a start to write on, all of it to be changed. */
const START: TypedTable = {
  sizes: ['', '', '', ''],
  chart: (['bust', 'waist', 'hip'] as const).map((point) => ({
    point,
    unit: 'cm',
    typed: ['', '', '', ''],
  })),
  finished: [],
};

/** A pattern typed in from its envelope, without a file. */
export function Component() {
  return (
    <>
      <PageHeading title="Type a pattern in" above={<TextLink to={paths.patterns}>Patterns</TextLink>} />
      <p className="mt-3 max-w-[42rem] text-ink-2">
        From the envelope, by hand, or pasted from a spreadsheet. What you type is kept in this tab until you
        save. If you have the tables as a file, <TextLink to={paths.newImport}>bring it in</TextLink>.
      </p>
      <NewPattern />
    </>
  );
}

function NewPattern() {
  const navigate = useNavigate();
  const make = useTypePattern();
  const [start] = useState(() => {
    const kept = readKeptEdit(NAME);
    const empty = beginHistory(beginEdit(START));
    return {
      history: kept ? stepOn(empty, kept.table, 'What you had typed before.') : empty,
      ...withKeptTyping(NAME, toValues({})),
    };
  });
  const form = useForm({
    resolver: zodResolver(wholeDetails({}), detailsErrors),
    defaultValues: start.values,
    shouldFocusError: false,
  });
  const { errors, submitCount, isSubmitting, isDirty } = form.formState;
  const editing = useTableEdit({ name: NAME, basedOn: null, base: START, history: start.history });
  const trouble = useRef<HTMLDivElement>(null);
  const save = async (details: PatternInput) => {
    const table = sendable(typedTable(editing.table));
    if (editing.errors.length > 0 || table === null) {
      trouble.current?.focus();
      return;
    }
    const made = await make.mutateAsync({ details, ...table }).catch(() => null);
    if (made === null) return;
    forgetEdit(NAME);
    forgetTyping(NAME);
    await navigate(paths.pattern(made.id), { state: AFTER_SAVING });
  };
  return (
    <>
      <LeaveGuard isUnsaved={editing.isChanged || isDirty || start.isKept}>
        <p>The pattern is not saved. What you typed stays in this tab until you close it.</p>
      </LeaveGuard>
      <section aria-labelledby="envelope" className="mt-8 border-t border-rule pt-4">
        <h2 id="envelope" className="text-section font-semibold">
          What is printed on the envelope
        </h2>
        <form
          noValidate
          className="mt-4 max-w-[44rem] xl:max-w-[68rem]"
          onSubmit={(event) => event.preventDefault()}
          onInput={() => setTimeout(() => keepTyping(NAME, form.getValues()))}
        >
          <FormErrors
            items={summaryOf(errors, DETAILS_FIELDS, [])}
            attempt={isSubmitting ? 0 : submitCount}
          />
          <DetailsFields form={form} />
        </form>
      </section>
      <TableEditor editing={editing} />
      <div
        ref={trouble}
        tabIndex={-1}
        role="group"
        aria-label="Saving"
        className="mt-10 border-t border-rule pt-5"
      >
        <SaveTrouble editing={editing} error={make.error} />
        <div className="flex flex-wrap items-center gap-x-7 gap-y-3">
          <Button
            kind="primary"
            pending={make.isPending}
            onClick={() => {
              editing.ask();
              void form.handleSubmit(save)();
            }}
          >
            {make.isPending ? 'Saving' : 'Save the pattern'}
          </Button>
          <ButtonLink kind="quiet" to={paths.patterns}>
            Leave it
          </ButtonLink>
        </div>
      </div>
    </>
  );
}
