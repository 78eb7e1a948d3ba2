import type { Paper } from '../../shared/reports/types';
import { annexPages } from './annex/annexPages';
import type { AnnexFacts } from './annex/types';
import { cautions } from './parts/cautions';
import { check } from './parts/check';
import { confidence } from './parts/confidence';
import { cover } from './parts/cover';
import { observed } from './parts/observed';
import { method } from './parts/method';
import { question } from './parts/question';
import { results } from './parts/results';
import { scenario } from './parts/scenario';
import { sections } from './parts/sections';
import { signOff } from './parts/signOff';
import { survey } from './parts/survey';
import { finishPages } from './pdf/finishPages';
import { closeSheet, openSheet } from './pdf/sheet';
import type { RunReport } from './runReport';
import { standingOf } from './types';

/** In the order of reading; a new part is one line. */
const PARTS = [
  cover,
  question,
  survey,
  scenario,
  method,
  results,
  observed,
  confidence,
  check,
  cautions,
  signOff,
  sections,
];

export interface DrawnReport {
  pdf: Uint8Array;
  pages: number;
}

/** The report as PDF, with the published cases as its last pages where they are given. The same report on the same paper gives the same bytes. Takes seconds: off the main thread. */
export async function runPdf(
  report: RunReport,
  paper: Paper,
  annex: AnnexFacts | null = null,
): Promise<DrawnReport> {
  const { firmName, study, run, signOff: signed, withdrawal } = report.facts;
  const title = `${study.title}: ${run.scenarioName}, run ${run.number}`;
  const sheet = openSheet(paper, {
    title,
    author: firmName,
    subject: 'Flood routing report',
    date: new Date(withdrawal?.at ?? signed?.at ?? run.finishedAt),
  });
  for (const part of PARTS) part(sheet, report);
  if (annex) annexPages(sheet, annex, run);
  const pages = sheet.doc.bufferedPageRange().count;
  finishPages(sheet, standingOf(report.facts), `${firmName} · ${title}`);
  return { pdf: new Uint8Array(await closeSheet(sheet)), pages };
}
