import { useId, useState, type ReactNode } from 'react';
import { buttonClass } from './button.tsx';
import { FieldError } from './field.tsx';

interface FileDropProps {
  id?: string;
  /** What belongs here; the name of the field. */
  label: string;
  /** What the button says. */
  choose: string;
  /** What is accepted, in words. */
  hint: ReactNode;
  /** As the file chooser wants it: `.csv,text/csv`. It only helps to find; what comes is judged by whoever reads it. */
  accept: string;
  error?: string | undefined;
  pending?: boolean;
  onFile: (file: File) => void;
}

/** A place to drop a file or to choose one. It is the platform's own file field, so that keyboard and readers know it. */
export function FileDrop({ id, label, choose, hint, accept, error, pending = false, onFile }: FileDropProps) {
  const made = useId();
  const fieldId = id ?? made;
  const [isOver, setIsOver] = useState(false);
  const take = (files: FileList | null) => {
    const file = files?.item(0);
    if (file && !pending) onFile(file);
  };
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={(event) => {
        event.preventDefault();
        setIsOver(false);
        take(event.dataTransfer.files);
      }}
      className={`border-2 border-dashed border-woad px-5 py-5 print:hidden ${isOver ? 'bg-woad-tint' : ''}`}
    >
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <span className="relative inline-flex">
          <input
            id={fieldId}
            type="file"
            accept={accept}
            aria-label={`${label}: ${choose.toLowerCase()}`}
            aria-describedby={`${fieldId}-hint${error === undefined ? '' : ` ${fieldId}-error`}`}
            aria-invalid={error === undefined ? undefined : true}
            aria-disabled={pending || undefined}
            onClick={(event) => {
              if (pending) event.preventDefault();
            }}
            onChange={(event) => {
              take(event.target.files);
              // The same file, mended meanwhile, may be chosen again.
              event.target.value = '';
            }}
            className="peer absolute inset-0 w-full cursor-pointer opacity-0"
          />
          <span
            aria-hidden="true"
            className={`${buttonClass('plain')} pointer-events-none bg-paper peer-focus-visible:outline-3 peer-focus-visible:outline-offset-3 peer-focus-visible:outline-woad`}
          >
            {pending ? 'Reading the file' : choose}
          </span>
        </span>
        <span className="text-ink-2">{isOver ? 'Let go to bring it in' : 'or drop it here'}</span>
      </div>
      <p id={`${fieldId}-hint`} className="mt-3 text-note text-ink-2">
        {hint}
      </p>
      <div role="alert">
        <FieldError fieldId={fieldId} error={error} />
      </div>
    </div>
  );
}
