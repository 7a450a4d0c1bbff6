import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { sayZones } from '../../shared/fit/say-plan.ts';
import { capital } from '../../shared/fit/say-words.ts';
import type { SavedPlanSummary } from '../../shared/plans/plans.schema.ts';
import { paths } from '../paths.ts';
import { printDay } from '../ui/day.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { SearchBox } from '../ui/search-box.tsx';
import { plansQuery } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) => {
    const { page, q } = readListAddress(request.url);
    return client.query(plansQuery(page, q));
  };

export function Component() {
  const [search] = useSearchParams();
  const { page, q } = readListAddress(`?${search.toString()}`);
  const { data } = useSuspenseQuery(plansQuery(page, q));
  const isNone = data.total === 0 && q === '';
  return (
    <>
      <PageHeading
        title="Plans"
        actions={
          !isNone && (
            <ButtonLink kind="primary" to={paths.fit}>
              A new plan
            </ButtonLink>
          )
        }
      />
      {isNone ? (
        <NoneYet />
      ) : (
        <div className="mt-7">
          <SearchBox label="Find by name, person or pattern" />
          <p role="status" className="mt-6 mb-2 text-note text-ink-2">
            {countWords(data.total, q)}
          </p>
          {data.items.length > 0 && (
            <ul className="border-t border-rule">
              {data.items.map((plan) => (
                <PlanRow key={plan.id} plan={plan} />
              ))}
            </ul>
          )}
          <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
        </div>
      )}
    </>
  );
}

function countWords(total: number, q: string): string {
  const plans = total === 0 ? 'No plan' : total === 1 ? '1 plan' : `${total} plans`;
  return q === '' ? plans : `${plans} with “${q}”`;
}

function PlanRow({ plan }: { plan: SavedPlanSummary }) {
  return (
    <li className="grid gap-x-10 border-b border-rule py-3 md:grid-cols-[minmax(0,2fr)_minmax(0,3fr)] md:items-baseline">
      <div className="min-w-0">
        <Link
          to={paths.plan(plan.id)}
          className="inline-flex min-h-11 items-center text-lead font-semibold break-words decoration-1 underline-offset-4 hover:text-woad hover:underline"
        >
          {plan.name}
        </Link>
        <p className="text-note text-ink-2">
          {plan.personName}, measured {printDay(plan.takenOn)}, in the {plan.patternTitle}
        </p>
      </div>
      <div className="min-w-0">
        <p className="font-medium">{sizesSaid(plan)}</p>
        <p className="text-note text-ink-2">Saved {printDay(plan.createdAt.slice(0, 10))}</p>
      </div>
    </li>
  );
}

/** A list holds no person's words, so it says sizes only. */
function sizesSaid(plan: SavedPlanSummary): string {
  if (plan.zones.length === 0) return 'Nothing to cut by yet';
  const cut = capital(sayZones(plan.zones, { unit: 'cm', chestWord: 'bust', sizes: [] }));
  return plan.status === 'outOfRange' ? `${cut}; the pattern’s sizes end before this body` : cut;
}

function NoneYet() {
  return (
    <EmptyState
      title="No plan is saved yet"
      action={
        <ButtonLink kind="primary" to={paths.fit}>
          Make a plan
        </ButtonLink>
      }
    >
      <p>
        A saved plan keeps the measurements and the tables it was made from and never changes by itself: it is
        what you cut by, and what you look up before the next one.
      </p>
    </EmptyState>
  );
}
