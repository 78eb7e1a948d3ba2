import { changeScenario } from '../../../shared/scenarios/changeScenario';
import { scenarioBody } from '../../server/runs/buildRunnable';

const reach = { from: 0, to: 2000 };
const body = scenarioBody(1);

test('the inflow is multiplied with its base flow, times stay', () => {
  const { body: more } = changeScenario(body, { kind: 'inflow', value: 1.1 }, reach);
  expect(more.upstream).toEqual({ ...body.upstream, flows: [22, 132, 33, 22] });
  const shaped = {
    ...body,
    upstream: {
      kind: 'generated' as const,
      shape: 'gamma' as const,
      baseFlow: 55,
      peakFlow: 490,
      timeToPeak: 3600,
      recessionRatio: null,
      gammaExponent: null,
    },
  };
  const { upstream } = changeScenario(shaped, { kind: 'inflow', value: 1.1 }, reach).body;
  expect(upstream).toMatchObject({ baseFlow: 60.5, peakFlow: 539, timeToPeak: 3600 });
});

test('roughness is multiplied on the whole reach beside what is there', () => {
  const once = changeScenario(body, { kind: 'roughness', value: 1.2 }, reach).body;
  const twice = changeScenario(once, { kind: 'roughness', value: 0.9 }, reach).body;
  expect(twice.roughnessFactors).toEqual([
    { from: 0, to: 2000, part: 'all', depths: [0], factors: [1.2] },
    { from: 0, to: 2000, part: 'all', depths: [0], factors: [0.9] },
  ]);
});

test('outlet slope and cell size are set; what has none says so and stays as it was', () => {
  const slope = changeScenario(body, { kind: 'outletSlope', value: 0.002 }, reach).body;
  expect(slope.downstream).toEqual({ kind: 'normalDepth', slope: 0.002 });
  const cells = changeScenario(body, { kind: 'cellSize', value: 25 }, reach).body;
  expect(cells.numerics).toEqual({ ...body.numerics, cellSize: 25 });
  const open = {
    ...body,
    downstream: { kind: 'open' as const },
    upstream: { kind: 'wall' as const },
  };
  for (const kind of ['outletSlope', 'inflow'] as const) {
    const refused = changeScenario(open, { kind, value: 2 }, reach);
    expect(refused.body).toBe(open);
    expect(refused.faults[0].path).toBe('change.kind');
  }
});
