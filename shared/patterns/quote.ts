/** A text short enough to stand in a sentence, in quotation marks; empty text answers empty marks. */
export function quote(text: string): string {
  return `“${shorten(text, 32)}”`;
}

/** A text cut to the characters that may be kept of it, an ellipsis for what is gone; short text answers itself. */
export function shorten(text: string, most: number): string {
  return text.length > most ? `${text.slice(0, most - 1)}…` : text;
}

/** “a, b and c”; nothing listed answers an empty text. */
export function listed(words: readonly string[], join: 'and' | 'or' = 'and'): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} ${join} ${last}`;
}
