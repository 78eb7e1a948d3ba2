import { formatDuration, formatNumber } from '../../../shared/units/format';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { heading, list, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { unitsOf } from '../words';

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
  heading(sheet, 'What was not done for this run');
  paragraph(
    sheet,
    'None of this is part of the result. Where the modeller did it by other means, the words of the checklist say so.',
  );
  list(sheet, [
    'Cell-size convergence: no repetition on finer and coarser cells belongs to this run, so its discretisation error is not known in numbers.',
    'Sensitivity: no repetition with other roughness or another inflow belongs to this run.',
    'Ensemble: no band of likely results was computed; each number is one outcome of one set of inputs.',
    'Calibration: no observed marks or gauge records were compared with the result.',
  ]);
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
      warnings.map(({ message, chainage, time }) => [
        chainage === null ? 'whole reach' : unit(chainage, 'chainage'),
        time === null ? '–' : formatDuration(time),
        message,
      ]),
    );
}

/** As a percentage with the digits that tell it from nothing. */
function shareText(share: number): string {
  const percent = 100 * Math.abs(share);
  return percent < 1e-4 ? 'below 0.0001 %' : `${formatNumber(percent, percent < 0.1 ? 4 : 2)} %`;
}
