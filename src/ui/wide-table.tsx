import type { ComponentProps } from 'react';

interface WideTableProps extends ComponentProps<'table'> {
  label: string;
  /** It may be longer than the screen as well: its headings then stay in sight too. */
  isTall?: boolean;
}

/** A table wider than the screen: it scrolls in a frame of its own, by keyboard too; its first column stays in sight. */
export function WideTable({ label, isTall = false, className, children, ...rest }: WideTableProps) {
  return (
    <div
      role="region"
      aria-label={label}
      tabIndex={0}
      className={`-mx-5 overflow-auto border-y border-rule focus-visible:-outline-offset-2 md:mx-0 print:max-h-none print:overflow-visible ${
        isTall ? 'max-h-[85vh]' : ''
      }`}
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
export const STICKY_CORNER =
  'sticky top-0 left-0 z-2 bg-paper pl-5 md:pl-0 border-b-2 border-rule align-bottom';
