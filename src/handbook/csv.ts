/** A table as CSV by RFC 4180: CRLF, quotes where needed; numbers unrounded with a decimal point; null is empty. */
export function csv(
  header: readonly string[],
  rows: readonly (readonly (string | number | null)[])[],
): string {
  return [header, ...rows].map((cells) => `${cells.map(field).join(',')}\r\n`).join('');
}

function field(cell: string | number | null): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  // a spreadsheet would run a text that starts like a formula
  const text = /^[=+\-@\t\r]/.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
