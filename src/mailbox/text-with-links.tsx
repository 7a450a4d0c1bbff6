import { Link } from 'react-router-dom';

/** A piece of a text: plain words, or an address of this site, as its path. */
export type TextPart = { kind: 'words'; text: string } | { kind: 'own'; text: string; path: string };

/** Splits a text at the web addresses in it; only those of `origins` become links, the rest stay words. */
export function splitAtLinks(text: string, origins: readonly string[]): TextPart[] {
  return text.split(/(https?:\/\/[^\s<>"]+)/).flatMap((piece): TextPart[] => {
    if (piece === '') return [];
    const url = /^https?:/.test(piece) && URL.canParse(piece) ? new URL(piece) : null;
    if (url === null || !origins.includes(url.origin)) return [{ kind: 'words', text: piece }];
    return [{ kind: 'own', text: piece, path: url.pathname + url.search + url.hash }];
  });
}

/** This site under the two names that one machine has for itself: a mail may say the other. */
function ownOrigins({ origin, protocol, port }: Location): string[] {
  const at = (host: string) => `${protocol}//${host}${port === '' ? '' : `:${port}`}`;
  return [origin, at('127.0.0.1'), at('localhost')];
}

/** A mail's text as it came. It is never drawn as HTML: what came by mail is no page of ours. */
export function TextWithLinks({ text }: { text: string }) {
  return (
    <div className="max-w-[44rem] break-words whitespace-pre-wrap">
      {splitAtLinks(text, ownOrigins(window.location)).map((part, index) =>
        part.kind === 'words' ? (
          part.text
        ) : (
          <Link
            key={index}
            to={part.path}
            className="break-all text-woad underline decoration-1 underline-offset-4 hover:decoration-2"
          >
            {part.text}
          </Link>
        ),
      )}
    </div>
  );
}
