import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { Link, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { MailboxEntry } from '../../shared/mailbox.ts';
import { paths } from '../paths.ts';
import { EmptyState } from '../ui/empty-state.tsx';
import { printMoment } from '../ui/moment.ts';
import { PageHeading } from '../ui/page-heading.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { mailboxQuery } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) =>
    client.query(mailboxQuery(readListAddress(request.url).page));

const LOOK_AGAIN_MS = 3000;

/** The mail of an instance that sends none out: it looks again by itself, since people wait here for a mail. */
export function Component() {
  const [search] = useSearchParams();
  const { page } = readListAddress(`?${search.toString()}`);
  const { data } = useSuspenseQuery({ ...mailboxQuery(page), refetchInterval: LOOK_AGAIN_MS });
  return (
    <>
      <PageHeading title="The mailbox here" />
      <p className="mt-3 max-w-[40rem] text-ink-2">
        This instance has no mail server, so nothing leaves the machine: whatever it would send, to whomever,
        arrives here. Only this machine can see it.
      </p>
      {data.total === 0 ? (
        <EmptyState title="No mail yet">
          <p>Make an account or ask for a new password: the mail appears here by itself.</p>
        </EmptyState>
      ) : (
        <>
          <p role="status" className="mt-7 mb-2 text-note text-ink-2">
            {data.total === 1 ? '1 mail' : `${data.total} mails`}, the newest first
          </p>
          <ul className="max-w-[60rem] border-t border-rule">
            {data.items.map((mail) => (
              <MailRow key={mail.id} mail={mail} />
            ))}
          </ul>
          <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
        </>
      )}
    </>
  );
}

function MailRow({ mail }: { mail: MailboxEntry }) {
  return (
    <li className="grid items-baseline gap-x-8 border-b border-rule py-3 md:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0">
        <Link
          to={paths.mailboxMessage(mail.id)}
          className="inline-flex min-h-11 items-center font-semibold break-words decoration-1 underline-offset-4 hover:text-woad hover:underline"
        >
          {mail.subject}
        </Link>
        <p className="text-note break-words text-ink-2">to {mail.to}</p>
      </div>
      <p className="text-note text-ink-2">{printMoment(mail.receivedAt)}</p>
    </li>
  );
}
