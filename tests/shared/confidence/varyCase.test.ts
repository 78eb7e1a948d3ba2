import type { CaseFile } from '@/shared/case/caseFile';
import { parametersOf } from '@/shared/confidence/parameters';
import { PLANS } from '@/shared/confidence/planMembers';
import { ensembleSchema, sensitivitySchema } from '@/shared/confidence/schemas';
import { scalePeak, varyCase } from '@/shared/confidence/varyCase';

const CASE: CaseFile = {
  format: 'spate-case/1',
  title: 'A reach',
  sections: [0, 1000].map((chainage) => ({
    id: `XS-${chainage}`,
    chainage,
    points: [
      [0, 10],
      [5, 5],
      [10, 10],
    ],
    roughness: [
      [0, 0.05],
      [5, 0.03],
    ],
  })),
  upstream: { kind: 'inflow', times: [0, 10, 20], flows: [20, 120, 15] },
  downstream: { kind: 'normalDepth', slope: 0.001 },
  laterals: [{ from: 0, to: 500, times: [0, 10], flows: [0, 8] }],
  structures: [],
  initial: { kind: 'steady' },
  numerics: { cellSize: 10, duration: 3600, outputInterval: 60 },
};
const frozen = JSON.stringify(CASE);

it('multiplies the peak and keeps the base flow', () => {
  // Qb = 20, peak 120 -> 132: s = 1.12; the tail at 15 goes to 20 - 1.12 × 5 = 14.4.
  expect(scalePeak([20, 120, 15], 1.1)).toEqual([20, 132, expect.closeTo(14.4, 12)]);
  expect(scalePeak([5, 5], 1.2)).toEqual([6, 6]);
  // Never below nothing, and what only takes water out stays.
  expect(scalePeak([10, 110, 1], 2)[2]).toBe(0);
  expect(scalePeak([0, -3], 1.5)).toEqual([0, -3]);
});

it('changes what is named, nothing else, and not the case itself', () => {
  const varied = varyCase(CASE, { roughness: 1.2, peakFlow: 1.1, outletSlope: 0.5, cellSize: 40 });
  expect(varied.sections[0].roughness).toEqual([
    [0, expect.closeTo(0.06, 12)],
    [5, expect.closeTo(0.036, 12)],
  ]);
  expect(varied.upstream).toMatchObject({ flows: [20, 132, expect.closeTo(14.4, 12)] });
  expect(varied.laterals[0].flows).toEqual([0, expect.closeTo(8.8, 12)]);
  expect(varied.downstream).toEqual({ kind: 'normalDepth', slope: 0.0005 });
  expect(varied.numerics).toEqual({ ...CASE.numerics, cellSize: 40 });
  expect(varied.sections[0].points).toEqual(CASE.sections[0].points);
  expect(varyCase(CASE, {})).toEqual(CASE);
  expect(JSON.stringify(CASE)).toBe(frozen);
});

it('moves the stage at the outlet and the breach where there are any', () => {
  const dam: CaseFile = {
    ...CASE,
    downstream: { kind: 'stage', times: [0], stages: [7] },
    structures: [
      {
        kind: 'breach',
        id: 'Dam',
        chainage: 500,
        crest: [
          [0, 12],
          [10, 12],
        ],
        trigger: { kind: 'time', time: 0 },
        mode: 'overtopping',
        growth: 'linear',
        formationTime: 600,
        bottomWidth: 8,
        bottomLevel: 6,
        sideSlope: 1,
      },
    ],
  };
  const varied = varyCase(dam, { outletStage: -0.5, breachWidth: 2, breachTime: 0.5 });
  expect(varied.downstream).toMatchObject({ stages: [6.5] });
  expect(varied.structures[0]).toMatchObject({
    bottomWidth: 16,
    formationTime: 300,
    chainage: 500,
  });
  const keys = (caseFile: CaseFile) => parametersOf(caseFile).map(({ key }) => key);
  expect(keys(dam)).toEqual(['roughness', 'peakFlow', 'outletStage', 'breachWidth', 'breachTime']);
  expect(keys(CASE)).toEqual(['roughness', 'peakFlow', 'outletSlope']);
  const shut: CaseFile = {
    ...CASE,
    upstream: { kind: 'wall' },
    laterals: [],
    downstream: { kind: 'open' },
  };
  expect(keys(shut)).toEqual(['roughness']);
});

