import { and, count, desc, eq, lt, lte, or, sql } from 'drizzle-orm';
import type { PageQuery } from '../../shared/paging.ts';
import type { Db } from '../db/client.ts';
import { newId } from '../db/columns.ts';
import { ERRNO, errnoOf } from '../db/errors.ts';
import type { Letter } from './letter.ts';
import { outbox, type MAIL_STATES } from './mail.table.ts';

export type MailState = (typeof MAIL_STATES)[number];

/** A mail to write. */
export interface NewMail {
  to: string;
  /** Whose account it concerns; it goes when the account goes. */
  userId: string | null;
  /** One word for the list of mail, such as `password-reset`. */
  kind: string;
  letter: Letter;
  /** After this the link in it no longer works, and it is not worth sending. */
  usefulUntil?: Date;
}

/** A mail in hand: nobody else sends it while the lease holds. */
export interface ClaimedMail {
  id: string;
  leaseToken: string;
  to: string;
  letter: Letter;
  messageId: string;
  attempts: number;
  isUseful: boolean;
}

// The database's clock decides, so that two senders whose own clocks differ agree.
const now = sql`NOW(3)`;
const inMs = (ms: number) => sql`NOW(3) + INTERVAL ${ms * 1000} MICROSECOND`;
const isDue = or(
  and(eq(outbox.state, 'waiting'), lte(outbox.nextAt, now)),
  and(eq(outbox.state, 'sending'), lt(outbox.leaseUntil, now)),
);

/**
 * Writes a mail into the outbox. Give it the transaction of what the mail tells of, so that either both happen or neither.
 * The Message-ID is settled here: a mail that is sent twice after a crash is known as one.
 */
export async function writeMail(tx: Db, mailFrom: string, mail: NewMail): Promise<string> {
  const id = newId();
  const createdAt = new Date();
  await tx.insert(outbox).values({
    id,
    to: mail.to,
    userId: mail.userId,
    kind: mail.kind,
    payload: mail.letter,
    state: 'waiting',
    attempts: 0,
    nextAt: createdAt,
    usefulUntil: mail.usefulUntil ?? null,
    messageId: `<${id}@${domainOf(mailFrom)}>`,
    createdAt,
  });
  return id;
}

/** `Leeway <leeway@example.org>` gives `example.org`. */
function domainOf(mailFrom: string): string {
  return /@([^<>@\s]+?)>?$/.exec(mailFrom)?.[1] ?? 'localhost';
}

/**
 * Claims the mail that has been due longest, or null. The claim is one committed UPDATE of one row that names the state it
 * expects: of two processes one changes the row, and of two cluster nodes that both did, one is told of a deadlock.
 */
export async function claimMail(db: Db, leaseMs: number): Promise<ClaimedMail | null> {
  const [next] = await db
    .select({ id: outbox.id })
    .from(outbox)
    .where(isDue)
    .orderBy(outbox.nextAt, outbox.id)
    .limit(1);
  if (next === undefined) return null;
  const leaseToken = newId();
  try {
    const [claimed] = await db
      .update(outbox)
      .set({
        state: 'sending',
        leaseToken,
        leaseUntil: inMs(leaseMs),
        attempts: sql`${outbox.attempts} + 1`,
      })
      .where(and(eq(outbox.id, next.id), isDue));
    // Another was quicker: look again.
    if (claimed.affectedRows === 0) return await claimMail(db, leaseMs);
  } catch (error) {
    if (errnoOf(error) === ERRNO.deadlock) return claimMail(db, leaseMs);
    throw error;
  }
  return readClaimed(db, next.id, leaseToken);
}

async function readClaimed(db: Db, id: string, leaseToken: string): Promise<ClaimedMail | null> {
  const [row] = await db
    .select({
      to: outbox.to,
      letter: outbox.payload,
      messageId: outbox.messageId,
      attempts: outbox.attempts,
      isUseful: sql`${outbox.usefulUntil} IS NULL OR ${outbox.usefulUntil} > NOW(3)`.mapWith(Boolean),
    })
    .from(outbox)
    .where(and(eq(outbox.id, id), eq(outbox.leaseToken, leaseToken)));
  // Its account may have been deleted since.
  if (row?.letter == null) return null;
  return { ...row, letter: row.letter, id, leaseToken };
}

const NOBODY = { leaseToken: null, leaseUntil: null };
const held = ({ id, leaseToken }: ClaimedMail) => and(eq(outbox.id, id), eq(outbox.leaseToken, leaseToken));

/** Writes down that it went out, and forgets what it said. False where the lease was lost meanwhile. */
export async function markSent(db: Db, mail: ClaimedMail): Promise<boolean> {
  const [done] = await db
    .update(outbox)
    .set({ ...NOBODY, state: 'sent', sentAt: now, payload: null, lastError: null })
    .where(held(mail));
  return done.affectedRows === 1;
}

/** Puts it back until later. */
export async function putBack(db: Db, mail: ClaimedMail, afterMs: number, lastError: string): Promise<void> {
  await db
    .update(outbox)
    .set({ ...NOBODY, state: 'waiting', nextAt: inMs(afterMs), lastError })
    .where(held(mail));
}

/** Gives it up; an administrator may send it on its way again. */
export async function markFailed(db: Db, mail: ClaimedMail, lastError: string): Promise<void> {
  await db
    .update(outbox)
    .set({ ...NOBODY, state: 'failed', lastError })
    .where(held(mail));
}

/** Forgets mail that went out or was given up long ago. */
export async function forgetOldMail(db: Db, days: number): Promise<void> {
  const old = sql`NOW(3) - INTERVAL ${days} DAY`;
  await db
    .delete(outbox)
    .where(and(or(eq(outbox.state, 'sent'), eq(outbox.state, 'failed')), lt(outbox.createdAt, old)));
}

const listed = {
  id: outbox.id,
  to: outbox.to,
  kind: outbox.kind,
  state: outbox.state,
  attempts: outbox.attempts,
  nextAt: outbox.nextAt,
  createdAt: outbox.createdAt,
  sentAt: outbox.sentAt,
  lastError: outbox.lastError,
};

/** A mail as the list of mail shows it: never what it says. */
export type ListedMail = Pick<typeof outbox.$inferSelect, keyof typeof listed>;

/** Mail in a state, or all of it, the latest written first, and how many there are. */
export async function listMail(
  db: Db,
  state: MailState | null,
  { page, pageSize }: PageQuery,
): Promise<{ mail: ListedMail[]; total: number }> {
  const wanted = state === null ? undefined : eq(outbox.state, state);
  const mail = await db
    .select(listed)
    .from(outbox)
    .where(wanted)
    .orderBy(desc(outbox.createdAt), desc(outbox.id))
    .limit(pageSize)
    .offset((page - 1) * pageSize);
  const [counted] = await db.select({ total: count() }).from(outbox).where(wanted);
  return { mail, total: counted?.total ?? 0 };
}

export async function findMail(db: Db, id: string): Promise<ListedMail | null> {
  const [row] = await db.select(listed).from(outbox).where(eq(outbox.id, id));
  return row ?? null;
}

/** Sends a mail that was given up, or that waits for its next attempt, on its way at once. False where it is neither. */
export async function retryMail(db: Db, id: string): Promise<boolean> {
  const [done] = await db
    .update(outbox)
    .set({ state: 'waiting', attempts: 0, nextAt: now })
    .where(and(eq(outbox.id, id), or(eq(outbox.state, 'failed'), eq(outbox.state, 'waiting'))));
  return done.affectedRows === 1;
}
