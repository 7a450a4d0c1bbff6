/** A pattern that finds the text anywhere, with what LIKE would read as a wildcard taken literally. */
export const containing = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
