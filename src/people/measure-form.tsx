import { useEffect, useState } from 'react';
import { useForm, useWatch, type UseFormReturn } from 'react-hook-form';
import type { MeasurementSet, Person } from '../../shared/people/people.schema.ts';
import { MEASURING_ORDER, pointName } from '../../shared/points/catalogue.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { Button } from '../ui/button.tsx';
import { todayHere } from '../ui/day.ts';
import { TextArea } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { LeaveGuard } from '../ui/leave-guard.tsx';
import { Notice } from '../ui/notice.tsx';
import { SectionHeading } from '../ui/page-heading.tsx';
import { summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { dropDraft, keepDraft, readDraft } from './measure-draft.ts';
import { MeasureSetting } from './measure-setting.tsx';
import {
  measureResolver,
  NOTHING_TYPED,
  startValues,
  toInput,
  type MeasureValues,
} from './measure-values.ts';
import { BASIC_POINTS, FURTHER_GROUPS } from './point-groups.ts';
import { PointField } from './point-field.tsx';
import { TapePanel } from './tape-panel.tsx';

interface MeasureFormProps {
  person: Person;
  last: MeasurementSet | null;
  save: (input: ReturnType<typeof toInput>) => Promise<void>;
}

/** The measuring form: the basics first, everything else to unfold, each point with its picture and its reading. */
export function MeasureForm({ person, last, save }: MeasureFormProps) {
  const [draft, setDraft] = useState(() => readDraft(person.id));
  const form = useForm<MeasureValues>({
    defaultValues: draft ?? startValues(person, last, todayHere()),
    resolver: measureResolver,
    mode: 'onBlur',
    shouldFocusError: false,
  });
  const [active, setActive] = useState<PointId>('waist');
  const { errors, isDirty, submitCount, isSubmitting } = form.formState;
  const fields = summaryFields(person);
  const server = useServerErrors(
    form,
    fields.map(({ name }) => name),
  );

  useEffect(
    () =>
      form.subscribe({ formState: { values: true }, callback: ({ values }) => keepDraft(person.id, values) }),
    [form, person.id],
  );

  const begin = (values: MeasureValues) => {
    form.reset(values);
    dropDraft(person.id);
    setDraft(null);
    server.clear();
  };
  const submit = form.handleSubmit(async (values) => {
    server.clear();
    await save(toInput(values)).catch(server.place);
  });
  const rows = (points: readonly PointId[]) =>
    points.map((point) => (
      <PointField
        key={point}
        form={form}
        point={point}
        chestWord={person.chestWord}
        last={last}
        onFocus={setActive}
      />
    ));
  const general = [...(errors.root?.message === undefined ? [] : [errors.root.message]), ...server.rest];

  return (
    <form noValidate onSubmit={(event) => void submit(event)}>
      <LeaveGuard isUnsaved={isDirty || draft !== null}>
        <p>
          What you typed stays in this tab, and is here again when you come back. Close the tab and it is
          gone.
        </p>
      </LeaveGuard>
      <MeasureSetting form={form} />
      <div className="mt-7 grid items-start gap-x-14 lg:grid-cols-[minmax(0,46rem)_minmax(0,1fr)]">
        <div>
          <FormErrors items={summaryOf(errors, fields, general)} attempt={isSubmitting ? 0 : submitCount} />
          <WhereItBegan
            hasDraft={draft !== null}
            hasLast={last !== null}
            onFresh={() => begin(startValues(person, last, todayHere()))}
            onEmpty={() => {
              form.setValue('typed', NOTHING_TYPED, { shouldDirty: true });
              form.setValue('startedFromId', null, { shouldDirty: true });
            }}
          />
          <SectionHeading id="basics">To begin with</SectionHeading>
          <div className="mt-2 border-t border-rule">{rows(BASIC_POINTS)}</div>
          <h2 className="mt-10 text-section font-semibold">Whatever else the pattern asks for</h2>
          {FURTHER_GROUPS.map((group) => (
            <details
              key={group.id}
              open={group.points.some((point) => last?.values[point] !== undefined || draft?.typed[point])}
              className="border-b border-rule"
            >
              <summary className="flex min-h-13 flex-wrap items-center gap-x-3 font-semibold hover:text-woad">
                <span className="underline decoration-woad decoration-dashed decoration-2 underline-offset-[6px]">
                  {group.name}
                </span>
                <GroupCount form={form} points={group.points} />
              </summary>
              <div className="mb-4 border-t border-rule">{rows(group.points)}</div>
            </details>
          ))}
          <div className="mt-8">
            <TextArea
              {...form.register('notes')}
              id="notes"
              label="Notes on this measuring"
              hint="What was worn under the tape, which tape, what felt unsure."
              error={errors.notes?.message}
            />
          </div>
          <SaveBar form={form} isSaving={isSubmitting} />
        </div>
        <TapePanel point={active} chestWord={person.chestWord} />
      </div>
    </form>
  );
}

function summaryFields(person: Person) {
  return [
    { name: 'takenOn' as const, label: 'Day' },
    ...MEASURING_ORDER.map((point) => ({
      name: `typed.${point}` as const,
      label: pointName(point, person.chestWord),
    })),
    { name: 'notes' as const, label: 'Notes' },
  ];
}

interface WhereItBeganProps {
  hasDraft: boolean;
  hasLast: boolean;
  onFresh: () => void;
  onEmpty: () => void;
}

function WhereItBegan({ hasDraft, hasLast, onFresh, onEmpty }: WhereItBeganProps) {
  if (hasDraft) {
    return (
      <Notice className="mb-8">
        <p>What you typed here before, and did not save, is back.</p>
        <Button kind="quiet" onClick={onFresh}>
          Throw it away and begin again
        </Button>
      </Notice>
    );
  }
  if (!hasLast) return null;
  return (
    <div className="mb-8 flex flex-wrap items-center gap-x-7 text-ink-2">
      <p>Begun from the last set: change what the tape says differently.</p>
      <Button kind="quiet" onClick={onEmpty}>
        Empty all fields
      </Button>
    </div>
  );
}

function GroupCount({ form, points }: { form: UseFormReturn<MeasureValues>; points: readonly PointId[] }) {
  const typed = useWatch({ control: form.control, name: 'typed' });
  const written = points.filter((point) => typed[point].trim() !== '').length;
  return (
    <span className="text-note font-normal text-ink-2">
      {written === 0 ? `${points.length} points` : `${written} of ${points.length} written`}
    </span>
  );
}

function SaveBar({ form, isSaving }: { form: UseFormReturn<MeasureValues>; isSaving: boolean }) {
  const typed = useWatch({ control: form.control, name: 'typed' });
  const written = MEASURING_ORDER.filter((point) => typed[point].trim() !== '').length;
  return (
    <div className="sticky bottom-13 -mx-5 mt-10 flex items-center justify-between gap-5 border-t-2 border-dashed border-woad bg-paper px-5 py-3 md:bottom-0 md:mx-0 md:px-0 print:hidden">
      <p className="text-ink-2">{written === 1 ? '1 point written' : `${written} points written`}</p>
      <Button type="submit" kind="primary" pending={isSaving}>
        {isSaving ? 'Saving' : 'Save the set'}
      </Button>
    </div>
  );
}
