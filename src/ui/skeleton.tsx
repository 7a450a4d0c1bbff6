/** The room a page will take, in hairlines, and the word for it. */
export function Skeleton({ rows = 6, word = 'Loading' }: { rows?: number; word?: string }) {
  return (
    <div role="status" className="come-in-late">
      <p className="text-note text-ink-2">{word}</p>
      <div aria-hidden="true" className="mt-3">
        <div className="h-9 w-3/5 max-w-96 bg-rule" />
        <div className="mt-9 border-t border-rule">
          {Array.from({ length: rows }, (_, row) => (
            <div key={row} className="flex items-center gap-6 border-b border-rule py-5">
              <div className="h-4 w-32 bg-rule" />
              <div className="h-4 grow border-b-2 border-dashed border-rule" />
              <div className="h-4 w-12 bg-rule" />
            </div>
          ))}
        </div>
      </div>
    </div>
  );
}
