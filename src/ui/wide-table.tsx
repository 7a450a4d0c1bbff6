import type { ComponentProps } from 'react';

/**
 * A table larger than the screen: it scrolls both ways in a frame of its own, by keyboard too, while its headings
 * and its first column stay in sight.
 */
export function WideTable({ label, className, children, ...rest }: ComponentProps<'table'> & { label: string }) {
  return (
    <div
      role="region"
      aria-label={label}
      tabIndex={0}
      className="-mx-5 max-h-[85vh] overflow-auto border-y border-rule focus-visible:-outline-offset-2 md:mx-0 print:max-h-none print:overflow-visible"
    >
      <table {...rest} className={`border-separate border-spacing-0 text-left ${className ?? ''}`}>
        <caption className="sr-only">{label}</caption>
        {children}
      </table>
    </div>
  );
}

/** For the cells of the heading row of a wide table. */
export const STICKY_HEAD = 'sticky top-0 z-1 bg-paper border-b-2 border-rule align-bottom';
/** For the cells of its first column. */
export const STICKY_SIDE = 'sticky left-0 bg-paper pl-5 md:pl-0';
/** For the one cell that is both. */
export const STICKY_CORNER = 'sticky top-0 left-0 z-2 bg-paper pl-5 md:pl-0 border-b-2 border-rule align-bottom';
