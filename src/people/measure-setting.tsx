import { useState } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import type { PointId } from '../../shared/points/point-ids.ts';
import type { LengthUnit } from '../../shared/units.ts';
import { todayHere } from '../ui/day.ts';
import { Button } from '../ui/button.tsx';
import { FieldError, useFieldIds } from '../ui/field.tsx';
import { Notice } from '../ui/notice.tsx';
import { SentenceSelect } from '../ui/sentence-select.tsx';
import { keepMeaning, takeAsNew } from './change-unit.ts';
import type { MeasureValues } from './measure-values.ts';

const UNIT_WORDS: Record<LengthUnit, string> = { cm: 'centimetres', mm: 'millimetres', in: 'inches' };
const UNITS = (['cm', 'in', 'mm'] as const).map((value) => ({ value, label: UNIT_WORDS[value] }));
const HANDS = [
  { value: 'self', label: 'oneself', inList: 'oneself, with one pair of hands' },
  { value: 'another', label: 'another person', inList: 'another person, who held the tape' },
] as const;

/** When, by whom and in which unit, said in one breath. */
export function MeasureSetting({ form }: { form: UseFormReturn<MeasureValues> }) {
  const [takenBy, unit] = useWatch({ control: form.control, name: ['takenBy', 'unit'] });
  const [changed, setChanged] = useState<{ from: LengthUnit; marked: PointId[] } | null>(null);
  const error = form.formState.errors.takenOn?.message;
  const { fieldId, attributes } = useFieldIds('takenOn', { error });

  const changeUnit = (next: LengthUnit) => {
    const { typed, marked } = keepMeaning(form.getValues('typed'), unit);
    form.setValue('unit', next, { shouldDirty: true });
    form.setValue('typed', typed, { shouldDirty: true });
    setChanged(marked.length > 0 ? { from: unit, marked } : null);
  };

  return (
    <div className="mt-4">
      <p className="text-lead leading-loose text-ink-2">
        Taken on{' '}
        <input
          {...form.register('takenOn')}
          {...attributes}
          type="date"
          aria-label="Day they were taken"
          max={todayHere()}
          min="1900-01-01"
          className="changeable min-h-9 bg-transparent font-semibold text-ink aria-invalid:border-solid aria-invalid:border-madder"
        />{' '}
        by{' '}
        <SentenceSelect
          label="Taken by"
          value={takenBy}
          options={HANDS}
          onChange={(next) => form.setValue('takenBy', next, { shouldDirty: true })}
        />
        , written in{' '}
        <SentenceSelect
          label="Unit of numbers without one"
          description="Any number may have its own unit written behind it."
          value={unit}
          options={UNITS}
          onChange={changeUnit}
        />
        .
      </p>
      <FieldError fieldId={fieldId} error={error} />
      {changed && changed.from !== unit && (
        <div role="status" className="mt-4">
          <Notice>
            <p>
              What was written before stays as it was meant: in {UNIT_WORDS[changed.from]}, with the unit
              behind it.
            </p>
            <Button
              kind="quiet"
              onClick={() => {
                form.setValue('typed', takeAsNew(form.getValues('typed'), changed.marked, changed.from));
                setChanged(null);
              }}
            >
              They were {UNIT_WORDS[unit]} all along
            </Button>
          </Notice>
        </div>
      )}
    </div>
  );
}
