export type CsvCell = string | number | null | undefined;

/** Starts that a spreadsheet takes for a formula (OWASP, CSV injection, from memory). */
const FORMULA_START = /^[=+\-@\t\r\uFF0B\uFF0D\uFF1D\uFF20]/;
const PLAIN_NUMBER = /^[+-]?\d+([.,]\d+)?$/;

/**
 * Rows as CSV (RFC 4180: comma, quotes doubled, CRLF). A text that a spreadsheet would run as a formula gets an
 * apostrophe in front, so that a name typed by a stranger never computes; numbers stay numbers.
 */
export function toCsv(rows: readonly (readonly CsvCell[])[]): string {
  return rows.map((row) => row.map(writeCell).join(",")).join("\r\n") + "\r\n";
}

function writeCell(cell: CsvCell): string {
  if (cell === null || cell === undefined) return "";
  if (typeof cell === "number") return Number.isFinite(cell) ? String(cell) : "";
  const safe = FORMULA_START.test(cell.trimStart()) && !PLAIN_NUMBER.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
