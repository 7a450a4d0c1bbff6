import { z } from 'zod';

/** The fewest characters a password may have. */
export const PASSWORD_MIN = 10;

const ADDRESS = 'Write an e-mail address, such as name@example.org.';

const newPassword = z
  .string()
  .min(PASSWORD_MIN, `Use at least ${PASSWORD_MIN} characters; a few words in a row are easy to remember.`)
  .max(128);
const currentPassword = z.string().min(1, 'Write your password.').max(128);
const linkToken = z.string().trim().min(1, 'Open the whole link of the mail.').max(2000);

/** What signing in takes: the address and the password. */
export const signInSchema = z.object({
  email: z.email('Write the e-mail address you signed up with, such as name@example.org.'),
  password: z.string().min(1, 'Write your password.'),
});

const accountName = z.string().trim().min(1, 'Write the name we should call you by.').max(80);

/** What making an account takes. */
export const signUpSchema = z.object({
  name: accountName,
  email: z.email(ADDRESS).max(254),
  password: newPassword,
});

/** What a person may change about their account at once; an address and a password have forms of their own. */
export const accountChangeSchema = z.strictObject({ name: accountName });

/** What confirming an address takes: the token of the link that was mailed. */
export const verifyEmailSchema = z.object({ token: linkToken });

/** Whom to send a link for a new password. */
export const requestPasswordResetSchema = z.object({ email: z.email(ADDRESS).max(254) });

/** A new password, by the token of the link that was mailed. */
export const resetPasswordSchema = z.object({ token: linkToken, newPassword });

/** Another address for an account; nothing changes until the link mailed there is used. */
export const changeEmailSchema = z.object({ newEmail: z.email(ADDRESS).max(254), password: currentPassword });

/** Another password, by the one in use. */
export const changePasswordSchema = z.object({ currentPassword, newPassword });

/** The password asked for again before something weighty. */
export const passwordAgainSchema = z.object({ password: currentPassword });

/** Six digits from an authenticator; spaces between them are let through. */
export const totpSchema = z.object({
  code: z
    .string()
    .max(20)
    .transform((text) => text.replace(/\s/g, ''))
    .pipe(z.string().regex(/^\d{6}$/, 'Write the six digits that your authenticator shows.')),
});

/** A recovery code, as it was shown once. */
export const recoveryCodeSchema = z.object({
  code: z
    .string()
    .trim()
    .regex(/^[a-z\d]{5}-[a-z\d]{5}$/i, 'Write one of your recovery codes, such as aB3dE-fG5hI.'),
});
