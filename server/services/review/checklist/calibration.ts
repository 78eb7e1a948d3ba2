import type { GaugeFit, RunResiduals } from '../../../../shared/calibration/types';
import { partsOf, q, say, sayAll, type Said } from '../../../../shared/units/message';
import type { ChecklistRule } from './types';

/** Off by the tolerance on average: beyond it the run is worth a look. */
const GOOD = 1;

export const calibration: ChecklistRule = ({ observed }) => {
  const item = { id: 'calibration', title: 'Calibration' };
  if (!observed || observed.misfit === null)
    return {
      ...item,
      outcome: 'asked',
      finding:
        'Against which marks or gauge records was the roughness set, and how far off is the result? If none: why not, and what follows?',
      rule: 'A model without observations says so (common practice).',
    };
  return {
    ...item,
    outcome: observed.misfit <= GOOD ? 'good' : 'look',
    finding: say`Against ${observed.flood || 'the observed flood'}: ${partsOf(sayAll(told(observed), '; '))}.`,
    rule: say`Good marks within ${q(0.3, 'depth')} and gauges within ${q(0.15, 'depth')} (common practice).`,
  };
};

function told({ all, gauges, misfit }: RunResiduals): Said[] {
  return [
    ...(all
      ? [
          say`${all.within} of ${all.count} marks within their tolerance, mean error ${q(all.mean, 'depth')}, root mean square ${q(all.rms, 'depth')}`,
        ]
      : []),
    ...gauges.flatMap(ofGauge),
    say`misfit ${misfit!.toFixed(2)} tolerances`,
  ];
}

function ofGauge({ name, quantity, figures }: GaugeFit): Said[] {
  if (!figures) return [];
  const { efficiency, rms } = figures;
  const off = q(rms, quantity === 'stage' ? 'depth' : 'flow');
  return [
    say`${quantity} at ${name} off by ${off} root mean square${efficiency === null ? '' : `, efficiency ${efficiency.toFixed(2)}`}`,
  ];
}
