import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import { SMTPServer } from 'smtp-server';
import type { Db } from '../db/client.ts';
import { keepMessage } from './mailbox.store.ts';
import { readMessage } from './read-message.ts';

const LARGEST_BYTES = 1_000_000;

/** A mail server for this machine alone. */
export interface LocalSmtp {
  url: string;
  close: () => Promise<void>;
}

/** Receives mail on a free port of the loopback address and keeps it in the mailbox; nothing leaves this machine. */
export function startLocalSmtp(db: Db, log: Logger): Promise<LocalSmtp> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    logger: false,
    size: LARGEST_BYTES,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => void chunks.push(chunk));
      stream.on('end', () => {
        const to = session.envelope.rcptTo.map(({ address }) => address);
        keepMessage(db, readMessage(Buffer.concat(chunks)), to).then(
          () => done(),
          () => done(Object.assign(new Error('The mailbox cannot be written.'), { responseCode: 451 })),
        );
      });
    },
  });
  server.on('error', () => log.warn('the local mailbox was spoken to in something else than SMTP'));
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    const listening = server.listen(0, '127.0.0.1', () => {
      const { port } = listening.address() as AddressInfo;
      resolve({
        url: `smtp://127.0.0.1:${port}`,
        close: () =>
          new Promise((closed) => {
            server.close(closed);
          }),
      });
    });
  });
}
