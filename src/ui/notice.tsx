import type { ReactNode } from 'react';

/** What kind of thing is said; each has its own word and its own edge, so that no colour is needed to tell. */
export type NoticeKind = 'info' | 'caution' | 'error';

const EDGE: Record<NoticeKind, string> = {
  info: 'border-l-2 border-woad',
  caution: 'border-l-4 border-dashed border-ink',
  error: 'border-l-6 border-madder',
};
const WORD: Record<NoticeKind, string> = { info: 'Note', caution: 'Take care', error: 'Error' };

interface NoticeProps {
  kind?: NoticeKind;
  /** In place of the kind's own word. */
  word?: string;
  children: ReactNode;
  className?: string;
}

export function Notice({ kind = 'info', word, children, className = '' }: NoticeProps) {
  return (
    <div className={`${EDGE[kind]} py-1 pl-4 ${className}`}>
      <p className={`text-note font-semibold ${kind === 'error' ? 'text-madder' : 'text-ink'}`}>
        {word ?? WORD[kind]}
      </p>
      <div className="space-y-2">{children}</div>
    </div>
  );
}
