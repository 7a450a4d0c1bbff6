import { z } from 'zod';

/** The fewest characters a password may have. */
export const PASSWORD_MIN = 10;

export const signInSchema = z.object({
  email: z.email('Write the e-mail address you signed up with, such as name@example.org.'),
  password: z.string().min(1, 'Write your password.'),
});

export const signUpSchema = z.object({
  name: z.string().trim().min(1, 'Write the name we should call you by.').max(80),
  email: z.email('Write an e-mail address, such as name@example.org.').max(254),
  password: z
    .string()
    .min(PASSWORD_MIN, `Use at least ${PASSWORD_MIN} characters; a few words in a row are easy to remember.`)
    .max(128),
});
