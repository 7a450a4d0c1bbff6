import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { isGarmentKind } from '../../shared/fit/garments.ts';
import type { GarmentKind } from '../../shared/fit/fit-words.ts';
import { paths } from '../paths.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { SearchBox } from '../ui/search-box.tsx';
import { SentenceSelect } from '../ui/sentence-select.tsx';
import { NoPatterns } from './no-patterns.tsx';
import { PatternRow } from './pattern-row.tsx';
import { KIND_OPTIONS } from './pattern-words.ts';
import { draftsQuery, patternsQuery } from './queries.ts';
import { UnfinishedImports } from './unfinished-imports.tsx';

export const loader =
  (client: QueryClient) =>
  async ({ request }: LoaderFunctionArgs) => {
    const { page, q, kind } = readPatternsAddress(request.url);
    await Promise.all([client.query(patternsQuery(page, q, kind)), client.query(draftsQuery())]);
    return null;
  };

/** As every list's address, and the kind of garment; a kind that there is not counts as every kind. */
function readPatternsAddress(url: string): { page: number; q: string; kind: GarmentKind | null } {
  const kind = new URL(url, 'http://page.invalid').searchParams.get('kind') ?? '';
  return { ...readListAddress(url), kind: isGarmentKind(kind) ? kind : null };
}

export function Component() {
  const [search] = useSearchParams();
  const { page, q, kind } = readPatternsAddress(`?${search.toString()}`);
  const { data: patterns } = useSuspenseQuery(patternsQuery(page, q, kind));
  const isNarrowed = q !== '' || kind !== null;
  const isEmpty = patterns.total === 0 && !isNarrowed;
  return (
    <>
      <PageHeading
        title="Patterns"
        actions={
          !isEmpty && (
            <>
              <ButtonLink kind="primary" to={paths.newImport}>
                Add a pattern
              </ButtonLink>
              <ButtonLink to={paths.newPattern}>Type one in</ButtonLink>
            </>
          )
        }
      />
      <UnfinishedImports />
      {isEmpty ? (
        <NoPatterns />
      ) : (
        <>
          <div className="mt-8 flex flex-wrap items-end gap-x-10 gap-y-5">
            <SearchBox label="Find by title, maker or number" />
            <KindFilter kind={kind} total={patterns.total} />
          </div>
          {patterns.items.length === 0 ? (
            <NothingFound isNarrowed={isNarrowed} />
          ) : (
            <ul aria-label="Patterns" className="mt-6 border-t border-rule">
              {patterns.items.map((pattern) => (
                <PatternRow key={pattern.id} pattern={pattern} />
              ))}
            </ul>
          )}
          <Pagination page={page} pageSize={patterns.pageSize} total={patterns.total} />
        </>
      )}
    </>
  );
}

function KindFilter({ kind, total }: { kind: GarmentKind | null; total: number }) {
  const [, setSearch] = useSearchParams();
  return (
    <p className="pb-2 text-lead text-ink-2" role="status">
      {total === 1 ? '1 pattern' : `${total} patterns`},{' '}
      <SentenceSelect
        label="Kind of garment"
        value={kind ?? 'every'}
        options={[
          { value: 'every', label: 'every kind', inList: 'Every kind' },
          ...KIND_OPTIONS.map(({ value, label }) => ({ value, label: label.toLowerCase(), inList: label })),
        ]}
        onChange={(next) => {
          setSearch(
            (current) => {
              const asked = new URLSearchParams(current);
              asked.delete('page');
              if (next === 'every') asked.delete('kind');
              else asked.set('kind', next);
              return asked;
            },
            { preventScrollReset: true },
          );
        }}
      />
    </p>
  );
}

function NothingFound({ isNarrowed }: { isNarrowed: boolean }) {
  return (
    <p className="mt-8 max-w-[38rem] border-t border-rule pt-5">
      {isNarrowed
        ? 'None of your patterns has these words and this kind. '
        : 'There are not so many pages of patterns. '}
      <TextLink to={paths.patterns}>Show all patterns</TextLink>
    </p>
  );
}
