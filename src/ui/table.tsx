import type { ComponentProps } from 'react';

/** A table with a name, in a frame of its own that scrolls sideways where it must, by keyboard too. */
export function Table({ label, className, children, ...rest }: ComponentProps<'table'> & { label: string }) {
  return (
    <div
      role="region"
      aria-label={label}
      tabIndex={0}
      className="-mx-5 overflow-x-auto px-5 focus-visible:-outline-offset-2 md:mx-0 md:px-0"
    >
      <table {...rest} className={`w-full border-collapse text-left ${className ?? ''}`}>
        <caption className="sr-only">{label}</caption>
        {children}
      </table>
    </div>
  );
}

/** A column's head; `number` sets it over right-aligned figures. */
export function Th({ number = false, className, ...rest }: ComponentProps<'th'> & { number?: boolean }) {
  return (
    <th
      scope="col"
      {...rest}
      className={`border-b border-rule py-2 pr-4 md:pr-6 align-bottom text-small font-normal text-ink-2 last:pr-0 md:last:pr-0 ${
        number ? 'text-right' : ''
      } ${className ?? ''}`}
    />
  );
}

/** A row's head. */
export function RowHead({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="row"
      {...rest}
      className={`border-b border-rule py-3 pr-4 md:pr-6 align-baseline font-semibold ${className ?? ''}`}
    />
  );
}

export function Td({ number = false, className, ...rest }: ComponentProps<'td'> & { number?: boolean }) {
  return (
    <td
      {...rest}
      className={`border-b border-rule py-3 pr-4 md:pr-6 align-baseline last:pr-0 md:last:pr-0 ${
        number ? 'text-right whitespace-nowrap' : ''
      } ${className ?? ''}`}
    />
  );
}
