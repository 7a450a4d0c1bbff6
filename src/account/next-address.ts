import { paths } from '../paths.ts';

/** Where to go on after signing in: an address of this site, never another's, and not the sign-in page itself. */
export function nextAddress(search: URLSearchParams, origin: string): string {
  const next = search.get('next');
  if (next === null || !next.startsWith('/')) return paths.people;
  // The parser of addresses is asked, since `//host` and `/\host` name another site too.
  const url = URL.canParse(next, origin) ? new URL(next, origin) : null;
  if (url?.origin !== origin) return paths.people;
  if (url.pathname === paths.signIn || url.pathname === paths.signUp) return paths.people;
  return url.pathname + url.search + url.hash;
}
