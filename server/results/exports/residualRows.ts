import { CONFIDENCE_WORDS, KIND_WORDS } from '../../../shared/calibration/marks';
import type { RunResiduals } from '../../../shared/calibration/types';
import type { UnitSystem } from '../../../shared/units/units';
import { EXPORT_UNITS } from './exportUnits';

type Row = (string | number | null)[];

const HOUR = 3600;
const WHY = {
  offReach: 'off the reach',
  dry: 'dry in the run',
  noClock: 'the scenario has no start by the clock',
  noOverlap: 'no common moments',
} as const;

/** Marks and gauges against a run as rows of a table: every mark, the summaries, every gauge. In the study's units. */
export function residualRows(residuals: RunResiduals, system: UnitSystem): Row[] {
  const { length, flow } = EXPORT_UNITS[system];
  const m = length.symbol;
  const metres = (value: number | null) => (value === null ? null : value / length.si);
  const rows: Row[] = [
    ['Flood', residuals.flood],
    ['Residuals are computed less observed.'],
    [],
    [
      `Mark at chainage (${m})`,
      `Observed (${m})`,
      `Computed (${m})`,
      `Residual (${m})`,
      `Tolerance (${m})`,
      'Kind',
      'Confidence',
      'Seen on',
      'Note',
    ],
    ...residuals.marks.map(({ mark, computed, residual, tolerance, why }): Row => [
      mark.chainage / length.si,
      mark.level / length.si,
      metres(computed),
      metres(residual) ?? (why && WHY[why]),
      tolerance / length.si,
      KIND_WORDS[mark.kind],
      CONFIDENCE_WORDS[mark.confidence],
      mark.observedOn,
      mark.note,
    ]),
    [],
    ['Marks', 'Count', `Mean error (${m})`, `Root mean square (${m})`, `Largest (${m})`, 'Within'],
  ];
  const summaries = [
    ...(residuals.all ? [{ name: 'All', summary: residuals.all }] : []),
    ...residuals.byConfidence.map(({ confidence, summary }) => ({
      name: CONFIDENCE_WORDS[confidence],
      summary,
    })),
    ...residuals.byKind.map(({ kind, summary }) => ({ name: KIND_WORDS[kind], summary })),
  ];
  for (const { name, summary } of summaries) {
    const { count, mean, rms, largest, within } = summary;
    rows.push([name, count, metres(mean), metres(rms), metres(largest), within]);
  }
  rows.push(
    [],
    [
      'Gauge',
      'Quantity',
      `Chainage (${m})`,
      'Values',
      'Efficiency (-)',
      'Mean error',
      'Root mean square',
      'Error at the peak',
      'Peak late by (h)',
      'Unit',
    ],
    ...residuals.gauges.map(({ name, quantity, chainage, figures, why }): Row => {
      const unit = quantity === 'stage' ? length : flow;
      if (!figures) return [name, quantity, chainage / length.si, why && WHY[why]];
      const { count, efficiency, mean, rms, peak } = figures;
      return [
        name,
        quantity,
        chainage / length.si,
        count,
        efficiency,
        mean / unit.si,
        rms / unit.si,
        peak ? peak.error / unit.si : null,
        peak ? peak.delay / HOUR : null,
        unit.symbol,
      ];
    }),
    [],
    ['Misfit (1: off by the tolerance on average)', residuals.misfit],
  );
  return rows;
}
