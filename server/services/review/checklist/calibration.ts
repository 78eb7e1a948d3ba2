import type { GaugeFit, RunResiduals } from '../../../../shared/calibration/types';
import { metres, type ChecklistRule } from './types';

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
    finding: `Against ${observed.flood || 'the observed flood'}: ${told(observed).join('; ')}.`,
    rule: 'Good marks within 0.30 m and gauges within 0.15 m (common practice).',
  };
};

function told({ all, gauges, misfit }: RunResiduals): string[] {
  return [
    ...(all
      ? [
          `${all.within} of ${all.count} marks within their tolerance, mean error ${metres(all.mean)}, root mean square ${metres(all.rms)}`,
        ]
      : []),
    ...gauges.flatMap(ofGauge),
    `misfit ${misfit!.toFixed(2)} tolerances`,
  ];
}

function ofGauge({ name, quantity, figures }: GaugeFit): string[] {
  if (!figures) return [];
  const { efficiency, rms } = figures;
  const off = quantity === 'stage' ? metres(rms) : `${rms.toFixed(1)} m³/s`;
  return [
    `${quantity} at ${name} off by ${off} root mean square${efficiency === null ? '' : `, efficiency ${efficiency.toFixed(2)}`}`,
  ];
}
