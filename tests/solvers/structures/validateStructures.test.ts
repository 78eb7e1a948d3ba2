import type { CaseFile } from '@/shared/case/caseFile';
import { validateCase } from '@/shared/case/validateCase';
import { soundCase } from '../unit/soundCase';

const crest = [
  [0, 12],
  [20, 12],
];
const weir = { kind: 'weir', id: 'w', chainage: 500, crest, form: 'broad' };
const sluice = {
  kind: 'sluice',
  id: 's',
  chainage: 400,
  width: 4,
  sill: 10,
  times: [0],
  openings: [1],
};
const culvert = {
  kind: 'culvert',
  id: 'c',
  chainage: 300,
  shape: 'box',
  width: 2,
  height: 1.5,
  barrels: 2,
  n: 0.013,
  length: 20,
  invertUp: 10.4,
  invertDown: 10.3,
  inlet: 'boxWingwalls30to75',
};
const bridge = {
  kind: 'bridge',
  id: 'b',
  chainage: 200,
  piers: 'square',
  obstructed: 0.1,
  soffit: 13,
};
const breach = {
  kind: 'breach',
  id: 'd',
  chainage: 700,
  crest,
  trigger: { kind: 'time', time: 60 },
  mode: 'overtopping',
  growth: 'sine',
  formationTime: 600,
  bottomWidth: 8,
  bottomLevel: 10,
  sideSlope: 1,
};
const reservoir = {
  kind: 'reservoir',
  stages: [10, 20],
  volumes: [0, 1e6],
  initialStage: 12,
  inflow: { times: [0], flows: [1] },
};

const faultsOf = (structures: unknown[], change: Partial<CaseFile> = {}): string =>
  validateCase({ ...soundCase(), ...change, structures })
    .faults.map(({ path, message }) => `${path}: ${message}`)
    .join('\n');

describe('validation of structures', () => {
  it('accepts every kind, and several at one place', () => {
    expect(faultsOf([weir, sluice, culvert, bridge, breach, { ...weir, id: 'w2' }])).toBe('');
    const head = { ...breach, chainage: 0 };
    const upstream = reservoir as CaseFile['upstream'];
    expect(faultsOf([head, weir], { upstream })).toBe('');
  });

  it.each<[string, unknown, string]>([
    ['an unknown kind', { ...weir, kind: 'pump' }, 'structures[0].kind: must be one of weir'],
    ['no id', { ...weir, id: '' }, 'structures[0].id: is empty'],
    ['an unknown field', { ...weir, hight: 3 }, 'structures[0].hight: is not known here'],
    ['a place outside', { ...weir, chainage: 1000 }, 'structures[0].chainage: 1000 m does not lie'],
    ['a place at the head', { ...weir, chainage: 0 }, 'only a reservoir'],
    [
      'a crest that turns back',
      {
        ...weir,
        crest: [
          [5, 1],
          [0, 1],
        ],
      },
      'structures[0].crest[1]: its offset',
    ],
    [
      'a crest without length',
      {
        ...weir,
        crest: [
          [5, 1],
          [5, 2],
        ],
      },
      'structures[0].crest: has no length',
    ],
    ['a wrong form', { ...weir, form: 'round' }, 'structures[0].form: must be one of broad, sharp'],
    ['a coefficient of 0', { ...weir, coefficient: 0 }, 'structures[0].coefficient: is 0'],
    ['a gate below its sill', { ...sluice, openings: [-1] }, 'structures[0].openings[0]: is -1 m'],
    ['no width', { ...sluice, width: 0 }, 'structures[0].width: is 0'],
    ['a contraction of 2', { ...sluice, contraction: 2 }, 'structures[0].contraction: is 2'],
    ['half a barrel', { ...culvert, barrels: 1.5 }, 'structures[0].barrels: is 1.5'],
    [
      'an inlet of a pipe',
      { ...culvert, inlet: 'metalPipeHeadwall' },
      'is no inlet of a box barrel',
    ],
    [
      'a pipe without diameter',
      { ...culvert, shape: 'circular' },
      'structures[0].diameter: is missing',
    ],
    [
      'a cliff of a culvert',
      { ...culvert, invertDown: -5 },
      'structures[0].invertDown: makes a slope',
    ],
    [
      'piers that fill the river',
      { ...bridge, obstructed: 0.8 },
      'structures[0].obstructed: is 0.8',
    ],
    [
      'unknown piers',
      { ...bridge, piers: 'star' },
      'structures[0].piers: must be one of semicircular',
    ],
    ['a breach wider than its dam', { ...breach, bottomWidth: 30 }, 'reaches beyond the crest'],
    ['a breach above its dam', { ...breach, bottomLevel: 15 }, 'lies above the crest'],
    [
      'a pipe without a level',
      { ...breach, mode: 'piping' },
      'structures[0].startLevel: is missing',
    ],
    [
      'a breach that grows up',
      { ...breach, startLevel: 9 },
      'structures[0].startLevel: 9 m lies below',
    ],
    [
      'no trigger',
      { ...breach, trigger: { kind: 'stage' } },
      'structures[0].trigger.stage: is missing',
    ],
    [
      'a time before all time',
      { ...breach, formationTime: -1 },
      'structures[0].formationTime: is -1',
    ],
  ])('finds %s', (_, structure, fault) => {
    expect(faultsOf([structure])).toContain(fault);
  });

  it('finds an id that is used twice, and a reach of one cell', () => {
    expect(faultsOf([weir, { ...sluice, id: 'w' }])).toContain('also the id of structures[0]');
    const numerics = { ...soundCase().numerics, cellSize: 1000 };
    expect(faultsOf([weir], { numerics })).toContain('numerics.cellSize: makes one cell');
  });

  it.each<[string, object, string]>([
    ['storage that falls', { volumes: [5, 4] }, 'upstream.volumes[1]: is 4 m³, not above'],
    ['a stage beyond its table', { initialStage: 30 }, 'upstream.initialStage: 30 m lies outside'],
    ['a negative inflow', { inflow: { times: [0], flows: [-1] } }, 'upstream.inflow.flows[0]'],
    [
      'one point of a spillway',
      { spillway: { stages: [1], flows: [0] } },
      'upstream.spillway.stages',
    ],
  ])('of a reservoir: finds %s', (_, change, fault) => {
    const upstream = { ...reservoir, ...change } as CaseFile['upstream'];
    expect(faultsOf([], { upstream })).toContain(fault);
  });
});
