import { validateCase } from '../../../shared/case/validateCase';
import { buildCase } from '../../../shared/scenarios/buildCase';
import { checkScenario } from '../../../shared/scenarios/checkScenario';
import { newScenario, outletSlopeOf, proposals } from '../../../shared/scenarios/proposals';
import { scenarioSchema, type ScenarioBody } from '../../../shared/scenarios/schemas';
import { plainSections } from '../../helpers/plainSections';

const sections = plainSections(5, 500);

const sound = (change: Partial<ScenarioBody> = {}): ScenarioBody => {
  const body = newScenario('1 in 100 year', 1, sections);
  return {
    ...body,
    upstream: {
      ...body.upstream,
      baseFlow: 10,
      peakFlow: 60,
      timeToPeak: 7200,
    } as ScenarioBody['upstream'],
    ...change,
  };
};
const faultsOf = (change: Partial<ScenarioBody>) =>
  checkScenario(sound(change), sections).faults.map(({ path }) => path);
const doubtsOf = (change: Partial<ScenarioBody>) =>
  checkScenario(sound(change), sections).doubts.map(({ path }) => path);
const numerics = (change: Partial<ScenarioBody['numerics']>) => ({
  numerics: { ...sound().numerics, ...change },
});

test('a new scenario lacks its flood and nothing else', () => {
  const { faults } = checkScenario(newScenario('Flood', 1, sections), sections);
  expect(faults.map(({ path }) => path)).toEqual([
    'upstream.baseFlow',
    'upstream.peakFlow',
    'upstream.timeToPeak',
  ]);
});
test('a sound one has neither faults nor doubts, and passes the schema unchanged', async () => {
  expect(checkScenario(sound(), sections)).toEqual({ faults: [], doubts: [] });
  expect(await scenarioSchema.validate(sound())).toEqual(sound());
});

describe('the upstream end', () => {
  const generated = sound().upstream as Extract<ScenarioBody['upstream'], { kind: 'generated' }>;
  test.each([
    [{ ...generated, baseFlow: -1 }, ['upstream.baseFlow']],
    [{ ...generated, peakFlow: 5 }, ['upstream.peakFlow']],
    [{ ...generated, timeToPeak: 0 }, ['upstream.timeToPeak']],
    [{ ...generated, shape: 'triangle', recessionRatio: null }, ['upstream.recessionRatio']],
    [{ ...generated, shape: 'gamma', gammaExponent: 0 }, ['upstream.gammaExponent']],
    [{ kind: 'table', times: [], flows: [] }, ['upstream.times']],
    [{ kind: 'table', times: [0, 10], flows: [1] }, ['upstream.times']],
    [
      { kind: 'table', times: [0, 20, 20, 10], flows: [1, 2, -3, 4] },
      ['upstream.times[2]', 'upstream.flows[2]', 'upstream.times[3]'],
    ],
    [{ kind: 'table', times: [0], flows: [5] }, []],
    [{ kind: 'stage', times: [], stages: [] }, ['upstream.times']],
    [{ kind: 'wall' }, []],
  ] as [ScenarioBody['upstream'], string[]][])('%j', (upstream, paths) => {
    expect(faultsOf({ upstream })).toEqual(paths);
  });
  test('a wrong column is not told a thousand times', () => {
    const times = Array.from({ length: 5000 }, (_, i) => -i);
    expect(
      faultsOf({ upstream: { kind: 'table', times, flows: times.map(() => 1) } }).length,
    ).toBeLessThan(25);
  });
  test('a peak after the end of the run is doubted', () => {
    expect(doubtsOf(numerics({ duration: 3600, outputInterval: 300 }))).toEqual([
      'numerics.duration',
    ]);
  });
});

