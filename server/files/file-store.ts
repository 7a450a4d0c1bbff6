import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { randomUUID } from 'node:crypto';

/** Where uploaded files are kept as they came. Knows ids and bytes, not what the files are. */
export interface FileStore {
  /** Keeps the bytes whole or not at all. */
  put: (id: string, bytes: Uint8Array) => Promise<void>;
  /** The bytes; throws where there are none under this id. */
  get: (id: string) => Promise<Buffer>;
  /** Removes the bytes; nothing where there are none. */
  remove: (id: string) => Promise<void>;
}

const ID = /^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** Keeps files in folders under `root`, which is made when the first one comes. */
export function createFileStore(root: string): FileStore {
  return {
    async put(id, bytes) {
      const path = pathOf(root, id);
      await mkdir(dirname(path), { recursive: true, mode: 0o700 });
      const draft = `${path}.${randomUUID()}.part`;
      try {
        await writeDown(draft, bytes);
        // Whoever reads sees the whole file or none.
        await rename(draft, path);
      } catch (error) {
        await rm(draft, { force: true });
        throw error;
      }
    },
    get: (id) => readFile(pathOf(root, id)),
    remove: (id) => rm(pathOf(root, id), { force: true }),
  };
}

async function writeDown(path: string, bytes: Uint8Array): Promise<void> {
  const file = await open(path, 'wx', 0o600);
  try {
    await file.writeFile(bytes);
    await file.sync();
  } finally {
    await file.close();
  }
}

/** Only an id names a file, so no text from outside can lead elsewhere. An id's end is random: it spreads the folders. */
function pathOf(root: string, id: string): string {
  if (!ID.test(id)) throw new RangeError('A file is kept under a lower-case UUID.');
  return join(root, id.slice(-2), id);
}
