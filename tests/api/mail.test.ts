import { eq, sql } from 'drizzle-orm';
import { pino } from 'pino';
import { afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createDatabase, type Database } from '../../server/db/client.ts';
import { inTransaction } from '../../server/db/transaction.ts';
import { setLetter, type Letter } from '../../server/mail/letter.ts';
import { outbox } from '../../server/mail/mail.table.ts';
import { claimMail, markSent, putBack, retryMail, writeMail } from '../../server/mail/outbox.store.ts';
import { pauseAfter, startSender, type Sender } from '../../server/mail/sender.ts';
import { smtpTransport } from '../../server/mail/transport.ts';
import { startMail } from '../../server/start-mail.ts';
import { testDatabase, type TestDatabase } from '../support/database.ts';
import { testSmtp, until, type TestSmtp } from '../support/smtp.ts';

let first: TestDatabase;
/** Another process's own connections to the same database. */
let second: Database;
let smtp: TestSmtp;
const FROM = 'Leeway <leeway@example.org>';
const lines: string[] = [];
const log = pino({ level: 'trace' }, { write: (line: string) => void lines.push(line) });
let senders: Sender[] = [];

beforeAll(async () => {
  first = await testDatabase();
  second = createDatabase(first.url, { connections: 4 });
  smtp = await testSmtp();
  return () => second.close();
});
beforeEach(async () => {
  await first.db.delete(outbox);
  smtp.received.length = 0;
  smtp.refusals.length = 0;
  smtp.slowMs = 0;
  lines.length = 0;
});
afterEach(async () => {
  await Promise.all(senders.map((sender) => sender.stop()));
  senders = [];
});

const LETTER: Letter = {
  subject: 'Größe 42, “roomier”',
  greets: 'Zoë <b>',
  lines: ['A first line & more.'],
  link: { words: 'Open it', url: 'https://leeway.example.org/x?token=a&b=c' },
  after: ['A last line.'],
};

const write = (to: string, more: object = {}) =>
  writeMail(first.db, FROM, { to, userId: null, kind: 'test', letter: LETTER, ...more });
const rowOf = async (id: string) => (await first.db.select().from(outbox).where(eq(outbox.id, id)))[0]!;
const send = (database: Database = first, options: object = {}): Sender => {
  const sender = startSender({
    db: database.db,
    log,
    from: FROM,
    transport: smtpTransport(smtp.url),
    restMs: 20,
    ...options,
  });
  senders.push(sender);
  return sender;
};
const countOf = async (state: 'waiting' | 'sending' | 'sent' | 'failed') =>
  (await first.db.select().from(outbox).where(eq(outbox.state, state))).length;

describe('the outbox', () => {
  it('takes part in the transaction of what it tells of', async () => {
    const id = { value: '' };
    const failed = inTransaction(first.db, async (tx) => {
      id.value = await writeMail(tx, FROM, {
        to: 'a@example.org',
        userId: null,
        kind: 'test',
        letter: LETTER,
      });
      throw new RangeError('what it tells of did not happen');
    });
    await expect(failed).rejects.toThrow('did not happen');
    expect(await first.db.select().from(outbox)).toEqual([]);
  });

  it('settles the Message-ID once and for all', async () => {
    const id = await write('a@example.org');
    expect((await rowOf(id)).messageId).toBe(`<${id}@example.org>`);
    await expect(
      first.db.insert(outbox).values({ ...(await rowOf(id)), id: crypto.randomUUID() }),
    ).rejects.toThrow();
  });

  it('gives a mail to one of two processes, and to another only once the lease has run out', async () => {
    const id = await write('a@example.org');
    const claims = await Promise.all([claimMail(first.db, 60_000), claimMail(second.db, 60_000)]);
    const held = claims.filter((claim) => claim !== null);
    expect(held.map((claim) => claim.id)).toEqual([id]);
    expect(await claimMail(second.db, 60_000)).toBeNull();

    await first.db.update(outbox).set({ leaseUntil: sql`NOW(3) - INTERVAL 1 SECOND` });
    const taken = await claimMail(second.db, 60_000);
    expect(taken).toMatchObject({ id, attempts: 2, messageId: held[0]!.messageId });
    // Who was too slow can neither end it nor put it back.
    expect(await markSent(first.db, held[0]!)).toBe(false);
    await putBack(first.db, held[0]!, 0, 'late');
    expect(await rowOf(id)).toMatchObject({ state: 'sending', lastError: null });
    expect(await markSent(second.db, taken!)).toBe(true);
  });

  it('shares a hundred mails among eight claims at once, each to one', async () => {
    for (let at = 0; at < 100; at += 1) await write(`a${String(at)}@example.org`);
    const taken: string[] = [];
    await Promise.all(
      Array.from({ length: 8 }, async (_, at) => {
        for (;;) {
          const claim = await claimMail(at % 2 === 0 ? first.db : second.db, 60_000);
          if (claim === null) return;
          taken.push(claim.id);
        }
      }),
    );
    expect(taken).toHaveLength(100);
    expect(new Set(taken).size).toBe(100);
  });
});

