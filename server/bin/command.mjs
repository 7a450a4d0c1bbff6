// What the commands beside `npm start` share: they find the data of an instance, running or stopped. Needs no node_modules
// at first.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { startDatabase } from './database.mjs';
import { lockFolder, whileLocked } from './lock.mjs';
import { checkNode, installPackages } from './machine.mjs';
import { Sentence } from './steps.mjs';
import { endChildren } from './tied.mjs';

export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
export const say = (text) => process.stdout.write(`${text}\n`);

/** Where whoever typed the command stands; npm itself goes to the project's folder. */
const here = process.env.INIT_CWD || process.cwd();
export const pathFrom = (text) => resolve(here, text);

export const dataFolder = () => resolve(root, process.env.LEEWAY_DATA || '.leeway');

const undoing = [];
let ending = null;

/** Undone when the command ends, however it ends, the last first. */
export function afterwards(undo) {
  undoing.push(undo);
}

function end(code) {
  ending ??= (async () => {
    for (const undo of undoing.reverse()) {
      try {
        await undo();
      } catch (error) {
        process.stderr.write(`${error.stack}\n`);
        code ||= 1;
      }
    }
    await endChildren();
    process.exit(code);
  })();
  return ending;
}

/** Runs a command to its end: its sentence instead of a stack, and nothing left behind. */
export async function run(main) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(1));
  try {
    checkNode(root);
    process.chdir(root);
    await whileLocked(root, 'packages', () => installPackages(root));
    // The server's own code, as it is written: a command must not wait for a build.
    const { register } = await import('tsx/esm/api');
    register();
    await main(process.argv.slice(2));
    await end(0);
  } catch (error) {
    process.stderr.write(`${error instanceof Sentence ? error.message : error.stack}\n`);
    await end(1);
  }
}

/**
 * The address of the instance's database: yours, the running instance's, or one started for this command on the data of
 * a stopped one (which then cannot be started meanwhile).
 */
export async function openDatabase() {
  if (process.env.DATABASE_URL) {
    return { url: process.env.DATABASE_URL.replace(/^mariadb:/, 'mysql:'), isStartedHere: false };
  }
  const folder = dataFolder();
  if (!existsSync(join(folder, 'database'))) {
    throw new Sentence(
      `There is no data in ${folder}: start Leeway once, or set LEEWAY_DATA to the folder it uses.`,
    );
  }
  const lock = await lockFolder(folder, 'data');
  if (lock === null) return { url: runningUrl(folder), isStartedHere: false };
  const database = await startDatabase(folder);
  afterwards(database.stop);
  return { url: database.url, isStartedHere: true };
}

/** How the running instance reaches its database: it keeps that in a file that only its owner can read. */
function runningUrl(folder) {
  const path = join(folder, 'database.cnf');
  if (!existsSync(path)) throw new Sentence('Leeway is just starting or stopping: try again in a moment.');
  const options = Object.fromEntries(
    readFileSync(path, 'utf8')
      .split('\n')
      .flatMap((line) => (line.includes('=') ? [line.split(/=(.*)/s, 2)] : [])),
  );
  return `mysql://${options.user}:${options.password}@${options.host}:${options.port}/leeway`;
}

/** A folder made anew, and removed when the command ends. */
export function temporaryFolder(path, mode) {
  const remove = () => rmSync(path, { recursive: true, force: true });
  remove();
  mkdirSync(path, { mode });
  afterwards(remove);
  return path;
}
