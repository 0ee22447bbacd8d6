/** Cells that a spreadsheet would run as a formula when it opens the file. */
const FORMULA = /^[=+\-@\t\r]/;
const NUMBER = /^[+-]?\d+(\.\d+)?([eE][+-]?\d+)?$/;

/** One cell after RFC 4180: quoted where needed; text that a spreadsheet would take for a formula gets a leading apostrophe. */
export function csvCell(text: string): string {
  const safe = FORMULA.test(text) && !NUMBER.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replace(/"/g, '""')}"` : safe;
}

/** Rows of cells as CSV with CRLF line ends (RFC 4180). */
export function csvTable(rows: readonly (readonly string[])[]): string {
  return rows.map((row) => `${row.map(csvCell).join(',')}\r\n`).join('');
}
