import type { LengthUnit } from '../../../shared/surveys/types';
import { inUnit, unitOf } from '../headings/lengthUnits';
import type { DecimalMark } from '../../../shared/numbers/decimalMark';
import { parseNumber } from '../../../shared/numbers/parseNumber';

/**
 * A length in the unit of its column: a plain number, a number with its own unit (`12.4 km`), or stationing
 * (`1+250`: 1 km and 250 m; `12+50`: 1,250 ft; common practice). null where it is none.
 */
export function parseLength(text: string, decimal: DecimalMark, unit: LengthUnit): number | null {
  const plain = parseNumber(text, decimal);
  if (plain !== null) return plain;
  const stationing = /^\s*(\d+)\s*\+\s*(\d{2,3})([.,]\d+)?\s*$/.exec(text);
  if (stationing) {
    const [, whole, rest, decimals] = stationing;
    const value =
      Number(whole) * 10 ** rest.length + Number(rest + (decimals ?? '').replace(',', '.'));
    return unit === 'km' ? value / 1000 : value;
  }
  const parts = /^(?:(km)\s+)?(.*?\d[.,]?)\s*([a-z][a-z. ]*)?$/i.exec(text.trim());
  const own = unitOf(parts?.[3] ?? parts?.[1] ?? '');
  const value = parts && own ? parseNumber(parts[2], decimal) : null;
  return value === null || !own ? null : inUnit(value, own, unit);
}