describe('laterals', () => {
  const lateral = { name: '', from: 100, to: 900, times: [0], flows: [2] };
  test.each([
    [{ ...lateral }, []],
    [{ ...lateral, from: -5 }, ['laterals[0].from']],
    [{ ...lateral, to: 2001 }, ['laterals[0].to']],
    [{ ...lateral, from: 900, to: 100 }, ['laterals[0].to']],
    [{ ...lateral, from: null, to: null }, ['laterals[0].from', 'laterals[0].to']],
    [{ ...lateral, times: [], flows: [] }, ['laterals[0].times']],
  ])('%j', (one, paths) => expect(faultsOf({ laterals: [one] })).toEqual(paths));
  test('one that takes water is doubted', () => {
    expect(doubtsOf({ laterals: [{ ...lateral, flows: [-2] }] })).toEqual(['laterals[0].flows']);
  });
});

describe('the outlet', () => {
  test.each([
    [{ kind: 'normalDepth', slope: null }, ['downstream.slope']],
    [{ kind: 'normalDepth', slope: 0 }, ['downstream.slope']],
    [{ kind: 'stage', times: [], stages: [] }, ['downstream.times']],
    [{ kind: 'rating', stages: [8, 9], flows: [0, 30] }, []],
    [{ kind: 'rating', stages: [8], flows: [5] }, ['downstream.stages']],
    [{ kind: 'rating', stages: [8, 9, 10], flows: [0, 30, 20] }, ['downstream.flows[2]']],
    [{ kind: 'rating', stages: [9, 8], flows: [0, 30] }, ['downstream.stages[1]']],
    [{ kind: 'rating', stages: [8, 9], flows: [0, 0] }, ['downstream.flows']],
    [{ kind: 'rating', stages: [1, 2], flows: [0, 9] }, ['downstream.stages']],
    [{ kind: 'criticalDepth' }, []],
    [{ kind: 'open' }, []],
    [{ kind: 'wall' }, ['initial.kind']],
  ] as [ScenarioBody['downstream'], string[]][])('%j', (downstream, paths) => {
    expect(faultsOf({ downstream })).toEqual(paths);
  });
});

describe('the initial state', () => {
  test.each([
    [{ kind: 'still', stage: null }, ['initial.stage']],
    [{ kind: 'profile', chainages: [], stages: [], flows: [] }, ['initial.chainages']],
    [{ kind: 'profile', chainages: [0, 2000], stages: [12, 10], flows: [5] }, ['initial.flows']],
    [{ kind: 'dam', chainage: 1000, stageAbove: 14, stageBelow: null }, []],
    [{ kind: 'dam', chainage: 0, stageAbove: 14, stageBelow: null }, ['initial.chainage']],
    [{ kind: 'dam', chainage: 1000, stageAbove: 14, stageBelow: 15 }, ['initial.stageBelow']],
    [{ kind: 'dam', chainage: 1000, stageAbove: 8.9, stageBelow: null }, ['initial.stageAbove']],
    [
      { kind: 'dam', chainage: null, stageAbove: null, stageBelow: null },
      ['initial.chainage', 'initial.stageAbove'],
    ],
  ] as [ScenarioBody['initial'], string[]][])('%j', (initial, paths) => {
    expect(faultsOf({ initial })).toEqual(paths);
  });
});

describe('numerical settings', () => {
  test.each([
    [{ cellSize: null }, ['numerics.cellSize']],
    [{ cellSize: 0.01 }, ['numerics.cellSize']],
    [{ cellSize: 1500 }, ['numerics.cellSize']],
    [{ duration: -1 }, ['numerics.duration']],
    [{ outputInterval: 1 }, ['numerics.outputInterval']],
    [{ duration: 600, outputInterval: 900 }, ['numerics.outputInterval']],
    [{ courant: 1.2 }, ['numerics.courant']],
    [{ dryDepth: 0 }, ['numerics.dryDepth']],
  ])('%j', (change, paths) => expect(faultsOf(numerics(change))).toEqual(paths));
  test('cells longer than the spacing of the sections are doubted', () => {
    expect(doubtsOf(numerics({ cellSize: 600 }))).toEqual(['numerics.cellSize']);
  });
});

