import { z } from 'zod';
import {
  accountChangeSchema,
  changeEmailSchema,
  changePasswordSchema,
  passwordAgainSchema,
  recoveryCodeSchema,
  requestPasswordResetSchema,
  resetPasswordSchema,
  signInSchema,
  signUpSchema,
  totpSchema,
  verifyEmailSchema,
} from '../../shared/account.ts';
import {
  accountSchema,
  accountSessionsSchema,
  confirmedAddressSchema,
  doneSchema,
  recoveryCodesSchema,
  secondFactorSetupSchema,
  signedInAnswerSchema,
} from '../../shared/account-answers.ts';
import { meSchema } from '../../shared/me.ts';
import type { NounDescription, RouteDescription } from '../http/describe.ts';

/** What the sign-in library takes where nothing need be said. */
const nothingSchema = z.object({}).default({});

/** The sign-in library's own answer; only what is relied on is described. */
const sessionSchema = z.looseObject({
  user: z.looseObject({ id: z.uuid(), name: z.string(), email: z.string() }),
});

/** What is done in a browser, with its session or on the way to one, never by a token. */
const inBrowser = (
  who: 'anyone' | 'member',
  summary: string,
  body: z.ZodType,
  ok: z.ZodType,
  problems: RouteDescription['problems'] = ['tooMany'],
): RouteDescription => ({ summary, who, scope: null, body, answers: { 200: ok }, problems });

const signing: NounDescription['routes'] = {
  'POST /api/auth/sign-up/email': inBrowser(
    'anyone',
    'Make an account; the answer is the same where there is one already, and its owner is told by mail',
    signUpSchema,
    doneSchema,
  ),
  'POST /api/auth/sign-in/email': inBrowser(
    'anyone',
    'Sign in; the session comes as a cookie, after a code where there is a second factor',
    signInSchema,
    signedInAnswerSchema,
    ['signedOut', 'tooMany'],
  ),
  'POST /api/auth/sign-out': inBrowser(
    'anyone',
    'End the session',
    nothingSchema,
    z.looseObject({ success: z.boolean() }),
    [],
  ),
  'GET /api/auth/get-session': {
    summary: 'Read the session, or null',
    who: 'anyone',
    scope: null,
    answers: { 200: sessionSchema.nullable() },
  },
  'GET /api/me': {
    summary: 'Read who is signed in, or nobody',
    who: 'anyone',
    scope: null,
    answers: { 200: meSchema },
    problems: ['signedOut', 'outsideScope'],
  },
};

const links: NounDescription['routes'] = {
  'POST /api/auth/send-verification-email': inBrowser(
    'member',
    'Send the link that confirms your address once more',
    nothingSchema,
    doneSchema,
    ['conflict', 'tooMany'],
  ),
  'POST /api/auth/verify-email': inBrowser(
    'anyone',
    'Confirm an address with the link that was mailed there',
    verifyEmailSchema,
    confirmedAddressSchema,
  ),
  'POST /api/auth/request-password-reset': inBrowser(
    'anyone',
    'Send a link for a new password, if there is an account',
    requestPasswordResetSchema,
    doneSchema,
  ),
  'POST /api/auth/reset-password': inBrowser(
    'anyone',
    'Choose a new password with the link that was mailed; every session ends',
    resetPasswordSchema,
    doneSchema,
  ),
  'POST /api/auth/change-email': inBrowser(
    'member',
    'Ask for another address; it is used once it is confirmed',
    changeEmailSchema,
    doneSchema,
  ),
  'POST /api/auth/change-password': inBrowser(
    'member',
    'Choose another password; every other session ends',
    changePasswordSchema,
    doneSchema,
  ),
};

const secondFactor: NounDescription['routes'] = {
  'POST /api/auth/two-factor/enable': inBrowser(
    'member',
    'Begin with a second factor; it is on once a code has shown that it works',
    passwordAgainSchema,
    secondFactorSetupSchema,
    ['conflict', 'tooMany'],
  ),
  'POST /api/auth/two-factor/verify-totp': inBrowser(
    'anyone',
    'Give a code of the authenticator, at sign-in or to switch the second factor on',
    totpSchema,
    doneSchema,
    ['signedOut', 'conflict', 'tooMany'],
  ),
  'POST /api/auth/two-factor/verify-backup-code': inBrowser(
    'anyone',
    'Give a recovery code at sign-in; each works once',
    recoveryCodeSchema,
    doneSchema,
    ['signedOut', 'conflict', 'tooMany'],
  ),
  'POST /api/auth/two-factor/generate-backup-codes': inBrowser(
    'member',
    'Make new recovery codes; the ones before no longer work',
    passwordAgainSchema,
    recoveryCodesSchema,
    ['conflict', 'tooMany'],
  ),
  'POST /api/auth/two-factor/disable': inBrowser(
    'member',
    'Switch the second factor off',
    passwordAgainSchema,
    doneSchema,
    ['conflict', 'tooMany'],
  ),
};

const account: NounDescription['routes'] = {
  'GET /api/account': {
    summary: 'Read your account',
    who: 'member',
    scope: null,
    answers: { 200: accountSchema },
  },
  'PATCH /api/account': inBrowser(
    'member',
    'Change your name',
    accountChangeSchema.partial(),
    accountSchema,
    [],
  ),
  'DELETE /api/account': {
    summary: 'Delete your account and all that is yours, for good',
    who: 'member',
    scope: null,
    body: passwordAgainSchema,
    answers: { 204: 'nothing' },
    problems: ['tooMany'],
  },
  'GET /api/account/sessions': {
    summary: 'List where you are signed in',
    who: 'member',
    scope: null,
    answers: { 200: accountSessionsSchema },
  },
  'DELETE /api/account/sessions': {
    summary: 'End every session but this one',
    who: 'member',
    scope: null,
    answers: { 204: 'nothing' },
  },
  'DELETE /api/account/sessions/:id': {
    summary: 'End one of your sessions',
    who: 'member',
    scope: null,
    answers: { 204: 'nothing' },
  },
  'POST /api/account/export': {
    summary: 'Take away everything that is yours, as one archive',
    who: 'member',
    scope: null,
    answers: { 200: { mediaType: 'application/zip' } },
    problems: ['tooMany'],
  },
};

export const accountApi: NounDescription = {
  noun: 'Account',
  schemas: { Me: meSchema, Account: accountSchema },
  routes: { ...signing, ...links, ...secondFactor, ...account },
};
