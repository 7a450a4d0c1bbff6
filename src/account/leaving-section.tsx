import { useState } from 'react';
import { Button } from '../ui/button.tsx';
import { Notice } from '../ui/notice.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { useTakeEverythingAway } from './account-queries.ts';
import { AccountSection } from './account-section.tsx';
import { DeleteAccountDialog } from './delete-account-dialog.tsx';

/** Everything, as an archive. */
export function TakeAwaySection() {
  const take = useTakeEverythingAway();
  return (
    <AccountSection
      id="take-away"
      title="Yours to take away"
      lead={<p>One archive with all you keep here, readable without Leeway.</p>}
    >
      <p>
        People, measurement sets, patterns with their tables and files, and plans: each as JSON, the tables as
        CSV too, to be opened in any spreadsheet. Your measurements are in it, so keep it as privately as you
        keep them here.
      </p>
      <p className="mt-5 flex flex-wrap items-center gap-x-6 gap-y-2">
        <Button pending={take.isPending} onClick={() => take.mutate()}>
          {take.isPending ? 'Packing the archive' : 'Take everything away'}
        </Button>
        <span role="status" className="text-note text-ink-2">
          {take.isSuccess && `Saved as ${take.data.name ?? 'an archive'}.`}
        </span>
      </p>
      {take.isError && (
        <div role="alert" className="mt-4">
          <Notice kind="error">{failureWords(take.error)}</Notice>
        </div>
      )}
    </AccountSection>
  );
}

/** The end of the account. */
export function DeleteSection() {
  const [isAsking, setAsking] = useState(false);
  return (
    <AccountSection
      id="delete"
      title="Leave for good"
      lead={<p>Deleting is real here: nothing is kept back, and nobody can undo it.</p>}
    >
      <Button onClick={() => setAsking(true)}>Delete the account</Button>
      {isAsking && <DeleteAccountDialog onCancel={() => setAsking(false)} />}
    </AccountSection>
  );
}
