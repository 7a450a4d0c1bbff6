import { useState, type ReactNode } from 'react';
import type { UseMutationResult } from '@tanstack/react-query';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { failureWords } from '../ui/use-server-errors.ts';

interface DeleteButtonProps {
  word: string;
  title: string;
  /** What goes with it. */
  children: ReactNode;
  confirm: string;
  mutation: UseMutationResult<void, Error, string>;
  id: string;
  onDone: () => void;
}

/** Deletes after asking; where the server refuses, its reason stands in the dialog. */
export function DeleteButton({ word, title, children, confirm, mutation, id, onDone }: DeleteButtonProps) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button kind="quiet" onClick={() => setOpen(true)}>
        {word}
      </Button>
      <AlertDialog
        isOpen={isOpen}
        title={title}
        confirm={confirm}
        pending={mutation.isPending}
        error={mutation.isError ? failureWords(mutation.error) : undefined}
        onConfirm={() => mutation.mutate(id, { onSuccess: onDone })}
        onCancel={() => {
          setOpen(false);
          mutation.reset();
        }}
      >
        {children}
      </AlertDialog>
    </>
  );
}
