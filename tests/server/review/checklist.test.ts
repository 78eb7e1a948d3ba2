import type { CaseFile } from '../../../shared/case/caseFile';
import { q, say } from '../../../shared/units/message';
import { changeOutlet, describeOutletChange } from '../../../server/services/review/changeOutlet';
import type { UnitSystem } from '../../../shared/units/units';
import { checklistItems } from '../../../server/services/review/checklist/items';
import type { ChecklistFacts } from '../../../server/services/review/checklist/types';
import { sampleBlocks } from '../results/sampleRun';

let facts: ChecklistFacts;
beforeAll(async () => {
  const { blocks, caseFile } = sampleBlocks();
  facts = {
    caseFile,
    run: { ...(await blocks.facts()), warnings: [] },
    places: await blocks.places(),
    sections: caseFile.sections.map(({ chainage, id }) => ({
      id,
      chainage,
      fellDry: false,
      rewetted: false,
      peakFroude: 0.4,
      peakStage: 53,
      lowerEnd: 55,
    })),
    advice: [],
    probe: null,
    convergence: null,
    observed: null,
    grids: [{ runNumber: 1, cellSize: 25, peaks: [{ name: 'Mill', stage: 52.5 }] }],
  };
});

const item = (id: string, change: Partial<ChecklistFacts> = {}, system: UnitSystem = 'metric') =>
  checklistItems({ ...facts, ...change }, system).find((found) => found.id === id)!;

test.each([
  [0.0009, 'good'],
  [-0.0009, 'good'],
  [0.005, 'look'],
  [-0.011, 'bad'],
])('a volume error of %p is %s', (relativeError, outcome) => {
  // Below 0.1 % good, above 1 % rejected: common practice.
  const run = { ...facts.run, volume: { ...facts.run.volume, relativeError } };
  expect(item('volumeBalance', { run }).outcome).toBe(outcome);
});

test('the shortest step is that of the fastest place: c = v + sqrt(g d)', () => {
  // By hand: 2 m/s and 3 m deep, g = 9.80665 m/s²: 2 + 5.424 = 7.424 m/s; 0.8 · 25 m / 7.424 m/s = 2.69 s.
  expect(item('timeStep').finding).toContain('2.69 s on cells of 25');
  const numerics = { ...facts.caseFile.numerics, courant: 1.2 };
  expect(item('timeStep', { caseFile: { ...facts.caseFile, numerics } }).outcome).toBe('bad');
});

test('the supercritical length is half the way to each neighbour', () => {
  const [a, b, c] = facts.sections;
  const sections = [a, { ...b, peakFroude: 1.2 }, c];
  // Sections at 0, 1000 and 2500 m: 500 m above and 750 m below the middle one.
  expect(item('supercritical', { sections })).toMatchObject({ outcome: 'look' });
  expect(item('supercritical', { sections }).finding).toContain('1,250 m');
});

test('sections that fall dry, that are overtopped, and roughness that no table knows', () => {
  const [a, ...rest] = facts.sections;
  const dry = { sections: [{ ...a, fellDry: true, rewetted: true }, ...rest] };
  expect(item('dryCells', dry).outcome).toBe('look');
  expect(item('dryCells').outcome).toBe('good');
  const high = { sections: [{ ...a, peakStage: 55.25 }, ...rest] };
  expect(item('sectionEnds', high)).toMatchObject({ outcome: 'bad' });
  expect(item('sectionEnds', high).finding).toContain('0.25 m');
  const [section, ...others] = facts.caseFile.sections;
  const odd = { ...section, roughness: [[0, 0.4]] as [number, number][] };
  const caseFile: CaseFile = { ...facts.caseFile, sections: [odd, ...others] };
  expect(item('roughness', { caseFile }).outcome).toBe('look');
});

test('the outlet is judged by the place that moves most', () => {
  const probe = (there: number): ChecklistFacts['probe'] => ({
    runNumber: 2,
    state: 'routed',
    change: describeOutletChange({ kind: 'stage', times: [0], stages: [50] })!,
    peaks: [
      { name: 'Mill', here: 52.5, there: 52.501 },
      { name: 'Bridge', here: 52, there },
    ],
  });
  expect(item('outletInfluence').outcome).toBe('asked');
  expect(item('outletInfluence', { probe: probe(52.01) }).outcome).toBe('good');
  expect(item('outletInfluence', { probe: probe(51.95) }).outcome).toBe('look');
  const far = item('outletInfluence', { probe: probe(52.2) });
  expect(far.outcome).toBe('bad');
  expect(far.finding).toContain('the stage at the outlet 0.50 m higher moves');
  expect(far.finding).toContain('0.200 m, at Bridge');
  // 0.5 m are 1.640 ft, 0.2 m are 0.656 ft, 0.02 m are 0.066 ft: 1 ft is 0.3048 m exactly (NIST SP 811, app. B.8).
  const inFeet = item('outletInfluence', { probe: probe(52.2) }, 'usCustomary');
  expect(inFeet.finding).toContain('the stage at the outlet 1.64 ft higher moves');
  expect(inFeet.finding).toContain('0.656 ft, at Bridge');
  expect(inFeet.rule).toContain('below 0.07 ft is good');
  expect(item('outletInfluence', { probe: { ...probe(52)!, state: 'running' } }).outcome).toBe(
    'asked',
  );
});

