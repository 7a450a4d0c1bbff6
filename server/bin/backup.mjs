// `npm run backup [-- file]`: database, files and secret of one moment in one archive, while Leeway runs or not.
import { createHash } from 'node:crypto';
import { copyFileSync, existsSync, linkSync, mkdirSync, openSync, readFileSync, rmSync } from 'node:fs';
import { closeSync, statSync, writeFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { filesBelow, FORMAT, pack, PARTS } from './archive.mjs';
import { dataFolder, openDatabase, pathFrom, root, run, say, temporaryFolder } from './command.mjs';
import { lockFolder } from './lock.mjs';
import { Sentence, step } from './steps.mjs';

/** How often a busy instance is looked at anew before a file is held to be missing. */
const LOOKS = 10;

await run(async ([name, ...more]) => {
  if (more.length > 0 || name?.startsWith('-'))
    throw new Sentence('Say where to: npm run backup -- file.tgz');
  const file = pathFrom(
    name ?? `leeway-backup-${new Date().toISOString().slice(0, 19).replaceAll(':', '')}.tgz`,
  );
  if (existsSync(file)) throw new Sentence(`${file} is there already: name another file.`);
  if (!existsSync(dirname(file)))
    throw new Sentence(`There is no folder ${dirname(file)} to write the archive to.`);
  const folder = dataFolder();
  const { url } = await openDatabase();
  if (!existsSync(folder))
    throw new Sentence(`There is no data in ${folder}: set LEEWAY_DATA to its folder.`);
  if ((await lockFolder(folder, 'backup')) === null)
    throw new Sentence('Another backup is being made just now.');
  // Beside the files, since a link cannot lead to another disk.
  const staging = temporaryFolder(join(folder, 'backup.part'), 0o700);
  const manifest = await step('Reading the database and the files', () => gather(url, folder, staging));
  await step('Writing the archive', () => pack(staging, file));
  tell(file, staging, manifest);
});

async function gather(url, folder, staging) {
  let moment = await takeMoment(url, folder, staging);
  // One written and removed between two looks is on no list the next time; one missing twice is truly not there.
  for (let look = 1, before = new Set(); look < LOOKS; look += 1) {
    if (moment.missing.every((id) => before.has(id))) break;
    before = new Set(moment.missing);
    moment = await takeMoment(url, folder, staging);
  }
  const { dumped, sha256, files, missing } = moment;
  for (const part of [PARTS.secret, PARTS.signIns]) {
    if (existsSync(join(folder, part))) copyFileSync(join(folder, part), join(staging, part));
  }
  const manifest = {
    format: FORMAT,
    leeway: JSON.parse(readFileSync(join(root, 'package.json'), 'utf8')).version,
    mariaDb: dumped.serverVersion,
    madeAt: new Date().toISOString(),
    rows: dumped.rows,
    files,
    dumpSha256: sha256,
  };
  writeFileSync(join(staging, PARTS.manifest), `${JSON.stringify(manifest, null, 2)}\n`, { mode: 0o600 });
  return { ...manifest, missing: missing.length };
}

/**
 * Files are linked before and after the tables are read: one removed in between is still there, and one added is too.
 * What the tables of that moment do not name is then left out.
 */
async function takeMoment(url, folder, staging) {
  const from = join(folder, 'files');
  const to = join(staging, PARTS.files);
  mkdirSync(to, { recursive: true, mode: 0o700 });
  rmSync(join(staging, PARTS.dump), { force: true });
  linkFiles(from, to);
  const { dumped, sha256 } = await dump(url, join(staging, PARTS.dump));
  linkFiles(from, to);
  const kept = new Set();
  for (const path of filesBelow(to)) {
    if (dumped.values.has(basename(path))) kept.add(basename(path));
    else rmSync(join(to, path));
  }
  const missing = [...dumped.values].filter((id) => !kept.has(id));
  return { dumped, sha256, files: kept.size, missing };
}

async function dump(url, path) {
  const { dumpDatabase } = await import('../db/dump.ts');
  const hash = createHash('sha256');
  const out = openSync(path, 'wx', 0o600);
  try {
    const dumped = await dumpDatabase(url, {
      column: { table: 'stored_file', column: 'id' },
      async write(line) {
        hash.update(`${line}\n`);
        writeFileSync(out, `${line}\n`);
      },
    });
    return { dumped, sha256: hash.digest('hex') };
  } finally {
    closeSync(out);
  }
}

/** A file is written once and never changed, so a link to it is a copy of it. */
function linkFiles(from, to) {
  for (const path of filesBelow(from)) {
    mkdirSync(join(to, dirname(path)), { recursive: true, mode: 0o700 });
    try {
      linkSync(join(from, path), join(to, path));
    } catch (error) {
      // Linked the first time, or removed since it was listed.
      if (error.code === 'EEXIST' || error.code === 'ENOENT') continue;
      copyFileSync(join(from, path), join(to, path));
    }
  }
}

function tell(file, staging, { rows, files, missing }) {
  const count = Object.values(rows).reduce((sum, n) => sum + n, 0);
  const size = (statSync(file).size / 1_000_000).toFixed(1);
  say(
    `Backed up ${Object.keys(rows).length} tables with ${count} rows and ${files} files to ${file} (${size} MB).`,
  );
  say('Keep it safe: it holds measurements, addresses and what signs people in.');
  if (missing > 0) say(`${missing} files that the tables name were not in the data folder.`);
  if (process.env.BETTER_AUTH_SECRET) {
    say('BETTER_AUTH_SECRET is set and is not in it: keep it beside the archive.');
  } else if (!existsSync(join(staging, PARTS.secret))) say('There was no secret in the data folder to keep.');
}
