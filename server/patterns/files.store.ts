import { createHash } from 'node:crypto';
import { eq, inArray } from 'drizzle-orm';
import type { StoredFile } from '../../shared/patterns/patterns.schema.ts';
import type { Db } from '../db/client.ts';
import { storedFile } from './files.table.ts';

/** A kept file and whose it is. */
export interface OwnedFile extends StoredFile {
  ownerId: string;
}

export async function findFile(db: Db, id: string): Promise<OwnedFile | null> {
  const [row] = await db
    .select({
      id: storedFile.id,
      ownerId: storedFile.ownerId,
      name: storedFile.name,
      bytes: storedFile.bytes,
    })
    .from(storedFile)
    .where(eq(storedFile.id, id));
  return row ?? null;
}

/** Writes down a file whose bytes are kept already. */
export async function insertFile(
  db: Db,
  file: OwnedFile,
  content: Uint8Array,
  mediaType: string,
): Promise<void> {
  const sha256 = createHash('sha256').update(content).digest('hex');
  await db.insert(storedFile).values({ ...file, sha256, mediaType, createdAt: new Date() });
}

export async function deleteFiles(db: Db, ids: readonly string[]): Promise<void> {
  if (ids.length > 0) await db.delete(storedFile).where(inArray(storedFile.id, [...ids]));
}
