import type { SurveyFault } from '@/shared/surveys/types';

type Place = Pick<SurveyFault, 'sheet' | 'row' | 'lastRow' | 'column'>;

/** `row 218, D`, `rows 1204–1239`, `column D`; empty where the fault is of the whole sheet. */
export function faultCell({ row, lastRow, column }: Place): string {
  if (row === null) return column === null ? '' : `column ${column}`;
  const rows = lastRow !== null && lastRow !== row ? `rows ${row}–${lastRow}` : `row ${row}`;
  return column === null ? rows : `${rows}, ${column}`;
}

/** `Sheet Main, row 218, D`: one line, as a screen reader says it. */
export function faultPlace(place: Place): string {
  return [place.sheet ? `Sheet ${place.sheet}` : 'The file', faultCell(place)]
    .filter(Boolean)
    .join(', ');
}

/** `4 faults`, `1 fault and 2 doubts`. */
export function countFaults(faults: Pick<SurveyFault, 'severity'>[], notListed = 0): string {
  const faultCount = faults.filter(({ severity }) => severity === 'fault').length + notListed;
  const doubtCount = faults.filter(({ severity }) => severity === 'doubt').length;
  const parts = [counted(faultCount, 'fault'), counted(doubtCount, 'doubt')];
  return parts.filter(Boolean).join(' and ') || 'no faults';
}

const counted = (count: number, noun: string): string =>
  count === 0 ? '' : `${count.toLocaleString('en-GB')} ${noun}${count === 1 ? '' : 's'}`;
