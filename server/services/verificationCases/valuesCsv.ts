import type { VerificationResult } from '../../../shared/verificationCases/types';
import { csvLine } from '../../results/exports/csvField';

/** Computed beside exact on the finest grid, a row a place or a moment; every digit. */
export function valuesCsv({ curves }: VerificationResult): string {
  const { along, at, bed, stage, flow } = curves;
  const heading = [
    along === 'time' ? 'time (s)' : 'chainage (m)',
    ...(bed ? ['bed (m)'] : []),
    'stage computed (m)',
    'stage exact (m)',
    'flow computed (m3/s)',
    'flow exact (m3/s)',
  ];
  const rows = at.map((place, i) => [
    place,
    ...(bed ? [bed[i]] : []),
    stage.computed[i],
    stage.exact[i],
    flow.computed[i],
    flow.exact[i],
  ]);
  return [heading, ...rows].map(csvLine).join('');
}
