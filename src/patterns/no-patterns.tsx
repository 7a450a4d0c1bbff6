import { paths } from '../paths.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { ExampleCsv, ExampleTable, TABLE_MEANINGS } from './example-tables.tsx';

/** Before the first pattern: what the two tables are, and what a file of one looks like. */
export function NoPatterns() {
  return (
    <>
      <EmptyState
        title="Bring in your first pattern"
        action={
          <>
            <ButtonLink kind="primary" to={paths.newImport}>
              Add a pattern
            </ButtonLink>
            <ButtonLink to={paths.newPattern}>Type one in</ButtonLink>
          </>
        }
      >
        <p>
          A pattern can publish two tables. Leeway reads either; with both it knows the room the draft gives
          at every point.
        </p>
      </EmptyState>
      <div className="mt-10 grid max-w-[64rem] gap-x-14 gap-y-10 md:grid-cols-2">
        <section aria-labelledby="what-is-chart">
          <h2 id="what-is-chart" className="border-t-2 border-ink pt-3 text-lead font-semibold">
            The size chart: the body
          </h2>
          <p className="mt-1 mb-4 text-ink-2">{TABLE_MEANINGS.chart}</p>
          <ExampleTable role="chart" />
        </section>
        <section aria-labelledby="what-is-finished">
          <h2
            id="what-is-finished"
            className="border-t-2 border-dashed border-woad pt-3 text-lead font-semibold"
          >
            Finished measurements: the cloth
          </h2>
          <p className="mt-1 mb-4 text-ink-2">{TABLE_MEANINGS.finished}</p>
          <ExampleTable role="finished" />
        </section>
        <section aria-labelledby="what-is-csv" className="md:col-span-2">
          <h2 id="what-is-csv" className="border-t border-rule pt-3 text-lead font-semibold">
            As a CSV file
          </h2>
          <p className="mt-1 mb-4 max-w-[42rem] text-ink-2">
            CSV is plain text: a line for each size, the cells set apart by commas, semicolons or tabs. Every
            spreadsheet saves it. Type the envelope’s table with the points along the top and a row for each
            size; inches such as 37 3/8 and decimal commas are read as well.
          </p>
          <ExampleCsv role="chart" />
        </section>
      </div>
    </>
  );
}
