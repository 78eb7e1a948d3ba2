import { filterRoughness } from '@/components/screens/reach/filterRoughness';
import { groupAdvice } from '@/components/screens/reach/groupAdvice';
import { planModel } from '@/components/screens/reach/planModel';
import { reachProfile } from '@/components/screens/reach/reachProfile';
import { ROUGHNESS_TABLE } from '@/shared/reaches/roughnessTable';
import type { Advice, ReachSection } from '@/shared/reaches/types';

/** Across a river that runs due east: left bank in the north. */
const across = (id: string, chainage: number): Parameters<typeof planModel>[0][number] => ({
  id,
  chainage,
  points: [
    [0, 5],
    [10, 1],
    [20, 5],
  ],
  coordinates: [
    [1000 + chainage, 510],
    [1000 + chainage, 500],
    [1000 + chainage, 490],
  ],
});

describe('the plan of a reach', () => {
  const model = planModel([across('A', 0), across('B', 300)], { width: 348, height: 200 });

  it('has one scale both ways, north up, in the middle of its box', () => {
    expect(model.pxPerMetre).toBeCloseTo(1, 12);
    expect(model.lines.map(({ at }) => at)).toEqual([
      [24, 100],
      [324, 100],
    ]);
    expect(model.lines[0].d).toBe('M24.0,90.0L24.0,100.0L24.0,110.0');
    expect(model.river).toBe('M24.0,100.0L324.0,100.0');
  });

  it('offers a round length for its scale, in metres or feet', () => {
    expect(model.scaleBar(1)).toBe(100);
    expect(model.scaleBar(0.3048)).toBe(200);
  });
});

describe('what stands beside the drawings', () => {
  it('keeps advice of a kind together, by place', () => {
    const advice = (code: Advice['code'], chainage: number) => ({ code, chainage }) as Advice;
    const groups = groupAdvice([
      advice('spacing', 900),
      advice('adverseSlope', 50),
      advice('spacing', 100),
    ]);
    expect(groups.map(({ code, items }) => [code, items.map(({ chainage }) => chainage)])).toEqual([
      ['spacing', [100, 900]],
      ['adverseSlope', [50]],
    ]);
  });

  it('finds rows of the roughness table by words in any order', () => {
    const found = filterRoughness(ROUGHNESS_TABLE, 'grass HIGH');
    expect(found).toMatchObject([{ group: 'Flood plain', normal: 0.035 }]);
    expect(filterRoughness(ROUGHNESS_TABLE, ' ')).toHaveLength(ROUGHNESS_TABLE.length);
    expect(filterRoughness(ROUGHNESS_TABLE, 'lava')).toEqual([]);
  });

  it('lifts the pen of the banks where a section has no marks', () => {
    const section = (banks: [number, number] | null) =>
      ({ chainage: 0, thalweg: 1, leftBank: 5, rightBank: 6, banks }) as ReachSection;
    const profile = reachProfile([section([0, 20]), section(null)]);
    expect(profile.leftBank).toEqual([5, NaN]);
    expect(profile.rightBank).toEqual([6, NaN]);
  });
});
