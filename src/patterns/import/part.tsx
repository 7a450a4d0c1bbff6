import type { ReactNode } from 'react';

interface PartProps {
  id: string;
  number: number;
  title: string;
  /** `chart` begins with the body's line, `finished` with the cloth's, everything else with a hairline. */
  line?: 'chart' | 'finished' | 'plain';
  beside?: ReactNode;
  children: ReactNode;
}

const LINE = {
  chart: 'border-t-2 border-ink',
  finished: 'border-t-2 border-dashed border-woad',
  plain: 'border-t border-rule',
} as const;

/** One step of the import: its number and name at the left, what is to be done at the right. */
export function Part({ id, number, title, line = 'plain', beside, children }: PartProps) {
  return (
    <section
      aria-labelledby={id}
      className={`mt-12 grid gap-x-12 gap-y-4 pt-5 lg:grid-cols-[13rem_minmax(0,1fr)] ${LINE[line]}`}
    >
      {/* On the phone what stands beside the title stays in sight by itself, as long as its step does. */}
      <div className="contents lg:sticky lg:top-6 lg:block lg:self-start">
        <h2 id={id} tabIndex={-1} className="text-section leading-tight font-semibold">
          <span className="mr-2 text-ink-2">{number}</span>
          {title}
        </h2>
        {beside !== undefined && (
          <div className="sticky top-0 z-1 bg-paper py-1 lg:static lg:mt-3">{beside}</div>
        )}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}
