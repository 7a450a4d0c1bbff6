import { useEffect, useRef } from 'react';

export interface FormErrorItem {
  message: string;
  /** The id of the field at fault, where it is one field's. */
  fieldId?: string;
  /** That field's name as the page writes it. */
  label?: string;
}

interface FormErrorsProps {
  items: FormErrorItem[];
  /** Counts the attempts: with each one that failed the focus comes here. */
  attempt: number;
}

/** Everything that keeps a form from being sent, at its top, each with the way to its field. */
export function FormErrors({ items, attempt }: FormErrorsProps) {
  const box = useRef<HTMLDivElement>(null);
  const hasErrors = items.length > 0;
  useEffect(() => {
    if (hasErrors && attempt > 0) box.current?.focus();
  }, [attempt, hasErrors]);
  if (!hasErrors) return null;
  return (
    <div ref={box} role="alert" tabIndex={-1} className="mb-7 border-l-6 border-madder py-1 pl-4">
      <h2 className="text-note font-semibold text-madder">
        {items.length === 1 ? 'One thing to put right' : `${items.length} things to put right`}
      </h2>
      <ul className="mt-1 space-y-1">
        {items.map((item, index) => (
          <li key={`${item.fieldId ?? ''}-${index}`}>
            <ErrorLine item={item} />
          </li>
        ))}
      </ul>
    </div>
  );
}

function ErrorLine({ item: { message, fieldId, label } }: { item: FormErrorItem }) {
  if (fieldId === undefined) return message;
  return (
    <a
      href={`#${fieldId}`}
      className="underline decoration-1 underline-offset-4 hover:decoration-2"
      onClick={(event) => {
        // A change of the address would be a navigation, and a form that warns on leaving would ask.
        event.preventDefault();
        focusField(fieldId);
      }}
    >
      {label === undefined ? '' : `${label}: `}
      {message}
    </a>
  );
}

function focusField(fieldId: string) {
  const field = document.getElementById(fieldId);
  const folded = field?.closest('details');
  if (folded) folded.open = true;
  field?.focus();
}
