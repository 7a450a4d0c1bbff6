import { useId, type ReactNode } from 'react';
import { Dialog } from 'react-aria-components/Dialog';
import { Heading } from 'react-aria-components/Heading';
import { Modal, ModalOverlay } from 'react-aria-components/Modal';
import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

interface AlertDialogProps {
  isOpen: boolean;
  title: string;
  /** What goes with it, in words. */
  children: ReactNode;
  confirm: string;
  cancel?: string;
  pending?: boolean;
  /** Why it failed, where it did. */
  error?: string | undefined;
  onConfirm: () => void;
  onCancel: () => void;
  /** A further way out beside the two. */
  extra?: ReactNode;
}

/** Asks before what cannot be undone. The way back has the focus first; Escape is the way back too. */
export function AlertDialog(props: AlertDialogProps) {
  const {
    isOpen,
    title,
    children,
    confirm,
    cancel = 'Keep it',
    pending,
    error,
    onConfirm,
    onCancel,
    extra,
  } = props;
  const id = useId();
  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={(open) => {
        if (!open) onCancel();
      }}
      className="fixed inset-0 z-30 flex items-end justify-center bg-[rgb(8_14_17/0.6)] sm:items-center"
    >
      <Modal className="w-full max-w-[34rem] border-t-4 border-ink bg-paper text-ink forced-colors:border-2">
        <Dialog
          role="alertdialog"
          aria-describedby={id}
          className="max-h-[90dvh] overflow-y-auto p-6 outline-none sm:p-8"
        >
          <Heading slot="title" className="text-section font-semibold">
            {title}
          </Heading>
          <div id={id} className="mt-3 space-y-3">
            {children}
          </div>
          {error !== undefined && (
            <div role="alert" className="mt-5">
              <Notice kind="error">{error}</Notice>
            </div>
          )}
          <div className="mt-7 flex flex-wrap gap-3">
            <Button autoFocus onClick={onCancel}>
              {cancel}
            </Button>
            <Button kind="primary" pending={pending ?? false} onClick={onConfirm}>
              {confirm}
            </Button>
            {extra}
          </div>
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
}
