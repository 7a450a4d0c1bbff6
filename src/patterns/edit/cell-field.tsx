import { useEffect, useRef } from 'react';
import type { Grid } from './use-grid.ts';

/** The field of the cell that is being written: on the same line, which is solid while it is. */
export function CellField({ grid, label, isName }: { grid: Grid; label: string; isName: boolean }) {
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    const { current } = field;
    current?.focus();
    // Whoever began by typing goes on after the first sign; whoever opened the cell stands at its end.
    current?.setSelectionRange(current.value.length, current.value.length);
  }, []);
  return (
    <input
      ref={field}
      type="text"
      size={1}
      aria-label={label}
      autoComplete="off"
      autoCapitalize="off"
      spellCheck={false}
      enterKeyHint="next"
      maxLength={isName ? 60 : 160}
      value={grid.draft ?? ''}
      onChange={(event) => grid.change(event.target.value)}
      onKeyDown={grid.onWritingKey}
      onBlur={grid.finish}
      className={`block min-h-8 w-full min-w-16 border-0 border-b-2 border-solid border-woad bg-transparent p-0 text-right text-base text-ink outline-offset-1 ${
        isName ? 'font-semibold' : ''
      }`}
    />
  );
}
