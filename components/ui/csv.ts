/** Tables as CSV (RFC 4180): commas, CRLF, quotes doubled. */

/** The text of a CSV file. A text that a spreadsheet would take for a formula gets an apostrophe in front. */
export function csvOf(heads: readonly string[], rows: readonly (readonly (string | number)[])[]): string {
  return [heads, ...rows].map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}

function cell(value: string | number): string {
  const text = typeof value === 'string' && /^[=+\-@\t\r]/.test(value) ? `'${value}` : String(value);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
