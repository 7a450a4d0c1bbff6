import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { confirmedAddressSchema } from '../../shared/account-answers.ts';
import { request } from '../api/request.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { ButtonLink } from '../ui/link.tsx';
import { linkWords } from './enter-error.ts';
import { EnterPage } from './enter-page.tsx';
import { meQuery } from './queries.ts';

/** Confirms an address by the link that was mailed: on a press, since programs that look through mail open links. */
export function Component() {
  const [search] = useSearchParams();
  const client = useQueryClient();
  const token = search.get('token') ?? '';
  const confirm = useMutation({
    mutationFn: () =>
      request('/api/auth/verify-email', confirmedAddressSchema, { method: 'POST', body: { token } }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: ['account'] }),
        client.invalidateQueries({ queryKey: meQuery.queryKey }),
      ]);
    },
  });
  if (confirm.isSuccess) return <Confirmed email={confirm.data.email} />;
  if (confirm.isError) return <NotConfirmed words={linkWords(confirm.error)} />;
  if (token.trim() === '')
    return <NotConfirmed words="The link is not whole: open it from the mail again." />;
  return (
    <EnterPage
      title="Confirm your e-mail address"
      lead={<p>One press, and we know that our mail reaches you.</p>}
    >
      <Button kind="primary" pending={confirm.isPending} onClick={() => confirm.mutate()}>
        {confirm.isPending ? 'Confirming' : 'Confirm the address'}
      </Button>
    </EnterPage>
  );
}

function Confirmed({ email }: { email: string }) {
  const { data: me } = useQuery(meQuery);
  return (
    <EnterPage
      title="Your address is confirmed"
      isLaterStep
      lead={<p className="break-words">From now on we reach you at {email}.</p>}
    >
      {me?.user ? (
        <ButtonLink kind="primary" to={paths.account}>
          To your account
        </ButtonLink>
      ) : (
        <ButtonLink kind="primary" to={paths.signIn}>
          Sign in
        </ButtonLink>
      )}
    </EnterPage>
  );
}

function NotConfirmed({ words }: { words: string }) {
  return (
    <EnterPage title="The address is not confirmed" isLaterStep lead={<p role="alert">{words}</p>}>
      <ButtonLink to={paths.account}>To your account, to send another link</ButtonLink>
    </EnterPage>
  );
}
