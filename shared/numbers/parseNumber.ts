import type { DecimalMark } from './decimalMark';

const WITH_POINT = /^[-+]?(\d+|\d{1,3}(,\d{3})+)?(\.\d*)?(e[-+]?\d+)?$/i;
const WITH_COMMA = /^[-+]?(\d+|\d{1,3}(\.\d{3})+)?(,\d*)?(e[-+]?\d+)?$/i;

/** A number as people write it, with marks or spaces between thousands; null where it is none. */
export function parseNumber(text: string, decimal: DecimalMark): number | null {
  const number = text
    .trim()
    .replace(/[−–](?=[\d.,])/, '-')
    .replace(/(\d)[\s'’\u00a0\u202f](?=\d{3}(\D|$))/g, '$1');
  if (!/\d/.test(number)) return null;
  if (!(decimal === 'point' ? WITH_POINT : WITH_COMMA).test(number)) return null;
  const plain =
    decimal === 'point' ? number.replaceAll(',', '') : number.replaceAll('.', '').replace(',', '.');
  const value = Number(plain);
  return Number.isFinite(value) ? value : null;
}
