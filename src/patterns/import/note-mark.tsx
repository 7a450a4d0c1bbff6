import { JumpLink } from '../../ui/jump-link.tsx';
import { NOTE_WORDS, type Note } from './notes.ts';

/** The marks at a place: word and number of each note there, and the way to its line in the list. */
export function NoteMarks({ notes }: { notes: readonly Note[] | undefined }) {
  if (!notes) return null;
  return notes.map((note) => (
    <JumpLink
      key={note.id}
      to={note.id}
      className={`mr-2 inline-block py-0.5 text-small font-semibold whitespace-nowrap ${
        note.issue.severity === 'error' ? 'text-madder' : 'text-ink'
      }`}
    >
      {NOTE_WORDS[note.issue.severity]} {note.number}
    </JumpLink>
  ));
}

/** The edge of a place with notes: thick where something stops the import, dashed where it asks for a look. */
export function noteEdge(notes: readonly Note[] | undefined): string {
  if (!notes) return '';
  return notes.some(({ issue }) => issue.severity === 'error')
    ? 'border-l-4 border-l-madder bg-madder-tint'
    : 'border-l-4 border-dashed border-l-ink';
}
