import { randomBytes } from 'node:crypto';
import type { Role } from '../../shared/me.ts';
import type { Auth } from '../auth.ts';
import type { DemoSignIn } from './kept-sign-ins.ts';

/** An account of the demo as it now is: its id, and how to sign in to it. */
export interface DemoAccount {
  id: string;
  signIn: DemoSignIn;
}

/** Makes the account with a random password; one that is there already, from a start cut short, gets a new one. */
export async function demoAccount(auth: Auth, name: string, role: Role): Promise<DemoAccount> {
  const { internalAdapter, password: hasher } = await auth.$context;
  const email = `${name.toLowerCase()}@leeway.example`;
  const password = randomBytes(9).toString('base64url');
  const hash = await hasher.hash(password);
  const signIn = { name, email, password, role };
  const there = await internalAdapter.findUserByEmail(email);
  if (there) {
    await internalAdapter.updatePassword(there.user.id, hash);
    return { id: there.user.id, signIn };
  }
  const user = await internalAdapter.createUser(
    { name, email, emailVerified: true, role },
    { method: 'email-password' },
  );
  await internalAdapter.linkAccount({
    userId: user.id,
    accountId: user.id,
    providerId: 'credential',
    password: hash,
  });
  return { id: user.id, signIn };
}

/** Whether the database knows the account. */
export async function isDemoAccountKnown(auth: Auth, { email }: DemoSignIn): Promise<boolean> {
  const { internalAdapter } = await auth.$context;
  return (await internalAdapter.findUserByEmail(email)) !== null;
}
