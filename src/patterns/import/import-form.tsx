import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import type { DraftDetails, ImportDraft } from '../../../shared/patterns/imports.schema.ts';
import type { LengthUnit } from '../../../shared/units.ts';
import { DetailsFields } from '../details-fields.tsx';
import { DETAILS_FIELDS, detailsErrors, draftDetails, missingDetails, toValues } from '../details-values.ts';
import { KeepPart } from './keep-part.tsx';
import { withKeptTyping } from './kept-typing.ts';
import { obstaclesOf } from './obstacles.ts';
import { Part } from './part.tsx';
import { SavingWord } from './saving-word.tsx';
import { TablePart } from './table-part.tsx';
import { useDraftSaving } from './use-draft-saving.ts';

/** The whole import, in the order in which a person has things in hand: the envelope, then its tables. */
export function ImportForm({ draft }: { draft: ImportDraft }) {
  // The form begins with the draft as it was on arrival; from then on the form is the newer of the two.
  const [start] = useState(() => ({
    ...withKeptTyping(draft.id, toValues(draft.details)),
    details: draft.details,
  }));
  const [resolver] = useState(() => zodResolver(draftDetails(start.details), detailsErrors));
  const form = useForm<ReturnType<typeof toValues>, unknown, DraftDetails>({
    resolver,
    defaultValues: start.values,
    mode: 'onTouched',
  });
  const typed = useWatch({ control: form.control });
  const saving = useDraftSaving(draft, form, start.details, start.isKept);
  const [shownIn, showIn] = useState<LengthUnit>('cm');
  const values = { ...start.values, ...typed, seamEdges: { ...start.values.seamEdges, ...typed.seamEdges } };
  const obstacles = obstaclesOf(draft, values, start.details);
  const markMissing = () => {
    for (const { name, words } of missingDetails(form.getValues(), start.details)) {
      const field = DETAILS_FIELDS.find((known) => known.name === name);
      if (field) form.setError(field.name, { type: 'missing', message: words });
    }
  };
  return (
    <>
      <Part
        id="envelope"
        number={1}
        title="What is printed on the envelope"
        beside={<SavingWord state={saving.state} onRetry={() => void saving.save()} />}
      >
        <form
          noValidate
          className="max-w-[44rem] xl:max-w-[68rem]"
          onSubmit={(event) => {
            event.preventDefault();
            void saving.save();
          }}
          onBlur={() => void saving.save()}
        >
          <DetailsFields form={form} />
        </form>
      </Part>
      <Part id="chart" number={2} title="The size chart" line="chart">
        <TablePart
          draftId={draft.id}
          role="chart"
          name="Size chart"
          table={draft.chart}
          shownIn={shownIn}
          onShowIn={showIn}
        />
      </Part>
      <Part id="finished" number={3} title="The finished measurements" line="finished">
        <TablePart
          draftId={draft.id}
          role="finished"
          name="Finished measurements"
          table={draft.finished}
          shownIn={shownIn}
          onShowIn={showIn}
        />
      </Part>
      <Part id="keep" number={4} title={draft.patternId === null ? 'Keep it' : 'Keep the new tables'}>
        <KeepPart
          draft={draft}
          obstacles={obstacles}
          save={saving.save}
          onRefused={markMissing}
          onEnd={saving.end}
        />
      </Part>
    </>
  );
}
