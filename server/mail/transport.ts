import { createTransport } from 'nodemailer';
import type { MailBody } from './letter.ts';

/** A mail as it goes out. */
export interface OutgoingMail extends MailBody {
  from: string;
  to: string;
  subject: string;
  messageId: string;
}

/** What carries a mail away. */
export interface MailTransport {
  /** Resolves once a server has taken the mail; throws where none did. */
  send: (mail: OutgoingMail) => Promise<void>;
  close: () => void;
}

const PATIENCE_MS = 20_000;

/** Over SMTP: `smtp://host:port`, or `smtps://` for TLS from the first byte. */
export function smtpTransport(url: string): MailTransport {
  const mailer = createTransport({
    url,
    connectionTimeout: PATIENCE_MS,
    greetingTimeout: PATIENCE_MS,
    socketTimeout: PATIENCE_MS,
    dnsTimeout: PATIENCE_MS,
    // Nothing in a letter may make this process read a file or fetch an address.
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    async send(mail) {
      await mailer.sendMail({
        ...mail,
        // An address with a comma or a bracket in it must not become two.
        to: { name: '', address: mail.to },
        headers: { 'Auto-Submitted': 'auto-generated' },
      });
    },
    close: () => mailer.close(),
  };
}

/** What may be written down of a failure: no server's sentence, since it names people's addresses. */
export function describeMailError(error: unknown): { words: string; isFinal: boolean } {
  if (!(error instanceof Error)) return { words: 'unknown', isFinal: false };
  const code = 'code' in error && typeof error.code === 'string' ? error.code : error.name;
  const answered =
    'responseCode' in error && typeof error.responseCode === 'number' ? error.responseCode : null;
  // Only the refusal of this address or this message is final; a refused sign-in is ours to mend.
  const isFinal = answered !== null && answered >= 500 && (code === 'EENVELOPE' || code === 'EMESSAGE');
  return { words: answered === null ? code : `${code} ${answered}`, isFinal };
}
