import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field.tsx';

interface ListedChoice {
  value: string;
  label: string;
  /** What choosing it means, beside it. */
  hint: string;
}

type ChoiceListProps = Omit<ComponentProps<'input'>, 'type' | 'value'> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  choices: readonly ListedChoice[];
  /** Any number of them may be chosen, not one. */
  isMany?: boolean;
};

/** One of a few, or any number of them, a line each with what it means. The other properties go to every box. */
export function ChoiceList(props: ChoiceListProps) {
  const { label, hint, error, choices, isMany = false, id, className, ...input } = props;
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
        {choices.map((choice, index) => (
          <label
            key={choice.value}
            className="grid min-h-11 grid-cols-[auto_1fr] items-baseline gap-x-2.5 border-b border-rule py-2.5 sm:grid-cols-[auto_11rem_1fr]"
          >
            <input
              type={isMany ? 'checkbox' : 'radio'}
              {...input}
              // The list's own id leads to its first choice, so that a link from a summary can land here.
              id={index === 0 ? listId : `${listId}-${choice.value}`}
              value={choice.value}
              // The words are in the label so that a touch on them chooses; the name is the choice alone.
              aria-labelledby={`${listId}-${choice.value}-name`}
              aria-describedby={`${listId}-${choice.value}-hint`}
              aria-invalid={error === undefined ? undefined : true}
              className="size-5 shrink-0 translate-y-1 accent-woad"
            />
            <span id={`${listId}-${choice.value}-name`} className="font-medium">
              {choice.label}
            </span>
            <span
              id={`${listId}-${choice.value}-hint`}
              className="col-start-2 text-note text-ink-2 sm:col-start-3"
            >
              {choice.hint}
            </span>
          </label>
        ))}
      </div>
      <FieldError fieldId={listId} error={error} />
    </fieldset>
  );
}
