/** What a request says of the way it came. */
interface Way {
  /** The host that was asked for, as the browser wrote it. */
  hostname: string | undefined;
  /** Headers that a proxy adds. */
  forwarded: (string | undefined)[];
}

const NEAR = /^(localhost|127(\.\d{1,3}){3}|\[?::1\]?)$/i;

/**
 * Links in the mailbox open accounts, so only a browser on this machine may read it: not through a proxy, and not by another
 * site's name that was made to point here.
 */
export function mayReadMailbox({ hostname, forwarded }: Way): boolean {
  return hostname !== undefined && NEAR.test(hostname) && forwarded.every((value) => value === undefined);
}
