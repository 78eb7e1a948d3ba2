import { validateCase } from '../../../shared/case/validateCase';
import { buildCase } from '../../../shared/scenarios/buildCase';
import { checkScenario } from '../../../shared/scenarios/checkScenario';
import { newScenario } from '../../../shared/scenarios/proposals';
import {
  scenarioSchema,
  type ReservoirEnd,
  type ScenarioBody,
} from '../../../shared/scenarios/schemas';
import { damDataOf, damInputsOf } from '../../../shared/scenarios/structures/damData';
import { newStructure } from '../../../shared/scenarios/structures/newStructure';
import type { BreachBody, StructureBody } from '../../../shared/scenarios/structures/schemas';
import { plainSections } from '../../helpers/plainSections';

const sections = plainSections(5, 500);
const KINDS = ['weir', 'sluice', 'culvert', 'bridge', 'breach'] as const;

const reservoir: ReservoirEnd = {
  kind: 'reservoir',
  storage: { stages: [10, 14, 18], volumes: [0, 4e5, 1.5e6] },
  initialStage: 17,
  inflow: { kind: 'table', times: [0], flows: [2] },
  spillway: { stages: [16.5, 18], flows: [0, 60] },
};
const sound = (change: Partial<ScenarioBody> = {}): ScenarioBody => ({
  ...newScenario('1 in 100 year', 1, sections),
  upstream: { kind: 'table', times: [0, 7200], flows: [10, 60] },
  ...change,
});
const proposed = (kind: StructureBody['kind'], chainage = 700, upstream = sound().upstream) =>
  newStructure(kind, { chainage, sections, upstream, taken: [] });
const whole = (change: Partial<BreachBody> = {}): BreachBody => ({
  ...(proposed('breach', 0, reservoir) as BreachBody),
  bottomWidth: 12,
  sideSlope: 1,
  formationTime: 1800,
  ...change,
});
const pathsOf = (body: ScenarioBody) =>
  checkScenario(body, sections).faults.map(({ path }) => path);
const withStructure = (structure: StructureBody) => pathsOf(sound({ structures: [structure] }));

describe('what is proposed', () => {
  test.each(['weir', 'sluice', 'culvert', 'bridge'] as const)(
    'a %s can be routed as it is',
    (kind) => {
      const body = sound({ structures: [proposed(kind)] });
      expect(checkScenario(body, sections)).toEqual({ faults: [], doubts: [] });
      expect(validateCase(buildCase(body, sections, 't')).faults).toEqual([]);
    },
  );
  test('a dam lacks what only the modeller knows', () => {
    expect(withStructure(proposed('breach'))).toEqual([
      'structures[0].formationTime',
      'structures[0].bottomWidth',
      'structures[0].sideSlope',
    ]);
  });
  test('a dam at the head is as high as the storage table', () => {
    expect(Math.min(...whole().levels)).toBe(18);
    expect(pathsOf(sound({ upstream: reservoir, structures: [whole()] }))).toEqual([]);
  });
  test('names do not repeat', () => {
    const where = { chainage: 700, sections, upstream: sound().upstream };
    expect(newStructure('weir', { ...where, taken: ['Weir 1', 'Weir 2'] }).id).toBe('Weir 3');
  });
});

test('a scenario with everything passes the schema unchanged', async () => {
  const structures = [...KINDS.map((kind, i) => proposed(kind, 400 + 300 * i)), whole()];
  const body = sound({ upstream: reservoir, structures });
  expect(await scenarioSchema.validate(body)).toEqual(body);
});
test('one that was stored before there were structures is routed as before', () => {
  const { structures: _none, ...before } = sound();
  expect(pathsOf(before)).toEqual([]);
  expect(buildCase(before, sections, 't').structures).toEqual([]);
});

