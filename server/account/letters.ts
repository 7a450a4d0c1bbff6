import type { Letter } from '../mail/letter.ts';

/** The mails about an account: what each says, and where its link leads. */
interface About {
  name: string;
  appUrl: string;
}

/** How long a link to confirm an address works. */
export const CONFIRM_HOURS = 24;
/** How long a link for a new password works. */
export const RESET_HOURS = 1;

const page = (appUrl: string, path: string, token: string): string =>
  `${appUrl}${path}?token=${encodeURIComponent(token)}`;

const NOT_YOU = 'Was this not you? Then set a new password by the link above, which ends every session.';

const plain = (name: string, subject: string, lines: string[]): Letter => ({
  subject,
  greets: name,
  lines,
  link: null,
  after: [],
});

export function confirmAddress({ name, appUrl }: About, token: string): Letter {
  return {
    ...plain(name, 'Confirm your e-mail address', [
      'This address was given for an account at Leeway. Confirm it, so that we can reach you here, for instance when you need a new password.',
    ]),
    link: { words: 'Confirm this address', url: page(appUrl, '/confirm-address', token) },
    after: [
      `The link works once, for ${CONFIRM_HOURS} hours.`,
      'If you made no account, leave the link alone: without it nothing more comes to this address.',
    ],
  };
}

export function confirmNewAddress({ name, appUrl }: About, token: string): Letter {
  return {
    ...plain(name, 'Confirm your new e-mail address', [
      'You asked to use this address for your account at Leeway from now on. Until you confirm it, the old one stays.',
    ]),
    link: { words: 'Use this address', url: page(appUrl, '/confirm-address', token) },
    after: [
      `The link works once, for ${CONFIRM_HOURS} hours.`,
      'If you did not ask for this, leave the link alone: nothing changes.',
    ],
  };
}

/** To the address that was left. */
export function addressChanged({ name, appUrl }: About): Letter {
  return {
    ...plain(name, 'Your account has another e-mail address now', [
      'Your account at Leeway has another e-mail address from now on. You sign in with the new one; this one gets no more mail.',
    ]),
    link: { words: 'Open Leeway', url: appUrl },
    after: ['Was this not you? Then tell whoever runs this instance of Leeway at once.'],
  };
}

export function resetPassword({ name, appUrl }: About, token: string): Letter {
  return {
    ...plain(name, 'Choose a new password', ['You asked for a new password for your account at Leeway.']),
    link: { words: 'Choose a new password', url: page(appUrl, '/new-password', token) },
    after: [
      'The link works once, for an hour. Every place where you are signed in now will be signed out.',
      'If you did not ask for this, leave the link alone: your password stays as it is.',
    ],
  };
}

export function passwordChanged({ name, appUrl }: About): Letter {
  return {
    ...plain(name, 'Your password was changed', [
      'The password of your account at Leeway was changed just now, and every other place was signed out.',
    ]),
    link: { words: 'Set a new password', url: `${appUrl}/forgotten-password` },
    after: [NOT_YOU],
  };
}

/** To somebody who has an account already when it is made once more. */
export function accountThere({ name, appUrl }: About): Letter {
  return {
    ...plain(name, 'You have an account already', [
      'Somebody, perhaps you, has just tried to make an account at Leeway with this address. There is one already, and nothing about it has changed.',
      `Sign in with the password you chose then: ${appUrl}/sign-in`,
    ]),
    link: { words: 'Choose a new password', url: `${appUrl}/forgotten-password` },
    after: ['If it was not you, there is nothing to do.'],
  };
}

export function secondFactorSwitched({ name, appUrl }: About, isOn: boolean): Letter {
  const what = isOn
    ? 'From now on signing in to your account at Leeway asks for a code of your authenticator too. Keep the recovery codes where you find them without your phone.'
    : 'Signing in to your account at Leeway no longer asks for a code: the password is enough.';
  return {
    ...plain(name, isOn ? 'Your second factor is on' : 'Your second factor is off', [what]),
    link: { words: 'Set a new password', url: `${appUrl}/forgotten-password` },
    after: [NOT_YOU],
  };
}

export function recoveryCodesMade({ name, appUrl }: About): Letter {
  return {
    ...plain(name, 'You have new recovery codes', [
      'New recovery codes were made for your account at Leeway. The ones before no longer work.',
    ]),
    link: { words: 'Set a new password', url: `${appUrl}/forgotten-password` },
    after: [NOT_YOU],
  };
}
