import type { LengthUnit } from '../../../shared/surveys/types';
import type { DecimalMark } from '../../../shared/numbers/decimalMark';
import { parseLength } from '../numbers/parseLength';
import { parseNumber } from '../../../shared/numbers/parseNumber';
import type { Cell } from '../workbook/types';
import type { NumberCell } from './rawTypes';

/** A cell as a number in its column's unit; `unit` null for plain numbers. */
export function readNumberCell(
  cell: Cell | undefined,
  decimal: DecimalMark,
  unit: LengthUnit | null,
): NumberCell {
  if (!cell) return null;
  if (cell.kind === 'number') return cell.value;
  if (cell.kind === 'unsaved') return { bad: 'a formula without its value' };
  if (cell.kind === 'error') return { bad: `the failed formula ${cell.text}` };
  if (cell.kind === 'date') return { bad: `the date ${cell.text.replace('T00:00:00', '')}` };
  const value = unit ? parseLength(cell.text, decimal, unit) : parseNumber(cell.text, decimal);
  return value ?? { bad: `“${cell.text.trim().slice(0, 40)}”` };
}
