import { useCallback, type ReactNode } from 'react';
import { useBeforeUnload, useBlocker } from 'react-router-dom';
import { AlertDialog } from './alert-dialog.tsx';

/** The state of a navigation that follows on saving: nothing is left behind by it. */
export const AFTER_SAVING = { isAfterSaving: true } as const;

const isAfterSaving = (state: unknown): boolean =>
  typeof state === 'object' && state !== null && 'isAfterSaving' in state;

/** Asks before a page is left on which something typed is not saved. */
export function LeaveGuard({ isUnsaved, children }: { isUnsaved: boolean; children: ReactNode }) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      isUnsaved && currentLocation.pathname !== nextLocation.pathname && !isAfterSaving(nextLocation.state),
  );
  useBeforeUnload(
    useCallback(
      (event) => {
        if (isUnsaved) event.preventDefault();
      },
      [isUnsaved],
    ),
  );
  return (
    <AlertDialog
      isOpen={blocker.state === 'blocked'}
      title="Leave before saving?"
      cancel="Stay here"
      confirm="Leave"
      onCancel={() => blocker.reset?.()}
      onConfirm={() => blocker.proceed?.()}
    >
      {children}
    </AlertDialog>
  );
}
