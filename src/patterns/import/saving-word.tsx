import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import type { SavingState } from './use-draft-saving.ts';

const WORDS = { saved: 'Saved', waiting: 'Not saved yet', saving: 'Saving' } as const;

/** How the draft stands, quietly; loud only where it could not be saved. */
export function SavingWord({ state, onRetry }: { state: SavingState; onRetry: () => void }) {
  if (state.is === 'failed') {
    return (
      <div role="alert">
        <Notice kind="error" word="Not saved">
          <p className="text-note">{state.words}</p>
          <Button kind="quiet" onClick={onRetry}>
            Save it now
          </Button>
        </Notice>
      </div>
    );
  }
  return (
    <p role="status" className="text-note text-ink-2">
      {WORDS[state.is]}
    </p>
  );
}