test('three grids tell the order and the index', () => {
  // f = 50 + c h²: order 2. Fine 50.01 at 10 m, 50.04 at 20 m, 50.16 at 40 m; GCI = 1.25 · 0.03 / 50.01 / 3 = 0.025 %.
  const grids = [
    [10, 50.01],
    [20, 50.04],
    [40, 50.16],
  ].map(([cellSize, stage], k) => ({
    runNumber: k + 1,
    cellSize,
    peaks: [{ name: 'Mill', stage }],
  }));
  const found = item('gridSize', { grids });
  expect(found.outcome).toBe('good');
  expect(found.finding).toContain('order 2.0');
  expect(found.finding).toContain('0.025 %');
  expect(item('gridSize', { grids: grids.slice(1) }).outcome).toBe('look');
  // A convergence set of the case goes before runs that happen to be there.
  const set = (difference: number) => ({
    name: 'Three grids',
    result: {
      kind: 'convergence' as const,
      grids: [25, 50, 100].map((cellSize) => ({ cellSize, cells: 1000 / cellSize, seconds: 1 })),
      stations: [],
      along: {
        chainage: [0],
        bed: [0],
        peakStage: [1],
        difference: [difference],
        band: [null],
        order: 1.9,
        monotone: 1,
      },
      widest: { chainage: 400, difference },
    },
  });
  expect(item('gridSize', { convergence: set(-0.012) })).toMatchObject({
    outcome: 'good',
    finding:
      'Three grids: cells of 25.0 m, 50.0 m, 100.0 m; the finest two differ in peak stage by at most 0.012 m, at chainage 400 m. Observed order of the peak stage 1.9.',
  });
  expect(item('gridSize', { convergence: set(0.06) }).outcome).toBe('look');
  expect(item('gridSize').outcome).toBe('asked');
});

test('a breach is held against the regressions for its reservoir', () => {
  const dam = {
    id: 'DAM',
    kind: 'breach' as const,
    chainage: 0,
    crest: [
      [0, 70],
      [100, 70],
    ] as [number, number][],
    trigger: { kind: 'stage' as const, stage: 70 },
    mode: 'overtopping' as const,
    growth: 'linear' as const,
    formationTime: 1800,
    bottomWidth: 40,
    bottomLevel: 50,
    sideSlope: 1,
  };
  const upstream = {
    kind: 'reservoir' as const,
    stages: [50, 70],
    volumes: [0, 10e6],
    initialStage: 69,
    inflow: { times: [0], flows: [5] },
  };
  const found = (change: object, head: CaseFile['upstream'] = upstream) =>
    item('breach', {
      caseFile: { ...facts.caseFile, upstream: head, structures: [{ ...dam, ...change }] },
    });
  // By hand for 20 m of water and 10 million m³: USBR 1988 gives 3 · 20 = 60 m of width and 0.011 · 60 h = 40 min.
  expect(found({}).outcome).toBe('good');
  expect(found({}).finding).toContain('average width 60.0 m');
  expect(found({ bottomWidth: 2 }).outcome).toBe('look');
  expect(found({ formationTime: 0 }).outcome).toBe('look');
  expect(found({}, { kind: 'wall' }).outcome).toBe('asked');
  expect(item('breach')).toBeUndefined();
});

test('every kind of outlet is changed, but for a closed end', () => {
  const at = (downstream: CaseFile['downstream']) =>
    changeOutlet({ ...facts.caseFile, downstream })?.downstream;
  expect(at({ kind: 'normalDepth', slope: 0.001 })).toEqual({ kind: 'normalDepth', slope: 0.0005 });
  expect(at({ kind: 'stage', times: [0], stages: [10] })).toMatchObject({ stages: [10.5] });
  expect(at({ kind: 'rating', stages: [1, 2], flows: [0, 9] })).toMatchObject({
    stages: [1.5, 2.5],
  });
  expect(at({ kind: 'open' })).toMatchObject({ kind: 'normalDepth' });
  expect(at({ kind: 'wall' })).toBeUndefined();
  expect(describeOutletChange({ kind: 'wall' })).toBeNull();
});

test('a run against observed marks says how far off it is; without any it is asked', () => {
  const summary = { count: 5, mean: -0.1, rms: 0.2, largest: 0.4, within: 4 };
  const observed = {
    runId: 1,
    flood: 'January 2024',
    reported: 'January 2024',
    marks: [],
    all: summary,
    byKind: [],
    byConfidence: [],
    gauges: [],
    misfit: 0.7,
  };
  expect(item('calibration').outcome).toBe('asked');
  expect(item('calibration', { observed })).toMatchObject({
    outcome: 'good',
    finding:
      'Against January 2024: 4 of 5 marks within their tolerance, mean error −0.10 m, root mean square 0.20 m; misfit 0.70 tolerances.',
  });
  expect(item('calibration', { observed: { ...observed, misfit: 1.2 } }).outcome).toBe('look');
});

test('no item of a study in feet speaks of metres, whatever it finds', () => {
  const run = {
    ...facts.run,
    warnings: [
      {
        code: 'initialDry' as const,
        ...say`Rose by ${q(0.42, 'depth')}.`,
        chainage: null,
        time: null,
      },
    ],
  };
  const sections = facts.sections.map((section) => ({
    ...section,
    peakFroude: 1.2,
    lowerEnd: 52,
  }));
  const grids = [1, 2, 4].map((k) => ({
    runNumber: k,
    cellSize: 25 * k,
    peaks: [{ name: 'Mill', stage: 52.5 + 0.1 * k }],
  }));
  const items = checklistItems({ ...facts, run, sections, grids }, 'usCustomary');
  const words = items.map(({ finding, rule }) => `${finding} ${rule}`).join('\n');
  expect(words).toContain('Rose by 1.38 ft.');
  expect(words).not.toMatch(/\d\s?(m|km|m³|m³\/s|m\/s)(?![\w³²/])|metre/);
});
