// `npm run admin -- name@example.org`: makes an existing account an administrator, running or stopped.
import { openDatabase, run, say } from './command.mjs';
import { Sentence, step } from './steps.mjs';

await run(async ([email, ...more]) => {
  if (!email || more.length > 0 || !/^[^@\s]+@[^@\s]+$/.test(email)) {
    throw new Sentence('Say whose account: npm run admin -- name@example.org');
  }
  const { url, isStartedHere } = await openDatabase();
  const { createDatabase } = await import('../db/client.ts');
  const { migrate } = await import('../db/migrate.ts');
  const { makeAdministrator } = await import('../admin/roles.store.ts');
  const database = createDatabase(url, { connections: 1 });
  try {
    // A running instance has brought its tables up to date itself.
    if (isStartedHere) await step('Preparing the tables', () => migrate(database));
    const outcome = await makeAdministrator(database.db, email);
    if (outcome === 'unknown') {
      throw new Sentence(`There is no account with the address ${email}: sign up with it first.`);
    }
    say(
      outcome === 'made'
        ? `${email} is an administrator now.`
        : `${email} is an administrator already: nothing was changed.`,
    );
  } finally {
    await database.close();
  }
});
