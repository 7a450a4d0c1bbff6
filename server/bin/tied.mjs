// Child processes that end with this one, however it ends. Needs no node_modules.
import { spawn } from 'node:child_process';

/** The kernel tells a child of its parent's death only from `prctl` on: the shell closes the gap before it. */
const STILL_MINE = '[ "$PPID" = "$0" ] || exit 1; exec "$@"';

/** Everything still running, so that an orderly end need not wait for the kernel. */
const running = new Set();

/**
 * Starts a program that gets SIGTERM when this process dies, even by SIGKILL. It leads a process group of its
 * own: Ctrl-C reaches only the launcher, which then ends its children in the right order.
 */
export function spawnTied(command, args, { as, ...options } = {}) {
  const drop = as ? [`--reuid=${as.uid}`, `--regid=${as.gid}`, '--clear-groups'] : [];
  const child = spawn(
    'setpriv',
    [
      ...drop,
      '--pdeathsig',
      'TERM',
      '--',
      '/bin/sh',
      '-c',
      STILL_MINE,
      String(process.pid),
      command,
      ...args,
    ],
    { stdio: ['ignore', 'pipe', 'pipe'], detached: true, ...options },
  );
  running.add(child);
  child.once('close', () => running.delete(child));
  child.once('error', () => running.delete(child));
  return child;
}

/** Runs a program to its end and gives its exit code and all that it wrote; `onOutput` hears it as it comes. */
export function runTied(command, args, { onOutput, ...options } = {}) {
  return new Promise((done) => {
    const child = spawnTied(command, args, options);
    let output = '';
    const hear = (chunk) => {
      output += chunk;
      onOutput?.(chunk);
    };
    child.stdout?.setEncoding('utf8').on('data', hear);
    child.stderr?.setEncoding('utf8').on('data', hear);
    child.once('error', (error) => done({ code: 127, output: `${output}${error.message}\n` }));
    child.once('close', (code, signal) => done({ code: code ?? 1, signal, output }));
  });
}

/** Ends every child with its own children, politely first. */
export async function endChildren(patienceMs = 5_000) {
  const ended = [...running].map(
    (child) =>
      new Promise((done) => {
        child.once('close', done);
        signalGroup(child, 'SIGTERM');
        setTimeout(() => signalGroup(child, 'SIGKILL'), patienceMs).unref();
      }),
  );
  await Promise.all(ended);
}

/** Signals the child and whatever it started in its group. */
export function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    child.kill(signal);
  }
}
