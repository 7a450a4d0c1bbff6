/** What makes a spreadsheet run a text as a formula, wide signs included. */
const FORMULA = /^[=+\-@\t\r＝＋－＠]/;
/** With marks in front already, before a sign or a number: one more goes on, so that taking one off gives it back. */
const GUARDED = /^'+[=+\-@\t\r＝＋－＠\d]/;

/** A text as it may leave in a CSV file: what a spreadsheet would run gets a `'` in front, which it shows as text. Empty text stays empty. */
export function guardText(text: string): string {
  return FORMULA.test(text) || GUARDED.test(text) ? `'${text}` : text;
}

/** A text as it came in, without the `'` that `guardText` or a spreadsheet put before it; any other text stays as it is. */
export function unguardText(text: string): string {
  return GUARDED.test(text) ? text.slice(1) : text;
}

/** True where a spreadsheet would run the text; false for empty text. */
export function isFormula(text: string): boolean {
  return FORMULA.test(text);
}
