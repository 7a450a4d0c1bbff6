import { once } from 'node:events';
import { createReadStream, createWriteStream } from 'node:fs';
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PassThrough, Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { ZipFile } from 'yazl';
import type { FileStore } from '../files/file-store.ts';
import type { Belongings } from './archive.store.ts';
import { accountFiles, peopleFiles, planFiles, README, type Entry } from './archive-entries.ts';
import { patternFiles, uploadEntries, type WriteTable } from './archive-patterns.ts';

/** A finished archive. */
export interface Archive {
  stream: Readable;
  bytes: number;
}

/**
 * Writes everything into one archive beside, whole before the first byte of it is sent: the moment it shows must not last as
 * long as somebody's slow connection. The file has no name any more once it is opened, so nothing of it is left behind.
 */
export async function writeArchive(
  all: Belongings,
  files: FileStore,
  writeTable: WriteTable,
): Promise<Archive> {
  const folder = await mkdtemp(join(tmpdir(), 'leeway-archive-'));
  try {
    const path = join(folder, 'archive.zip');
    const zip = new ZipFile();
    const output = zip.outputStream.pipe(new PassThrough());
    // What goes wrong in the archive itself is told here and nowhere else.
    zip.on('error', (error: Error) => output.destroy(error));
    fill(zip, all, files, writeTable);
    await pipeline(output, createWriteStream(path, { mode: 0o600 }));
    const { size } = await stat(path);
    const stream = createReadStream(path);
    await once(stream, 'open');
    return { stream, bytes: size };
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

function fill(zip: ZipFile, all: Belongings, files: FileStore, writeTable: WriteTable): void {
  const entries: Entry[] = [
    { path: 'read me.txt', text: README },
    ...accountFiles(all),
    ...peopleFiles(all),
    ...patternFiles(all, writeTable),
    ...planFiles(all),
  ];
  for (const { path, text } of entries) zip.addBuffer(Buffer.from(text, 'utf8'), path);
  for (const { path, id } of uploadEntries(all)) {
    zip.addReadStreamLazy(path, (done) => {
      // One at a time, as the archive comes to it.
      files.get(id).then(
        (content) => done(null, Readable.from([content])),
        (error: unknown) => done(error, Readable.from([])),
      );
    });
  }
  zip.end();
}
