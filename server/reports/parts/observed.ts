import { CONFIDENCE_WORDS, KIND_WORDS, toleranceSource } from '../../../shared/calibration/marks';
import type { GaugeFit, MarkResidual, RunResiduals } from '../../../shared/calibration/types';
import { formatDuration, formatNumber } from '../../../shared/units/format';
import { observedGauge } from '../charts/observedGauge';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { heading, note, paragraph, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { unitsOf } from '../words';

type Say = ReturnType<typeof unitsOf>;

/** The run against what was observed of a flood, where the modeller has chosen one. */
export function observed(sheet: Sheet, { facts }: RunReport): void {
  const residuals = facts.observed;
  if (!residuals) return;
  const say = unitsOf(facts.study.unitSystem);
  partHeading(sheet, 'Observed against computed', 'flowing');
  paragraph(
    sheet,
    `What was observed of the flood ${residuals.flood ? `“${residuals.flood}”` : 'that the study has marks of'} beside what this run computed. Residuals are computed less observed: above zero the model stands too high.`,
  );
  if (residuals.marks.length > 0) markTables(sheet, residuals, say);
  for (const fit of residuals.gauges) gauge(sheet, fit, facts.study.unitSystem, say);
  note(
    sheet,
    `${toleranceSource(facts.study.unitSystem)}${residuals.misfit === null ? '' : ` Misfit ${formatNumber(residuals.misfit, 2)}: the root of the mean square of all deviations over their tolerances; 1 means off by the tolerance on average.`}`,
  );
}

function markTables(sheet: Sheet, { marks, all, byConfidence, byKind }: RunResiduals, say: Say) {
  heading(sheet, 'Marks');
  if (all)
    factRows(sheet, [
      ['Mean error', signed(say(all.mean, 'depth'), all.mean)],
      ['Root mean square', say(all.rms, 'depth')],
      ['Largest', say(all.largest, 'depth')],
      ['Within tolerance', `${all.within} of ${all.count}`],
    ]);
  table(
    sheet,
    [
      { heading: 'Chainage', share: 1.8, align: 'right' },
      { heading: 'Observed', share: 1.8, align: 'right' },
      { heading: 'Computed', share: 1.8, align: 'right' },
      { heading: 'Residual', share: 1.7, align: 'right' },
      { heading: 'Tolerance', share: 1.7, align: 'right' },
      { heading: 'What it is', share: 3 },
    ],
    marks.map((row) => [
      say(row.mark.chainage, 'chainage'),
      say(row.mark.level, 'elevation'),
      row.computed === null ? '–' : say(row.computed, 'elevation'),
      residualText(row, say),
      `±${say(row.tolerance, 'depth')}`,
      `${KIND_WORDS[row.mark.kind]}, ${CONFIDENCE_WORDS[row.mark.confidence].toLowerCase()}${row.mark.note ? `: ${row.mark.note}` : ''}`,
    ]),
  );
  const groups = [
    ...byConfidence.map((group) => ({ name: CONFIDENCE_WORDS[group.confidence], ...group })),
    ...byKind.map((group) => ({ name: KIND_WORDS[group.kind], ...group })),
  ];
  table(
    sheet,
    [
      { heading: 'Marks', share: 3 },
      { heading: 'Mean error', share: 2, align: 'right' },
      { heading: 'Root mean square', share: 2, align: 'right' },
      { heading: 'Within tolerance', share: 2, align: 'right' },
    ],
    groups.map(({ name, summary }) => [
      name,
      signed(say(summary.mean, 'depth'), summary.mean),
      say(summary.rms, 'depth'),
      `${summary.within} of ${summary.count}`,
    ]),
  );
}

const WHY = { offReach: 'off the reach', dry: 'dry in the run' };

function residualText({ residual, why }: MarkResidual, say: Say): string {
  if (residual !== null) return signed(say(residual, 'depth'), residual);
  return why ? WHY[why] : '–';
}

const signed = (text: string, value: number) =>
  value > 0 && /[1-9]/.test(text) ? `+${text}` : text;

const NOT_COMPARED: Record<NonNullable<GaugeFit['why']>, string> = {
  offReach: 'It lies off the reach of this run.',
  noClock: 'Its record is told by the clock, and the scenario has no start by the clock.',
  noOverlap: 'Its record and the run share no two moments.',
};

function gauge(
  sheet: Sheet,
  fit: GaugeFit,
  system: RunReport['facts']['study']['unitSystem'],
  say: Say,
): void {
  const { name, quantity, chainage, figures, series, why } = fit;
  heading(
    sheet,
    `${quantity === 'stage' ? 'Stage' : 'Flow'} at ${name}, ${say(chainage, 'chainage')}`,
  );
  if (!figures || !series) {
    paragraph(sheet, `Not compared. ${why ? NOT_COMPARED[why] : ''}`);
    return;
  }
  const value = (of: number) => say(of, quantity === 'stage' ? 'depth' : 'flow');
  const { efficiency, mean, rms, count, peak } = figures;
  factRows(sheet, [
    [
      'Efficiency, Nash and Sutcliffe (1970)',
      efficiency === null ? '–' : formatNumber(efficiency, 3),
    ],
    ['Mean error', signed(value(mean), mean)],
    ['Root mean square error', `${value(rms)} over ${formatNumber(count, 0)} values`],
    [
      'Error at the peak',
      peak ? signed(value(peak.error), peak.error) : 'no peak within the record',
    ],
    ...(peak ? [['Peak computed late by', formatDuration(peak.delay)] as const] : []),
  ]);
  figure(sheet, [observedGauge(name, series, quantity, system)], 150, '');
}