describe('faults stand where they are mended', () => {
  test('the dam of a reservoir stands at the head, other structures within the reach', () => {
    expect(withStructure(whole())).toEqual(['structures[0].chainage']);
    expect(withStructure(proposed('weir', 2000))).toEqual(['structures[0].chainage']);
  });
  test.each([
    [{ ...proposed('weir'), offsets: [], levels: [] }, 'offsets'],
    [{ ...proposed('weir'), offsets: [4, 3], levels: [12, 12] }, 'offsets[1]'],
    [{ ...proposed('sluice'), times: [], openings: [] }, 'times'],
    [{ ...proposed('sluice'), times: [0, 9], openings: [1, -1] }, 'openings[1]'],
    [{ ...proposed('culvert'), barrels: 1.5 }, 'barrels'],
    [{ ...proposed('culvert'), inlet: 'boxFlared45Beveled' }, 'inlet'],
    [{ ...proposed('bridge'), obstructed: 5 }, 'obstructed'],
    [{ ...proposed('bridge'), id: '' }, 'id'],
  ] as [StructureBody, string][])('%#: %s', (structure, place) => {
    expect(withStructure(structure)).toEqual([`structures[0].${place}`]);
  });
  test.each([
    [{ mode: 'piping' }, 'startLevel'],
    [{ bottomWidth: 500 }, 'bottomWidth'],
    [{ trigger: 'time', triggerTime: null }, 'triggerTime'],
    [{ startLevel: 2 }, 'startLevel'],
    [{ centre: -400 }, 'centre'],
  ] as [Partial<BreachBody>, string][])('a breach with %j', (change, place) => {
    const body = sound({ upstream: reservoir, structures: [whole(change)] });
    expect(pathsOf(body)).toEqual([`structures[0].${place}`]);
  });
  test('of a reservoir', () => {
    const change = (to: Partial<ReservoirEnd>) =>
      pathsOf(sound({ upstream: { ...reservoir, ...to } }));
    expect(change({ initialStage: 19 })).toEqual(['upstream.initialStage']);
    expect(change({ storage: { stages: [1, 20], volumes: [5, 5] } })).toEqual([
      'upstream.storage.volumes[1]',
    ]);
    expect(change({ inflow: { kind: 'table', times: [], flows: [] } })).toEqual([
      'upstream.inflow.times',
    ]);
    expect(change({ spillway: { stages: [1, 2], flows: [3, 2] } })).toEqual([
      'upstream.spillway.flows[1]',
    ]);
  });
  test('two of one name', () => {
    expect(pathsOf(sound({ structures: [proposed('weir'), proposed('weir', 900)] }))).toEqual([
      'structures[1].id',
    ]);
  });
});

describe('what is free of faults is taken by the solver', () => {
  const VALUES = [
    null,
    -1e9,
    -3,
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
  ];
  const box = {
    ...proposed('culvert'),
    shape: 'box',
    inlet: 'boxFlared45Beveled',
  } as StructureBody;
  const bodies = [
    ...(['weir', 'sluice', 'culvert', 'bridge'] as const).map((kind) =>
      sound({ structures: [proposed(kind)] }),
    ),
    sound({ structures: [box] }),
    sound({ upstream: reservoir, structures: [whole()] }),
    sound({ structures: [whole({ chainage: 900, mode: 'piping', startLevel: 13 })] }),
  ];
  const variants = bodies.flatMap((body) => {
    const text = JSON.stringify(body);
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
      const { faults } = validateCase(buildCase(body, sections, 't'));
      expect({ text, faults }).toEqual({ text, faults: [] });
    }
    expect(routable).toBeGreaterThan(400);
    expect(routable).toBeLessThan(0.8 * variants.length);
  });
});

describe('the data of a dam', () => {
  test('at the head come from the storage table', () => {
    const dam = whole({ bottomLevel: 10 });
    // Crest 18, fails when the water stands there: 8 m deep, the whole table above the bottom.
    expect(damDataOf(dam, reservoir, sections)).toEqual({
      height: 8,
      waterDepth: 8,
      storage: 1.5e6,
      waterVolume: 1.5e6,
    });
  });
  test('elsewhere come from the sections above it', () => {
    const dam = whole({ chainage: 1000, trigger: 'stage', triggerStage: 13, bottomLevel: 10 });
    const { waterVolume, storage } = damDataOf(dam, sound().upstream, sections);
    expect(storage).toBeGreaterThan(waterVolume!);
    expect(waterVolume).toBeGreaterThan(0);
  });
  test('are not enough without a volume', () => {
    expect(damInputsOf(whole())).toBeNull();
  });
});

test('what a breach is founded on is frozen with the case', () => {
  const dam = whole({ estimate: 'froehlich2008', note: 'Old homogeneous fill.' });
  const [built] = buildCase(
    sound({ upstream: reservoir, structures: [dam] }),
    sections,
    't',
  ).structures;
  expect(built.note).toBe(
    'Width and formation time by Froehlich 2008 (Froehlich (2008), J. Hydraul. Eng. 134(12), 1708-1721). Old homogeneous fill.',
  );
});
