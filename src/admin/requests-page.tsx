import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { AdminTeacherRequest } from '../../shared/admin/people.schema.ts';
import { TEACHER_REQUEST_STATES } from '../../shared/teacher-request.ts';
import { AddressSelect, readChoice } from '../ui/address-select.tsx';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { printMomentDay } from '../ui/moment.ts';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { AdminFrame, NothingListed } from './admin-frame.tsx';
import { adminRequestsQuery, useAnswerRequest, type RequestState } from './queries.ts';

const WORDS: Record<RequestState, { label: string; inList: string; none: string }> = {
  pending: { label: 'waiting', inList: 'Waiting', none: 'Nobody waits for an answer.' },
  accepted: { label: 'accepted', inList: 'Accepted', none: 'None has been accepted.' },
  declined: { label: 'declined', inList: 'Declined', none: 'None has been declined.' },
};
const OPTIONS = TEACHER_REQUEST_STATES.map((value) => ({ value, ...WORDS[value] }));

const queryOf = (url: string) =>
  adminRequestsQuery(readListAddress(url).page, readChoice(url, 'state', TEACHER_REQUEST_STATES, 'pending'));

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) =>
    client.query(queryOf(request.url));

export function Component() {
  const [search] = useSearchParams();
  const url = `?${search.toString()}`;
  const state = readChoice(url, 'state', TEACHER_REQUEST_STATES, 'pending');
  const { data } = useSuspenseQuery(queryOf(url));
  return (
    <AdminFrame
      title="Requests to teach"
      lead="Members who ask to become teachers, and what they say of it. Each is told of your answer by mail."
    >
      <p className="mt-7 text-lead text-ink-2" role="status">
        {data.total === 1 ? '1 request' : `${data.total} requests`},{' '}
        <AddressSelect label="State" name="state" value={state} usual="pending" options={OPTIONS} />
      </p>
      {data.items.length === 0 ? (
        <NothingListed>{WORDS[state].none}</NothingListed>
      ) : (
        <ul className="mt-5 max-w-[60rem] border-t border-rule">
          {data.items.map((request) => (
            <RequestRow key={request.id} request={request} />
          ))}
        </ul>
      )}
      <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
    </AdminFrame>
  );
}

function RequestRow({ request }: { request: AdminTeacherRequest }) {
  const [accept, setAccept] = useState<boolean | null>(null);
  const { person, sentence, state, createdAt, answeredAt } = request;
  return (
    <li className="border-b border-rule py-4">
      <p className="break-words">
        <span className="font-semibold">{person.name}</span>{' '}
        <span className="text-note text-ink-2">
          {person.email}, asked on {printMomentDay(createdAt)}
          {answeredAt !== null && `, answered on ${printMomentDay(answeredAt)}`}
        </span>
      </p>
      <blockquote className="mt-2 max-w-[44rem] border-l-2 border-rule pl-4 break-words">
        {sentence}
      </blockquote>
      {state === 'pending' && (
        <div className="mt-3 flex flex-wrap gap-x-7">
          <Button kind="quiet" aria-label={`Make ${person.name} a teacher`} onClick={() => setAccept(true)}>
            Make a teacher
          </Button>
          <Button kind="quiet" aria-label={`Decline ${person.name}`} onClick={() => setAccept(false)}>
            Decline
          </Button>
        </div>
      )}
      <AnswerDialog request={request} accept={accept} onClose={() => setAccept(null)} />
    </li>
  );
}

interface AnswerDialogProps {
  request: AdminTeacherRequest;
  accept: boolean | null;
  onClose: () => void;
}

function AnswerDialog({ request, accept, onClose }: AnswerDialogProps) {
  const answer = useAnswerRequest();
  const close = () => {
    answer.reset();
    onClose();
  };
  const { id, person } = request;
  return (
    <AlertDialog
      isOpen={accept !== null}
      title={accept === true ? `Make ${person.name} a teacher?` : `Decline the request of ${person.name}?`}
      cancel="Leave it waiting"
      confirm={accept === true ? 'Make a teacher' : 'Decline'}
      pending={answer.isPending}
      error={answer.isError ? failureWords(answer.error) : undefined}
      onCancel={close}
      onConfirm={() => {
        if (accept !== null) answer.mutate({ id, accept }, { onSuccess: close });
      }}
    >
      <p>
        {accept === true
          ? 'Teachers can open classes, and see there what learners share with that class.'
          : 'They stay a member and can ask again.'}{' '}
        A mail tells them, and it is written into the log.
      </p>
    </AlertDialog>
  );
}
