import type { QueryClient } from '@tanstack/react-query';
import { useEffect, useRef, type ReactNode } from 'react';
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

interface EnterPageProps {
  title: string;
  lead: ReactNode;
  /** It took the place of another step on the same address, so that the focus has to be brought to its heading. */
  isLaterStep?: boolean;
  children: ReactNode;
}

/** The frame that signing in, signing up and what the mails lead to share. */
export function EnterPage({ title, lead, isLaterStep = false, children }: EnterPageProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (isLaterStep) box.current?.querySelector('h1')?.focus();
  }, [isLaterStep, title]);
  return (
    <div ref={box} className="max-w-[27rem] pt-2 md:pt-8">
      <PageHeading title={title} />
      <div className="mt-3 mb-8 space-y-2 text-ink-2">{lead}</div>
      {children}
    </div>
  );
}
