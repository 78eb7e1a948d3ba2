import type { Sheet } from '../pdf/sheet';
import { facts as factRows } from '../pdf/table';
import { heading, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { momentText } from '../words';

/** What was asked, by whom, and in the modeller's words how it was gone about. */
export function question(sheet: Sheet, { facts }: RunReport): void {
  const { study, run, review } = facts;
  partHeading(sheet, 'The question', 'newPage');
  paragraph(
    sheet,
    study.purpose ||
      'The study states no purpose. Whoever relies on the result must know what it was made for.',
  );
  factRows(sheet, [
    ['Client', study.clientName || 'not stated'],
    ['Place', study.place || 'not stated'],
    ['Scenario', run.scenarioName],
    ['Run', `${run.number}, asked for by ${run.requestedBy} on ${momentText(run.requestedAt)}`],
    ['Computed', momentText(run.finishedAt)],
    ['Solver version', run.solverVersion],
  ]);
  if (!review) return;
  heading(sheet, 'How it was gone about');
  paragraph(sheet, review.method || 'Not described.');
  heading(sheet, 'What was assumed');
  paragraph(sheet, review.assumptions || 'Nothing was named.');
  heading(sheet, 'Where the result ends');
  paragraph(sheet, review.limits || 'Nothing was named.');
}
