import { departureWords } from '../../../shared/reaches/compare/departures';
import { formatNumber } from '../../../shared/units/format';
import { longSection } from '../charts/longSection';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows } from '../pdf/table';
import { note, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { momentText, unitsOf } from '../words';

/** Where the ground comes from. */
export function survey(sheet: Sheet, { facts, caseFile, surface }: RunReport): void {
  const { study, survey: revision } = facts;
  const unit = unitsOf(study.unitSystem);
  const { sections } = caseFile;
  const [first, last] = [sections[0].chainage, sections[sections.length - 1].chainage];
  const n = sections.flatMap(({ roughness }) => roughness.map(([, value]) => value));
  const marked = sections.filter(({ banks }) => banks).length;

  partHeading(sheet, 'Survey and datum', 'newPage');
  factRows(sheet, [
    ['Vertical datum', study.verticalDatum || 'not stated'],
    ['Survey', `revision ${revision.revision}, ${revision.fileName}`],
    ['Handed in', `${revision.sentBy}, ${momentText(revision.sentAt)}`],
    ...(revision.note ? ([['Note', revision.note]] as const) : []),
    ['Sections', `${sections.length}, with ${formatNumber(pointsOf(sections), 0)} points`],
    ['Ground', departureWords(facts.surveyed, sections)],
    ['Chainage', `${unit(first, 'chainage')} to ${unit(last, 'chainage')}`],
    ['Greatest distance between sections', unit(widestGap(sections), 'length')],
    ["Manning's n", `${formatNumber(Math.min(...n), 3)} to ${formatNumber(Math.max(...n), 3)}`],
    ['Bank marks', `on ${marked} of ${sections.length} sections`],
    ['SHA-256 of the file', revision.fileHash],
  ]);
  figure(
    sheet,
    [
      longSection({
        chainages: surface.chainages,
        bed: surface.bed,
        leftBank: surface.leftBank,
        rightBank: surface.rightBank,
        peakStage: null,
        startStage: null,
        stations: [],
        system: study.unitSystem,
        alt: `Long profile of the surveyed bed and banks from ${unit(first, 'chainage')} to ${unit(last, 'chainage')}.`,
      }),
    ],
    190,
    'Bed and banks along the reach. The cross-sections are drawn at the end of the report.',
  );
  note(
    sheet,
    'Between surveyed sections the ground is taken to run straight between corresponding points. What lies between two sections and was not surveyed is not in the result.',
  );
}

const pointsOf = (sections: RunReport['caseFile']['sections']) =>
  sections.reduce((sum, { points }) => sum + points.length, 0);

const widestGap = (sections: RunReport['caseFile']['sections']) =>
  sections.reduce(
    (widest, { chainage }, k) =>
      k === 0 ? 0 : Math.max(widest, chainage - sections[k - 1].chainage),
    0,
  );
