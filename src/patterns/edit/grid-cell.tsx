import { memo, type ReactNode } from 'react';
import { JumpLink } from '../../ui/jump-link.tsx';
import type { FindingNote } from './finding-notes.ts';

const WORDS = { error: 'Error', caution: 'Look' } as const;

interface GridCellProps {
  id: string;
  line: number;
  size: number;
  /** What stands in the cell, as typed. */
  text: string;
  /** How it is read, under it. */
  under: string;
  notes: readonly FindingNote[] | undefined;
  isAtHand: boolean;
  isMarked: boolean;
  /** The field, while the cell is being written. */
  children?: ReactNode;
}

/** One cell to be written on: what was typed on its line, and under it what it is read as and what stands there. */
export const GridCell = memo(function GridCell(props: GridCellProps) {
  const { id, line, size, text, under, notes, isAtHand, isMarked, children } = props;
  const isHead = line < 0;
  const hasError = notes?.some(({ severity }) => severity === 'error') ?? false;
  const Tag = isHead ? 'th' : 'td';
  return (
    <Tag
      id={id}
      role={isHead ? 'columnheader' : 'gridcell'}
      {...(isHead ? { scope: 'col' as const } : {})}
      data-line={line}
      data-size={size}
      tabIndex={isAtHand ? 0 : -1}
      aria-selected={isHead ? undefined : isMarked}
      aria-invalid={hasError || undefined}
      className={`select-none scroll-mt-20 scroll-mr-6 scroll-ml-40 px-1.5 pt-1.5 text-right align-top font-normal focus-visible:-outline-offset-2 ${
        isHead ? 'sticky top-0 z-1 border-b-2 border-rule bg-paper' : 'border-b border-rule'
      } ${isMarked && !isAtHand ? 'bg-woad-tint' : ''} ${hasError ? 'bg-madder-tint' : ''}`}
    >
      {children ?? (
        <span
          className={`block min-h-8 min-w-16 border-b-2 whitespace-nowrap ${
            hasError ? 'border-madder' : 'border-dashed border-woad'
          } ${isHead ? 'font-semibold' : ''}`}
        >
          {text === '' ? <span className="text-small text-ink-2">{isHead ? 'no name' : ''}</span> : text}
        </span>
      )}
      <span className="block min-h-6 text-small whitespace-nowrap text-ink-2">{under}</span>
      {/* Their own line: beside the reading they would widen the whole column. */}
      <span className="-mt-1 block text-small whitespace-nowrap empty:hidden">
        {notes?.map((note) => (
          <JumpLink
            key={note.id}
            to={note.id}
            tabIndex={-1}
            className={`ml-1.5 inline-block pb-1 font-semibold ${note.severity === 'error' ? 'text-madder' : 'text-ink'}`}
          >
            {WORDS[note.severity]} {note.number}
          </JumpLink>
        ))}
      </span>
    </Tag>
  );
});
