import type { KeyboardEvent } from 'react';

/** Keys in a table of fields with `data-cell="row/column"`: Enter and the arrows up and down go to the cell below or above. */
export function goBetweenCells(event: KeyboardEvent<HTMLElement>): void {
  const step = { Enter: 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
  const cell = (event.target as HTMLElement).dataset['cell'];
  if (!step || !cell) return;
  event.preventDefault();
  const [row, column] = cell.split('/').map(Number);
  const next = event.currentTarget.querySelector<HTMLInputElement>(
    `[data-cell="${row + step}/${column}"]`,
  );
  if (next) {
    next.focus();
    next.select();
  } else (event.target as HTMLElement).blur();
}
