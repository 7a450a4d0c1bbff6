import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { inject } from 'vitest';
import { readMessage, type ReadMessage } from '../../server/mailbox/read-message.ts';

const PATIENCE_MS = 20_000;

/** The newest mail that the served product has sent to an address with this subject, once it has come. */
export async function mailTo(to: string, subject: string): Promise<ReadMessage> {
  const until = Date.now() + PATIENCE_MS;
  for (;;) {
    const found = received().find((one) => one.to === to && one.mail.subject === subject);
    if (found) return found.mail;
    if (Date.now() > until) throw new Error(`No mail “${subject}” came to ${to}.`);
    await wait(200);
  }
}

/** All of it, the newest first. */
function received(): { to: string; mail: ReadMessage }[] {
  const { mailFolder } = inject('servedApp');
  return readdirSync(mailFolder)
    .sort()
    .reverse()
    .map((name) => {
      const bytes = readFileSync(join(mailFolder, name));
      const end = bytes.indexOf('\n');
      return { to: bytes.subarray(0, end).toString(), mail: readMessage(bytes.subarray(end + 1)) };
    });
}

/** The path that a mail's link leads to, its token with it. */
export function pathIn({ text }: Pick<ReadMessage, 'text'>): string {
  const [link] = /https?:\/\/\S+token=\S+/.exec(text) ?? [];
  if (link === undefined) throw new Error('The mail has no link with a token.');
  const { pathname, search } = new URL(link);
  return pathname + search;
}

/** Confirms an address by the mail that was sent to it. */
export async function confirmAddress(baseURL: string, to: string): Promise<void> {
  const path = pathIn(await mailTo(to, 'Confirm your e-mail address'));
  const token = new URL(path, baseURL).searchParams.get('token');
  const response = await fetch(`${baseURL}/api/auth/verify-email`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: baseURL },
    body: JSON.stringify({ token }),
  });
  if (!response.ok) throw new Error(`Confirming answered ${String(response.status)}.`);
}
