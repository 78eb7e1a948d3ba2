import type { Cell } from '../workbook/types';
import { parseNumber } from '../../../shared/numbers/parseNumber';

/** Whether a cell holds a number, be it as text and with either decimal mark. */
export function isNumeric(cell: Cell | undefined): boolean {
  if (!cell) return false;
  if (cell.kind === 'number') return true;
  if (cell.kind !== 'text') return false;
  return parseNumber(cell.text, 'point') !== null || parseNumber(cell.text, 'comma') !== null;
}
