import { buildCase, steadyFlow } from '../../helpers/solvers/caseBuilders';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const sections = naturalReach(9, { length: 6000, spacing: 200, slope: 0.001 });

describe('the volume ledger', () => {
  const flood = { times: [0, 3600, 7200, 18_000], flows: [30, 30, 300, 30] };
  const result = routeChecked(
    buildCase({
      sections,
      upstream: { kind: 'inflow', ...flood },
      downstream: { kind: 'normalDepth', slope: 0.001 },
      laterals: [
        { from: 1000, to: 2000, times: [0, 18_000], flows: [0, 20] },
        { from: 4000, to: 4000, times: [0, 18_000], flows: [-2, -2] },
      ],
      initial: { kind: 'steady' },
      numerics: { cellSize: 25, duration: 18_000, outputInterval: 60 },
    }),
  );
  const { volume } = result;

  it('takes in what the hydrographs say', () => {
    // Trapezoids: 30 x 3600 + 165 x 3600 + 165 x 10800; laterals 10 x 18000 - 2 x 18000. Two-stage steps
    // integrate straight lines exactly; only steps across a kink of the hydrograph differ.
    expect(volume.inflow / (195 * 3600 + 165 * 10_800)).toBeCloseTo(1, 5);
    expect(volume.lateral / (8 * 18_000)).toBeCloseTo(1, 5);
  });

  it('lets out what the outlet hydrograph shows', () => {
    const { flow } = result.sections[result.sections.length - 1];
    const shown = flow.slice(1).reduce((sum, q, i) => sum + ((q + flow[i]) / 2) * 60, 0);
    expect(shown / volume.outflow).toBeCloseTo(1, 4);
  });

  it('adds up', () => {
    const { initial, inflow, lateral, outflow, final } = volume;
    const error = final - initial - inflow - lateral + outflow;
    expect(Math.abs(error)).toBeLessThan(1e-12 * (initial + inflow + Math.abs(lateral)) * 10);
  });
});

describe('a dry bed', () => {
  it('is filled by the flood, cell by cell, to the normal depth of the steady flow', () => {
    const dry = routeChecked(
      buildCase({
        sections,
        upstream: { kind: 'inflow', ...steadyFlow(60) },
        downstream: { kind: 'normalDepth', slope: 0.001 },
        initial: { kind: 'still', stage: -10 },
        numerics: { cellSize: 25, duration: 20_000, outputInterval: 1000 },
      }),
    );
    const steady = routeChecked(
      buildCase({
        sections,
        upstream: { kind: 'inflow', ...steadyFlow(60) },
        downstream: { kind: 'normalDepth', slope: 0.001 },
        initial: { kind: 'steady' },
        numerics: { cellSize: 25, duration: 100, outputInterval: 100 },
      }),
    );
    expect(dry.volume.initial).toBe(0);
    dry.cells.finalStage.forEach((stage, i) =>
      expect(Math.abs(stage - steady.cells.finalStage[i])).toBeLessThan(1e-3),
    );
    const arrivals = dry.cells.arrival.map((time) => time ?? Infinity);
    arrivals.slice(1).forEach((time, i) => expect(time).toBeGreaterThanOrEqual(arrivals[i]));
  });
});
