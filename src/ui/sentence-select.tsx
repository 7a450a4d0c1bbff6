import { useId } from 'react';

export interface SentenceOption<Value extends string = string> {
  value: Value;
  /** As it stands in the sentence. */
  label: string;
  /** As it stands in the list, where that should say more. */
  inList?: string;
  isDisabled?: boolean;
}

interface SentenceSelectProps<Value extends string> {
  /** What is chosen here, for those who do not see the sentence: “Person”, “Silhouette”. */
  label: string;
  value: Value;
  options: readonly SentenceOption<Value>[];
  onChange: (value: Value) => void;
  /** What stands in the sentence while nothing is chosen. */
  placeholder?: string;
  /** Why it cannot be changed here, or a word on what the choice means. */
  description?: string;
  isDisabled?: boolean;
}

/**
 * A chooser in place: a word in a sentence with the dashed line under it. The platform's own list opens over it
 * (it is the most accessible there is, best on the phone, and weighs nothing); the word is drawn by itself, since
 * a list's own box is as wide as its longest choice and would tear the sentence apart.
 */
export function SentenceSelect<Value extends string>(props: SentenceSelectProps<Value>) {
  const { label, value, options, onChange, placeholder = 'choose', description, isDisabled = false } = props;
  const id = useId();
  const chosen = options.find((option) => option.value === value);
  return (
    <span className="group relative inline-block max-w-full">
      <span
        aria-hidden="true"
        className={`font-semibold ${
          isDisabled
            ? 'text-ink'
            : 'border-b-2 border-dashed border-woad text-ink group-hover:border-solid group-hover:text-woad'
        }`}
      >
        {chosen?.label ?? placeholder}
      </span>
      <select
        aria-label={label}
        aria-describedby={description === undefined ? undefined : id}
        value={chosen ? value : ''}
        disabled={isDisabled}
        onChange={(event) => {
          const next = options.find((option) => option.value === event.target.value);
          if (next) onChange(next.value);
        }}
        className="peer absolute inset-x-0 -inset-y-1.5 w-full cursor-pointer text-base text-ink opacity-0 disabled:cursor-default"
      >
        {!chosen && <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.isDisabled ?? false}>
            {option.inList ?? option.label}
          </option>
        ))}
      </select>
      <span
        aria-hidden="true"
        className="pointer-events-none absolute -inset-x-1 inset-y-0 peer-focus-visible:outline-3 peer-focus-visible:outline-woad"
      />
      {description !== undefined && (
        <span id={id} className="sr-only">
          {description}
        </span>
      )}
    </span>
  );
}
