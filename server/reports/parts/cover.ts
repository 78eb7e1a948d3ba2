import { reachLine } from '../charts/reachLine';
import { COLOUR } from '../pdf/colours';
import { figure } from '../pdf/figure';
import { FONT, type Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { note, notice, paragraph, tagged } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { standingOf } from '../types';
import { codeText, dayText, momentText, timeText, unitsOf } from '../words';

/** What it is, for whom, whether it stands, and the answer in short. */
export function cover(sheet: Sheet, report: RunReport): void {
  const { doc, width, left } = sheet;
  const { facts, caseFile, places } = report;
  const { study, run, signOff, withdrawal } = facts;
  const unit = unitsOf(study.unitSystem);
  doc.outline.addItem('Cover');
  const line = (type: string, text: string, size: number, font: string, colour: string) =>
    tagged(sheet, type, () =>
      doc.font(font).fontSize(size).fillColor(colour).text(text, left, doc.y, { width }),
    );

  line('P', facts.firmName, 11, FONT.semibold, COLOUR.ink);
  doc.y += 56;
  line('P', 'Flood routing report', 11, FONT.regular, COLOUR.soft);
  doc.y += 4;
  line('H1', study.title, 30, FONT.semibold, COLOUR.ink);
  doc.y += 4;
  line('P', `${run.scenarioName} · run ${run.number}`, 14, FONT.regular, COLOUR.ink);
  doc.y += 14;

  const { sections } = caseFile;
  figure(
    sheet,
    [reachLine([sections[0].chainage, sections[sections.length - 1].chainage], shown(report))],
    74,
    'The reach from upstream (left) to downstream (right), a drawing and not a map.',
  );

  const standing = standingOf(facts);
  if (standing === 'preliminary')
    notice(
      sheet,
      'Preliminary: not signed by a licensed engineer. For discussion within the work only; not to be relied on.',
      'ochre',
    );
  if (withdrawal)
    notice(
      sheet,
      `Withdrawn on ${momentText(withdrawal.at)} by ${withdrawal.by}: ${withdrawal.reason} This report is not to be relied on.`,
      'brick',
    );
  factRows(sheet, [
    ['Client', study.clientName || 'not stated'],
    ['Place', study.place || 'not stated'],
    ['Prepared by', `${run.requestedBy}, ${facts.firmName}`],
    ...(signOff
      ? ([
          ['Signed by', `${signOff.by}, ${signOff.qualification}, on ${dayText(signOff.at)}`],
          ['Verification code', codeText(signOff.verificationCode)],
        ] as const)
      : ([['Signed by', 'not signed']] as const)),
    ['Input hash', run.caseHash],
  ]);

  paragraph(sheet, 'The answer in short', { bold: true, size: 11, after: 2 });
  table(
    sheet,
    [
      { heading: report.placesAreStations ? 'Station' : 'Section', share: 3 },
      { heading: 'Highest water', share: 2, align: 'right' },
      { heading: 'Greatest flow', share: 2, align: 'right' },
      { heading: 'Flood arrives', share: 3, align: 'right' },
      { heading: 'Highest at', share: 3, align: 'right' },
    ],
    places
      .slice(0, IN_SHORT)
      .map(({ name, peaks }) => [
        name,
        unit(peaks.peakStage, 'elevation'),
        unit(peaks.peakFlow, 'flow'),
        peaks.arrival === null ? 'never' : timeText(peaks.arrival, facts),
        timeText(peaks.peakStageTime, facts),
      ]),
  );
  note(
    sheet,
    `Elevations above ${study.verticalDatum || 'the datum of the study, which is not stated'}. Times from the start of the run` +
      (run.startsAt ? `, ${momentText(run.startsAt)}.` : '.') +
      (places.length > IN_SHORT ? ' The other stations are in the results.' : ''),
  );
}

const IN_SHORT = 6;
const shown = ({ places }: RunReport) =>
  places.map(({ name, peaks }) => ({ name, chainage: peaks.chainage }));
