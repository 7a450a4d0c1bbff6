import { z } from 'zod';
import { ROLES } from './me.ts';
import { teacherRequestSchema } from './teacher-request.ts';

/** An account as its owner sees it; moments are ISO 8601 in UTC. */
export const accountSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  emailVerified: z.boolean(),
  twoFactorEnabled: z.boolean(),
  /** How many recovery codes are not used yet; null without a second factor. */
  recoveryCodesLeft: z.int().nullable(),
  /** The latest request to become a teacher, waiting or answered; null where there is none. */
  teacherRequest: teacherRequestSchema.nullable(),
  createdAt: z.string(),
});
/** An account as its owner sees it. */
export type Account = z.infer<typeof accountSchema>;

/** A place where somebody is signed in; moments are ISO 8601 in UTC. */
export const accountSessionSchema = z.object({
  id: z.uuid(),
  createdAt: z.string(),
  lastUsedAt: z.string(),
  expiresAt: z.string(),
  userAgent: z.string().nullable(),
  ipAddress: z.string().nullable(),
  isCurrent: z.boolean(),
});
/** A place where somebody is signed in. */
export type AccountSession = z.infer<typeof accountSessionSchema>;

/** Every place where somebody is signed in. */
export const accountSessionsSchema = z.object({ items: z.array(accountSessionSchema) });

/** Nothing more than that it was done. */
export const doneSchema = z.object({ status: z.literal(true) });

/** That an address is confirmed, and which. */
export const confirmedAddressSchema = z.object({ status: z.literal(true), email: z.string() });

/** That somebody is signed in, or that a code is asked for first. */
export const signedInAnswerSchema = z.union([
  z.object({ twoFactorRedirect: z.literal(true), twoFactorMethods: z.array(z.string()) }),
  z.object({ user: z.object({ id: z.uuid(), name: z.string(), email: z.string() }) }),
]);

/** What an authenticator is set up with, shown once: the key as an `otpauth:` address, and the recovery codes. */
export const secondFactorSetupSchema = z.object({ totpURI: z.string(), backupCodes: z.array(z.string()) });

/** Fresh recovery codes, shown once. */
export const recoveryCodesSchema = z.object({ backupCodes: z.array(z.string()) });
