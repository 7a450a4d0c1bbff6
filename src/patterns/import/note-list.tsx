import { JumpLink } from '../../ui/jump-link.tsx';
import { NOTE_WORDS, sayPlace, type Note } from './notes.ts';

/** Everything that was not understood or wants a look, errors first; each line leads to its place in the table. */
export function NoteList({ notes, label }: { notes: readonly Note[]; label: string }) {
  if (notes.length === 0) return null;
  return (
    <ol aria-label={label} className="mt-4 max-w-[52rem] border-t border-rule">
      {notes.map((note) => (
        <li
          key={note.id}
          id={note.id}
          tabIndex={-1}
          className={`grid grid-cols-[5rem_1fr] gap-x-3 border-b border-rule py-2 sm:grid-cols-[5rem_9rem_1fr] ${
            note.issue.severity === 'error' ? 'border-l-4 border-l-madder pl-3' : 'pl-4'
          }`}
        >
          <span className={`font-semibold ${note.issue.severity === 'error' ? 'text-madder' : ''}`}>
            {NOTE_WORDS[note.issue.severity]} {note.number}
          </span>
          <span className="text-note text-ink-2">
            <Place note={note} />
          </span>
          <span className="col-span-full sm:col-span-1">{note.issue.words}</span>
        </li>
      ))}
    </ol>
  );
}

function Place({ note }: { note: Note }) {
  const words = sayPlace(note.issue);
  if (words === '') return 'the whole table';
  if (note.targetId === null) return words;
  return (
    <JumpLink to={note.targetId} className="inline-block text-woad">
      {words}
    </JumpLink>
  );
}
