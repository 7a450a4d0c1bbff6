import { mkdirSync, writeFileSync } from 'node:fs';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { SMTPServer } from 'smtp-server';

export interface MailFolder {
  /** For `SMTP_URL`. */
  url: string;
  close: () => Promise<void>;
}

/** A mail server on this machine that keeps each mail as a file, in the order they came: any process can read them. */
export async function startMailFolder(folder: string): Promise<MailFolder> {
  mkdirSync(folder, { recursive: true });
  let count = 0;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    logger: false,
    onData(stream, session, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        count += 1;
        const to = session.envelope.rcptTo.map(({ address }) => address).join(', ');
        // The address as it was handed over comes first, on a line of its own.
        const name = `${String(count).padStart(6, '0')}.eml`;
        writeFileSync(join(folder, name), Buffer.concat([Buffer.from(`${to}\n`), ...chunks]));
        done();
      });
    },
  });
  const listening = server.listen(0, '127.0.0.1');
  await new Promise((resolve) => listening.once('listening', resolve));
  const { port } = listening.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${String(port)}`,
    close: () =>
      new Promise<void>((resolve) => {
        server.close(resolve);
      }),
  };
}
