import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import type { AdminReference } from '../../shared/admin/reference.schema.ts';
import { GARMENT_KINDS, type GarmentKind } from '../../shared/fit/fit-words.ts';
import { capital, KIND_WORDS } from '../../shared/fit/say-words.ts';
import { CATALOGUE } from '../../shared/points/catalogue.ts';
import { AddressSelect, readChoice } from '../ui/address-select.tsx';
import { SectionHeading } from '../ui/page-heading.tsx';
import { RowHead, Table, Td, Th } from '../ui/table.tsx';
import { AdminFrame } from './admin-frame.tsx';
import { EaseRange } from './ease-range.tsx';
import { adminReferenceQuery } from './queries.ts';

export const loader = (client: QueryClient) => () => client.query(adminReferenceQuery);

type KindAsked = GarmentKind | 'every';
const KINDS_ASKED: readonly KindAsked[] = [...GARMENT_KINDS, 'every'];
const KIND_OPTIONS = [
  ...GARMENT_KINDS.map((value) => ({
    value,
    label: KIND_WORDS[value],
    inList: capital(KIND_WORDS[value]),
  })),
  { value: 'every' as const, label: 'every garment', inList: 'Every garment' },
];

const UNITS = { mm: 'millimetres', cm: 'centimetres', in: 'inches' } as const;

const STANDING: Record<AdminReference['wearingEase'][number]['standing'], string> = {
  published: 'published',
  commonPractice: 'common practice',
  fromMemory: 'from memory',
};

export function Component() {
  const { data } = useSuspenseQuery(adminReferenceQuery);
  const [search] = useSearchParams();
  const kind = readChoice<KindAsked>(`?${search.toString()}`, 'kind', KINDS_ASKED, 'dress');
  const ease = data.wearingEase.filter((row) => kind === 'every' || row.kind === kind);
  return (
    <AdminFrame
      title="Reference figures"
      lead="The figures that this version of Leeway carries and reckons with, each with where it comes from. They come with the version and are not changed here."
    >
      <section aria-labelledby="bodies" className="mt-9">
        <SectionHeading id="bodies">Published body tables</SectionHeading>
        <ul className="mt-2 max-w-[52rem] border-t border-rule">
          {data.bodyTables.map((table) => (
            <BodyTable key={`${table.number} ${table.title}`} table={table} />
          ))}
        </ul>
      </section>
      <section aria-labelledby="ease" className="mt-12">
        <SectionHeading id="ease">Ease that wearing takes</SectionHeading>
        <p className="mt-2 mb-4 text-lead text-ink-2" role="status">
          {ease.length === 1 ? '1 figure' : `${ease.length} figures`}, of{' '}
          <AddressSelect<KindAsked>
            label="Garment"
            name="kind"
            value={kind}
            usual="dress"
            options={KIND_OPTIONS}
          />
        </p>
        <Table label="Ease that wearing takes, in millimetres">
          <thead>
            <tr>
              <Th>Point, garment</Th>
              <Th>mm over the body</Th>
              <Th className="max-md:hidden">Source</Th>
            </tr>
          </thead>
          <tbody>
            {ease.map((row) => (
              <tr key={`${row.kind} ${row.point}`}>
                <RowHead className="font-medium md:w-64">
                  {capital(pointName(row.point))}
                  <span className="block text-note font-normal text-ink-2">{KIND_WORDS[row.kind]}</span>
                  <span className="block text-note font-normal md:hidden">
                    <Source row={row} />
                  </span>
                </RowHead>
                <Td className="w-24 text-note whitespace-nowrap md:w-80">
                  {sayRange(row.lowMm, row.highMm)}
                  <EaseRange lowMm={row.lowMm} highMm={row.highMm} />
                </Td>
                <Td className="text-note max-md:hidden">
                  <Source row={row} />
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      </section>
    </AdminFrame>
  );
}

function BodyTable({ table }: { table: AdminReference['bodyTables'][number] }) {
  const { title, maker, number, source, sizes, points, unit } = table;
  return (
    <li className="border-b border-rule py-4">
      <p className="font-semibold">{title}</p>
      <p className="text-note text-ink-2">
        {[maker, number].filter((part) => part !== '').join(', ')}; {sizes.length} sizes, {sizes[0]} to{' '}
        {sizes.at(-1)}; given in {UNITS[unit]}
      </p>
      <p className="mt-1 text-note">{source}</p>
      <p className="mt-1 text-note text-ink-2">{capital(points.map(pointName).join(', '))}</p>
    </li>
  );
}

function Source({ row: { standing, source } }: { row: AdminReference['wearingEase'][number] }) {
  return (
    <>
      <span className="font-semibold">{STANDING[standing]}</span>
      {standing === 'published' && `: ${source}`}
    </>
  );
}

const pointName = (point: keyof typeof CATALOGUE): string => CATALOGUE[point].name.toLowerCase();

function sayRange(lowMm: number, highMm: number | null): string {
  const print = (mm: number) => mm.toFixed(0);
  return highMm === null ? `from ${print(lowMm)}` : `${print(lowMm)} to ${print(highMm)}`;
}
