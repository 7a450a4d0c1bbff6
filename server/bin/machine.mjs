// What the project needs of the machine: npm packages and Debian's. Needs no node_modules.
import { accessSync, constants, existsSync, readFileSync } from 'node:fs';
import { spawn } from 'node:child_process';
import { delimiter, join } from 'node:path';
import { lastLines, Sentence, step } from './steps.mjs';
import { runTied } from './tied.mjs';

/** An ordinary user's PATH may lack the sbin folders. */
const FOLDERS = ['/usr/bin', '/usr/sbin', '/usr/local/bin', '/usr/local/sbin', '/bin', '/sbin'];

/** The path of the first of the programs that can be run, or null. */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(delimiter).filter(Boolean), ...FOLDERS];
  for (const name of names) {
    for (const folder of folders) if (canRun(join(folder, name))) return join(folder, name);
  }
  return null;
}

function canRun(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Stops with a sentence where Node is another than the packages are made for. */
export function checkNode(root) {
  const { engines } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    throw new Sentence(`Leeway needs Node ${engines.node}; this is Node ${process.versions.node}.`);
  }
}

/** Installs the npm packages where node_modules is not what package-lock.json says. */
export async function installPackages(root, say) {
  if (isInstalled(root)) return;
  const npm = process.env.npm_execpath;
  const [command, first] = npm?.endsWith('.js') ? [process.execPath, [npm]] : ['npm', []];
  // NODE_ENV=production would leave out what builds the client.
  const args = [...first, 'ci', '--include=dev', '--no-audit', '--no-fund', '--no-progress'];
  const { code, output } = await step(
    'Installing the npm packages',
    () => runTied(command, args, { cwd: root }),
    say,
  );
  if (code !== 0) throw new Sentence(`npm ci failed:\n${lastLines(output)}`);
}

/** npm writes its own list of what it put into node_modules, last of all: it is compared with the lock file. */
function isInstalled(root) {
  const wanted = readPackages(join(root, 'package-lock.json'));
  const found = readPackages(join(root, 'node_modules/.package-lock.json'));
  if (wanted === null) throw new Sentence('package-lock.json is missing.');
  if (found === null) return false;
  return Object.entries(wanted).every(([path, entry]) => {
    if (path === '') return true;
    const there = found[path];
    if (there === undefined)
      return entry.optional === true || entry.devOptional === true || entry.peer === true;
    return there.version === entry.version && there.integrity === entry.integrity;
  });
}

function readPackages(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')).packages : null;
}

/**
 * Installs Debian packages, as root or with sudo. `need` begins the sentence for those who can do neither;
 * `otherwise` ends it.
 */
export async function installDebian(packages, need, { otherwise = '', say } = {}) {
  const apt = findProgram('apt-get');
  const command = `apt-get install ${packages.join(' ')}`;
  const sorry = (why) =>
    new Sentence(
      `${need}, and ${why}: run “${apt ? `sudo ${command}` : `the equivalent of ${command}`}”${otherwise}.`,
    );
  if (!apt) throw sorry('this is not a Debian system');
  const prefix = await rootPrefix();
  if (prefix === null) throw sorry('installing it needs root or sudo');
  await step(
    `Installing ${packages.join(', ')}`,
    async () => {
      const options = ['-y', '-q', '--no-install-recommends', '-o', 'DPkg::Lock::Timeout=120'];
      await runWhole([...prefix, apt, 'update', '-q']);
      const { code, output } = await runWhole([...prefix, apt, 'install', ...options, ...packages]);
      if (code !== 0) throw new Sentence(`${command} failed:\n${lastLines(output)}`);
    },
    say,
  );
}

/** How to become root: not at all, with sudo, or (null) in no way. */
async function rootPrefix() {
  const environment = ['env', 'DEBIAN_FRONTEND=noninteractive'];
  if (process.getuid() === 0) return environment;
  const sudo = findProgram('sudo');
  if (!sudo) return null;
  if ((await runWhole([sudo, '-n', 'true'])).code === 0) return [sudo, '-n', ...environment];
  return process.stdin.isTTY && process.stdout.isTTY ? [sudo, ...environment] : null;
}

/** Not tied: a package manager cut short leaves a system that must be repaired by hand. It ends by itself. */
function runWhole([command, ...args]) {
  return new Promise((done) => {
    const child = spawn(command, args, { stdio: ['inherit', 'pipe', 'pipe'] });
    let output = '';
    child.stdout.on('data', (chunk) => (output += chunk));
    child.stderr.on('data', (chunk) => (output += chunk));
    child.once('error', (error) => done({ code: 127, output: error.message }));
    child.once('close', (code) => done({ code: code ?? 1, output }));
  });
}
