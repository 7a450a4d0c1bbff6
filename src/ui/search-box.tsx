import { useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from './button.tsx';
import { TextField } from './field.tsx';

/** Search words, kept in the address as `q`. Typing searches after a breath; Enter at once. */
export function SearchBox({ label }: { label: string }) {
  const [search, setSearch] = useSearchParams();
  const asked = search.get('q') ?? '';
  const [typed, setTyped] = useState(asked);
  const [before, setBefore] = useState(asked);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  // The address can change without the box: by the back button, or a link.
  if (asked !== before) {
    setBefore(asked);
    if (asked !== typed.trim()) setTyped(asked);
  }
  useEffect(() => () => clearTimeout(timer.current), []);

  const ask = (words: string) => {
    clearTimeout(timer.current);
    setSearch(
      (current) => {
        const next = new URLSearchParams(current);
        next.delete('page');
        if (words.trim() === '') next.delete('q');
        else next.set('q', words.trim());
        return next;
      },
      { replace: true, preventScrollReset: true },
    );
  };

  return (
    <form
      role="search"
      className="max-w-96 grow print:hidden"
      onSubmit={(event) => {
        event.preventDefault();
        ask(typed);
      }}
    >
      <TextField
        label={label}
        type="search"
        name="q"
        autoComplete="off"
        maxLength={100}
        value={typed}
        onChange={(event) => {
          const words = event.target.value;
          setTyped(words);
          clearTimeout(timer.current);
          timer.current = setTimeout(() => ask(words), 300);
        }}
        after={
          typed !== '' && (
            <Button
              kind="quiet"
              onClick={() => {
                setTyped('');
                ask('');
              }}
            >
              Clear
            </Button>
          )
        }
      />
    </form>
  );
}
