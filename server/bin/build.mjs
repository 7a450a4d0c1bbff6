// Builds the browser's and the server's code where the sources changed. Needs no node_modules until it builds.
import { createHash } from 'node:crypto';
import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync } from 'node:fs';
import { renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync, constants, gzipSync } from 'node:zlib';
import { whileLocked } from './lock.mjs';
import { lastLines, Sentence, step } from './steps.mjs';
import { runTied } from './tied.mjs';

/** All that ends up in the build, and what decides how. */
const SOURCES = [
  'index.html',
  'vite.config.ts',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
  'public',
  'shared',
  'src',
  'server',
  'server/bin/build.mjs',
];

/** Loaded from node_modules as they are. The others are bundled: hundreds of small files take half a second to load. */
const EXTERNAL = ['express', 'helmet', 'multer', 'mysql2', 'papaparse', 'pino', 'pino-http', 'vite'];

/** How long the files of earlier builds are served. */
const KEPT_MS = 24 * 3_600_000;

/** Two launchers in one folder with data of their own build one after the other, and the second finds it done. */
export function buildIfChanged(root, say) {
  return whileLocked(root, 'build', async () => {
    const stamp = stampOf(root);
    const stampPath = join(root, 'dist/stamp');
    if (existsSync(stampPath) && readFileSync(stampPath, 'utf8') === stamp) return;
    await step('Building', () => build(root), say);
    writeFileSync(stampPath, stamp);
  });
}

/** Built beside and renamed, so that an instance that runs from the same folder never sees half a build. */
async function build(root) {
  const draft = join(root, 'dist/.draft');
  rmSync(draft, { recursive: true, force: true });
  mkdirSync(draft, { recursive: true });
  const results = await Promise.all([
    runTied(
      process.execPath,
      [
        join(root, 'node_modules/vite/bin/vite.js'),
        'build',
        '--outDir',
        join(draft, 'client'),
        '--logLevel',
        'warn',
      ],
      { cwd: root },
    ),
    runTied(
      join(root, 'node_modules/.bin/esbuild'),
      [
        'server/index.ts',
        '--bundle',
        ...EXTERNAL.map((name) => `--external:${name}`),
        // What is written for `require` and bundled all the same asks for Node's own modules by it.
        "--banner:js=import { createRequire } from 'node:module'; const require = createRequire(import.meta.url);",
        '--platform=node',
        '--target=node20',
        '--format=esm',
        '--sourcemap',
        '--log-level=warning',
        `--outfile=${join(draft, 'server/index.js')}`,
      ],
      { cwd: root },
    ),
  ]);
  const failed = results.find(({ code }) => code !== 0);
  if (failed) throw new Sentence(`The build failed:\n${lastLines(failed.output, 30)}`);
  compressAssets(join(draft, 'client/assets'));
  rmSync(join(root, 'dist/stamp'), { force: true });
  keepEarlierAssets(join(root, 'dist/client/assets'), join(draft, 'client/assets'));
  for (const part of ['client', 'server']) {
    // Renamed away before it is removed, which takes longer: hardly a moment is without it.
    const [current, old] = [join(root, 'dist', part), join(draft, `old-${part}`)];
    if (existsSync(current)) renameSync(current, old);
    renameSync(join(draft, part), current);
  }
  rmSync(draft, { recursive: true, force: true });
}

/** A page opened before the build still asks for the chunks of its own; their names never mean anything else. */
function keepEarlierAssets(from, to) {
  if (!existsSync(from)) return;
  for (const name of readdirSync(from)) {
    const isYoung = Date.now() - statSync(join(from, name)).mtimeMs < KEPT_MS;
    if (isYoung && !existsSync(join(to, name))) {
      cpSync(join(from, name), join(to, name), { preserveTimestamps: true });
    }
  }
}

/** Once here instead of at every request. */
function compressAssets(folder) {
  for (const name of readdirSync(folder).filter((file) => /\.(js|css|svg)$/.test(file))) {
    const bytes = readFileSync(join(folder, name));
    writeFileSync(join(folder, `${name}.gz`), gzipSync(bytes, { level: 9 }));
    writeFileSync(
      join(folder, `${name}.br`),
      brotliCompressSync(bytes, { params: { [constants.BROTLI_PARAM_QUALITY]: 9 } }),
    );
  }
}

/** Changes when any source changes: names and contents, so that a checkout's new dates alone build nothing. */
function stampOf(root) {
  const hash = createHash('sha256').update(process.version);
  for (const source of SOURCES) {
    for (const path of filesBelow(root, source))
      hash.update(`\0${path}\0`).update(readFileSync(join(root, path)));
  }
  return hash.digest('hex');
}

function filesBelow(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (path === 'server/bin') return [];
  if (/\.[a-z]+$/.test(path)) return [path];
  return readdirSync(full, { withFileTypes: true })
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) =>
      entry.isDirectory() ? filesBelow(root, `${path}/${entry.name}`) : [`${path}/${entry.name}`],
    );
}
