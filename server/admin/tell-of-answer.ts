import type { Config } from '../config.ts';
import type { Db } from '../db/client.ts';
import type { Letter } from '../mail/letter.ts';
import { writeMail } from '../mail/outbox.store.ts';

interface Asker {
  id: string;
  name: string;
  email: string;
}

/** Writes to whoever asked to become a teacher, in the transaction that answers. */
export function tellerOfAnswers({ mailFrom, appUrl }: Pick<Config, 'mailFrom' | 'appUrl'>) {
  return async (tx: Db, { id, name, email }: Asker, isAccepted: boolean): Promise<void> => {
    await writeMail(tx, mailFrom, {
      to: email,
      userId: id,
      kind: isAccepted ? 'teacher-accepted' : 'teacher-declined',
      letter: isAccepted ? accepted(name, appUrl) : declined(name, appUrl),
    });
  };
}

const accepted = (name: string, appUrl: string): Letter => ({
  subject: 'You are a teacher at Leeway now',
  greets: name,
  lines: ['You asked to become a teacher at Leeway, and your request was accepted.'],
  link: { words: 'Open Leeway', url: appUrl },
  after: [],
});

const declined = (name: string, appUrl: string): Letter => ({
  subject: 'Your request to become a teacher',
  greets: name,
  lines: [
    'You asked to become a teacher at Leeway. Whoever runs this instance has declined for now.',
    'Everything that is yours stays as it is. You may ask again from your account page, and say more about your class.',
  ],
  link: { words: 'Open your account', url: `${appUrl}/account` },
  after: [],
});
