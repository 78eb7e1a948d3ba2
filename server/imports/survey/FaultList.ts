import { LIMITS } from '../../../shared/limits';
import type { SurveyFault } from '../../../shared/surveys/types';
import { columnLetter } from '../workbook/columnLetter';

/** Where a fault lies: a row and a column as the code counts them, from 0. */
export interface Place {
  sheet: string;
  row?: number;
  lastRow?: number;
  column?: number;
}

/** Gathers all faults of a file, so that a person mends it once. */
export class FaultList {
  private readonly all: SurveyFault[] = [];
  private readonly sheetOrder: Map<string, number>;
  private count = 0;

  constructor(sheetNames: string[]) {
    this.sheetOrder = new Map(sheetNames.map((name, index) => [name, index]));
  }

  fault(place: Place, title: string, detail: string) {
    this.add(place, title, detail, 'fault');
  }

  /** Something that a careful person would look at but that does not refuse the file. */
  doubt(place: Place, title: string, detail: string) {
    this.add(place, title, detail, 'doubt');
  }

  get refuses(): boolean {
    return this.count > 0;
  }

  /** Faults first, each kind in the order of the file; no more than the limit, the rest as a number. */
  list(): { faults: SurveyFault[]; faultsNotListed: number } {
    const sheet = (fault: SurveyFault) => this.sheetOrder.get(fault.sheet) ?? -1;
    const sorted = this.all.sort(
      (a, b) =>
        Number(a.severity === 'doubt') - Number(b.severity === 'doubt') ||
        sheet(a) - sheet(b) ||
        (a.row ?? 0) - (b.row ?? 0) ||
        (a.column ?? '').length - (b.column ?? '').length ||
        (a.column ?? '').localeCompare(b.column ?? ''),
    );
    const { faults } = LIMITS.upload;
    return {
      faults: sorted.slice(0, faults),
      faultsNotListed: Math.max(0, sorted.length - faults),
    };
  }

  private add(place: Place, title: string, detail: string, severity: SurveyFault['severity']) {
    if (severity === 'fault') this.count++;
    this.all.push({
      sheet: place.sheet,
      row: place.row === undefined ? null : place.row + 1,
      lastRow:
        place.lastRow === undefined || place.lastRow === place.row ? null : place.lastRow + 1,
      column: place.column === undefined ? null : columnLetter(place.column),
      title,
      detail,
      severity,
    });
  }
}
