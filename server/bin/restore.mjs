// `npm run restore -- file [--into folder]`: a backup into an empty data folder (or an empty database of yours).
import { createReadStream, existsSync, mkdirSync, readdirSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { PARTS, unpack } from './archive.mjs';
import { dataFolder, pathFrom, run, say, temporaryFolder } from './command.mjs';
import { startDatabase } from './database.mjs';
import { lockFolder } from './lock.mjs';
import { Sentence, step } from './steps.mjs';

/** Everything is put together in here and moved out at the end: what is cut short leaves no half an instance. */
const DRAFT = 'restore.part';

await run(async (args) => {
  const { file, folder } = readArguments(args);
  if (!existsSync(file)) throw new Sentence(`There is no file ${file}.`);
  mkdirSync(folder, { recursive: true, mode: 0o711 });
  if ((await lockFolder(folder, 'data')) === null) {
    throw new Sentence(
      `Leeway is running on the data in ${folder}: stop it first, or name another folder with --into.`,
    );
  }
  if (readdirSync(folder).some((name) => name !== DRAFT)) {
    throw new Sentence(
      `${folder} is not empty: a backup is restored into an empty folder only. Move it aside, or name another with --into.`,
    );
  }
  await refuseFullDatabase();
  const draft = temporaryFolder(join(folder, DRAFT), 0o711);
  const manifest = await step('Unpacking the archive', () => unpack(file, draft));
  await fillDatabase(draft, manifest);
  for (const part of [PARTS.manifest, PARTS.dump]) rmSync(join(draft, part));
  // The database last: without it the folder is not one that starts.
  const parts = readdirSync(draft).sort((a, b) => Number(a === 'database') - Number(b === 'database'));
  for (const part of parts) renameSync(join(draft, part), join(folder, part));
  tell(folder, manifest);
});

function readArguments(args) {
  const at = args.indexOf('--into');
  const into = at < 0 ? null : args[at + 1];
  const rest = at < 0 ? args : [...args.slice(0, at), ...args.slice(at + 2)];
  if (into === undefined || rest.length !== 1 || rest[0].startsWith('-')) {
    throw new Sentence('Say which file: npm run restore -- file.tgz [--into folder]');
  }
  return { file: pathFrom(rest[0]), folder: into === null ? dataFolder() : pathFrom(into) };
}

function givenUrl() {
  return process.env.DATABASE_URL?.replace(/^mariadb:/, 'mysql:') || null;
}

async function refuseFullDatabase() {
  const url = givenUrl();
  if (url === null) return;
  const { isEmptyDatabase } = await import('../db/load-dump.ts');
  if (await isEmptyDatabase(url)) return;
  throw new Sentence(
    'The database at DATABASE_URL has tables already: a backup is restored into an empty one only.',
  );
}

async function fillDatabase(draft, manifest) {
  const { loadDump } = await import('../db/load-dump.ts');
  const { countKnownMigrations } = await import('../db/migrate.ts');
  if (manifest.rows.__drizzle_migrations > countKnownMigrations()) {
    throw new Sentence(
      `The backup was made by a newer Leeway (${manifest.leeway}): bring this one up to date first.`,
    );
  }
  const database = givenUrl() === null ? await startDatabase(draft) : null;
  try {
    const bytes = createReadStream(join(draft, PARTS.dump));
    const rows = await step('Loading the database', () => loadDump(database?.url ?? givenUrl(), bytes));
    const wrong = Object.keys({ ...rows, ...manifest.rows }).filter(
      (name) => rows[name] !== manifest.rows[name],
    );
    if (wrong.length > 0) throw new Sentence(`These tables did not come out whole: ${wrong.join(', ')}.`);
  } finally {
    await database?.stop();
  }
}

function tell(folder, { rows, files, madeAt, leeway }) {
  const count = Object.values(rows).reduce((sum, n) => sum + n, 0);
  say(
    `Restored ${count} rows and ${files} files into ${folder}, as they were on ${madeAt} (Leeway ${leeway}).`,
  );
  if (!existsSync(join(folder, PARTS.secret)) && !process.env.BETTER_AUTH_SECRET) {
    say('The archive holds no secret: set BETTER_AUTH_SECRET to the one that the instance had.');
  }
  say(
    folder === dataFolder() ? 'Start it with: npm start' : `Start it with: LEEWAY_DATA=${folder} npm start`,
  );
}
