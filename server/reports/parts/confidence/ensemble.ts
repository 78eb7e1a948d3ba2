import { VALUE_NAMES, valueText } from '../../../../shared/confidence/placeValueWords';
import { bandOf } from '../../../../shared/confidence/quantile';
import type {
  BandSeries,
  EnsembleResult,
  EnsembleStation,
  PlaceValues,
} from '../../../../shared/confidence/types';
import type { UnitSystem } from '../../../../shared/units/units';
import { bands } from '../../charts/bands';
import { figure } from '../../pdf/figure';
import type { Sheet } from '../../pdf/sheet';
import { table } from '../../pdf/table';
import { note } from '../../pdf/writing';
import { DRAWN_STATIONS } from './drawnStations';

/** Bands over time and along the reach, and their numbers. */
export function ensemblePart(sheet: Sheet, result: EnsembleResult, system: UnitSystem): void {
  const { along, members, stations, times } = result;
  const data = (x: number[], { p5, p50, p95 }: BandSeries) => ({
    x,
    line: p50,
    band: { low: p5, high: p95 },
  });
  for (const { name, stage, flow } of stations.slice(0, DRAWN_STATIONS))
    figure(
      sheet,
      [
        bands(`Stage at ${name}`, data(times, stage), 'time', 'elevation', system),
        bands(`Flow at ${name}`, data(times, flow), 'time', 'flow', system),
      ],
      150,
      '',
    );
  figure(
    sheet,
    [
      bands(
        'Peak stage along the reach',
        { ...data(along.chainage, along.peakStage), compare: along.base, ground: along.bed },
        'chainage',
        'elevation',
        system,
      ),
    ],
    220,
    `Median and band from 5 to 95 of 100 of ${members} members.`,
  );
  table(
    sheet,
    [
      { heading: 'Station', share: 3 },
      { heading: 'Value', share: 2 },
      ...['Base case', '5 %', '50 %', '95 %'].map((heading) => ({
        heading,
        share: 1.8,
        align: 'right' as const,
      })),
    ],
    stations.flatMap((station) =>
      (Object.keys(VALUE_NAMES) as (keyof PlaceValues)[]).map((quantity) => {
        const band = bandOf(valuesOf(station, quantity));
        const shown = (value: number | null) => valueText(quantity, value, system);
        return [
          station.name,
          VALUE_NAMES[quantity],
          station.base ? shown(station.base[quantity]) : 'failed',
          shown(band.p5),
          shown(band.p50),
          shown(band.p95),
        ];
      }),
    ),
  );
  note(
    sheet,
    'The bands tell of the inputs that were varied and of nothing else. They hold if this flood comes; they are not the chance of the flood.',
  );
}

function valuesOf(station: EnsembleStation, quantity: keyof PlaceValues): number[] {
  if (quantity === 'peakStage') return station.peakStages;
  if (quantity === 'peakFlow') return station.peakFlows;
  return station.arrivals.map((arrival) => arrival ?? Infinity);
}
