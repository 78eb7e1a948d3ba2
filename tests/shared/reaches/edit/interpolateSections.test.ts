import { fillBetween, interpolateSections } from '@/shared/reaches/edit/interpolateSections';
import { checkGeometry } from '@/shared/reaches/edit/checkGeometry';
import { thalwegOf } from '@/shared/reaches/sectionGeometry';
import { lowerVeshall } from '@/seed/reaches/lowerVeshall';
import { sectionProperties } from '@/server/solvers';
import { shapedGrid } from '@/server/solvers/geometry/grid';
import { buildCase } from '@/shared/scenarios/buildCase';
import { newScenario } from '@/shared/scenarios/proposals';
import type { Section } from '@/shared/surveys/types';
import { plainSections } from '../../../helpers/plainSections';

const between = (a: Section, b: Section, spacing: number) =>
  interpolateSections(a, b, spacing, ({ id }, n) => `${id}/${n}`);

test('half way between two trapezoids of one shape lies the mean', () => {
  const [a, b] = plainSections();
  const [half, ...rest] = between(a, b, 250);
  expect(rest).toEqual([]);
  expect(half).toMatchObject({ id: 'XS-01/1', chainage: 250, banks: [20, 38], coordinates: null });
  expect(half.roughness).toEqual(a.roughness);
  // The bed falls 0.5 m over 500 m.
  half.points.forEach(([y, z], i) => {
    expect(y).toBeCloseTo(a.points[i][0], 12);
    expect(z).toBeCloseTo(a.points[i][1] - 0.25, 12);
  });
});

test('none lies farther from its neighbour than the spacing, and they are even', () => {
  const [a, b] = plainSections();
  expect(between(a, b, 500)).toEqual([]);
  expect(between(a, b, 499).map(({ chainage }) => chainage)).toEqual([250]);
  expect(between(a, b, 100).map(({ chainage }) => chainage)).toEqual([100, 200, 300, 400]);
});

test('roughness, coordinates, storage and embankments go along in proportion', () => {
  const [first, second] = plainSections();
  const a: Section = {
    ...first,
    coordinates: first.points.map(([y]) => [y, 0]),
    storage: [{ from: 0, to: 10, flowsAbove: 15 }],
    embankments: { right: { offset: 48, crest: 14 } },
  };
  const b: Section = {
    ...second,
    roughness: [
      [0, 0.08],
      [20, 0.045],
      [38, 0.08],
    ],
    coordinates: second.points.map(([y]) => [y, 500]),
    storage: [{ from: 0, to: 20, flowsAbove: 14 }],
    embankments: { right: { offset: 50, crest: 13 }, left: { offset: 10, crest: 14 } },
  };
  const [made] = between(a, b, 400);
  expect(made.roughness.map(([, n]) => n)).toEqual(
    [0.07, 0.04, 0.07].map((n) => expect.closeTo(n, 12)),
  );
  expect(made.coordinates![0]).toEqual([0, 250]);
  expect(made.storage).toEqual([{ from: 0, to: 15, flowsAbove: 14.5 }]);
  expect(made.embankments).toEqual({ right: { offset: 49, crest: 13.5 } });
});

test('on a natural reach the solver finds the same cross-section there without it', () => {
  const [a, b] = lowerVeshall().slice(7, 9);
  const [made] = between(a, b, 0.6 * (b.chainage - a.chainage));
  // The solver's own cell whose middle lies there: of three equal cells the second.
  const body = newScenario('Middle', 1, [a, b]);
  body.numerics.cellSize = (b.chainage - a.chainage) / 3;
  body.upstream = { kind: 'wall' };
  const shapes = [...shapedGrid(buildCase(body, [a, b], 'Middle')).shapes];
  for (const depth of [0.5, 2, 4, 6]) {
    const stage = thalwegOf(made) + depth;
    const mine = sectionProperties(caseSection(made), stage);
    const theirs = sectionProperties(shapes[2], stage);
    expect(mine.area).toBeCloseTo(theirs.area, 8);
    expect(mine.topWidth).toBeCloseTo(theirs.topWidth, 8);
    expect(mine.conveyance / theirs.conveyance).toBeCloseTo(1, 8);
  }
});

const caseSection = ({ id, chainage, points, roughness, banks }: Section) => ({
  id,
  chainage,
  points,
  roughness,
  ...(banks && { banks }),
});

test('the demo river filled to 200 m is a geometry without fault', () => {
  const sections = lowerVeshall();
  const filled = fillBetween(sections, new Set(sections.map(({ id }) => id)), 200);
  expect(filled.length).toBeGreaterThan(100);
  expect(checkGeometry(filled)).toEqual([]);
  filled.slice(1).forEach((section, i) => {
    expect(section.chainage - filled[i].chainage).toBeGreaterThan(0);
    expect(section.chainage - filled[i].chainage).toBeLessThanOrEqual(200 + 1e-9);
  });
  expect(filled.every(({ coordinates, points }) => coordinates?.length === points.length)).toBe(
    true,
  );
});

test('only between chosen neighbours, and never more than a reach holds', () => {
  const sections = plainSections(4);
  const some = fillBetween(sections, new Set(['XS-02', 'XS-03']), 250);
  expect(some.map(({ id }) => id)).toEqual(['XS-01', 'XS-02', 'XS-02/1', 'XS-03', 'XS-04']);
  const all = new Set(sections.map(({ id }) => id));
  expect(() => fillBetween(sections, all, 1)).toThrow(/a reach holds 500/);
});