describe('what has no fault here is refused by nobody later', () => {
  // Each number and list of a sound body is replaced by each of these, in bodies of every kind.
  const VALUES = [
    null,
    -1,
    0,
    1e-9,
    0.5,
    1,
    7,
    2000,
    1e5,
    1e9,
    [],
    [0],
    [0, 1],
    [5, 5],
    [3, 1],
    [-1, 2],
    [0, 10, 20],
  ];
  const bodies: Partial<ScenarioBody>[] = [
    {},
    {
      upstream: { kind: 'table', times: [0, 10], flows: [1, 2] },
      downstream: { kind: 'rating', stages: [8, 9], flows: [0, 5] },
    },
    {
      upstream: { kind: 'stage', times: [0, 9], stages: [12, 13] },
      downstream: { kind: 'stage', times: [0, 9], stages: [9, 10] },
    },
    {
      laterals: [{ name: '', from: 5, to: 9, times: [0, 1], flows: [1, 2] }],
      initial: { kind: 'still', stage: 12 },
    },
    { initial: { kind: 'profile', chainages: [0, 9], stages: [12, 11], flows: [1, 1] } },
    {
      initial: { kind: 'dam', chainage: 700, stageAbove: 15, stageBelow: 12 },
      upstream: { kind: 'wall' },
      downstream: { kind: 'wall' },
    },
  ];
  const variants = bodies.flatMap((change) => {
    const text = JSON.stringify(sound(change));
    const leaves = [...text.matchAll(/:(-?[\d.e+-]+|null|\[[-\d.,e+]*\])(?=[,}])/g)];
    return leaves.flatMap((leaf) =>
      VALUES.map(
        (value) =>
          text.slice(0, leaf.index + 1) +
          JSON.stringify(value) +
          text.slice(leaf.index + leaf[0].length),
      ),
    );
  });
  test(`${variants.length} bodies`, () => {
    let routable = 0;
    for (const text of variants) {
      if (!scenarioSchema.isValidSync(JSON.parse(text))) continue;
      const body = scenarioSchema.cast(JSON.parse(text)) as ScenarioBody;
      if (checkScenario(body, sections).faults.length > 0) continue;
      routable++;
      expect({ text, faults: validateCase(buildCase(body, sections, 't')).faults }).toEqual({
        text,
        faults: [],
      });
    }
    expect(routable).toBeGreaterThan(200);
    expect(routable).toBeLessThan(0.8 * variants.length);
  });
});

test('sections without roughness cannot be routed', () => {
  const bare = sections.map((section, i) => (i === 2 ? { ...section, roughness: [] } : section));
  const { faults } = checkScenario(sound(), bare);
  expect(faults).toEqual([
    { path: 'reachId', message: expect.stringMatching(/^Section XS-03 has no roughness/) },
  ]);
});

describe('proposals', () => {
  test('the outlet slope is the fall of the bed', () => {
    expect(outletSlopeOf(sections)).toBe(0.001);
  });
  test('a bed that does not fall gets a small slope, not none', () => {
    const level = sections.map((section) => ({ ...section, points: sections[0].points }));
    expect(outletSlopeOf(level)).toBe(1e-4);
  });
  test('cells are round, finer than the sections, and not too many', () => {
    for (const [count, spacing] of [
      [4, 500],
      [40, 500],
      [400, 500],
      [10, 7],
      [3, 20_000],
    ] as const) {
      const reach = plainSections(count, spacing);
      const length = spacing * (count - 1);
      // In a study in feet they are round in feet: 1 ft is 0.3048 m.
      for (const [system, unit] of [
        ['metric', 1],
        ['usCustomary', 0.3048],
      ] as const) {
        const { cellSize } = proposals(reach, undefined, system);
        const shown = cellSize / unit;
        expect(cellSize).toBeLessThanOrEqual(spacing);
        expect(length / cellSize).toBeLessThanOrEqual(50_000);
        expect([1, 2, 2.5, 5]).toContain(
          Number((shown / 10 ** Math.floor(Math.log10(shown) + 1e-9)).toFixed(6)),
        );
      }
    }
  });
  test('the run lasts until the flood has passed the outlet', () => {
    const { duration, outputInterval } = proposals(sections, sound().upstream);
    expect(duration).toBeGreaterThanOrEqual(5 * 7200 + 2000);
    expect(duration / outputInterval).toBeLessThanOrEqual(600);
  });
});

