import { useWatch, type UseFormReturn } from 'react-hook-form';
import type { MeasurementSet, Person } from '../../shared/people/people.schema.ts';
import { readMeasurement } from '../../shared/people/read-measurements.ts';
import { CATALOGUE, howToTake, otherNames, pointName } from '../../shared/points/catalogue.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { printLengthWithUnit } from '../../shared/units.ts';
import { FieldError, useFieldIds } from '../ui/field.tsx';
import { BODY_MARKS } from './drawing/body-marks.ts';
import { BodyFigure } from './drawing/body-figure.tsx';
import type { MeasureValues } from './measure-values.ts';
import { printBoth, printMeasurement } from './print-measurement.ts';

interface PointFieldProps {
  form: UseFormReturn<MeasureValues>;
  point: PointId;
  chestWord: Person['chestWord'];
  last: MeasurementSet | null;
  onFocus: (point: PointId) => void;
}

/** One point: its name, a line to write on, what was understood, what it was last time, and how to take it. */
export function PointField({ form, point, chestWord, last, onFocus }: PointFieldProps) {
  const error = form.formState.errors.typed?.[point]?.message;
  const { fieldId, attributes } = useFieldIds(`typed.${point}`, { error });
  const unit = useWatch({ control: form.control, name: 'unit' });
  const readingId = `${fieldId}-reading`;
  return (
    <div
      className="grid grid-cols-[minmax(0,1fr)_8.5rem] items-end gap-x-5 border-b border-rule py-3 sm:grid-cols-[minmax(0,1fr)_9rem_minmax(0,15rem)]"
      onFocus={() => onFocus(point)}
    >
      <label htmlFor={fieldId} className="self-end pb-2.5 leading-snug font-semibold">
        {pointName(point, chestWord)}
      </label>
      <input
        {...form.register(`typed.${point}`)}
        {...attributes}
        aria-describedby={[attributes['aria-describedby'], readingId].filter(Boolean).join(' ')}
        type="text"
        inputMode={unit === 'in' ? 'text' : 'decimal'}
        autoComplete="off"
        maxLength={40}
        className="field-line text-right text-lead font-semibold"
      />
      <div
        id={readingId}
        className="col-span-2 min-h-6 pt-1 text-right sm:col-span-1 sm:self-center sm:pt-0 sm:text-left"
      >
        <Reading form={form} point={point} last={last} />
      </div>
      <div className="col-span-full">
        <FieldError fieldId={fieldId} error={error} />
        <HowTo point={point} chestWord={chestWord} />
      </div>
    </div>
  );
}

/** What was understood, in both systems, and how it compares with last time: beside the field, while typing. */
function Reading({ form, point, last }: Pick<PointFieldProps, 'form' | 'point' | 'last'>) {
  const [text, unit] = useWatch({ control: form.control, name: [`typed.${point}`, 'unit'] });
  const read = readMeasurement(point, text, unit);
  const before = last?.values[point];
  const now = read === null || typeof read === 'string' ? null : read;
  if (!now && !before) return null;
  return (
    <p className="text-small leading-snug">
      {now && <span className="length block font-medium">= {printBoth(now.mm)}</span>}
      {before && (
        <span className="length block text-ink-2">
          last {printMeasurement(before)}
          {now && Math.abs(now.mm - before.mm) >= 0.5
            ? `, now ${printLengthWithUnit(now.mm - before.mm, now.unit, { signed: true })}`
            : now && ', the same'}
        </span>
      )}
    </p>
  );
}

function HowTo({ point, chestWord }: { point: PointId; chestWord: Person['chestWord'] }) {
  const names = otherNames(point)
    .filter((name) => name !== CATALOGUE[point].shortName.toLowerCase())
    .slice(0, 5);
  const mark = BODY_MARKS[point];
  return (
    <details className="group text-note text-ink-2">
      <summary className="inline-flex min-h-8 items-center underline decoration-dashed decoration-1 underline-offset-4 hover:text-woad">
        How to take it
      </summary>
      <div className="flex items-start gap-6 py-3">
        {mark && <BodyFigure view={mark.view} active={point} className="h-56 shrink-0 lg:hidden" />}
        <div className="space-y-3">
          <p className="max-w-[34rem] text-ink">{howToTake(point, chestWord)}</p>
          {names.length > 0 && <p className="max-w-[34rem]">Also called {names.join(', ')}.</p>}
        </div>
      </div>
    </details>
  );
}
