import type { Upstream } from '@/shared/case/caseFile';
import {
  buildCase,
  buildSections,
  steadyFlow,
  trapezoidPoints,
} from '../../helpers/solvers/caseBuilders';
import { routeChecked } from '../../helpers/solvers/routeChecked';

const LENGTH = 1000;
const sections = buildSections(0, LENGTH, 2, 0.03, (x) =>
  trapezoidPoints(20, 1, 0.004 * (LENGTH - x), 12),
);

function flood(outputInterval: number, upstream: Upstream) {
  return routeChecked(
    buildCase({
      sections,
      upstream,
      downstream: { kind: 'criticalDepth' },
      structures:
        upstream.kind === 'reservoir'
          ? [{ kind: 'weir', id: 'crest', chainage: 0, form: 'broad', crest: [[0, 8], [15, 8]] }] // prettier-ignore
          : [],
      initial: { kind: 'still', stage: -1 },
      numerics: { cellSize: 20, duration: 1200, outputInterval },
    }),
  );
}

/** A dry reach has no wave to bound a step by: what comes in must not wait for the next output time. */
describe('a flood that begins on a dry reach', () => {
  it.each<[string, Upstream]>([
    ['an inflow', { kind: 'inflow', times: [0, 100, 130], flows: [0, 0, 200] }],
    ['a stage', { kind: 'stage', times: [0, 100, 130], stages: [3, 3, 7] }],
    [
      'a reservoir that fills to its crest',
      {
        kind: 'reservoir',
        stages: [4, 12],
        volumes: [0, 80_000],
        initialStage: 7,
        inflow: steadyFlow(150),
      },
    ],
  ])('by %s, is the same whatever is kept of it', (_, upstream) => {
    const rare = flood(600, upstream).cells;
    const often = flood(5, upstream).cells;
    rare.peakStage.forEach((stage, i) =>
      expect(Math.abs(stage - often.peakStage[i])).toBeLessThan(0.03),
    );
    rare.arrival.forEach((arrival, i) =>
      expect(Math.abs(arrival! - often.arrival[i]!)).toBeLessThan(5),
    );
  });
});
