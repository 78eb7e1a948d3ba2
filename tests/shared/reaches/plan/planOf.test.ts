import { coordinateAt } from '@/shared/reaches/edit/coordinateAt';
import { floodExtent, wetEdges } from '@/shared/reaches/plan/floodExtent';
import { planOf } from '@/shared/reaches/plan/planOf';
import type { Section } from '@/shared/surveys/types';
import { plainSections } from '../../../helpers/plainSections';

/** The river runs north: offsets count eastwards from 5000, chainage northwards from 7000. */
const placed = (): Section[] =>
  plainSections().map((section) => ({
    ...section,
    coordinates: section.points.map(([y]) => [5000 + y, 7000 + section.chainage]),
  }));

test('an offset has its place on the line of the section, and beyond its ends', () => {
  const [section] = placed();
  expect(coordinateAt(section, 23)).toEqual([5023, 7000]);
  expect(coordinateAt(section, -4)).toEqual([4996, 7000]);
  expect(coordinateAt(section, 60)).toEqual([5060, 7000]);
  expect(coordinateAt(plainSections()[0], 23)).toBeNull();
});

test('the edges of the water stand where the ground meets the stage', () => {
  // Half way up both sides of 1 in 2: 23 and 35 m.
  expect(wetEdges(placed()[0], 11.5)).toMatchObject({ left: [5023, 7000], right: [5035, 7000] });
  // Above both ends the water stands against them.
  expect(wetEdges(placed()[0], 20)).toMatchObject({ left: [5000, 7000], right: [5058, 7000] });
  expect(wetEdges(placed()[0], 9)).toBeNull();
});

test('behind an embankment it stays dry until the water is over its crest', () => {
  const section = { ...placed()[0], embankments: { left: { offset: 15, crest: 14 } } };
  // The ground at 15 m lies 0.1 m above the bank of 13 m.
  expect(wetEdges(section, 13.5)).toMatchObject({ left: [5015, 7000] });
  // Over the crest the water reaches the slope of 2.8 m over 10 m: 10 − 10·(14.6 − 13.2)/2.8 = 5 m.
  expect(wetEdges(section, 14.6)?.left[0]).toBeCloseTo(5005, 9);
});

test('neighbouring edges are joined, anticlockwise and closed; nothing is drawn to a dry section', () => {
  const stages = new Map([
    ['XS-01', 11.5],
    ['XS-02', 11],
    ['XS-03', 8],
    ['XS-04', 10],
  ]);
  const { features, crossing } = floodExtent(placed(), stages);
  expect(crossing).toEqual([]);
  expect(features).toHaveLength(1);
  expect(features[0].geometry.coordinates).toEqual([
    [
      [5023, 7000],
      [5035, 7000],
      [5035, 7500],
      [5023, 7500],
      [5023, 7000],
    ],
  ]);
  expect(features[0].properties).toMatchObject({ from: 'XS-01', to: 'XS-02', toPeakStage: 11 });
});

test('between sections whose lines cross no extent is drawn, and it is said', () => {
  const sections = placed();
  sections[1].coordinates!.reverse();
  const peakStages = new Map(sections.map(({ id }) => [id, 14]));
  const plan = planOf(sections, 'Local grid of Tornick', { number: 3, peakStages });
  expect(plan.features.filter(({ properties }) => properties.kind === 'peakExtent')).toHaveLength(
    1,
  );
  expect(plan.notes.join(' ')).toContain('XS-01 to XS-02, XS-02 to XS-03');
});

test('the file names its coordinate system, its lines and what is missing', () => {
  const sections = placed();
  sections[3] = plainSections()[3];
  const plan = planOf(sections, 'Local grid of Tornick');
  expect(plan.coordinateSystem).toBe('Local grid of Tornick');
  expect(plan.features.map(({ properties }) => properties.kind)).toEqual([
    'centreLine',
    'section',
    'section',
    'section',
  ]);
  // The lowest point, the first of two at one level, stands at 26 m.
  expect(plan.features[0].geometry.coordinates[0]).toEqual([5026, 7000]);
  expect(plan.notes).toContain('Without coordinates and left out: 1 section.');
});
