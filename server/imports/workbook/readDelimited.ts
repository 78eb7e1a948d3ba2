import { tooLarge } from '../importError';
import { LIMITS } from '../../../shared/limits';
import type { Grid, Workbook } from './types';

const SEPARATORS = ['\t', ';', ',', '|'] as const;
const MAX_COLUMNS = 200;
const MAX_ROWS = LIMITS.upload.sections * LIMITS.upload.pointsPerSection;

/** A text table (RFC 4180, and the same with tabs, semicolons or bars) as one sheet of text cells. */
export function readDelimited(text: string, sheetName: string): Workbook {
  const separator = guessSeparator(text);
  const rows: Grid['rows'] = [];
  for (const fields of splitRows(text, separator)) {
    if (rows.length >= MAX_ROWS)
      throw tooLarge(`The file has more than ${MAX_ROWS.toLocaleString('en-GB')} rows.`);
    rows.push(
      fields
        .slice(0, MAX_COLUMNS)
        .map((field) => (field.trim() === '' ? undefined : { kind: 'text', text: field.trim() })),
    );
  }
  return {
    kind: 'text',
    separator,
    sheets: [{ name: sheetName, hidden: false, rows, hiddenRows: [] }],
  };
}

/**
 * The separator that cuts most lines into the same number of fields, two or more. A comma competes with the decimal
 * comma, so tabs and semicolons win where they cut as well.
 */
function guessSeparator(text: string): string {
  const named = /^sep=(.)\r?\n/i.exec(text);
  if (named) return named[1];
  const lines = text
    .slice(0, 64_000)
    .split(/\r\n|\n|\r/)
    .filter((line) => line.trim())
    .slice(0, 200);
  let best: string = ',';
  let bestScore = 0;
  for (const separator of SEPARATORS) {
    const counts = new Map<number, number>();
    for (const line of lines) {
      const fields = line.replace(/"[^"]*"/g, '').split(separator).length;
      if (fields > 1) counts.set(fields, (counts.get(fields) ?? 0) + 1);
    }
    const score = Math.max(0, ...counts.values());
    if (score > bestScore * 1.2) {
      best = separator;
      bestScore = score;
    }
  }
  return best;
}

function* splitRows(text: string, separator: string): Generator<string[]> {
  let fields: string[] = [];
  let field = '';
  let quoted = false;
  const start = /^sep=.\r?\n/i.exec(text)?.[0].length ?? 0;
  // The row of the `sep=` line counts as a spreadsheet counts it.
  if (start > 0) yield [];
  for (let at = start; at < text.length; at++) {
    const sign = text[at];
    if (quoted) {
      if (sign !== '"') field += sign;
      else if (text[at + 1] === '"') field += text[at++];
      else quoted = false;
    } else if (sign === '"' && field === '') quoted = true;
    else if (sign === separator) {
      fields.push(field);
      field = '';
    } else if (sign === '\n' || sign === '\r') {
      if (sign === '\r' && text[at + 1] === '\n') at++;
      yield [...fields, field];
      fields = [];
      field = '';
    } else field += sign;
  }
  if (field !== '' || fields.length > 0) yield [...fields, field];
}
