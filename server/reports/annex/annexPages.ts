import type { Sheet } from '../pdf/sheet';
import { casePage } from './casePage';
import { summaryPage } from './summaryPage';
import type { AnnexFacts } from './types';

/** Published cases: their verdicts, and a page a case. Of a report that they are the last pages of, `report` says what it is. */
export function annexPages(
  sheet: Sheet,
  facts: AnnexFacts,
  report: { solverVersion: string } | null = null,
): void {
  summaryPage(sheet, facts, report);
  for (const each of facts.cases) casePage(sheet, each);
}
