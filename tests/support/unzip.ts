import { buffer } from 'node:stream/consumers';
import { fromBuffer, type Entry, type ZipFile } from 'yauzl';

/** The files of an archive by their paths, read by another library than the one that wrote it. */
export function unzip(archive: Buffer): Promise<Map<string, Buffer>> {
  return new Promise((resolve, reject) => {
    fromBuffer(archive, { lazyEntries: true, validateEntrySizes: true }, (error, zip) => {
      if (error) {
        reject(error);
        return;
      }
      const files = new Map<string, Buffer>();
      zip.on('error', reject);
      zip.on('end', () => resolve(files));
      zip.on('entry', (entry: Entry) => {
        read(zip, entry).then((content) => {
          if (files.has(entry.fileName)) reject(new Error(`${entry.fileName} is there twice.`));
          files.set(entry.fileName, content);
          zip.readEntry();
        }, reject);
      });
      zip.readEntry();
    });
  });
}

function read(zip: ZipFile, entry: Entry): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    zip.openReadStream(entry, (error, stream) => {
      if (error) reject(error);
      else buffer(stream).then(resolve, reject);
    });
  });
}
