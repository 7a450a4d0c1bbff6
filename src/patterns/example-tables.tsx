import type { TableRole } from '../../shared/patterns/imports.schema.ts';

/** Invented: four sizes in centimetres, the garment 8 at the bust, 5 at the waist and 7 at the hip over the body. */
const EXAMPLES: Record<TableRole, { name: string; headings: string[]; rows: string[][] }> = {
  chart: {
    name: 'A size chart',
    headings: ['Size', 'Bust (cm)', 'Waist', 'Hip'],
    rows: [
      ['10', '86', '68', '92'],
      ['12', '90', '72', '96'],
      ['14', '94.5', '76.5', '100.5'],
    ],
  },
  finished: {
    name: 'A finished-measurement table',
    headings: ['Size', 'Bust (cm)', 'Waist', 'Hip'],
    rows: [
      ['10', '94', '73', '99'],
      ['12', '98', '77', '103'],
      ['14', '102.5', '81.5', '107.5'],
    ],
  },
};

/** How such a table looks, small: a heading row of points, a row a size. */
export function ExampleTable({ role }: { role: TableRole }) {
  const { name, headings, rows } = EXAMPLES[role];
  return (
    <table className="border-collapse text-note">
      <caption className="pb-1 text-left text-small whitespace-nowrap text-ink-2">
        {name}, for example
      </caption>
      <thead>
        <tr className={`border-b-2 ${role === 'chart' ? 'border-ink' : 'border-dashed border-woad'}`}>
          {headings.map((heading) => (
            <th
              key={heading}
              scope="col"
              className="py-1 pr-5 text-left font-medium whitespace-nowrap last:pr-0"
            >
              {heading}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map(([size, ...cells]) => (
          <tr key={size}>
            <th scope="row" className="border-b border-rule py-1 pr-5 text-left font-semibold">
              {size}
            </th>
            {cells.map((cell, column) => (
              <td key={column} className="border-b border-rule py-1 pr-5 last:pr-0">
                {cell}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** The same as it stands in a CSV file. */
export function ExampleCsv({ role }: { role: TableRole }) {
  const { headings, rows } = EXAMPLES[role];
  const lines = [headings, ...rows].map((cells) => cells.join(',')).join('\n');
  return (
    <pre
      tabIndex={0}
      aria-label="The same table as a CSV file"
      className="overflow-x-auto border-l-2 border-rule py-1 pl-4 font-sans text-note text-ink"
    >
      {lines}
    </pre>
  );
}

/** What each of the two tables is, in a sentence. */
export const TABLE_MEANINGS: Record<TableRole, string> = {
  chart:
    'The bodies that the sizes are drafted for: on the envelope often “body measurements” or “to fit”. One body to a size, or a range such as 91–94.',
  finished:
    'The sewn garment, measured from seam to seam all the way round: on the envelope often “finished garment measurements”.',
};
