import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { printMoment } from '../ui/moment.ts';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { Table, Td, Th } from '../ui/table.tsx';
import { AdminFrame, NothingListed } from './admin-frame.tsx';
import { adminLogQuery } from './queries.ts';
import { sayAct } from './say-act.ts';

const queryOf = (url: string) => adminLogQuery(readListAddress(url).page);

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) =>
    client.query(queryOf(request.url));

export function Component() {
  const [search] = useSearchParams();
  const { data } = useSuspenseQuery(queryOf(`?${search.toString()}`));
  return (
    <AdminFrame
      title="What administrators did"
      lead="Every act, the latest first. Nobody can change or delete an entry here."
    >
      {data.items.length === 0 ? (
        <NothingListed>
          {data.total === 0 ? 'Nothing has been done yet.' : 'There are not so many pages.'}
        </NothingListed>
      ) : (
        <div className="mt-7 max-w-[60rem]">
          <Table label="What administrators did">
            <thead>
              <tr>
                <Th>When</Th>
                <Th>What</Th>
              </tr>
            </thead>
            <tbody>
              {data.items.map((act) => (
                <tr key={act.id}>
                  <Td className="w-32 text-note text-ink-2 md:w-64">
                    <time dateTime={act.at}>{printMoment(act.at)}</time>
                  </Td>
                  <Td className="[overflow-wrap:anywhere]">{sayAct(act)}</Td>
                </tr>
              ))}
            </tbody>
          </Table>
        </div>
      )}
      <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
    </AdminFrame>
  );
}
