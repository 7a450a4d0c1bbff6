import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useParams, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { messageQuery } from './queries.ts';
import { TextWithLinks } from './text-with-links.tsx';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    client.query(messageQuery(param(params, 'mailId')));

export function Component() {
  const { data: mail } = useSuspenseQuery(messageQuery(param(useParams(), 'mailId')));
  return (
    <article className="max-w-[60rem]">
      <PageHeading title={mail.subject} above={<TextLink to={paths.mailbox}>The mailbox here</TextLink>} />
      <p className="mt-3 break-words text-ink-2">
        From {mail.from} to <span className="font-semibold text-ink">{mail.to}</span>,{' '}
        {printMoment(mail.receivedAt)}
      </p>
      <div className="mt-7 border-t-2 border-ink pt-1">
        <div className="border-t-2 border-dashed border-woad pt-6">
          <TextWithLinks text={mail.text} />
        </div>
      </div>
      <p className="mt-9 border-t border-rule pt-3 text-note break-all text-ink-2">
        The text as it was sent; the mail carries the same as HTML. Message-ID {mail.messageId}
      </p>
    </article>
  );
}
