import { useWatch, type UseFormReturn } from 'react-hook-form';
import { ChoiceList } from '../ui/choice-list.tsx';
import { RadioGroup } from '../ui/choice.tsx';
import { SelectField, TextArea, TextField } from '../ui/field.tsx';
import { Notice } from '../ui/notice.tsx';
import { messageAt } from '../ui/use-server-errors.ts';
import { seamLevels, type DetailsValues } from './details-values.ts';
import { KIND_OPTIONS, SILHOUETTE_CHOICES } from './pattern-words.ts';

interface DetailsFormProps<Output> {
  /** What its schema makes of the values does not matter to the fields. */
  form: UseFormReturn<DetailsValues, unknown, Output>;
}

/** What is printed on the envelope: what it is at the left, how it is meant to sit at the right. */
export function DetailsFields<Output>({ form }: DetailsFormProps<Output>) {
  return (
    <div className="grid items-start gap-x-16 gap-y-8 xl:grid-cols-2">
      <WhatItIs form={form} />
      <HowItSits form={form} />
      <div className="xl:col-span-2">
        <TextArea
          {...form.register('notes')}
          id="notes"
          label="Notes"
          hint="For you alone: closures, linings, what to remember next time."
          error={form.formState.errors.notes?.message}
        />
      </div>
    </div>
  );
}

function WhatItIs<Output>({ form }: DetailsFormProps<Output>) {
  const { register } = form;
  const { errors } = form.formState;
  const structure = useWatch({ control: form.control, name: 'structure' });
  return (
    <div className="space-y-8">
      <TextField
        {...register('title')}
        id="title"
        label="Title"
        hint="As it is printed on the pattern."
        autoComplete="off"
        error={errors.title?.message}
      />
      <div className="grid grid-cols-[2fr_1fr] gap-x-8">
        <TextField
          {...register('maker')}
          id="maker"
          label="Maker"
          autoComplete="off"
          error={errors.maker?.message}
        />
        <TextField
          {...register('number')}
          id="number"
          label="Number"
          autoComplete="off"
          error={errors.number?.message}
        />
      </div>
      <SelectField
        {...register('kind')}
        id="kind"
        label="Kind of garment"
        options={[{ value: '', label: 'Choose the kind' }, ...KIND_OPTIONS]}
        error={errors.kind?.message}
      />
      <div>
        <RadioGroup
          {...register('structure')}
          id="structure"
          label="Meant for"
          choices={[
            { value: 'woven', label: 'Woven cloth' },
            { value: 'knit', label: 'Knit' },
          ]}
          error={errors.structure?.message}
        />
        <div role="status">
          {structure === 'knit' && (
            <Notice className="mt-3">
              <p>
                Knits are not reckoned yet. The pattern and its tables are kept as they are, and a plan will
                say that it cannot judge the stretch.
              </p>
            </Notice>
          )}
        </div>
      </div>
      <TextField
        {...register('cloth')}
        id="cloth"
        label="Cloth it is meant for"
        hint="What the envelope suggests, such as linen, poplin, light wool."
        autoComplete="off"
        error={errors.cloth?.message}
      />
    </div>
  );
}

function HowItSits<Output>({ form }: DetailsFormProps<Output>) {
  const { register } = form;
  const { errors } = form.formState;
  return (
    <div className="space-y-8">
      <ChoiceList
        {...register('silhouette')}
        id="silhouette"
        label="Silhouette"
        hint="How much room the garment is meant to have. The envelope’s description or drawing says."
        choices={SILHOUETTE_CHOICES}
        error={errors.silhouette?.message}
      />
      <RadioGroup
        {...register('worn')}
        id="worn"
        label="Worn"
        hint="Open: a cape or a wrap that need not meet in front. Its bust, waist and hip then ask for no room of their own."
        choices={[
          { value: 'closed', label: 'Closed' },
          { value: 'open', label: 'Open' },
        ]}
        error={errors.worn?.message}
      />
      <SeamEdges form={form} />
    </div>
  );
}

function SeamEdges<Output>({ form }: DetailsFormProps<Output>) {
  const kind = useWatch({ control: form.control, name: 'kind' });
  return (
    <fieldset aria-describedby="seam-edges-hint">
      <legend className="text-note font-semibold">Seam edges</legend>
      <p id="seam-edges-hint" className="max-w-[36rem] text-small text-ink-2">
        A change in girth is shared over the cut edges of the seams that cross a level. A side seam has two
        edges, front and back, so two side seams are 4. Each further seam that may take a share, such as one
        from shoulder to hem, adds 2.
      </p>
      <div className="mt-2 grid max-w-[26rem] grid-cols-3 gap-x-8">
        {seamLevels(kind).map((level) => (
          <TextField
            key={level}
            {...form.register(`seamEdges.${level}`)}
            id={`seamEdges.${level}`}
            label={`At the ${level}`}
            inputMode="numeric"
            autoComplete="off"
            maxLength={4}
            error={messageAt(form.formState.errors, `seamEdges.${level}`)}
          />
        ))}
      </div>
    </fieldset>
  );
}
