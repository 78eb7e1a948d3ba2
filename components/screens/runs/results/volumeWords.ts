import type { RunSummary } from '@/shared/runs/types';
import { formatNumber, formatWithUnit } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/units/units';

/** Where the water went, line by line. */
export function volumeLines({ volume }: RunSummary, system: UnitSystem) {
  const show = (value: number) => formatWithUnit(value, 'volume', system);
  return [
    { name: 'In the reach at start', value: show(volume.initial) },
    { name: 'Came in at the top', value: show(volume.inflow) },
    ...(volume.lateral === 0
      ? []
      : [
          {
            name: volume.lateral > 0 ? 'Came in along the way' : 'Taken out along the way',
            value: show(Math.abs(volume.lateral)),
          },
        ]),
    { name: 'Left at the outlet', value: show(volume.outflow) },
    { name: 'In the reach at the end', value: show(volume.final) },
    { name: 'Not accounted for', value: `${show(volume.error)}, ${errorShare(volume)}` },
  ];
}

/** The balance in one sentence. */
export function volumeSentence({ volume }: RunSummary): string {
  const share = Math.abs(volume.relativeError);
  if (share <= CLOSED)
    return `The volume balance closes: ${errorShare(volume)} is unaccounted for.`;
  return `The volume balance is off by ${errorShare(volume)}. Find out why before the result is used.`;
}

/** A scheme that conserves volume closes to rounding; a thousandth of a per cent is far above that. */
export const CLOSED = 1e-5;

function errorShare({ relativeError }: RunSummary['volume']): string {
  const inPercent = Math.abs(relativeError) * 100;
  if (inPercent < 0.001) return 'less than 0.001 %';
  return `${formatNumber(inPercent, inPercent < 1 ? 3 : 1)} %`;
}
