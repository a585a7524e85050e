/**
 * Comma-separated values as RFC 4180 says: CR LF after every row, quotes around what needs them. The text
 * starts with a byte order mark (U+FEFF): without it a widely used spreadsheet opens UTF-8 as the old
 * code page and spoils every name with an accent. Readers of CSV skip it ("utf-8-sig" in Python).
 */
export const BYTE_ORDER_MARK = '\ufeff';

/** A figure is printed as it is; text may come from people and is made harmless. */
export type Cell = string | number;

/** The rows as the text of a CSV file. */
export function printCsv(rows: readonly (readonly Cell[])[]): string {
  return BYTE_ORDER_MARK + rows.map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
}

function cellText(cell: Cell): string {
  if (typeof cell === 'number') return String(cell);
  const text = withoutFormula(withoutControls(cell));
  return /[",]/.test(text) || text.startsWith(' ') || text.endsWith(' ')
    ? `"${text.replaceAll('"', '""')}"`
    : text;
}

/**
 * A spreadsheet runs a cell that begins with one of these, full-width forms included; an apostrophe before
 * it makes it text (OWASP, "CSV Injection"). Spaces before it do not save it. Where the comma is the decimal
 * sign, a spreadsheet begins a new cell at a semicolon instead, quotes or not.
 */
const FORMULA_STARTS = /(^|;)(?=\s*[=+\-@\uff0b\uff0d\uff1d\uff20])/g;

function withoutFormula(text: string): string {
  return text.replace(FORMULA_STARTS, "$1'");
}

/** Tabs and line breaks would start a new cell, and what follows them a formula. */
function withoutControls(text: string): string {
  return text.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g, ' ');
}
