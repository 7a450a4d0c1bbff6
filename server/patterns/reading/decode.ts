import { IMPORT_BYTES_MAX, type ImportIssue } from '../../../shared/patterns/imports.schema.ts';
import { cautionAt, errorAt } from './issues.ts';

/** The text of a file, or why it is not one. */
export type Decoded = { ok: true; text: string; issues: ImportIssue[] } | { ok: false; issue: ImportIssue };

const SAVE_AS_CSV =
  'This is a spreadsheet file, not a table of text: open it, save the sheet as CSV, and bring that file.';
const NOT_A_TABLE = 'Bring the table as a CSV file: text, a line for each size.';

/** How files that are no text begin. The signatures are those of the formats' own public descriptions. */
const SIGNATURES: { bytes: readonly number[]; code: string; words: string }[] = [
  { bytes: [0x50, 0x4b, 0x03, 0x04], code: 'spreadsheetFile', words: SAVE_AS_CSV },
  { bytes: [0xd0, 0xcf, 0x11, 0xe0], code: 'spreadsheetFile', words: SAVE_AS_CSV },
  { bytes: [0x25, 0x50, 0x44, 0x46], code: 'binaryFile', words: `This is a PDF. ${NOT_A_TABLE}` },
  { bytes: [0x89, 0x50, 0x4e, 0x47], code: 'binaryFile', words: `This is a picture. ${NOT_A_TABLE}` },
  { bytes: [0xff, 0xd8, 0xff], code: 'binaryFile', words: `This is a picture. ${NOT_A_TABLE}` },
  { bytes: [0x47, 0x49, 0x46, 0x38], code: 'binaryFile', words: `This is a picture. ${NOT_A_TABLE}` },
  {
    bytes: [0x1f, 0x8b],
    code: 'binaryFile',
    words: `This is a packed file: unpack it first. ${NOT_A_TABLE}`,
  },
];

/**
 * Reads bytes as text: UTF-8, UTF-16 where its mark stands in front (some spreadsheets save so), else Windows-1252 with a
 * caution. Empty, too large and binary files are refused in words, before anything is built from them.
 */
export function decode(bytes: Uint8Array): Decoded {
  if (bytes.length > IMPORT_BYTES_MAX) {
    return refused('fileTooLarge', 'The file is larger than 5 MB: bring the size table alone.');
  }
  const signature = SIGNATURES.find((known) => known.bytes.every((byte, at) => bytes[at] === byte));
  if (signature) return refused(signature.code, signature.words);
  const { text, issues } = toText(bytes);
  if (hasControls(text)) return refused('binaryFile', `This file is not text. ${NOT_A_TABLE}`);
  if (text.trim() === '') {
    return refused('emptyFile', 'The file is empty: it needs a heading row and a row for each size.');
  }
  return { ok: true, text: text.replace(/\r\n?/g, '\n'), issues };
}

function toText(bytes: Uint8Array): { text: string; issues: ImportIssue[] } {
  const mark = `${String(bytes[0])} ${String(bytes[1])}`;
  if (mark === '255 254') return { text: new TextDecoder('utf-16le').decode(bytes), issues: [] };
  if (mark === '254 255') return { text: new TextDecoder('utf-16be').decode(bytes), issues: [] };
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), issues: [] };
  } catch {
    const words =
      'The file is not in UTF-8; it was read as Windows-1252. Look whether ½ and accented letters came through.';
    return {
      text: fromWindows1252(bytes),
      issues: [cautionAt({}, 'encoding', words)],
    };
  }
}

/** What Windows-1252 holds from 0x80 to 0x9f, where Latin-1 has control characters; five places are empty. */
const WINDOWS_1252 = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

/** By hand, since the decoder of Node 20 reads Windows-1252 as Latin-1 and loses its dashes. */
function fromWindows1252(bytes: Uint8Array): string {
  const latin = Buffer.from(bytes).toString('latin1');
  return latin.replace(/[\u0080-\u009f]/g, (sign) => WINDOWS_1252[sign.charCodeAt(0) - 0x80] ?? sign);
}

/** Control characters other than tabs and line ends have no place in a table. */
function hasControls(text: string): boolean {
  return /[\u0000-\u0008\u000e-\u001f]/.test(text);
}

function refused(code: string, words: string): Decoded {
  return { ok: false, issue: errorAt({}, code, words) };
}
