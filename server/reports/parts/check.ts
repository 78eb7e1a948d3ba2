import type { ChecklistItem, ReviewPoint } from '../../../shared/review/types';
import { formatDuration } from '../../../shared/units/format';
import type { Sheet } from '../pdf/sheet';
import { table } from '../pdf/table';
import { heading, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { momentText, unitsOf } from '../words';

const OUTCOMES: Record<ChecklistItem['outcome'], string> = {
  good: 'Good',
  look: 'Worth a look',
  bad: 'Against the rule',
  asked: 'Asked',
};
const STATES: Record<ReviewPoint['state'], string> = {
  open: 'Open',
  answered: 'Answered, not closed',
  closed: 'Closed',
};
const ENTRIES = { answer: 'Answer', closed: 'Closed', reopened: 'Reopened' } as const;

/** The checklist and the points, as they stood. */
export function check(sheet: Sheet, { facts }: RunReport): void {
  const { review } = facts;
  partHeading(sheet, 'Check', 'flowing');
  if (!review) {
    paragraph(
      sheet,
      'This run was not sent for checking: nobody but its modeller has looked at it.',
    );
    return;
  }
  if (review.sentAt) paragraph(sheet, `Sent for checking on ${momentText(review.sentAt)}.`);
  heading(sheet, 'Checklist');
  table(
    sheet,
    [
      { heading: 'Item', share: 2.4 },
      { heading: 'Outcome', share: 1.5 },
      { heading: 'Found', share: 4 },
      { heading: 'Rule', share: 3 },
    ],
    review.checklist.map(({ title, outcome, finding, rule, answer }) => [
      title,
      OUTCOMES[outcome],
      answer ? `${finding}\nModeller: ${answer}` : finding,
      rule,
    ]),
  );
  heading(sheet, 'Points raised');
  if (review.points.length === 0) paragraph(sheet, 'No point was raised.');
  const unit = unitsOf(facts.study.unitSystem);
  const where = ({ chainage, time }: ReviewPoint) =>
    [
      chainage === null ? 'On the run as a whole' : `At chainage ${unit(chainage, 'chainage')}`,
      ...(time === null ? [] : [`${formatDuration(time)} from start`]),
    ].join(', ');
  review.points.forEach((point, k) => {
    const { state, text, raisedBy, raisedAt, entries } = point;
    paragraph(sheet, `Point ${k + 1}. ${where(point)}. ${STATES[state]}.`, {
      bold: true,
      after: 2,
    });
    paragraph(sheet, `${text} (${raisedBy.name}, ${momentText(raisedAt)})`, { after: 2 });
    for (const entry of entries)
      paragraph(
        sheet,
        `${ENTRIES[entry.kind]}${entry.text ? `: ${entry.text}` : '.'} (${entry.by}, ${momentText(entry.at)})`,
        { after: 2 },
      );
    sheet.doc.y += 8;
  });
}
