import { MailboxHint } from '../mailbox/parts/mailbox-hint.tsx';
import { Button } from '../ui/button.tsx';
import { Notice } from '../ui/notice.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { useSendConfirmation } from './account-queries.ts';

/** That an address waits for its confirmation, and the mail once more. */
export function ConfirmFirst({ email }: { email: string }) {
  const send = useSendConfirmation();
  return (
    <Notice kind="caution" word="Confirm your address" className="mt-8 max-w-[38rem]">
      <p className="break-words">
        We wrote to {email}. Open the link in that mail, so that we can reach you when you need a new
        password. <MailboxHint />
      </p>
      <p className="flex flex-wrap items-center gap-x-5">
        <Button kind="quiet" pending={send.isPending} onClick={() => send.mutate()}>
          {send.isPending ? 'Sending' : 'Send it again'}
        </Button>
        <span role="status" className="text-note text-ink-2">
          {send.isSuccess && 'It is on its way; only the newest link works.'}
          {send.isError && failureWords(send.error)}
        </span>
      </p>
    </Notice>
  );
}
