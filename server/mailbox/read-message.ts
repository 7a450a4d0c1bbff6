/** A mail as it came over the wire, read as far as our own mails need: RFC 5322 headers, MIME parts of text. */
export interface ReadMessage {
  from: string;
  subject: string;
  messageId: string;
  text: string;
  html: string;
}

type Headers = ReadonlyMap<string, string>;

/** Reads what our own sender writes: single or multipart text, quoted-printable, base64 or plain. */
export function readMessage(raw: Buffer): ReadMessage {
  // One byte, one character: the parts say themselves which characters their bytes are.
  const { headers, body } = split(raw.toString('latin1'));
  const parts = { text: '', html: '' };
  collect(headers, body, parts, 0);
  return {
    from: readWords(headers.get('from') ?? ''),
    subject: readWords(headers.get('subject') ?? ''),
    messageId: headers.get('message-id') ?? '',
    ...parts,
  };
}

function split(part: string): { headers: Headers; body: string } {
  const end = /\r?\n\r?\n/.exec(part);
  const head = end === null ? part : part.slice(0, end.index);
  const headers = new Map<string, string>();
  for (const line of head.replace(/\r?\n[ \t]+/g, ' ').split(/\r?\n/)) {
    const colon = line.indexOf(':');
    if (colon > 0) headers.set(line.slice(0, colon).trim().toLowerCase(), line.slice(colon + 1).trim());
  }
  return { headers, body: end === null ? '' : part.slice(end.index + end[0].length) };
}

const DEEPEST = 5;

function collect(headers: Headers, body: string, into: { text: string; html: string }, depth: number): void {
  const type = headers.get('content-type') ?? 'text/plain';
  const boundary = /boundary="?([^";]+)"?/i.exec(type)?.[1];
  if (/^multipart\//i.test(type) && boundary !== undefined && depth < DEEPEST) {
    for (const part of body.split(`--${boundary}`).slice(1)) {
      if (part.startsWith('--')) break;
      const inner = split(part.replace(/^\r?\n/, ''));
      collect(inner.headers, inner.body, into, depth + 1);
    }
    return;
  }
  const words = decode(body, headers.get('content-transfer-encoding') ?? '7bit').toString('utf8');
  if (/^text\/html/i.test(type)) into.html ||= words;
  else if (/^text\//i.test(type)) into.text ||= words;
}

function decode(body: string, encoding: string): Buffer {
  switch (encoding.toLowerCase()) {
    case 'base64':
      return Buffer.from(body, 'base64');
    case 'quoted-printable':
      return quotedPrintable(body.replace(/=\r?\n/g, ''));
    default:
      return Buffer.from(body, 'latin1');
  }
}

function quotedPrintable(text: string): Buffer {
  const bytes = text.replace(/=([\dA-F]{2})/gi, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1');
}

/** Encoded words of RFC 2047; blanks between two of them are none. */
function readWords(header: string): string {
  return header
    .replace(/(\?=)\s+(=\?)/g, '$1$2')
    .replace(/=\?[\w-]+\?([bq])\?([^?]*)\?=/gi, (_, kind: string, text: string) =>
      (kind.toLowerCase() === 'b'
        ? Buffer.from(text, 'base64')
        : quotedPrintable(text.replaceAll('_', ' '))
      ).toString('utf8'),
    );
}
