import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { MAIL_STATES_LISTED, type AdminMail } from '../../shared/admin/mail.schema.ts';
import { MailboxHint } from '../mailbox/parts/mailbox-hint.tsx';
import { AddressSelect, readChoice } from '../ui/address-select.tsx';
import { Button } from '../ui/button.tsx';
import { printMoment } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { RowHead, Table, Td, Th } from '../ui/table.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { AdminFrame, NothingListed } from './admin-frame.tsx';
import { sayMailError, sayMailKind, sayMailState } from './mail-words.ts';
import { adminMailQuery, useRetryMail, type MailState } from './queries.ts';

const WORDS: Record<MailState, { label: string; inList: string; none: string }> = {
  waiting: { label: 'waiting', inList: 'Waiting', none: 'No mail waits: whatever was due has gone out.' },
  sending: { label: 'being sent', inList: 'Being sent', none: 'None is being sent at this moment.' },
  failed: { label: 'given up', inList: 'Given up', none: 'None was given up.' },
  sent: { label: 'sent', inList: 'Sent', none: 'None has been sent.' },
};
const OPTIONS = MAIL_STATES_LISTED.map((value) => ({ value, ...WORDS[value] }));

const readState = (url: string) => readChoice(url, 'state', MAIL_STATES_LISTED, 'waiting');
const queryOf = (url: string) => adminMailQuery(readListAddress(url).page, readState(url));

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) =>
    client.query(queryOf(request.url));

export function Component() {
  const [search] = useSearchParams();
  const url = `?${search.toString()}`;
  const { data } = useSuspenseQuery(queryOf(url));
  const state = readState(url);
  const retry = useRetryMail();
  return (
    <AdminFrame
      title="Mail"
      lead={
        <>
          To whom and of what kind, never what it says. A mail is tried again by itself for about a day.{' '}
          <MailboxHint />
        </>
      }
    >
      <p className="mt-7 text-lead text-ink-2" role="status">
        {data.total === 1 ? '1 mail' : `${data.total} mails`},{' '}
        <AddressSelect label="State" name="state" value={state} usual="waiting" options={OPTIONS} />
      </p>
      <div role="status" className="text-note text-ink-2">
        {retry.isSuccess && `The mail to ${retry.data.to} is on its way again.`}
      </div>
      {retry.isError && (
        <div role="alert" className="mt-4">
          <Notice kind="error">{failureWords(retry.error)}</Notice>
        </div>
      )}
      {data.items.length === 0 ? (
        <NothingListed>{WORDS[state].none}</NothingListed>
      ) : (
        <div className="mt-5">
          <Table label="Mail">
            <thead>
              <tr>
                <Th>To</Th>
                <Th className="max-md:hidden">About</Th>
                <Th className="max-md:hidden">State</Th>
                <Th>{state === 'sent' ? 'Written' : 'Again'}</Th>
              </tr>
            </thead>
            <tbody>
              {data.items.map((mail) => (
                <MailRow
                  key={mail.id}
                  mail={mail}
                  isRetrying={retry.isPending && retry.variables === mail.id}
                  onRetry={() => retry.mutate(mail.id)}
                />
              ))}
            </tbody>
          </Table>
        </div>
      )}
      <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
    </AdminFrame>
  );
}

interface MailRowProps {
  mail: AdminMail;
  isRetrying: boolean;
  onRetry: () => void;
}

function MailRow({ mail, isRetrying, onRetry }: MailRowProps) {
  const state = (
    <>
      {sayMailState(mail)}
      {mail.lastError !== null && (
        <span className="block text-small text-ink-2">{sayMailError(mail.lastError)}</span>
      )}
    </>
  );
  return (
    <tr>
      <RowHead className="[overflow-wrap:anywhere]">
        {mail.to}
        <span className="block text-note font-normal md:hidden">{sayMailKind(mail.kind)}</span>
        <span className="block text-note font-normal text-ink-2 md:hidden">{state}</span>
      </RowHead>
      <Td className="max-md:hidden">{sayMailKind(mail.kind)}</Td>
      <Td className="text-note max-md:hidden">{state}</Td>
      <Td className="text-note">
        {mail.state === 'waiting' || mail.state === 'failed' ? (
          <Button
            kind="quiet"
            pending={isRetrying}
            aria-label={`Send again to ${mail.to}: ${sayMailKind(mail.kind)}`}
            onClick={onRetry}
          >
            Send now
          </Button>
        ) : (
          printMoment(mail.createdAt)
        )}
      </Td>
    </tr>
  );
}
