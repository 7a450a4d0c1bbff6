// `npm test`, `npm run check`, `npm run shots`, `npm run bench`: installs what they need, runs them, counts.
import { mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { spawnTied } from './tied.mjs';
import { buildIfChanged } from './build.mjs';
import { CHECKS, runCheck, runSuite, SUITES } from './checks.mjs';
import { findMariaDb } from './database.mjs';
import { whileLocked } from './lock.mjs';
import { checkNode, findProgram, installDebian, installPackages } from './machine.mjs';
import { seconds, Sentence } from './steps.mjs';
import { endChildren } from './tied.mjs';

const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));
const [mode = '--all', ...rest] = process.argv.slice(2);
const total = { passed: 0, failed: 0 };
const context = { root, environment: {} };
const say = (text) => process.stdout.write(`${text}\n`);
/** The figures of `npm run bench` are read by programs: nothing else goes there. */
const sayBeside = (text) => process.stderr.write(text);

async function main() {
  checkNode(root);
  process.chdir(root);
  // A test sees of the environment only what it sets itself.
  for (const name of [
    'DATABASE_URL',
    'LEEWAY_DATA',
    'BETTER_AUTH_SECRET',
    'APP_URL',
    'HOST',
    'PORT',
    'NODE_ENV',
  ]) {
    delete process.env[name];
  }
  mkdirSync(join(root, '.test'), { recursive: true });
  await whileLocked(root, 'packages', () => installPackages(root, sayBeside));
  if (mode === '--checks') {
    await runAtOnce(CHECKS);
    return close();
  }
  await findMariaDb(sayBeside);
  context.environment.LEEWAY_CHROMIUM = await findChromium();
  if (mode === '--all') return runAll();
  const script = { '--shots': 'tests/e2e/shots.ts', '--bench': 'tests/bench/run.ts' }[mode];
  if (!script) throw new Sentence(`${mode} is unknown: it may be --checks, --shots or --bench.`);
  await buildIfChanged(root, sayBeside);
  return runScript(script);
}

async function runAll() {
  const began = performance.now();
  await runAtOnce([...CHECKS, ['build', build]]);
  for (const suite of SUITES) count(await runSuite(suite, context));
  say(`All in ${seconds(performance.now() - began)}`);
  return close();
}

async function build() {
  try {
    await buildIfChanged(root, () => undefined);
    return { code: 0, output: '' };
  } catch (error) {
    return { code: 1, output: error.message };
  }
}

/** Two at a time: most machines that run this have two cores. */
async function runAtOnce(checks) {
  const waiting = [...checks];
  const work = async () => {
    for (let check = waiting.shift(); check; check = waiting.shift()) count(await runCheck(check, context));
  };
  await Promise.all([work(), work()]);
}

function count({ name, ms, passed, failed, output }) {
  total.passed += passed;
  total.failed += failed;
  const tally = passed + failed > 1 ? `  ${passed} passed${failed ? `, ${failed} failed` : ''}` : '';
  if (output) say(`\n${output.trimEnd()}\n`);
  say(`${failed ? '✗' : '✓'} ${name.padEnd(14)}${seconds(ms).padStart(8)}${tally}`);
}

/** The last line, and the exit code that goes with it. */
function close() {
  say(`${total.passed} passed, ${total.failed} failed`);
  return total.failed === 0 ? 0 : 1;
}

/** Runs one of the project's own TypeScript programs, its output as it comes. */
function runScript(script) {
  return new Promise((done) => {
    const child = spawnTied(process.execPath, ['--import', 'tsx', script, ...rest], {
      env: { ...process.env, ...context.environment },
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    child.once('close', (code) => done(code ?? 1));
  });
}

async function findChromium() {
  const find = () => findProgram('chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome');
  const found = find();
  if (found) return found;
  await installDebian(['chromium'], 'The tests need Chromium, which was not found', { say: sayBeside });
  const installed = find();
  if (!installed) throw new Sentence('Chromium was installed but cannot be found.');
  return installed;
}

let ending = null;
function end(code) {
  ending ??= endChildren().then(() => process.exit(code));
  return ending;
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(1));

try {
  await end(await main());
} catch (error) {
  process.stderr.write(`${error instanceof Sentence ? error.message : error.stack}\n`);
  // Whatever stopped it, the last line says so.
  if (mode === '--all' || mode === '--checks') say(`${total.passed} passed, ${total.failed + 1} failed`);
  await end(1);
}