describe('sending', () => {
  it('delivers text and HTML over SMTP, then forgets what was said', async () => {
    const id = await write('to@example.org');
    send();
    await until(async () => (await countOf('sent')) === 1, 'it was sent');
    const [mail] = smtp.received;
    expect(mail).toMatchObject({ from: 'leeway@example.org', to: ['to@example.org'] });
    expect(mail?.raw).toContain(`Message-ID: <${id}@example.org>`);
    expect(mail?.raw).toContain('multipart/alternative');
    expect(mail?.raw).toContain('Auto-Submitted: auto-generated');
    const row = await rowOf(id);
    expect(row).toMatchObject({
      state: 'sent',
      attempts: 1,
      payload: null,
      lastError: null,
      leaseToken: null,
    });
    expect(row.sentAt).toBeInstanceOf(Date);
  });

  it('sends nothing twice with two senders on one database', async () => {
    smtp.slowMs = 5;
    for (let at = 0; at < 40; at += 1) await write(`to-${String(at)}@example.org`);
    send(first);
    send(second);
    await until(async () => (await countOf('sent')) === 40, 'all were sent', 20_000);
    const addresses = smtp.received.flatMap(({ to }) => to);
    expect(addresses).toHaveLength(40);
    expect(new Set(addresses).size).toBe(40);
  });

  it('tries again later after a refusal for now, with the same Message-ID and no address written down', async () => {
    smtp.refusals.push({ at: 'data', code: 451 });
    const id = await write('to@example.org');
    send();
    await until(
      async () => (await rowOf(id)).attempts === 1 && (await countOf('waiting')) === 1,
      'it was put back',
    );
    const row = await rowOf(id);
    expect(row.lastError).toBe('EMESSAGE 451');
    const pause = row.nextAt.getTime() - Date.now();
    expect(pause).toBeGreaterThan(25_000);
    expect(pause).toBeLessThanOrEqual(30_000);
    expect(lines.join('')).toContain('a mail did not go out');
    expect(lines.join('')).not.toMatch(/@example\.org/);
    await first.db.update(outbox).set({ nextAt: sql`NOW(3)` });
    await until(async () => (await countOf('sent')) === 1, 'it was sent');
    expect(smtp.received.map(({ raw }) => /Message-ID: (\S+)/.exec(raw)?.[1])).toEqual([
      `<${id}@example.org>`,
    ]);
    expect((await rowOf(id)).attempts).toBe(2);
  });

  it('gives up at once where the address is refused for good, and can be told to try again', async () => {
    smtp.refusals.push({ at: 'recipient', code: 550 });
    const id = await write('to@example.org');
    send();
    await until(async () => (await countOf('failed')) === 1, 'it was given up');
    expect(await rowOf(id)).toMatchObject({ attempts: 1, lastError: 'EENVELOPE 550' });
    expect(await retryMail(first.db, id)).toBe(true);
    await until(async () => (await countOf('sent')) === 1, 'it was sent');
    expect(await retryMail(first.db, id)).toBe(false);
  });

  it('goes on after mails that cannot be delivered', async () => {
    smtp.refusals.push({ at: 'recipient', code: 550 });
    await write('one@example.org');
    await write('two@example.org');
    send();
    await until(() => smtp.received.length === 1, 'the second was sent');
    expect(smtp.received[0]?.to).toEqual(['two@example.org']);
  });

  it('waits where no server answers, then gives up after about a day', async () => {
    const id = await write('to@example.org');
    const closed = smtpTransport('smtp://127.0.0.1:1');
    senders.push(startSender({ db: first.db, log, from: FROM, transport: closed, restMs: 20 }));
    await until(
      async () => (await rowOf(id)).attempts === 1 && (await countOf('waiting')) === 1,
      'it was put back',
    );
    expect((await rowOf(id)).lastError).toBe('ESOCKET');
    for (let attempt = 2; attempt <= 9; attempt += 1) {
      await first.db.update(outbox).set({ nextAt: sql`NOW(3)` });
      await until(
        async () => {
          const row = await rowOf(id);
          return row.attempts === attempt && row.state !== 'sending';
        },
        `attempt ${String(attempt)}`,
      );
    }
    expect((await rowOf(id)).state).toBe('failed');
    const pauses = Array.from({ length: 8 }, (_, at) => pauseAfter(at + 1));
    expect(pauses.slice(0, 4)).toEqual([30_000, 120_000, 480_000, 1_920_000]);
    const hours = pauses.reduce((sum, pause) => sum + pause, 0) / 3_600_000;
    expect(hours).toBeGreaterThan(20);
    expect(hours).toBeLessThan(24);
  });

  it('does not send a link that has run out meanwhile', async () => {
    const id = await write('to@example.org', { usefulUntil: new Date(Date.now() - 1000) });
    send();
    await until(async () => (await countOf('failed')) === 1, 'it was given up');
    expect((await rowOf(id)).lastError).toBe('the link in it has run out');
    expect(smtp.received).toEqual([]);
  });

  it('finishes the mail under way when it is stopped, and takes no other', async () => {
    smtp.slowMs = 300;
    await write('one@example.org');
    await write('two@example.org');
    const sender = send();
    await until(() => smtp.underWay() === 1, 'a mail is under way');
    await sender.stop();
    expect(smtp.received.map(({ to }) => to)).toEqual([['one@example.org']]);
    expect([await countOf('sent'), await countOf('waiting')]).toEqual([1, 1]);
  });

  it('never keeps a mail longer than its lease', async () => {
    smtp.slowMs = 500;
    const id = await write('to@example.org');
    send(first, { patienceMs: 50, leaseMs: 5000 });
    await until(async () => (await rowOf(id)).lastError !== null, 'it was put back');
    expect(await rowOf(id)).toMatchObject({ state: 'waiting', lastError: 'ETIMEDOUT' });
  });
});

describe('an instance without a mail server', () => {
  it('keeps its mail waiting, and says so in the log', async () => {
    const id = await write('to@example.org');
    const config = { smtpUrl: null, mailFrom: FROM, hasMailbox: false };
    const mail = await startMail(config, { db: first.db, log });
    expect(lines.join('')).toContain('No SMTP_URL is set: mail is kept and waits');
    await mail.stop();
    expect(await rowOf(id)).toMatchObject({ state: 'waiting', attempts: 0 });
  });
});

describe('a letter', () => {
  it('says the same in text and in HTML, and runs nothing that somebody wrote', () => {
    const { text, html } = setLetter(LETTER);
    expect(text).toBe(
      'Hello Zoë <b>,\n\nA first line & more.\n\nOpen it:\nhttps://leeway.example.org/x?token=a&b=c\n\nA last line.\n\nLeeway\n',
    );
    expect(html).toContain('Hello Zoë &lt;b&gt;,');
    expect(html).toContain('href="https://leeway.example.org/x?token=a&amp;b=c"');
    expect(html).not.toMatch(/<b>|<script|<img|src=/);
  });
});
