import type { Logger } from 'pino';
import type { FileStore } from './file-store.ts';

/**
 * Removes bytes that no row refers to any more. The rows went first, so what cannot be removed now is a leftover, not a
 * loss: it is written down and the request succeeds.
 */
export async function removeBytes(files: FileStore, log: Logger, ids: readonly string[]): Promise<void> {
  for (const id of ids) {
    try {
      await files.remove(id);
    } catch (error) {
      log.warn(
        { file: id, error: error instanceof Error ? error.name : typeof error },
        'bytes were left over',
      );
    }
  }
}
