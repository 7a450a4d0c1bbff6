import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Pattern } from '../../shared/patterns/patterns.schema.ts';
import { paths } from '../paths.ts';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { useDeletePattern } from './queries.ts';

/** Deletes a pattern after saying what goes with it. */
export function DeletePattern({ pattern }: { pattern: Pattern }) {
  const navigate = useNavigate();
  const remove = useDeletePattern();
  const [isOpen, setOpen] = useState(false);
  const revisions = pattern.latestRevisionNumber;
  return (
    <>
      <Button kind="quiet" onClick={() => setOpen(true)}>
        Delete this pattern
      </Button>
      <AlertDialog
        isOpen={isOpen}
        title={`Delete ${pattern.title}?`}
        confirm="Delete for good"
        pending={remove.isPending}
        error={remove.isError ? failureWords(remove.error) : undefined}
        onConfirm={() =>
          remove.mutate(pattern.id, { onSuccess: () => void navigate(paths.patterns, { replace: true }) })
        }
        onCancel={() => {
          setOpen(false);
          remove.reset();
        }}
      >
        <p>
          With it go {revisions === 1 ? 'its tables' : `all ${revisions} revisions of its tables`}, the files
          that were uploaded, new tables that were begun, and every plan saved with it.
        </p>
        <p>Take the tables away as CSV first if you may want them again. It cannot be undone.</p>
      </AlertDialog>
    </>
  );
}
