import { readdirSync } from 'node:fs';
import { extname } from 'node:path';
import express, { type RequestHandler, type Response } from 'express';

/** What the build leaves beside a file, the smaller first. */
const ENCODINGS = [
  ['br', '.br'],
  ['gzip', '.gz'],
] as const;

/**
 * Sends the compressed form that the build left beside a file, to browsers that take it. The folder is listed
 * once: names from outside are only ever compared with it.
 */
export function precompressed(folder: string, maxAge: string): RequestHandler[] {
  const names = new Set(readdirSync(folder).map((name) => `/${name}`));
  return [
    (request, response, next) => {
      const found = ENCODINGS.find(
        ([encoding, suffix]) =>
          names.has(request.path + suffix) && request.acceptsEncodings(encoding) === encoding,
      );
      response.vary('accept-encoding');
      if (found) request.url = request.path + found[1];
      next();
    },
    express.static(folder, { immutable: true, maxAge, index: false, redirect: false, setHeaders: setType }),
  ];
}

/** Only once the file is really being sent: an answer that it is gone is not compressed. */
function setType(response: Response, path: string): void {
  const found = ENCODINGS.find(([, suffix]) => path.endsWith(suffix));
  if (!found) return;
  const [encoding, suffix] = found;
  response.set('content-encoding', encoding).type(extname(path.slice(0, -suffix.length)));
}
