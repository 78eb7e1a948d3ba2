import { CASE_LIMITS } from '../../../shared/case/caseLimits';
import { validateCase } from '../../../shared/case/validateCase';
import { soundCase } from './soundCase';

/** Paths of the faults of a sound case that was changed. */
function faultsOf(change: (draft: ReturnType<typeof soundCase>) => void) {
  const draft = soundCase();
  change(draft);
  const { faults, caseFile } = validateCase(draft);
  if (faults.length > 0) expect(caseFile).toBeNull();
  return faults.map(({ path, message }) => `${path}: ${message}`);
}

/** Writes past the types, as a hand-made file does. */
function put(target: object, key: string | number, value: unknown): void {
  (target as Record<string | number, unknown>)[key] = value;
}

describe('validation of a case', () => {
  it('lets a sound case through as it is', () => {
    const draft = soundCase();
    expect(validateCase(draft)).toEqual({ faults: [], caseFile: draft });
  });

  it.each([[null], [undefined], [3], ['case'], [[]]])('says what is no case: %j', (value) => {
    const { faults, caseFile } = validateCase(value);
    expect(caseFile).toBeNull();
    expect(faults).toHaveLength(1);
    expect(faults[0].path).toBe('(case)');
  });

  it('names every part that is missing', () => {
    const paths = validateCase({}).faults.map(({ path }) => path);
    expect(paths).toEqual([
      'format',
      'title',
      'sections',
      'upstream',
      'downstream',
      'laterals',
      'structures',
      'initial',
      'numerics',
    ]);
  });

  it('names all faults at once, each with place, fault and mend', () => {
    const faults = faultsOf((draft) => {
      put(draft, 'format', 'other/1');
      draft.sections[0].points[1][0] = -5;
      draft.sections[1].roughness[0][1] = -0.03;
      draft.sections[2].chainage = 400;
      put(draft.upstream, 'flows', [10, -1, 'x']);
      draft.numerics.cellSize = 0;
    });
    expect(faults).toEqual([
      'format: must be "spate-case/1", not the text "other/1"',
      'sections[0].points[1]: its offset -5 m lies left of the 0 m before it; order the points from left to right',
      "sections[1].roughness[0][1]: Manning's n is -0.03; it cannot be negative (rivers: 0.02 to 0.15)",
      'sections[2].chainage: is 400 m, not beyond the 500 m of sections[1]; order the sections downstream, each at a chainage of its own',
      'upstream.flows[2]: must be one of the flows in m³/s as a finite number, not the text "x"',
      'numerics.cellSize: is 0 m; a cell size must be above 0',
    ]);
  });

  it.each<[string, (draft: ReturnType<typeof soundCase>) => void, string]>([
    ['one section', (d) => d.sections.splice(1), 'sections: has 1 entries'],
    ['an id twice', (d) => (d.sections[1].id = 'S1'), 'sections[1].id: "S1" is also'],
    ['an empty id', (d) => (d.sections[1].id = ''), 'sections[1].id: is empty'],
    ['one point', (d) => d.sections[0].points.splice(1), 'sections[0].points: has 1 entries'],
    [
      'no width',
      (d) =>
        (d.sections[0].points = [
          [3, 2],
          [3, 1],
        ]),
      'sections[0].points: all points',
    ],
    [
      'an infinite elevation',
      (d) => (d.sections[0].points[0][1] = Infinity),
      'sections[0].points[0][1]',
    ],
    ['an elevation in millimetres', (d) => (d.sections[0].points[0][1] = 1e9), 'check the unit'],
    [
      'a point of three',
      (d) => put(d.sections[0].points, 0, [0, 1, 2]),
      'sections[0].points[0]: must be',
    ],
    [
      'a wall that rises in',
      (d) => d.sections[0].points.unshift([0, -9]),
      'sections[0].points[0]: starts a wall',
    ],
    ['a wall that falls out', (d) => d.sections[0].points.push([30, -9]), 'ends a wall'],
    ['no roughness', (d) => (d.sections[0].roughness = []), 'sections[0].roughness: has 0'],
    ['n as a percentage', (d) => (d.sections[0].roughness[0][1] = 35), 'must be below 10'],
    [
      'roughness that begins late',
      (d) => (d.sections[0].roughness[0][0] = 2),
      'the first zone begins at 2 m',
    ],
    ['roughness out of order', (d) => d.sections[0].roughness.push([0, 0.05]), 'order the zones'],
    [
      'roughness beyond the end',
      (d) => d.sections[0].roughness.push([99, 0.05]),
      'right of the last point',
    ],
    ['banks swapped', (d) => (d.sections[0].banks = [20, 10]), 'sections[0].banks: the left bank'],
    ['banks outside', (d) => (d.sections[0].banks = [5, 99]), 'must lie within'],
    [
      'an unknown key',
      (d) => put(d.sections[0], 'note', 'x'),
      'sections[0].note: is not known here',
    ],
    ['an unknown kind', (d) => put(d.upstream, 'kind', 'spring'), 'upstream.kind: must be one of'],
    ['a negative inflow', (d) => put(d.upstream, 'flows', [1, -2]), 'upstream.flows[1]: is -2'],
    [
      'times that stand',
      (d) => put(d.upstream, 'times', [5, 5]),
      'upstream.times[1]: 5 s is not beyond',
    ],
    ['flows without times', (d) => put(d.upstream, 'flows', [1]), 'has 1 values for 2 times'],
    ['an empty series', (d) => put(d.upstream, 'times', []), 'upstream.times: has 0 entries'],
    [
      'an adverse normal slope',
      (d) => (d.downstream = { kind: 'normalDepth', slope: -1 }),
      'downstream.slope',
    ],
    [
      'a falling rating',
      (d) => (d.downstream = { kind: 'rating', stages: [1, 2], flows: [9, 5] }),
      'downstream.flows[1]: is 5 m³/s, below',
    ],
    [
      'a lateral outside',
      (d) => d.laterals.push({ from: -5, to: 20, times: [0], flows: [1] }),
      'laterals[0].from: chainage -5 m lies outside',
    ],
    [
      'a lateral backwards',
      (d) => d.laterals.push({ from: 90, to: 20, times: [0], flows: [1] }),
      'laterals[0]: from 90 m lies below',
    ],
    ['a structure', (d) => put(d, 'structures', [{}]), 'structures[0].kind: must be one of weir'],
    [
      'a dam outside',
      (d) => (d.initial = { kind: 'dam', chainage: 2000, stageAbove: 5, stageBelow: null }),
      'initial.chainage: the dam at 2000 m',
    ],
    [
      'steady before a wall',
      (d) => (d.downstream = { kind: 'wall' }),
      'initial.kind: there is no steady',
    ],
    ['too many cells', (d) => (d.numerics.cellSize = 1e-3), 'numerics.cellSize'],
    ['too many outputs', (d) => (d.numerics.outputInterval = 1e-3), 'numerics.outputInterval'],
    ['a third order', (d) => put(d.numerics, 'order', 3), 'numerics.order'],
    ['a Courant number of 2', (d) => (d.numerics.courant = 2), 'numerics.courant'],
    ['a dry depth of 1 m', (d) => (d.numerics.dryDepth = 1), 'numerics.dryDepth'],
    ['gravity in feet', (d) => (d.gravity = 32.2), 'gravity'],
  ])('finds %s', (_, change, expected) => {
    const faults = faultsOf(change);
    expect(faults.join('\n')).toContain(expected);
  });

  it('keeps to its limits', () => {
    const many = faultsOf((draft) => {
      draft.sections[0].points = Array.from(
        { length: CASE_LIMITS.pointsPerSection + 1 },
        (_, k) => [k / 100, 5],
      );
      draft.sections[0].banks = undefined;
    });
    expect(many).toEqual([
      expect.stringContaining('sections[0].points: has 2001 entries; at most 2000'),
    ]);
    const sections = faultsOf((draft) => {
      draft.sections = Array.from({ length: CASE_LIMITS.sections + 1 }, (_, k) => ({
        ...draft.sections[0],
        id: `S${k}`,
        chainage: k,
      }));
    });
    expect(sections).toEqual([expect.stringContaining('sections: has 501 entries; at most 500')]);
  });
});