const ENSEMBLE = {
  members: 20,
  seed: 5,
  cellSize: 50,
  parameters: [
    { key: 'roughness', distribution: { kind: 'uniform', low: 0.8, high: 1.2 } },
    { key: 'peakFlow', distribution: { kind: 'normal', mean: 1, deviation: 0.1 } },
  ],
};

it('makes every member of an ensemble again from settings and seed', () => {
  const settings = ensembleSchema.validateSync(ENSEMBLE);
  const members = PLANS.ensemble(settings, CASE);
  expect(PLANS.ensemble(ensembleSchema.validateSync(ENSEMBLE), CASE)).toEqual(members);
  expect(PLANS.ensemble({ ...settings, seed: 6 }, CASE)).not.toEqual(members);
  expect(members).toHaveLength(21);
  expect(members[0]).toMatchObject({ label: 'Base case', payload: { role: { kind: 'base' } } });
  const factors = members.slice(1).map(({ payload }) => payload.variation.roughness!);
  // One in each twentieth of 0.8..1.2.
  expect(factors.map((f) => Math.floor((f - 0.8) / 0.02)).sort((a, b) => a - b)).toEqual(
    Array.from({ length: 20 }, (_, k) => k),
  );
});

it('halves the cells twice, exactly where their number allows', () => {
  const sizes = (finest: 'same' | 'half', cellSize: number) =>
    PLANS.convergence(
      { name: '', stationIds: [], finest },
      { ...CASE, numerics: { ...CASE.numerics, cellSize } },
    ).map(({ payload }) => payload.variation.cellSize);
  expect(sizes('same', 10)).toEqual([10, 20, 40]);
  expect(sizes('half', 10)).toEqual([5, 10, 20]);
  // 1000 / 30 -> 33 cells: the run's own wish stays, the others follow the cells that it really has.
  expect(sizes('same', 30)).toEqual([30, 2000 / 33, 4000 / 33]);
});

it('refuses settings that vary nothing or make no sense, each at its place', () => {
  const faults = (
    body: object,
    schema: { validateSync: (body: unknown, o: object) => unknown },
  ) => {
    try {
      schema.validateSync(body, { abortEarly: false });
      return [];
    } catch (error) {
      return (error as { inner: { path: string }[] }).inner.map(({ path }) => path);
    }
  };
  const side = (low: number, high: number, key = 'roughness') => ({
    parameters: [{ key, low, high }],
  });
  expect(faults(side(0.8, 1.2), sensitivitySchema)).toEqual([]);
  expect(faults(side(0, 1.2), sensitivitySchema)).toEqual(['parameters[0].low']);
  expect(faults(side(1.1, 1.2), sensitivitySchema)).toEqual(['parameters[0].low']);
  expect(faults(side(-0.5, 0.5, 'outletStage'), sensitivitySchema)).toEqual([]);
  expect(faults({ parameters: [] }, sensitivitySchema)).toEqual(['parameters']);
  expect(faults(ENSEMBLE, ensembleSchema)).toEqual([]);
  expect(faults({ ...ENSEMBLE, members: 19 }, ensembleSchema)).toEqual(['members']);
  const twice = { ...ENSEMBLE, parameters: [ENSEMBLE.parameters[0], ENSEMBLE.parameters[0]] };
  expect(faults(twice, ensembleSchema)).toEqual(['parameters']);
  const wide = { kind: 'normal', mean: 1, deviation: 0.5 };
  const spread = { ...ENSEMBLE, parameters: [{ key: 'roughness', distribution: wide }] };
  expect(faults(spread, ensembleSchema)).toEqual(['parameters[0].distribution']);
});
