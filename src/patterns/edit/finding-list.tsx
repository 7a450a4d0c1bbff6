import { JumpLink } from '../../ui/jump-link.tsx';
import type { FindingNote } from './finding-notes.ts';

/** Everything that keeps the tables from being saved or asks for a look, errors first; each line leads to its cell. */
export function FindingList({ notes }: { notes: readonly FindingNote[] }) {
  if (notes.length === 0) return null;
  return (
    <ol aria-label="What to look at in the tables" className="mt-3 max-w-[56rem] border-t border-rule">
      {notes.map((note) => {
        const isError = note.severity === 'error';
        return (
          <li
            key={note.id}
            id={note.id}
            tabIndex={-1}
            className={`grid grid-cols-[5rem_1fr] gap-x-3 border-b border-rule py-2 sm:grid-cols-[5rem_15rem_1fr] ${
              isError ? 'border-l-4 border-l-madder pl-3' : 'pl-4'
            }`}
          >
            <span className={`font-semibold ${isError ? 'text-madder' : ''}`}>
              {isError ? 'Error' : 'Look'} {note.number}
            </span>
            <span className="text-note text-ink-2">
              {note.targetId === null ? (
                note.where
              ) : (
                <JumpLink to={note.targetId} className="inline-block text-woad">
                  {note.where}
                </JumpLink>
              )}
            </span>
            <span className="col-span-full sm:col-span-1">{note.words}</span>
          </li>
        );
      })}
    </ol>
  );
}
