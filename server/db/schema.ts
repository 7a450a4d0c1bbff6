/** Every table in one place, for the migration generator and for the sign-in library. */
export * from '../account/account.table.ts';
export * from '../admin/admin.table.ts';
export * from '../mail/mail.table.ts';
export * from '../mailbox/mailbox.table.ts';
export * from '../patterns/files.table.ts';
export * from '../patterns/patterns.table.ts';
export * from '../people/people.table.ts';
export * from '../plans/plans.table.ts';
export * from '../tokens/tokens.table.ts';
