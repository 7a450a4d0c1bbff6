import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { TOKENS_MAX, type AccessToken, type NewToken } from '../../shared/tokens/tokens.schema.ts';
import { paths } from '../paths.ts';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { Button } from '../ui/button.tsx';
import { TextLink } from '../ui/link.tsx';
import { printMoment, printMomentDay } from '../ui/moment.ts';
import { ShownOnce } from '../ui/shown-once.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { AccountSection } from './account-section.tsx';
import { TokenForm } from './token-form.tsx';
import { tokensQuery, useWithdrawToken } from './token-queries.ts';
import { sayScopes } from './token-words.ts';

/** Tokens with which a script or a spreadsheet works for somebody. */
export function TokensSection() {
  const { data } = useSuspenseQuery(tokensQuery);
  const [made, setMade] = useState<NewToken | null>(null);
  const [isMaking, setMaking] = useState(false);
  const [withdrawn, setWithdrawn] = useState<AccessToken | null>(null);
  return (
    <AccountSection
      id="tokens"
      title="Tokens for scripts"
      lead={
        <p>
          With a token, a script or a spreadsheet works in your name, without your password.{' '}
          <TextLink to={paths.interface}>What it can ask for</TextLink>
        </p>
      }
    >
      {made !== null && <MadeToken made={made} onKept={() => setMade(null)} />}
      {data.items.length === 0 ? (
        <p className="text-ink-2">You have made none.</p>
      ) : (
        <ul className="border-t border-rule">
          {data.items.map((token) => (
            <TokenRow key={token.id} token={token} onWithdraw={() => setWithdrawn(token)} />
          ))}
        </ul>
      )}
      {isMaking ? (
        <div className="mt-7">
          <TokenForm
            onMade={(token) => {
              setMade(token);
              setMaking(false);
            }}
            onCancel={() => setMaking(false)}
          />
        </div>
      ) : (
        <p className="mt-5">
          {data.items.length < TOKENS_MAX ? (
            <Button onClick={() => setMaking(true)}>Make a token</Button>
          ) : (
            `You have ${TOKENS_MAX}, the most there can be: withdraw one first.`
          )}
        </p>
      )}
      <WithdrawDialog token={withdrawn} onClose={() => setWithdrawn(null)} />
    </AccountSection>
  );
}

function MadeToken({ made, onKept }: { made: NewToken; onKept: () => void }) {
  return (
    <div role="status" className="mb-9">
      <ShownOnce
        label="The token"
        lines={[made.token]}
        fileName="leeway-token.txt"
        fileHead={`A token for Leeway: ${made.name}. Whoever has it works in your name.`}
      >
        <p className="font-semibold">The token “{made.name}” is made.</p>
        <p>Keep it as you keep a password. It is shown now and never again.</p>
      </ShownOnce>
      <p className="mt-4">
        <Button kind="quiet" onClick={onKept}>
          I have kept it
        </Button>
      </p>
    </div>
  );
}

function TokenRow({ token, onWithdraw }: { token: AccessToken; onWithdraw: () => void }) {
  const { name, prefix, scopes, lastUsedAt, expiresAt } = token;
  return (
    <li className="flex items-center justify-between gap-x-8 border-b border-rule py-3 max-sm:flex-wrap">
      <div className="min-w-0">
        <p className="font-semibold break-words">
          {name} <span className="font-normal text-ink-2">{prefix}…</span>
        </p>
        <p className="text-note">{sayScopes(scopes)}.</p>
        <p className="text-note text-ink-2">
          {lastUsedAt === null ? 'Not used yet' : `Last used ${printMoment(lastUsedAt)}`}. {sayEnd(expiresAt)}
        </p>
      </div>
      <Button kind="quiet" className="shrink-0" aria-label={`Withdraw ${name}`} onClick={onWithdraw}>
        Withdraw
      </Button>
    </li>
  );
}

function sayEnd(expiresAt: string | null): string {
  if (expiresAt === null) return 'Works until you withdraw it.';
  const day = printMomentDay(expiresAt);
  return Date.parse(expiresAt) < Date.now() ? `Ended on ${day}.` : `Works until ${day}.`;
}

function WithdrawDialog({ token, onClose }: { token: AccessToken | null; onClose: () => void }) {
  const withdraw = useWithdrawToken();
  const close = () => {
    withdraw.reset();
    onClose();
  };
  return (
    <AlertDialog
      isOpen={token !== null}
      title={`Withdraw “${token?.name ?? ''}”?`}
      confirm="Withdraw it"
      pending={withdraw.isPending}
      error={withdraw.isError ? failureWords(withdraw.error) : undefined}
      onCancel={close}
      onConfirm={() => {
        if (token !== null) withdraw.mutate(token.id, { onSuccess: close });
      }}
    >
      <p>Whatever works with it is refused from that moment on. It cannot be brought back.</p>
    </AlertDialog>
  );
}
