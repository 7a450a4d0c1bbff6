import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field.tsx';

interface Choice {
  value: string;
  label: ReactNode;
  hint?: ReactNode;
}

type RadioGroupProps = Omit<ComponentProps<'input'>, 'type' | 'value'> & {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  choices: readonly Choice[];
  /** For a group that its page holds; one of a form library brings its own. */
  value?: string;
};

const MARK = 'size-5 shrink-0 accent-woad';

/** One of a few, all in sight. The rest of its properties go to every radio, a form library's among them. */
export function RadioGroup({
  label,
  hint,
  error,
  choices,
  value,
  className,
  id: givenId,
  ...input
}: RadioGroupProps) {
  const madeId = useId();
  const id = givenId ?? madeId;
  return (
    <fieldset
      aria-describedby={
        [hint === undefined ? '' : `${id}-hint`, error === undefined ? '' : `${id}-error`].join(' ').trim() ||
        undefined
      }
      className={className}
    >
      <legend className="text-note font-semibold">{label}</legend>
      {hint !== undefined && (
        <p id={`${id}-hint`} className="text-small text-ink-2">
          {hint}
        </p>
      )}
      <div className="flex flex-wrap gap-x-7">
        {choices.map((choice, index) => (
          <label key={choice.value} className="flex min-h-11 items-center gap-2.5">
            <input
              type="radio"
              {...input}
              // The group's own id leads to its first choice, so that a link from a summary can land here.
              id={index === 0 ? id : `${id}-${choice.value}`}
              value={choice.value}
              {...(value === undefined ? {} : { checked: value === choice.value })}
              className={MARK}
            />
            <span>
              {choice.label}
              {choice.hint !== undefined && (
                <span className="block text-small text-ink-2">{choice.hint}</span>
              )}
            </span>
          </label>
        ))}
      </div>
      <FieldError fieldId={id} error={error} />
    </fieldset>
  );
}
