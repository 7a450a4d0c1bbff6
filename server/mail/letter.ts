/** What a mail says, in paragraphs; how it looks is made of it when it is sent. */
export interface Letter {
  subject: string;
  /** The name of whom it greets; null where we do not know it. */
  greets: string | null;
  /** Before the link. */
  lines: string[];
  link: { words: string; url: string } | null;
  /** After the link. */
  after: string[];
}

/** A mail's body, twice. */
export interface MailBody {
  text: string;
  html: string;
}

const CLOSING = 'Leeway';

/** Sets a letter as plain text and as HTML that needs no picture, no style sheet and no network. */
export function setLetter({ subject, greets, lines, link, after }: Letter): MailBody {
  const greeting = greets === null ? 'Hello,' : `Hello ${greets},`;
  const text = [
    greeting,
    ...lines,
    ...(link === null ? [] : [`${link.words}:\n${link.url}`]),
    ...after,
    CLOSING,
  ];
  const paragraphs = [greeting, ...lines, ...(link === null ? [] : [link]), ...after, CLOSING].map((part) =>
    typeof part === 'string' ? paragraph(escape(part)) : linkParagraph(part),
  );
  return { text: `${text.join('\n\n')}\n`, html: page(escape(subject), paragraphs.join('\n')) };
}

const FACE = "font-family:'Public Sans',system-ui,sans-serif;font-size:17px;line-height:1.5";

const page = (title: string, body: string): string =>
  `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${title}</title></head>
<body style="margin:0;padding:24px">
<div style="max-width:34em;${FACE}">
${body}
</div>
</body>
</html>
`;

const paragraph = (inner: string): string => `<p style="margin:0 0 1em">${inner}</p>`;

/** The address is written out too: a mail program may show no links. */
function linkParagraph({ words, url }: { words: string; url: string }): string {
  const address = escape(url);
  return `${paragraph(`<a href="${address}">${escape(words)}</a>`)}
${paragraph(`<span style="font-size:14px;word-break:break-all">${address}</span>`)}`;
}

const escape = (text: string): string =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
