/** What a spreadsheet takes for the start of a formula (OWASP ASVS V1.2.10). */
const FORMULA_START = /^[=+\-@\t\r\0]/;
const NUMBER = /^-?\d+(\.\d+)?([eE][+-]?\d+)?$/;

/**
 * One cell. Text that a spreadsheet would run as a formula gets an apostrophe before it; a strict number stays a number,
 * the negative too: an index of -0.35 must not become text.
 */
function csvCell(value: string | number | null): string {
  if (value === null) return '';
  const text = String(value);
  const safe = FORMULA_START.test(text) && !NUMBER.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** One line with its end, quoted as RFC 4180 says. */
export const csvLine = (cells: readonly (string | number | null)[]): string =>
  `${cells.map(csvCell).join(',')}\r\n`;
