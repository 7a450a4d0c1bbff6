import { useState } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import type { Measurement, MeasurementSet, Person } from '../../shared/people/people.schema.ts';
import { readMeasurement } from '../../shared/people/read-measurements.ts';
import { CATALOGUE, howToTake, otherNames, pointName } from '../../shared/points/catalogue.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { printLengthWithUnit } from '../../shared/units.ts';
import { FieldError, useFieldIds } from '../ui/field.tsx';
import { Length } from '../ui/length.tsx';
import { BODY_MARKS } from './drawing/body-marks.ts';
import { BodyFigure } from './drawing/body-figure.tsx';
import type { MeasureValues } from './measure-values.ts';
import { printMeasurement } from './print-measurement.ts';

interface PointFieldProps {
  form: UseFormReturn<MeasureValues>;
  point: PointId;
  chestWord: Person['chestWord'];
  last: MeasurementSet | null;
  onFocus: (point: PointId) => void;
}

/** One point: its name, a line to write on, what was understood, what it was last time, and how to take it. */
export function PointField({ form, point, chestWord, last, onFocus }: PointFieldProps) {
  const [isUnfolded, setUnfolded] = useState(false);
  const error = form.formState.errors.typed?.[point]?.message;
  const { fieldId, attributes } = useFieldIds(`typed.${point}`, { error });
  const unit = useWatch({ control: form.control, name: 'unit' });
  const readingId = `${fieldId}-reading`;
  const name = pointName(point, chestWord);
  return (
    <div
      className="grid grid-cols-[minmax(0,1fr)_8.5rem] gap-x-5 border-b border-rule py-2.5 sm:grid-cols-[minmax(0,1fr)_9rem_14rem]"
      onFocus={() => onFocus(point)}
    >
      <label htmlFor={fieldId} className="self-center pt-2 leading-snug font-semibold sm:self-end sm:pt-0">
        {name}
      </label>
      <input
        {...form.register(`typed.${point}`)}
        {...attributes}
        aria-describedby={[attributes['aria-describedby'], readingId].filter(Boolean).join(' ')}
        type="text"
        inputMode={unit === 'in' ? 'text' : 'decimal'}
        autoComplete="off"
        maxLength={40}
        className="field-line text-right text-lead font-semibold sm:row-span-2 sm:self-start"
      />
      <button
        type="button"
        aria-expanded={isUnfolded}
        aria-controls={`${fieldId}-how`}
        aria-label={`How to take it: ${name}`}
        onClick={() => setUnfolded(!isUnfolded)}
        className="min-h-8 self-start text-left text-note text-ink-2 underline decoration-dashed decoration-1 underline-offset-4 hover:text-woad max-sm:order-1 sm:row-start-2"
      >
        How to take it
      </button>
      <div
        id={readingId}
        className="pt-1.5 text-right max-sm:order-1 sm:col-start-3 sm:row-span-2 sm:row-start-1 sm:self-center sm:pt-0 sm:text-left"
      >
        <Reading form={form} point={point} last={last} />
      </div>
      <div className="col-span-full max-sm:order-2">
        <FieldError fieldId={fieldId} error={error} />
        <div id={`${fieldId}-how`} hidden={!isUnfolded}>
          {isUnfolded && <HowTo point={point} chestWord={chestWord} />}
        </div>
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
      {now && (
        <span className="block font-medium">
          = <Length text={printLengthWithUnit(now.mm, 'cm')} /> /{' '}
          <Length text={printLengthWithUnit(now.mm, 'in')} />
        </span>
      )}
      {before && (
        <span className="block text-ink-2">
          last <Length text={printMeasurement(before)} />
          {now && <ChangeSince before={before} now={now} />}
        </span>
      )}
    </p>
  );
}

function ChangeSince({ before, now }: { before: Measurement; now: Measurement }) {
  const change = now.mm - before.mm;
  // Less than half a millimetre is the rounding of another unit, not a change.
  if (Math.abs(change) < 0.5) return ', the same';
  return (
    <>
      , now <Length text={printLengthWithUnit(change, now.unit, { signed: true })} />
    </>
  );
}

function HowTo({ point, chestWord }: { point: PointId; chestWord: Person['chestWord'] }) {
  const names = otherNames(point)
    .filter((name) => name !== CATALOGUE[point].shortName.toLowerCase())
    .slice(0, 5);
  const mark = BODY_MARKS[point];
  return (
    <div className="flex items-start gap-6 py-3 text-note text-ink-2">
      {mark && <BodyFigure view={mark.view} active={point} className="h-56 shrink-0 lg:hidden" />}
      <div className="space-y-3">
        <p className="max-w-[34rem] text-ink">{howToTake(point, chestWord)}</p>
        {names.length > 0 && <p className="max-w-[34rem]">Also called {names.join(', ')}.</p>}
      </div>
    </div>
  );
}
