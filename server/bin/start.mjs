// `npm start` and `npm run dev`: from a bare checkout to an address that answers. Needs no node_modules at first.
import { existsSync, mkdirSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { buildIfChanged } from './build.mjs';
import { startDatabase } from './database.mjs';
import { lockFolder, whileLocked } from './lock.mjs';
import { checkNode, installPackages } from './machine.mjs';
import { Sentence, step } from './steps.mjs';
import { endChildren } from './tied.mjs';

const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
const isDevelopment = process.argv.includes('--dev');
/** What stands, in the order it was put up; taken down from the top. */
const standing = [];
let ending = null;

/** Both npm and the terminal pass a signal on: the second finds the first at work. */
function end(code, why) {
  ending ??= (async () => {
    if (why) process.stderr.write(`${why}\n`);
    const hurry = setTimeout(() => process.exit(1), 30_000);
    for (const stop of standing.reverse()) {
      await stop().catch((error) => process.stderr.write(`${error.stack}\n`));
    }
    await endChildren();
    clearTimeout(hurry);
    process.exit(code);
  })();
  return ending;
}

async function start() {
  checkNode(root);
  process.chdir(root);
  process.env.NODE_ENV ??= isDevelopment ? 'development' : 'production';
  // Read raw: what parses the environment is not installed yet.
  const dataFolder = resolve(process.env.LEEWAY_DATA || '.leeway');
  const isOwnDatabase = !process.env.DATABASE_URL;
  makeFolder(dataFolder);
  if (isOwnDatabase && (await lockFolder(dataFolder, 'data')) === null) {
    throw new Sentence(
      `Leeway is already running on the data in ${dataFolder}: stop it first, or set LEEWAY_DATA to another folder.`,
    );
  }
  await checkPort(Number(process.env.PORT || 3000), process.env.HOST || '127.0.0.1');
  await whileLocked(root, 'packages', () => installPackages(root));
  if (!isDevelopment) await buildIfChanged(root);
  // While the server's code is read, the database starts; the first time, though, it is first asked whether the
  // configuration can be used.
  const early =
    isOwnDatabase && existsSync(join(dataFolder, 'database')) ? startOwnDatabase(dataFolder) : null;
  early?.catch(() => undefined);
  const { readConfig, serve } = await loadServer();
  readConfig(process.env, 'mysql://not-yet-started/leeway');
  const database = isOwnDatabase ? await (early ?? startOwnDatabase(dataFolder)) : null;
  const config = readConfig(process.env, database?.url);
  const served = await step('Preparing the tables', () => serve(config, { root, isDevelopment }));
  standing.push(served.stop);
  if (ending === null) tell(served);
}

async function startOwnDatabase(dataFolder) {
  const database = await startDatabase(dataFolder);
  standing.push(database.stop);
  void database.ended.then(
    () => ending ?? end(1, 'The database ended unexpectedly; its log is in the data folder.'),
  );
  return database;
}

async function loadServer() {
  if (!isDevelopment) return import(join(root, 'dist/server/index.js'));
  const { register } = await import('tsx/esm/api');
  register();
  return import('../index.ts');
}

function makeFolder(folder) {
  try {
    mkdirSync(folder, { recursive: true, mode: 0o711 });
  } catch (error) {
    throw new Sentence(`LEEWAY_DATA ${folder} cannot be made or used (${error.code}).`);
  }
}

/** Told before minutes are spent on installing. What is not a port at all is told by the configuration. */
function checkPort(port, host) {
  return new Promise((done, failed) => {
    const probe = createServer();
    probe.once('error', ({ code }) => {
      if (code !== 'EADDRINUSE') done();
      else failed(new Sentence(`PORT ${port} is taken by another program: set PORT to a free one.`));
    });
    try {
      probe.listen(port, host, () => probe.close(done));
    } catch {
      done();
    }
  });
}

function tell({ url, signIns }) {
  const lines = [`\nLeeway is at ${url}`];
  if (signIns.length > 0) {
    lines.push('', 'Sign in with one of the demo accounts (this machine only):');
    const width = Math.max(...signIns.map(({ email }) => email.length));
    for (const { email, password, role } of signIns) {
      lines.push(`  ${email.padEnd(width)}  ${password}  ${role}`);
    }
  }
  lines.push('', 'Ctrl-C stops it.');
  process.stdout.write(`${lines.join('\n')}\n`);
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(0));

try {
  await start();
} catch (error) {
  const isPlain = error instanceof Sentence || error.constructor.name === 'ConfigError';
  await end(1, isPlain ? error.message : error.stack);
}
