import { useQuery } from '@tanstack/react-query';
import { paths } from '../../paths.ts';
import { TextLink } from '../../ui/link.tsx';
import { hasMailboxQuery } from '../queries.ts';

/** Where mail does not leave the machine, the way to it; nothing anywhere else. */
export function MailboxHint() {
  const { data } = useQuery(hasMailboxQuery);
  if (data !== true) return null;
  return (
    <>
      Mail does not leave this machine: it is in <TextLink to={paths.mailbox}>the mailbox here</TextLink>.
    </>
  );
}
