/** What separates the decimals in numbers that stand as text. */
export type DecimalMark = 'point' | 'comma';

export interface DecimalEvidence {
  mark: DecimalMark;
  /** A number like `1,234` that reads both ways, where nothing in the file decides; else null. */
  unclear: string | null;
}

/**
 * Weighs the text numbers of a file. A mark followed by other than three digits, or standing last of two different
 * marks, is the decimal mark; a mark that stands twice parts thousands.
 */
export function decimalMark(
  texts: Iterable<string>,
  fallback: DecimalMark | null,
): DecimalEvidence {
  let point = 0;
  let comma = 0;
  let unclear: string | null = null;
  for (const text of texts) {
    const number = text.replace(/[\s'’]/g, '');
    if (!/^[-+−]?[\d.,]+([eE][-+]?\d+)?$/.test(number)) continue;
    const lastPoint = number.lastIndexOf('.');
    const lastComma = number.lastIndexOf(',');
    if (lastPoint >= 0 && lastComma >= 0) {
      if (lastPoint > lastComma) point++;
      else comma++;
    } else if (lastComma >= 0) {
      if (number.indexOf(',') !== lastComma) point++;
      else if (/^[-+−]?[1-9]\d{0,2},\d{3}$/.test(number)) unclear ??= text;
      else comma++;
    } else if (lastPoint >= 0) {
      if (number.indexOf('.') !== lastPoint) comma++;
      else point += /^[-+−]?[1-9]\d{0,2}\.\d{3}$/.test(number) ? 0.01 : 1;
    }
  }
  if (point === 0 && comma === 0)
    return { mark: fallback ?? 'point', unclear: fallback ? null : unclear };
  return { mark: comma > point ? 'comma' : 'point', unclear: null };
}
