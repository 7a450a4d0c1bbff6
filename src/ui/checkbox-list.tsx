import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field.tsx';

interface Box {
  value: string;
  label: string;
  /** What ticking it means, beside it. */
  hint: string;
}

type CheckboxListProps = Omit<ComponentProps<'input'>, 'type' | 'value'> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  boxes: readonly Box[];
};

/** Any number of a few, a line each with what it means. The rest of its properties go to every box. */
export function CheckboxList({ label, hint, error, boxes, id, className, ...input }: CheckboxListProps) {
  const made = useId();
  const listId = id ?? made;
  const described = [
    hint === undefined ? '' : `${listId}-hint`,
    error === undefined ? '' : `${listId}-error`,
  ];
  return (
    <fieldset aria-describedby={described.join(' ').trim() || undefined} className={className}>
      <legend className="text-note font-semibold">{label}</legend>
      {hint !== undefined && (
        <p id={`${listId}-hint`} className="text-small text-ink-2">
          {hint}
        </p>
      )}
      <div className="mt-1 border-t border-rule">
        {boxes.map((box, index) => (
          <label
            key={box.value}
            className="grid min-h-11 grid-cols-[auto_1fr] items-baseline gap-x-2.5 border-b border-rule py-2.5 sm:grid-cols-[auto_11rem_1fr]"
          >
            <input
              type="checkbox"
              {...input}
              // The list's own id leads to its first box, so that a link from a summary can land here.
              id={index === 0 ? listId : `${listId}-${box.value}`}
              value={box.value}
              aria-labelledby={`${listId}-${box.value}-name`}
              aria-describedby={`${listId}-${box.value}-hint`}
              aria-invalid={error === undefined ? undefined : true}
              className="size-5 shrink-0 translate-y-1 accent-woad"
            />
            <span id={`${listId}-${box.value}-name`} className="font-medium">
              {box.label}
            </span>
            <span
              id={`${listId}-${box.value}-hint`}
              className="col-start-2 text-note text-ink-2 sm:col-start-3"
            >
              {box.hint}
            </span>
          </label>
        ))}
      </div>
      <FieldError fieldId={listId} error={error} />
    </fieldset>
  );
}
