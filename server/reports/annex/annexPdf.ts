import type { Paper } from '../../../shared/reports/types';
import { SOLVER_VERSION } from '../../solvers/version';
import { finishPages } from '../pdf/finishPages';
import { closeSheet, openSheet } from '../pdf/sheet';
import { annexPages } from './annexPages';
import type { AnnexFacts } from './types';

/** The annex of a report as a file of its own. The same facts on the same paper give the same bytes. */
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
  annexPages(sheet, facts);
  finishPages(
    sheet,
    null,
    `${facts.firmName} · Annex: ${title.toLowerCase()}, solver ${SOLVER_VERSION}`,
  );
  return new Uint8Array(await closeSheet(sheet));
}
