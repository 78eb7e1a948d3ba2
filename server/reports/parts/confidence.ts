import type { ConfidenceKind } from '../../../shared/confidence/schemas';
import type { ChecklistItem } from '../../../shared/review/types';
import { formatDuration, formatNumber } from '../../../shared/units/format';
import type { UnitSystem } from '../../../shared/units/units';
import { sayIn } from '../../../shared/units/message';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { heading, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import type { ConfidenceFacts } from '../types';
import { momentText, unitsOf } from '../words';
import { convergencePart } from './confidence/convergence';
import { ensemblePart } from './confidence/ensemble';
import { sensitivityPart } from './confidence/sensitivity';

/** How far the numbers carry: what was done to find out, and plainly what was not. */
export function confidence(sheet: Sheet, { facts, run }: RunReport): void {
  const unit = unitsOf(facts.study.unitSystem);
  const { volume, warnings } = run;
  partHeading(sheet, 'Confidence', 'flowing');
  heading(sheet, 'Volume balance');
  factRows(sheet, [
    ['At the start', unit(volume.initial, 'volume')],
    ['Inflow', unit(volume.inflow, 'volume')],
    ['Lateral inflow', unit(volume.lateral, 'volume')],
    ['Outflow', unit(volume.outflow, 'volume')],
    ['At the end', unit(volume.final, 'volume')],
    ['Error', `${shareText(volume.relativeError)} (below 0.1 % is good, common practice)`],
  ]);
  for (const set of facts.confidence) setPart(sheet, set, facts.study.unitSystem);
  heading(sheet, 'How far it was tried');
  const checklist = facts.review?.checklist ?? [];
  factRows(
    sheet,
    TRIALS.map(({ title, item, set: kind, otherwise }) => {
      const found = checklist.find(({ id }) => id === item);
      const set = facts.confidence.find((one) => one.kind === kind);
      const text = found ? triedText(found) : set ? `Done: ${set.name}, above.` : otherwise;
      return [title, text] as const;
    }),
  );
  heading(sheet, 'Warnings of the run');
  if (warnings.length === 0) paragraph(sheet, 'The run gave no warning.');
  else
    table(
      sheet,
      [
        { heading: 'Chainage', share: 2, align: 'right' },
        { heading: 'Time', share: 1.6, align: 'right' },
        { heading: 'In words', share: 8 },
      ],
      warnings.map((warning) => [
        warning.chainage === null ? 'whole reach' : unit(warning.chainage, 'chainage'),
        warning.time === null ? '–' : formatDuration(warning.time),
        sayIn(facts.study.unitSystem, warning),
      ]),
    );
}

/** One set of the case: what was asked for and what it found. */
function setPart(sheet: Sheet, set: ConfidenceFacts, system: UnitSystem): void {
  const { result } = set;
  heading(sheet, set.name, 120);
  paragraph(
    sheet,
    `${set.settings.map(([name, value]) => `${name}: ${value}`).join('; ')}. Computed ${momentText(set.finishedAt)}${
      set.failed > 0
        ? `; ${set.failed} of ${set.total} members failed and are left out`
        : `, ${set.total} members`
    }.`,
  );
  if (result.kind === 'convergence') convergencePart(sheet, result, system);
  else if (result.kind === 'sensitivity') sensitivityPart(sheet, result, system);
  else ensemblePart(sheet, result, system);
}

/** By the item of the checklist or the set that tells of it; without either it was not done. */
const TRIALS: { title: string; item?: string; set?: ConfidenceKind; otherwise: string }[] = [
  {
    title: 'Cell-size convergence',
    item: 'gridSize',
    set: 'convergence',
    otherwise: 'Not done. The error of the discretisation is not known in numbers.',
  },
  {
    title: 'Outlet condition',
    item: 'outletInfluence',
    otherwise: 'Not done. How far it reaches upstream is not known in numbers.',
  },
  {
    title: 'Calibration',
    item: 'calibration',
    otherwise: 'Not done. No observed marks or gauge records were compared with the result.',
  },
  {
    title: 'Sensitivity',
    set: 'sensitivity',
    otherwise: 'Not done. The result was not repeated with other roughness or another inflow.',
  },
  {
    title: 'Ensemble',
    set: 'ensemble',
    otherwise:
      'Not done. There is no band of likely results; each number is one outcome of one set of inputs.',
  },
];

/** What the machine found; where it could not, that it was not tried, and the modeller's words on it. */
function triedText({ outcome, finding, answer }: ChecklistItem): string {
  const found = outcome === 'asked' ? 'Not computed.' : finding;
  return answer ? `${found} In the modeller's words: ${answer}` : found;
}

/** As a percentage with the digits that tell it from nothing. */
function shareText(share: number): string {
  const percent = 100 * Math.abs(share);
  return percent < 1e-4 ? 'below 0.0001 %' : `${formatNumber(percent, percent < 0.1 ? 4 : 2)} %`;
}
