import type { Cell } from './types';

/** What the person sees in the cell, near enough to recognise it. */
export function cellText(cell: Cell | undefined): string {
  if (!cell) return '';
  if (cell.kind === 'number') return String(cell.value);
  if (cell.kind === 'unsaved') return '(formula)';
  return cell.text.trim();
}
