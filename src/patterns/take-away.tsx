import type { PatternRevision } from '../../shared/patterns/patterns.schema.ts';
import { SectionHeading } from '../ui/page-heading.tsx';
import { FileLink } from './file-link.tsx';

/** What can be taken away of a revision: the files as they came, and the tables as Leeway reads them. */
export function TakeAway({ revision }: { revision: PatternRevision }) {
  const { chartFile, finishedFile, table } = revision;
  const base = `/api/pattern-revisions/${revision.id}`;
  return (
    <section aria-labelledby="take-away" className="mt-12 print:hidden">
      <SectionHeading id="take-away">Take away</SectionHeading>
      <dl className="mt-2 max-w-[44rem] border-t border-rule">
        {table.chart.length > 0 && (
          <Row name="Size chart">
            <Download href={`${base}/chart.csv`}>As CSV</Download>
            {chartFile && <FileLink file={chartFile} />}
          </Row>
        )}
        {table.finished.length > 0 && (
          <Row name="Finished measurements">
            <Download href={`${base}/finished.csv`}>As CSV</Download>
            {finishedFile && <FileLink file={finishedFile} />}
          </Row>
        )}
      </dl>
      <p className="mt-2 max-w-[44rem] text-note text-ink-2">
        The CSV has the points under names that can be read in again. A named file is the one that was
        uploaded, as it came.
      </p>
    </section>
  );
}

function Row({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div className="grid border-b border-rule py-1 sm:grid-cols-[14rem_1fr] sm:items-center">
      <dt className="font-medium">{name}</dt>
      <dd className="flex flex-wrap gap-x-7">{children}</dd>
    </div>
  );
}

function Download({ href, children }: { href: string; children: string }) {
  return (
    <a
      href={href}
      download
      className="inline-flex min-h-11 items-center text-woad underline decoration-1 underline-offset-4 hover:decoration-2"
    >
      {children}
    </a>
  );
}
