import { useSearchParams } from 'react-router-dom';
import { SentenceSelect, type SentenceOption } from './sentence-select.tsx';

interface AddressSelectProps<Value extends string> {
  /** What is chosen here: “Role”. */
  label: string;
  /** Its name in the address. */
  name: string;
  value: Value;
  options: readonly SentenceOption<Value>[];
  /** The choice that the address need not name. */
  usual: Value;
}

/** A filter as a word in a sentence, kept in the address; another choice begins at the first page. */
export function AddressSelect<Value extends string>(props: AddressSelectProps<Value>) {
  const { label, name, value, options, usual } = props;
  const [, setSearch] = useSearchParams();
  return (
    <SentenceSelect
      label={label}
      value={value}
      options={options}
      onChange={(next) => {
        setSearch(
          (current) => {
            const asked = new URLSearchParams(current);
            asked.delete('page');
            if (next === usual) asked.delete(name);
            else asked.set(name, next);
            return asked;
          },
          { preventScrollReset: true },
        );
      }}
    />
  );
}

/** The choice that an address names, or the usual one where it names none that there is. */
export function readChoice<Value extends string>(
  url: string,
  name: string,
  choices: readonly Value[],
  usual: Value,
): Value {
  const asked = new URL(url, 'http://page.invalid').searchParams.get(name);
  return choices.find((choice) => choice === asked) ?? usual;
}
