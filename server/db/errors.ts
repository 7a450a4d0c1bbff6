/** MariaDB's error numbers that the code acts on. */
export const ERRNO = {
  changedSinceRead: 1020,
  duplicate: 1062,
  lockWait: 1205,
  deadlock: 1213,
  stillReferred: 1451,
  noSuchReference: 1452,
} as const;

/** The database's own error number, which Drizzle keeps in the cause; null for any other error. */
export function errnoOf(error: unknown): number | null {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    if ('errno' in at && typeof at.errno === 'number' && 'sqlState' in at) return at.errno;
  }
  return null;
}

/** What may be logged of a database error: never its message, which holds the SQL with its values. */
export function describeDatabaseError(error: unknown): { errno: number; code: string } | null {
  const errno = errnoOf(error);
  if (errno === null) return null;
  const name = Object.entries(ERRNO).find(([, number]) => number === errno)?.[0];
  return { errno, code: name ?? 'database' };
}
