// A backup's archive: what lies in it, and packing and unpacking it. Needs no node_modules.
import { createHash } from 'node:crypto';
import {
  closeSync,
  createReadStream,
  openSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
} from 'node:fs';
import { join } from 'node:path';
import { lastLines, Sentence } from './steps.mjs';
import { spawnTied, runTied } from './tied.mjs';

/** Names in the archive. `manifest` says what the rest must be. */
export const PARTS = {
  manifest: 'manifest.json',
  dump: 'leeway.sql',
  files: 'files',
  secret: 'secret',
  signIns: 'demo-sign-ins.json',
};
export const FORMAT = 1;

/** Packs a folder into a file that appears whole or not at all, and that only its owner can read. */
export async function pack(folder, file) {
  const draft = `${file}.part`;
  rmSync(draft, { force: true });
  const out = openSync(draft, 'wx', 0o600);
  try {
    const child = spawnTied('tar', ['--create', '--gzip', '--directory', folder, ...readdirSync(folder)], {
      stdio: ['ignore', out, 'pipe'],
    });
    const { code, output } = await ended(child);
    if (code !== 0) throw new Sentence(`The archive could not be written:\n${lastLines(output)}`);
    renameSync(draft, file);
  } catch (error) {
    rmSync(draft, { force: true });
    throw error;
  } finally {
    closeSync(out);
  }
}

/** Unpacks a backup into a folder and answers its manifest. Throws a sentence where it is none or is damaged. */
export async function unpack(file, folder) {
  const no = (why) => new Sentence(`${file} is no whole backup of Leeway: ${why}.`);
  const { code, output } = await runTied('tar', [
    ...['--extract', '--gzip', '--no-same-owner', '--file', file, '--directory', folder],
  ]);
  if (code !== 0) throw no(lastLines(output, 1) || 'it cannot be unpacked');
  const manifest = readManifest(join(folder, PARTS.manifest));
  if (manifest === null) throw no('it has no manifest');
  if (manifest.format !== FORMAT)
    throw no(`its format is ${manifest.format}, and this version reads ${FORMAT}`);
  if ((await hashOf(join(folder, PARTS.dump)).catch(() => null)) !== manifest.dumpSha256) {
    throw no('the database in it is damaged');
  }
  const files = filesBelow(join(folder, PARTS.files)).length;
  if (files !== manifest.files) throw no(`it should hold ${manifest.files} files and holds ${files}`);
  return manifest;
}

function readManifest(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return null;
  }
}

/** The paths of all files below, relative to it; none where there is no such folder. */
export function filesBelow(folder) {
  try {
    return readdirSync(folder, { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1));
  } catch (error) {
    if (error.code === 'ENOENT') return [];
    throw error;
  }
}

async function hashOf(path) {
  const hash = createHash('sha256');
  for await (const chunk of createReadStream(path)) hash.update(chunk);
  return hash.digest('hex');
}

function ended(child) {
  return new Promise((done) => {
    let output = '';
    child.stderr.setEncoding('utf8').on('data', (chunk) => (output += chunk));
    child.once('error', (error) => done({ code: 127, output: error.message }));
    child.once('close', (code) => done({ code: code ?? 1, output }));
  });
}
