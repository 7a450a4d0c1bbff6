import type { ReactNode } from 'react';

interface PageHeadingProps {
  /** The page's name: its document title, and its heading where no other is given. */
  title: string;
  /** The heading as drawn, where it is more than the title. */
  children?: ReactNode;
  /** A line over the heading: where this page belongs. */
  above?: ReactNode;
  /** What can be done here, at the right on a wide screen. */
  actions?: ReactNode;
  /** `answer` is the largest text on a page, for a sentence that answers. */
  size?: 'title' | 'answer';
}

/** The one heading of a page. It takes the focus after a navigation. */
export function PageHeading({ title, children, above, actions, size = 'title' }: PageHeadingProps) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <title>{title === 'Leeway' ? title : `${title} · Leeway`}</title>
      <div className="min-w-0">
        {above !== undefined && <p className="mb-1 text-note text-ink-2">{above}</p>}
        <h1
          tabIndex={-1}
          className={`${size === 'answer' ? 'text-answer' : 'text-title'} font-bold tracking-[-0.015em] break-words`}
        >
          {children ?? title}
        </h1>
      </div>
      {actions !== undefined && <div className="flex flex-wrap items-center gap-3">{actions}</div>}
    </div>
  );
}

/** The heading of a part of a page. */
export function SectionHeading({ children, id }: { children: ReactNode; id?: string }) {
  return (
    <h2 id={id} className="text-section font-semibold tracking-[-0.005em]">
      {children}
    </h2>
  );
}
