// Which MariaDB a data folder was last used by, and bringing it up to a newer one. Needs no node_modules.
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { findProgram } from './machine.mjs';
import { lastLines, Sentence, step } from './steps.mjs';
import { runTied } from './tied.mjs';

const stampPath = (folder) => join(folder, 'database-version');

/**
 * Says whether the data must be brought up to this server before anybody uses them. Throws a sentence where they come
 * from a newer series: no server opens such data reliably. `isNew`: made just now, by this server.
 */
export async function judgeData({ server }, folder, isNew) {
  const version = await versionOf(server);
  const before = isNew ? version : readStamp(folder);
  if (before !== null && compare(series(before), series(version)) > 0) {
    throw new Sentence(
      `The data in ${folder} were last used by MariaDB ${before}, and this machine has MariaDB ${version}: ` +
        `install MariaDB ${series(before).join('.')} or newer, or restore a backup into an empty folder.`,
    );
  }
  return { version, before, isOlder: before === null || compare(parts(before), parts(version)) < 0 };
}

/**
 * What the server does before it accepts anybody where its data must be brought up to it: the system user this runs as may
 * do everything, through the socket in the data folder, which nobody else reaches. A folder that another user made has no
 * such account.
 */
export function upgradeStatements(userName) {
  const account = `'${userName}'@'localhost'`;
  return [
    `CREATE USER IF NOT EXISTS ${account} IDENTIFIED VIA unix_socket`,
    `GRANT ALL PRIVILEGES ON *.* TO ${account} WITH GRANT OPTION`,
  ];
}

/** Brings the running server's data up to it. The stamp is written last: what is cut short is begun again. */
export async function upgradeData(
  folder,
  { version, before, userName },
  say = (text) => process.stdout.write(text),
) {
  const whose =
    before === null ? 'do not say which MariaDB used them last' : `were last used by MariaDB ${before}`;
  say(`The data in ${folder} ${whose}: bringing them up to MariaDB ${version}.\n`);
  const program = findProgram('mariadb-upgrade', 'mysql_upgrade');
  if (!program) {
    throw new Sentence('mariadb-upgrade was not found: install mariadb-server-core and mariadb-client-core.');
  }
  const { code, output } = await step(
    'Upgrading the data',
    () =>
      runTied(
        program,
        // The socket relative to where it runs: the whole path could exceed the 107 bytes of a socket's name. --force,
        // since it would otherwise look at a note of its own, which a folder copied from elsewhere may carry wrongly.
        ['--no-defaults', '--socket=database.sock', `--user=${userName}`, '--force'],
        { cwd: join(folder, 'database') },
      ),
    say,
  );
  if (code !== 0) throw new Sentence(`The data could not be brought up to date:\n${lastLines(output)}`);
  writeStamp(folder, version);
}

export function writeStamp(folder, version) {
  writeFileSync(`${stampPath(folder)}.new`, `${version}\n`, { mode: 0o600 });
  renameSync(`${stampPath(folder)}.new`, stampPath(folder));
}

/** The version of a server program, such as 10.11.19. */
async function versionOf(server) {
  const { output } = await runTied(server, ['--no-defaults', '--version']);
  const [version] = /\d+\.\d+\.\d+/.exec(output.split('Ver ')[1] ?? '') ?? [];
  if (!version) throw new Sentence(`${server} does not say its version:\n${lastLines(output)}`);
  return version;
}

function readStamp(folder) {
  if (!existsSync(stampPath(folder))) return null;
  const text = readFileSync(stampPath(folder), 'utf8').trim();
  return /^\d+\.\d+\.\d+$/.test(text) ? text : null;
}

const parts = (version) => version.split('.').map(Number);
const series = (version) => parts(version).slice(0, 2);

function compare(a, b) {
  const index = a.findIndex((part, at) => part !== b[at]);
  return index < 0 ? 0 : a[index] - b[index];
}
