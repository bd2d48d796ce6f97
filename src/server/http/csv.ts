/**
 * CSV (RFC 4180). A text that a spreadsheet would take for a formula is led by an apostrophe, so
 * that a tank called `=…` is read and never run; numbers are written as they are.
 */
export function csv(rows: readonly (readonly (string | number)[])[]): string {
  return rows.map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}

function cell(value: string | number): string {
  if (typeof value === 'number') return String(value);
  const guarded = /^[\s]*[=+\-@]|^[\t\r\n]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
}