describe('rough valleys', () => {
  const loss = { from: 500, to: 1500, contraction: 0.1, expansion: 0.3 };

  test.each([
    [{ ...loss, to: 9999 }, ['localLosses[0].to']],
    [{ ...loss, from: null }, ['localLosses[0].from']],
    [{ ...loss, from: 1500 }, ['localLosses[0].to']],
    [
      { ...loss, contraction: -0.1, expansion: 2 },
      ['localLosses[0].contraction', 'localLosses[0].expansion'],
    ],
  ])('losses %#', (one, paths) => {
    expect(faultsOf({ localLosses: [one] })).toEqual(paths);
  });

  test('high coefficients are doubted', () => {
    expect(doubtsOf({ localLosses: [{ ...loss, expansion: 0.9 }] })).toEqual([
      'localLosses[0].expansion',
    ]);
  });

  test('reach the case file, which is sound; without them it is what it was', () => {
    const parted = sections.map((section, k) =>
      k === 2
        ? {
            ...section,
            storage: [{ from: section.points[0][0], to: section.points[1][0] }],
            embankments: { left: { offset: section.points[0][0], crest: 99 } },
          }
        : section,
    );
    const body = sound({ localLosses: [loss], ...numerics({ momentum: 'compound' }) });
    expect(checkScenario(body, parted).faults).toEqual([]);
    const caseFile = buildCase(body, parted, 't');
    expect(validateCase(caseFile).faults).toEqual([]);
    expect(caseFile.localLosses).toEqual([loss]);
    expect(caseFile.numerics.momentum).toBe('compound');
    expect(caseFile.sections[2]).toMatchObject({ storage: parted[2].storage });
    expect(caseFile.sections[2].embankments).toEqual(parted[2].embankments);

    const plain = buildCase(sound(), sections, 't');
    expect('localLosses' in plain || 'momentum' in plain.numerics).toBe(false);
    expect('storage' in plain.sections[2] || 'embankments' in plain.sections[2]).toBe(false);
  });

  test('parts of a section that the solver would refuse are faults of the reach', () => {
    const { points } = sections[2];
    const dammed = sections.map((section, k) =>
      k === 2
        ? { ...section, storage: [{ from: points[0][0], to: points[points.length - 1][0] }] }
        : section,
    );
    const [fault] = checkScenario(sound(), dammed).faults;
    expect(fault.path).toBe('reachId');
    expect(fault.message).toContain('covers the lowest bed');
  });
});

describe('the case file', () => {
  test('says everything that the run depends on', () => {
    const caseFile = buildCase(sound(), sections, 'Study: 1 in 100 year');
    expect(caseFile).toMatchObject({
      format: 'spate-case/1',
      title: 'Study: 1 in 100 year',
      upstream: { kind: 'inflow' },
      downstream: { kind: 'normalDepth', slope: 0.001 },
      initial: { kind: 'steady' },
      structures: [],
      numerics: { order: 2, courant: 0.8, dryDepth: 0.001 },
    });
    expect(caseFile.sections[0]).toEqual({
      id: 'XS-01',
      chainage: 0,
      points: sections[0].points,
      roughness: sections[0].roughness,
      banks: [20, 38],
    });
    expect(JSON.parse(JSON.stringify(caseFile))).toEqual(caseFile);
  });
  test('leaves out bank marks that are not there', () => {
    const bare = sections.map((section) => ({ ...section, banks: null }));
    expect('banks' in buildCase(sound(), bare, 't').sections[0]).toBe(false);
  });
  test('is not made of an incomplete scenario', () => {
    expect(() => buildCase(newScenario('Flood', 1, sections), sections, 't')).toThrow('upstream');
  });
});
