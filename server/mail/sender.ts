import { setTimeout as wait } from 'node:timers/promises';
import type { Logger } from 'pino';
import type { Db } from '../db/client.ts';
import { describeDatabaseError } from '../db/errors.ts';
import { setLetter } from './letter.ts';
import { claimMail, forgetOldMail, markFailed, markSent, putBack, type ClaimedMail } from './outbox.store.ts';
import { describeMailError, type MailTransport } from './transport.ts';

export interface SenderOptions {
  db: Db;
  transport: MailTransport;
  from: string;
  log: Logger;
  /** How long to rest when nothing is due. */
  restMs?: number;
  /** How long a claimed mail is this sender's alone. */
  leaseMs?: number;
  /** How long one mail may take: well within the lease, so that no two senders ever have the same one. */
  patienceMs?: number;
}

/** A sender at work. */
export interface Sender {
  /** Finishes the mail under way, then takes no other. */
  stop: () => Promise<void>;
}

const ATTEMPTS = 9;
const FIRST_PAUSE_MS = 30_000;
const LONGEST_PAUSE_MS = 6 * 3_600_000;
const KEPT_DAYS = 30;
const HOUR_MS = 3_600_000;

/** 30 s, 2 min, 8 min, 32 min, 2 h, then every 6 h: about a day in all. */
export function pauseAfter(attempts: number): number {
  return Math.min(FIRST_PAUSE_MS * 4 ** (attempts - 1), LONGEST_PAUSE_MS);
}

/** Sends what is due, one mail after another, until it is stopped. */
export function startSender(options: SenderOptions): Sender {
  const stopping = new AbortController();
  const finished = work({ restMs: 1000, leaseMs: 300_000, patienceMs: 120_000, ...options }, stopping.signal);
  return {
    async stop() {
      stopping.abort();
      await finished;
      options.transport.close();
    },
  };
}

async function work(options: Required<SenderOptions>, stopping: AbortSignal): Promise<void> {
  let tidiedAt = 0;
  while (!stopping.aborted) {
    let isIdle = true;
    try {
      if (Date.now() - tidiedAt > HOUR_MS) {
        tidiedAt = Date.now();
        await forgetOldMail(options.db, KEPT_DAYS);
      }
      const mail = await claimMail(options.db, options.leaseMs);
      isIdle = mail === null;
      if (mail !== null) await sendOne(options, mail);
    } catch (error) {
      isIdle = true;
      options.log.warn(sayError(error), 'the outbox could not be read');
    }
    if (isIdle) await wait(options.restMs, undefined, { signal: stopping }).catch(() => undefined);
  }
}

async function sendOne(options: Required<SenderOptions>, mail: ClaimedMail): Promise<void> {
  const { db, transport, from, log, patienceMs } = options;
  if (!mail.isUseful) return markFailed(db, mail, 'the link in it has run out');
  try {
    const { to, messageId, letter } = mail;
    await within(
      patienceMs,
      transport.send({ from, to, messageId, subject: letter.subject, ...setLetter(letter) }),
    );
  } catch (error) {
    const { words, isFinal } = describeMailError(error);
    log.warn({ mail: mail.id, attempt: mail.attempts, error: words }, 'a mail did not go out');
    if (isFinal || mail.attempts >= ATTEMPTS) await markFailed(db, mail, words);
    else await putBack(db, mail, pauseAfter(mail.attempts), words);
    return;
  }
  if (!(await markSent(db, mail))) log.warn({ mail: mail.id }, 'a mail went out after its lease had ended');
}

/** The work, or a failure where it takes longer. */
async function within(ms: number, work: Promise<void>): Promise<void> {
  const given = new AbortController();
  const late = wait(ms, undefined, { signal: given.signal }).then(() => {
    throw Object.assign(new Error('A mail took too long.'), { code: 'ETIMEDOUT' });
  });
  try {
    await Promise.race([work, late]);
  } finally {
    given.abort();
  }
}

function sayError(error: unknown): Record<string, unknown> {
  const database = describeDatabaseError(error);
  return database === null ? { error: error instanceof Error ? error.name : typeof error } : { database };
}
