import type { QueryClient } from '@tanstack/react-query';
import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import { meQuery } from '../account/queries.ts';
import { ProblemError } from '../api/problem-error.ts';
import { paths } from '../paths.ts';

/** Where to sign in, and where to go on afterwards. */
export function signInAddress(url: URL): string {
  const next = url.pathname + url.search;
  return `${paths.signIn}?${new URLSearchParams({ next }).toString()}`;
}

/**
 * Guards a page that belongs to somebody: nobody signed in goes to the sign-in page and comes back. What the page
 * needs is asked for only then, so that no request is sent that must be refused.
 */
export const forSignedIn =
  (client: QueryClient, read: ((args: LoaderFunctionArgs) => unknown) | null) =>
  async (args: LoaderFunctionArgs): Promise<unknown> => {
    const address = signInAddress(new URL(args.request.url));
    const me = await client.query(meQuery);
    if (!me.user) throw redirect(address);
    try {
      return (await read?.(args)) ?? null;
    } catch (error) {
      // A session that ended meanwhile shows as a refused request.
      if (!(error instanceof ProblemError) || error.status !== 401) throw error;
      client.setQueryData(meQuery.queryKey, { user: null });
      throw redirect(address);
    }
  };

/** Guards a page of the administration: whoever is signed in but no administrator finds nothing there. */
export const forAdministrators = (
  client: QueryClient,
  read: ((args: LoaderFunctionArgs) => unknown) | null,
) =>
  forSignedIn(client, async (args) => {
    const me = await client.query(meQuery);
    if (me.user?.role !== 'admin') throw new Response(null, { status: 404 });
    try {
      return await read?.(args);
    } catch (error) {
      // The role was taken away since the browser last asked.
      if (!(error instanceof ProblemError) || error.status !== 403) throw error;
      await client.invalidateQueries({ queryKey: meQuery.queryKey });
      throw new Response(null, { status: 404 });
    }
  });
