import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useParams, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { PatternRevision } from '../../shared/patterns/patterns.schema.ts';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { PageHeading, SectionHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { SentenceSelect } from '../ui/sentence-select.tsx';
import { DifferenceList } from './difference-list.tsx';
import { sayDifference } from './difference-words.ts';
import { comparisonQuery, patternQuery, revisionQuery, revisionsQuery } from './queries.ts';
import { VersionTable } from './version-table.tsx';

/** The two revisions that the address names; the latest and the one before where it does not. */
function chosen(url: string, revisions: readonly PatternRevision[]): { from: string; to: string } {
  const search = new URL(url, 'http://page.invalid').searchParams;
  const known = (name: string) => revisions.find(({ id }) => id === search.get(name))?.id;
  const to = known('to') ?? revisions[0]?.id ?? '';
  const before = revisions[revisions.findIndex(({ id }) => id === to) + 1] ?? revisions[0];
  return { from: known('from') ?? before?.id ?? '', to };
}

export const loader =
  (client: QueryClient) =>
  async ({ params, request }: LoaderFunctionArgs) => {
    const patternId = param(params, 'patternId');
    const [, revisions] = await Promise.all([
      client.query(patternQuery(patternId)),
      client.query(revisionsQuery(patternId)),
    ]);
    const { from, to } = chosen(request.url, revisions.items);
    await Promise.all([
      client.query(comparisonQuery(from, to)),
      client.query(revisionQuery(from)),
      client.query(revisionQuery(to)),
    ]);
    return null;
  };

export function Component() {
  const patternId = param(useParams(), 'patternId');
  const [search, setSearch] = useSearchParams();
  const { data: pattern } = useSuspenseQuery(patternQuery(patternId));
  const { data: revisions } = useSuspenseQuery(revisionsQuery(patternId));
  const { from, to } = chosen(`?${search.toString()}`, revisions.items);
  const { data } = useSuspenseQuery(comparisonQuery(from, to));
  const { data: before } = useSuspenseQuery(revisionQuery(from));
  const { data: after } = useSuspenseQuery(revisionQuery(to));
  const options = revisions.items.map(({ id, number, createdAt }) => ({
    value: id,
    label: `revision ${number}`,
    inList: `Revision ${number}, ${printMoment(createdAt)}`,
  }));
  const choose = (name: 'from' | 'to', id: string) =>
    setSearch({ from, to, [name]: id }, { replace: true, preventScrollReset: true });
  const names = { from: `Revision ${before.number}`, to: `Revision ${after.number}` };
  return (
    <>
      <PageHeading
        title={`${pattern.title}: revisions compared`}
        above={<TextLink to={paths.pattern(patternId)}>{pattern.title}</TextLink>}
      />
      <p className="mt-4 text-lead text-ink-2">
        What changed from{' '}
        <SentenceSelect
          label="From revision"
          value={from}
          options={options}
          onChange={(id) => choose('from', id)}
        />{' '}
        to{' '}
        <SentenceSelect
          label="To revision"
          value={to}
          options={options}
          onChange={(id) => choose('to', id)}
        />
      </p>
      {revisions.total === 1 ? (
        <p className="mt-5 max-w-[40rem]">
          The tables have one revision so far: there is nothing to compare it with until{' '}
          <TextLink to={paths.editTable(patternId)}>they are edited</TextLink>.
        </p>
      ) : (
        <p role="status" className="mt-5 text-lead font-semibold">
          {sayDifference(data.difference)}
        </p>
      )}
      <DifferenceList difference={data.difference} names={names} />
      {!data.difference.isSame && (
        <section aria-labelledby="whole" className="mt-10">
          <SectionHeading id="whole">Both as typed</SectionHeading>
          <div className="mt-3 grid gap-x-10 gap-y-8 xl:grid-cols-2">
            <VersionTable title={names.from} table={before.table} difference={data.difference} side="from" />
            <VersionTable title={names.to} table={after.table} difference={data.difference} side="to" />
          </div>
        </section>
      )}
    </>
  );
}
