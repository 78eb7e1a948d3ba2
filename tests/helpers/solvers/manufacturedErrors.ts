import { buildCase, GRAVITY } from './caseBuilders';
import { errorNorms } from './errorNorms';
import { LENGTH, type ManufacturedFlow } from './manufacturedFlow';
import { routeWithSource } from './routeWithSource';

const DURATION = 2000;

/** Mean errors of area (m²) and flow (m³/s) of a manufactured flow after some half an hour. */
export function manufacturedErrors(exact: ManufacturedFlow, cells: number, order: 1 | 2) {
  const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * LENGTH) / cells);
  const times = Array.from({ length: cells + 1 }, (_, i) => (i * DURATION) / cells);
  const sources = exact.sourcesAt(middles, GRAVITY);
  const found = routeWithSource(
    buildCase({
      sections: [0, ...middles, LENGTH].map(exact.section),
      upstream: { kind: 'inflow', times, flows: times.map((time) => exact.flow(0, time).value) },
      downstream: {
        kind: 'stage',
        times,
        stages: times.map((time) => exact.stage(LENGTH, time).value),
      },
      initial: { kind: 'still', stage: 0 },
      numerics: { cellSize: LENGTH / cells, duration: DURATION, outputInterval: DURATION, order },
    }),
    {
      lateral: (i, time) => sources(i, time).lateral,
      momentum: (i, time) => sources(i, time).momentum,
    },
    (x) => ({ stage: exact.stage(x, 0).value, flow: exact.flow(x, 0).value }),
  );
  const { chainage, area, flow } = found;
  return {
    area: errorNorms(chainage, area, (x) => exact.area(x, DURATION)).mean,
    flow: errorNorms(chainage, flow, (x) => exact.flow(x, DURATION).value).mean,
  };
}
