import type { Request, Response } from 'express';
import multer from 'multer';
import { IMPORT_BYTES_MAX } from '../../shared/patterns/imports.schema.ts';
import { invalid, Problem } from '../http/problem.ts';
import { cleanFileName } from './file-name.ts';
import { FILE_FIELD } from './imports.api.ts';

/** A file as it was sent, its name made harmless. */
export interface UploadedTable {
  name: string;
  content: Buffer;
  mediaType: string;
}

const receive = multer({
  storage: multer.memoryStorage(),
  // One byte more than allowed, so that a file of just the limit is not taken for a cut one.
  limits: { fileSize: IMPORT_BYTES_MAX + 1, files: 1, fields: 0, parts: 2, headerPairs: 20 },
  defParamCharset: 'utf8',
}).single(FILE_FIELD);

/** The one file of a multipart request, held in memory; call it after the sender was recognised. */
export async function uploadedTable(request: Request, reply: Response): Promise<UploadedTable> {
  if (!request.is('multipart/form-data')) {
    throw new Problem('unsupported', {
      detail: `Send the file as multipart/form-data, in the field “${FILE_FIELD}”.`,
    });
  }
  await new Promise<void>((resolve, reject) => {
    receive(request, reply, (error: unknown) => {
      if (error === undefined || error === null) resolve();
      else reject(toProblem(error));
    });
  });
  const { file } = request;
  if (file === undefined) {
    throw invalid([{ pointer: `/${FILE_FIELD}`, detail: 'Choose the file with the table: none was sent.' }]);
  }
  // The driver counts a column's characters, and a media type from outside may be anything.
  return {
    name: cleanFileName(file.originalname),
    content: file.buffer,
    mediaType: file.mimetype.slice(0, 120),
  };
}

function toProblem(error: unknown): Problem {
  if (error instanceof multer.MulterError) {
    if (error.code === 'LIMIT_FILE_SIZE') {
      return new Problem('tooLarge', {
        detail: 'The file is larger than 5 MB, the most that is taken: bring the size table alone.',
        cause: error,
      });
    }
    return invalid([
      { pointer: `/${FILE_FIELD}`, detail: `Send one file, in the field “${FILE_FIELD}”, and nothing else.` },
    ]);
  }
  return new Problem('malformed', { detail: 'The file did not arrive whole: try again.', cause: error });
}
