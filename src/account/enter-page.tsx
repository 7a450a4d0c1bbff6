import type { QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import { PageHeading } from '../ui/page-heading.tsx';
import { nextAddress } from './next-address.ts';
import { meQuery } from './queries.ts';

/** Who is signed in already has no need of these pages. */
export const skipWhenSignedIn =
  (client: QueryClient) =>
  async ({ request }: LoaderFunctionArgs) => {
    const me = await client.query(meQuery).catch(() => null);
    const url = new URL(request.url);
    if (me?.user) throw redirect(nextAddress(url.searchParams, url.origin));
    return null;
  };

/** The frame that signing in and signing up share. */
export function EnterPage({
  title,
  lead,
  children,
}: {
  title: string;
  lead: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="max-w-[26rem] pt-2 md:pt-8">
      <PageHeading title={title} />
      <p className="mt-3 mb-8 text-ink-2">{lead}</p>
      {children}
    </div>
  );
}
