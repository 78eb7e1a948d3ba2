import { damBreakCase, demoCase } from '../../../seed/demoCase';
import { lowerVeshall } from '../../../seed/reaches/lowerVeshall';
import { QUENLOW_DAM, quenlowReservoir, quenlowValley } from '../../../seed/reaches/quenlowValley';
import { bankfullStage, thalwegOf } from '../../../shared/reaches/sectionGeometry';
import type { Section } from '../../../shared/surveys/types';

describe.each([
  ['Lower Veshall', lowerVeshall, 44, 21_400],
  ['Quenlow valley', quenlowValley, 22, 5200],
])('the demo reach %s', (_, build, count, length) => {
  const sections: Section[] = build();
  test('is the same each time', () => expect(build()).toEqual(sections));
  test('has its sections in order over its length', () => {
    expect(sections).toHaveLength(count);
    expect(sections[0].chainage).toBe(0);
    expect(sections.at(-1)!.chainage).toBe(length);
    for (let i = 1; i < count; i++)
      expect(sections[i].chainage - sections[i - 1].chainage).toBeGreaterThanOrEqual(50);
  });
  test('has offsets that never go back, banks on points, roughness from the left end', () => {
    for (const { points, banks, roughness, coordinates } of sections) {
      const offsets = points.map(([y]) => y);
      for (let i = 1; i < offsets.length; i++) expect(offsets[i]).toBeGreaterThan(offsets[i - 1]);
      expect(offsets).toEqual(expect.arrayContaining(banks!));
      expect(roughness[0][0]).toBe(0);
      expect(roughness.map(([from]) => from)).toEqual(
        [...roughness.map(([from]) => from)].sort((a, b) => a - b),
      );
      expect(coordinates).toHaveLength(points.length);
    }
  });
  test('lies on the map as it is measured', () => {
    for (const { points, coordinates } of sections) {
      const [[e0, n0], [e1, n1]] = [coordinates![0], coordinates!.at(-1)!];
      expect(Math.abs(Math.hypot(e1 - e0, n1 - n0) - points.at(-1)![0])).toBeLessThan(0.2);
    }
  });
  test('ends above its banks', () => {
    for (const section of sections) {
      const ends = Math.min(section.points[0][1], section.points.at(-1)![1]);
      expect(ends).toBeGreaterThan(bankfullStage(section) + 2);
    }
  });
});

test('the Lower Veshall narrows at its bridge, and its floodplains vary', () => {
  const sections = lowerVeshall();
  const bridge = sections.find(({ chainage }) => chainage === 10_600)!;
  const channel = ({ banks }: Section) => banks![1] - banks![0];
  for (const section of sections)
    if (section !== bridge) expect(channel(section)).toBeGreaterThan(1.25 * channel(bridge));
  const plains = sections.map((section) => section.points.at(-1)![0] - channel(section));
  expect(Math.min(...plains)).toBeLessThan(150);
  expect(Math.max(...plains)).toBeGreaterThan(350);
  expect(sections.reduce((sum, { points }) => sum + points.length, 0)).toBeGreaterThan(1700);
});

test('the reservoir fits into its valley', () => {
  const dam = quenlowValley().find(({ chainage }) => chainage === QUENLOW_DAM.chainage)!;
  expect(quenlowReservoir() - thalwegOf(dam)).toBeCloseTo(QUENLOW_DAM.depth, 0);
  expect(Math.min(dam.points[0][1], dam.points.at(-1)![1])).toBeGreaterThan(quenlowReservoir());
});

test('both cases are complete', () => {
  expect(demoCase()).toMatchObject({ upstream: { kind: 'inflow' }, initial: { kind: 'steady' } });
  expect(Math.max(...(demoCase().upstream as { flows: number[] }).flows)).toBe(490);
  expect(damBreakCase()).toMatchObject({
    upstream: { kind: 'wall' },
    initial: { kind: 'dam', stageBelow: null },
  });
});
