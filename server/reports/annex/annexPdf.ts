import type { Paper } from '../../../shared/reports/types';
import { SOLVER_VERSION } from '../../solvers/version';
import { finishPages } from '../pdf/finishPages';
import { closeSheet, openSheet } from '../pdf/sheet';
import { casePage } from './casePage';
import { summaryPage } from './summaryPage';
import type { AnnexFacts } from './types';

/** Published cases as the annex of a report. The same facts on the same paper give the same bytes. */
export async function annexPdf(facts: AnnexFacts, paper: Paper): Promise<Uint8Array> {
  const title = 'Published cases';
  const latest = facts.cases.reduce(
    (last, { summary }) => (summary.computedAt > last ? summary.computedAt : last),
    '',
  );
  const sheet = openSheet(paper, {
    title,
    author: facts.firmName,
    subject: 'Annex: the solver against published and independent solutions',
    date: new Date(latest),
  });
  summaryPage(sheet, facts);
  for (const each of facts.cases) casePage(sheet, each);
  finishPages(
    sheet,
    null,
    `${facts.firmName} · Annex: ${title.toLowerCase()}, solver ${SOLVER_VERSION}`,
  );
  return new Uint8Array(await closeSheet(sheet));
}
