import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { AccountSession } from '../../shared/account-answers.ts';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { printMoment, printMomentDay } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { sessionsQuery, useEndOtherSessions, useEndSession } from './account-queries.ts';
import { sayDevice } from './device-words.ts';
import { AccountSection } from './account-section.tsx';

/** Every place where somebody is signed in, and the way to end it from here. */
export function SessionsSection() {
  const { data } = useSuspenseQuery(sessionsQuery);
  const end = useEndSession();
  const endOthers = useEndOtherSessions();
  const [isAsking, setAsking] = useState(false);
  const others = data.items.filter(({ isCurrent }) => !isCurrent);
  const thisOneFirst = [...data.items.filter(({ isCurrent }) => isCurrent), ...others];
  return (
    <AccountSection
      id="sessions"
      title="Where you are signed in"
      lead="A place you do not know? Sign it out, then change your password."
    >
      {end.isError && (
        <div role="alert" className="mb-4">
          <Notice kind="error">{failureWords(end.error)}</Notice>
        </div>
      )}
      <ul className="border-t border-rule">
        {thisOneFirst.map((session) => (
          <SessionRow
            key={session.id}
            session={session}
            isEnding={end.isPending && end.variables === session.id}
            onEnd={() => end.mutate(session.id)}
          />
        ))}
      </ul>
      <p role="status" className="mt-3 text-note text-ink-2">
        {others.length === 0 ? 'Nowhere else.' : ''}
      </p>
      {others.length > 1 && (
        <p className="mt-2">
          <Button onClick={() => setAsking(true)}>Sign out everywhere else</Button>
        </p>
      )}
      <AlertDialog
        isOpen={isAsking}
        title="Sign out everywhere else?"
        cancel="Leave them"
        confirm="Sign out everywhere else"
        pending={endOthers.isPending}
        error={endOthers.isError ? failureWords(endOthers.error) : undefined}
        onCancel={() => {
          setAsking(false);
          endOthers.reset();
        }}
        onConfirm={() => endOthers.mutate(undefined, { onSuccess: () => setAsking(false) })}
      >
        <p>The {others.length} other places ask for your password again. Here you stay signed in.</p>
      </AlertDialog>
    </AccountSection>
  );
}

interface SessionRowProps {
  session: AccountSession;
  isEnding: boolean;
  onEnd: () => void;
}

function SessionRow({ session, isEnding, onEnd }: SessionRowProps) {
  const { userAgent, ipAddress, isCurrent, lastUsedAt, createdAt } = session;
  const device = sayDevice(userAgent);
  return (
    <li className="flex items-center justify-between gap-x-8 border-b border-rule py-3 max-sm:flex-wrap">
      <div className="min-w-0">
        <p className="font-semibold">
          {device}
          {isCurrent && <span className="font-normal">, this one</span>}
        </p>
        <p className="text-note text-ink-2">
          {isCurrent ? 'In use now' : `Last used ${printMoment(lastUsedAt)}`}
          {ipAddress !== null && ipAddress !== '' && `, from ${ipAddress}`}. Signed in on{' '}
          {printMomentDay(createdAt)}.
        </p>
      </div>
      {!isCurrent && (
        <Button
          kind="quiet"
          className="shrink-0"
          pending={isEnding}
          aria-label={`Sign out ${device}, last used ${printMoment(lastUsedAt)}`}
          onClick={onEnd}
        >
          {isEnding ? 'Signing out' : 'Sign out'}
        </Button>
      )}
    </li>
  );
}
