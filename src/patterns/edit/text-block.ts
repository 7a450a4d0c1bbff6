/** A block of cells as text, line by line. */
export type Block = string[][];

/**
 * Cuts what was copied elsewhere into cells: tabs between the cells, line ends between the lines, a cell in quotation marks
 * where it holds either (`"37 3/8"""` is 37 3/8"). Blank lines at the end and blanks round a cell go.
 */
export function readBlock(text: string): Block {
  const block: Block = [[]];
  const cells = /(?:"((?:[^"]|"")*)"(?=[\t\r\n]|$)|([^\t\r\n]*))(\t|\r\n|\r|\n|$)/gy;
  let wasLast = false;
  while (!wasLast) {
    const found = cells.exec(text);
    if (!found) break;
    const [, quoted, plain = '', end = ''] = found;
    const cell = quoted === undefined ? plain : quoted.replaceAll('""', '"');
    block.at(-1)?.push(cell.replace(/\s+/g, ' ').trim());
    if (end === '') wasLast = true;
    else if (end !== '\t') block.push([]);
  }
  const last = block.findLastIndex((line) => line.some((cell) => cell !== ''));
  return block.slice(0, last + 1);
}

/** The block as a spreadsheet takes it: a cell with a tab, a line end or a mark in front is put in quotation marks. */
export function writeBlock(block: Block): string {
  const cell = (text: string) => (/[\t\r\n]|^"/.test(text) ? `"${text.replaceAll('"', '""')}"` : text);
  return block.map((line) => line.map(cell).join('\t')).join('\n');
}

/** Lines for columns and columns for lines; short lines are filled up with empty cells. */
export function turned(block: Block): Block {
  const width = Math.max(0, ...block.map((line) => line.length));
  return Array.from({ length: width }, (_, at) => block.map((line) => line[at] ?? ''));
}
