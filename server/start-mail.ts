import type { Logger } from 'pino';
import type { Config } from './config.ts';
import type { Db } from './db/client.ts';
import { startSender, type Sender } from './mail/sender.ts';
import { smtpTransport } from './mail/transport.ts';
import { startLocalSmtp } from './mailbox/local-smtp.ts';

/** The mail of a running instance. */
export interface Mail {
  /** Finishes the mail under way. */
  stop: () => Promise<void>;
}

/**
 * Sends what the outbox holds: over the mail server that is named, or, where nobody but this machine reaches the instance,
 * into the local mailbox. Elsewhere mail waits until a mail server is named.
 */
export async function startMail(
  config: Pick<Config, 'smtpUrl' | 'mailFrom' | 'hasMailbox'>,
  { db, log }: { db: Db; log: Logger },
): Promise<Mail> {
  const common = { db, log, from: config.mailFrom };
  if (config.smtpUrl !== null) return startSender({ ...common, transport: smtpTransport(config.smtpUrl) });
  if (config.hasMailbox) {
    const mailbox = await startLocalSmtp(db, log);
    const sender: Sender = startSender({ ...common, transport: smtpTransport(mailbox.url) });
    return {
      async stop() {
        await sender.stop();
        await mailbox.close();
      },
    };
  }
  log.warn('No SMTP_URL is set: mail is kept and waits until there is one.');
  return { stop: () => Promise.resolve() };
}
