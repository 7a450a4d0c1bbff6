// What the launcher says while it works. Needs no node_modules.

/** Something the reader can act on: shown as it is, without a stack. */
export class Sentence extends Error {}

const DOT_MS = 3_000;

/** Runs the work; says its name once it has taken a second, shows that it goes on, and how long it took. */
export async function step(name, work, say = (text) => process.stdout.write(text)) {
  const began = performance.now();
  let isSaid = false;
  const first = setTimeout(() => {
    isSaid = true;
    say(`${name} …`);
  }, 1_000);
  const more = setInterval(() => isSaid && say('.'), DOT_MS);
  const end = (word) => {
    clearTimeout(first);
    clearInterval(more);
    if (isSaid) say(` ${word} ${seconds(performance.now() - began)}\n`);
  };
  try {
    const result = await work();
    end('done in');
    return result;
  } catch (error) {
    end('failed after');
    throw error;
  }
}

/** `1.2 s`, or `2 min 5 s`. */
export function seconds(ms) {
  if (ms < 60_000) return `${(ms / 1_000).toFixed(1)} s`;
  return `${Math.floor(ms / 60_000)} min ${Math.round((ms % 60_000) / 1_000)} s`;
}

/** The last lines of an output, where its fault usually stands. */
export function lastLines(text, count = 15) {
  return text.trimEnd().split('\n').slice(-count).join('\n');
}
