import type { AddressInfo } from 'node:net';
import { setTimeout as wait } from 'node:timers/promises';
import { SMTPServer } from 'smtp-server';
import { afterAll } from 'vitest';

/** A mail as it came over the wire. */
export interface Received {
  from: string;
  to: string[];
  raw: string;
}

export interface TestSmtp {
  url: string;
  received: Received[];
  /** What the next mails are answered: a code and a sentence, or taken where there is none. */
  refusals: { at: 'recipient' | 'data'; code: number }[];
  /** How long it takes over a mail. */
  slowMs: number;
  /** How many mails are under way. */
  underWay: () => number;
  close: () => Promise<void>;
}

/** A real mail server on a free port of this machine; closed after the file's tests. */
export async function testSmtp(): Promise<TestSmtp> {
  let count = 0;
  const refuse = (at: 'recipient' | 'data'): Error | null => {
    const next = test.refusals[0];
    if (next?.at !== at) return null;
    test.refusals.shift();
    // As real servers do, it repeats the address in its answer.
    return Object.assign(new Error('no such person <secret@example.org>'), { responseCode: next.code });
  };
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    logger: false,
    onRcptTo: (_address, _session, done) => done(refuse('recipient')),
    onData(stream, session, done) {
      count += 1;
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        void wait(test.slowMs).then(() => {
          count -= 1;
          const refused = refuse('data');
          if (refused) {
            done(refused);
            return;
          }
          const { mailFrom, rcptTo } = session.envelope;
          test.received.push({
            from: mailFrom === false ? '' : mailFrom.address,
            to: rcptTo.map(({ address }) => address),
            raw: Buffer.concat(chunks).toString('utf8'),
          });
          done();
        });
      });
    },
  });
  server.on('error', () => undefined);
  const listening = server.listen(0, '127.0.0.1');
  await new Promise((resolve) => listening.once('listening', resolve));
  const { port } = listening.address() as AddressInfo;
  const close = () =>
    new Promise<void>((resolve) => {
      server.close(resolve);
    });
  const test: TestSmtp = {
    url: `smtp://127.0.0.1:${String(port)}`,
    received: [],
    refusals: [],
    slowMs: 0,
    underWay: () => count,
    close,
  };
  afterAll(close);
  return test;
}

/** Waits until something is so; fails where it does not become so. */
export async function until(
  isSo: () => Promise<boolean> | boolean,
  what: string,
  ms = 10_000,
): Promise<void> {
  const end = Date.now() + ms;
  while (!(await isSo())) {
    if (Date.now() > end) throw new Error(`It did not happen: ${what}.`);
    await wait(20);
  }
}
