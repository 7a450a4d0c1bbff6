import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Account } from '../../shared/account-answers.ts';
import { PageHeading } from '../ui/page-heading.tsx';
import { accountQuery, sessionsQuery } from './account-queries.ts';
import { AccountSentence, readChange, type Change } from './account-sentence.tsx';
import { ChangeEmail } from './change-email.tsx';
import { ChangeName } from './change-name.tsx';
import { ChangePart } from './change-part.tsx';
import { ChangePassword } from './change-password.tsx';
import { ConfirmFirst } from './confirm-first.tsx';
import { DeleteSection, TakeAwaySection } from './leaving-section.tsx';
import { SecondFactor } from './second-factor.tsx';
import { SessionsSection } from './sessions-section.tsx';
import { TeachingSection } from './teaching-section.tsx';
import { tokensQuery } from './token-queries.ts';
import { TokensSection } from './tokens-section.tsx';

export const loader = (client: QueryClient) => async () => {
  await Promise.all([client.query(accountQuery), client.query(sessionsQuery), client.query(tokensQuery)]);
  return null;
};

const TITLES: Record<Change, string> = {
  name: 'Another name',
  email: 'Another e-mail address',
  password: 'Another password',
  'second-factor': 'A second factor',
};

/** The account: who one is in a sentence, each word of it to be changed in place, and what belongs to it below. */
export function Component() {
  const { data: account } = useSuspenseQuery(accountQuery);
  const [search, setSearch] = useSearchParams();
  const [said, setSaid] = useState('');
  const open = readChange(search);
  const show = (change: Change | null) => {
    setSearch(change === null ? {} : { change }, { replace: true, preventScrollReset: true });
  };
  const close = (words: string) => {
    setSaid(words);
    // The word that opened it is where somebody goes on from.
    if (open !== null) document.getElementById(`word-${open}`)?.focus();
    show(null);
  };
  return (
    <>
      <PageHeading title="Your account" />
      <AccountSentence
        account={account}
        open={open}
        onOpen={(change) => {
          setSaid('');
          show(change === open ? null : change);
        }}
      />
      <p role="status" className={said === '' ? '' : 'mt-5 max-w-[46rem] border-l-2 border-woad py-1 pl-4'}>
        {said}
      </p>
      {open !== null && (
        <ChangePart key={open} id={`change-${open}`} title={TITLES[open]} onClose={() => close('')}>
          <ChangeForm change={open} account={account} onDone={close} />
        </ChangePart>
      )}
      {!account.emailVerified && <ConfirmFirst email={account.email} />}
      <div className="mt-14 grid gap-x-20 gap-y-14 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <div className="space-y-14">
          <SessionsSection />
          <TokensSection />
        </div>
        <div className="space-y-14">
          <TeachingSection role={account.role} request={account.teacherRequest} />
          <TakeAwaySection />
          <DeleteSection />
        </div>
      </div>
    </>
  );
}

interface ChangeFormProps {
  change: Change;
  account: Account;
  onDone: (words: string) => void;
}

function ChangeForm({ change, account, onDone }: ChangeFormProps) {
  switch (change) {
    case 'name':
      return <ChangeName name={account.name} onDone={onDone} />;
    case 'email':
      return <ChangeEmail onDone={onDone} />;
    case 'password':
      return <ChangePassword email={account.email} onDone={onDone} />;
    case 'second-factor':
      return <SecondFactor account={account} onDone={onDone} />;
  }
}
