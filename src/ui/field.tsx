import { useId, type ComponentProps, type ReactNode } from 'react';

interface FieldParts {
  label: ReactNode;
  /** What would be right, said beforehand. */
  hint?: ReactNode;
  /** What would be right, said because it is not. */
  error?: string | undefined;
}

/** The ids that tie a field to its hint and its error, and the attributes that say so. */
export function useFieldIds(
  id: string | undefined,
  { hint, error }: { hint?: ReactNode; error?: string | undefined },
) {
  const made = useId();
  const fieldId = id ?? made;
  const described = [
    hint !== undefined && hint !== null ? `${fieldId}-hint` : '',
    error === undefined ? '' : `${fieldId}-error`,
  ]
    .filter((part) => part !== '')
    .join(' ');
  return {
    fieldId,
    attributes: {
      id: fieldId,
      'aria-invalid': error === undefined ? undefined : (true as const),
      'aria-describedby': described === '' ? undefined : described,
    },
  };
}

/** What a field is at fault for, in words under it. */
export function FieldError({ fieldId, error }: { fieldId: string; error: string | undefined }) {
  if (error === undefined) return null;
  return (
    <p id={`${fieldId}-error`} className="mt-1.5 text-note font-medium text-madder">
      {error}
    </p>
  );
}

function Field({
  fieldId,
  label,
  hint,
  error,
  children,
}: FieldParts & { fieldId: string; children: ReactNode }) {
  return (
    <div>
      <label htmlFor={fieldId} className="block text-note font-semibold">
        {label}
      </label>
      {hint !== undefined && (
        <p id={`${fieldId}-hint`} className="text-small text-ink-2">
          {hint}
        </p>
      )}
      {children}
      <FieldError fieldId={fieldId} error={error} />
    </div>
  );
}

type TextFieldProps = FieldParts &
  ComponentProps<'input'> & {
    /** What stands after the field: a unit, or a button that shows a password. */
    after?: ReactNode;
  };

/** One line of text. The rest of its properties are the input's own, a form library's among them. */
export function TextField({ label, hint, error, after, id, className, ...input }: TextFieldProps) {
  const { fieldId, attributes } = useFieldIds(id, { hint, error });
  return (
    <Field fieldId={fieldId} label={label} hint={hint} error={error}>
      <div className="flex items-end gap-3">
        <input type="text" {...input} {...attributes} className={`field-line ${className ?? ''}`} />
        {after}
      </div>
    </Field>
  );
}

/** Several lines of text. */
export function TextArea({
  label,
  hint,
  error,
  id,
  className,
  ...input
}: FieldParts & ComponentProps<'textarea'>) {
  const { fieldId, attributes } = useFieldIds(id, { hint, error });
  return (
    <Field fieldId={fieldId} label={label} hint={hint} error={error}>
      <textarea
        rows={3}
        {...input}
        {...attributes}
        className={`field-line block field-sizing-content min-h-20 resize-y ${className ?? ''}`}
      />
    </Field>
  );
}

export interface Option<Value extends string = string> {
  value: Value;
  label: string;
}

type SelectFieldProps = FieldParts & ComponentProps<'select'> & { options: readonly Option[] };

/** One of a few, chosen from a list: the platform's own, which every phone and every reader of screens knows. */
export function SelectField({ label, hint, error, id, options, className, ...input }: SelectFieldProps) {
  const { fieldId, attributes } = useFieldIds(id, { hint, error });
  return (
    <Field fieldId={fieldId} label={label} hint={hint} error={error}>
      <select {...input} {...attributes} className={`field-line bg-paper ${className ?? ''}`}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
