import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { teacherRequestInputSchema, type TeacherRequest } from '../../shared/teacher-request.ts';
import type { Role } from '../../shared/me.ts';
import { Button } from '../ui/button.tsx';
import { TextArea } from '../ui/field.tsx';
import { FormErrors } from '../ui/form-errors.tsx';
import { printMomentDay } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { failureWords, summaryOf, useServerErrors } from '../ui/use-server-errors.ts';
import { useAskToTeach, useWithdrawAsking } from './account-queries.ts';
import { AccountSection } from './account-section.tsx';

interface TeachingProps {
  role: Role;
  request: TeacherRequest | null;
}

/** Asking to become a teacher, and what became of it. */
export function TeachingSection({ role, request }: TeachingProps) {
  return (
    <AccountSection
      id="teaching"
      title="Teaching"
      lead={<p>A teacher opens classes and helps learners choose before anyone cuts.</p>}
    >
      {role !== 'member' ? (
        <p>{role === 'teacher' ? 'You are a teacher here.' : 'As an administrator you can teach as well.'}</p>
      ) : request?.state === 'pending' ? (
        <Waiting request={request} />
      ) : (
        <>
          {request?.state === 'declined' && (
            <Notice word="Answered" className="mb-6">
              <p>
                Your request of {printMomentDay(request.createdAt)} was declined
                {request.answeredAt !== null && ` on ${printMomentDay(request.answeredAt)}`}. You can ask
                again.
              </p>
            </Notice>
          )}
          <AskToTeach />
        </>
      )}
    </AccountSection>
  );
}

function Waiting({ request }: { request: TeacherRequest }) {
  const withdraw = useWithdrawAsking();
  return (
    <>
      <p>You asked on {printMomentDay(request.createdAt)}. An administrator will answer, by mail too.</p>
      <blockquote className="mt-3 border-l-2 border-rule pl-4 break-words text-ink-2">
        {request.sentence}
      </blockquote>
      {withdraw.isError && (
        <div role="alert" className="mt-3">
          <Notice kind="error">{failureWords(withdraw.error)}</Notice>
        </div>
      )}
      <p className="mt-3">
        <Button kind="quiet" pending={withdraw.isPending} onClick={() => withdraw.mutate()}>
          Take the request back
        </Button>
      </p>
    </>
  );
}

function AskToTeach() {
  const ask = useAskToTeach();
  const form = useForm({
    resolver: zodResolver(teacherRequestInputSchema),
    defaultValues: { sentence: '' },
    shouldFocusError: false,
  });
  const { errors, submitCount } = form.formState;
  const server = useServerErrors(form, ['sentence']);
  const send = form.handleSubmit((values) => {
    server.clear();
    ask.mutate(values, { onError: server.place });
  });
  return (
    <form noValidate className="space-y-5" onSubmit={(event) => void send(event)}>
      <FormErrors
        items={summaryOf(errors, [{ name: 'sentence', label: 'What you teach' }], server.rest)}
        attempt={submitCount + ask.failureCount}
      />
      <TextArea
        {...form.register('sentence')}
        id="sentence"
        label="What you teach"
        hint="One sentence for the administrator: what, where, to whom."
        maxLength={500}
        error={errors.sentence?.message}
      />
      <Button type="submit" pending={ask.isPending}>
        Ask to become a teacher
      </Button>
    </form>
  );
}
