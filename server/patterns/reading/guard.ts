/** What makes a spreadsheet run a text as a formula, wide signs included. */
const FORMULA = /^[=+\-@\t\r＝＋－＠]/;
const GUARDED = /^'+[=+\-@\t\r＝＋－＠]/;
const GUARDED_NUMBER = /^'\d/;

/** A text as it may leave in a CSV file: what a spreadsheet would run gets a `'` in front, which it shows as text. */
export function guardText(text: string): string {
  return FORMULA.test(text) || GUARDED.test(text) ? `'${text}` : text;
}

/** A text as it came in, without the `'` that `guardText` or a spreadsheet put before it. */
export function unguardText(text: string): string {
  return GUARDED.test(text) || GUARDED_NUMBER.test(text) ? text.slice(1) : text;
}

/** True where a spreadsheet would run the text. */
export function isFormula(text: string): boolean {
  return FORMULA.test(text);
}
