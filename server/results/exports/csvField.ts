/**
 * One field of a CSV (RFC 4180). Text that a spreadsheet would take for a formula is led by an apostrophe, as is common
 * practice against formula injection. Numbers keep every digit, with a point; what is not there is empty.
 */
export function csvField(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  const text = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

export const csvLine = (fields: (string | number | null)[]): string =>
  `${fields.map(csvField).join(',')}\r\n`;
