/** What spreadsheets take for a formula, also after blanks; a plain negative number is none. */
const FORMULA = /^\s*[=+\-@|%]|^[\t\r]/;
const NUMBER = /^-?\d+([.,]\d+)?(e[+-]?\d+)?$/i;

/**
 * A cell of a CSV file: quoted where it must be, and with an apostrophe before what a spreadsheet would
 * run as a formula.
 */
export function csvCell(value: string | number | null): string {
  if (value === null) return '';
  const text = String(value);
  const safe = FORMULA.test(text) && !NUMBER.test(text) ? `'${text}` : text;
  return /[",;\r\n\t]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
