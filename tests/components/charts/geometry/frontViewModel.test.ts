import { frontShapes, frontViewModel } from '@/components/charts/geometry/frontViewModel';
import { structureLabels } from '@/components/charts/geometry/structureLabels';
import { newStructure } from '@/shared/scenarios/structures/newStructure';
import type { BreachBody, CulvertBody } from '@/shared/scenarios/structures/schemas';
import { structureMarks } from '@/shared/structures/structureMarks';
import { sectionNear } from '@/shared/structures/crests';
import { plainSections } from '../../../helpers/plainSections';

const sections = plainSections(5, 500);
const section = sectionNear(sections, 700);
const upstream = { kind: 'table', times: [0], flows: [10] } as const;
const proposed = (kind: Parameters<typeof newStructure>[0]) =>
  newStructure(kind, {
    chainage: 700,
    sections,
    upstream: { ...upstream, times: [0], flows: [10] },
    taken: [],
  });
const breach = {
  ...proposed('breach'),
  bottomWidth: 10,
  sideSlope: 1,
  bottomLevel: 10,
} as BreachBody;

describe('what is drawn of a structure from the front', () => {
  it.each(['weir', 'sluice', 'culvert', 'bridge', 'breach'] as const)(
    'a %s as it is proposed fits its drawing',
    (kind) => {
      const shapes = frontShapes(proposed(kind), section);
      expect(shapes.length).toBeGreaterThan(0);
      const size = { width: 300, height: 180 };
      const { px, py } = frontViewModel(size, section, shapes, 'metric');
      for (const [offset, level] of shapes.flatMap(({ points }) => points)) {
        expect(px(offset)).toBeGreaterThanOrEqual(0);
        expect(px(offset)).toBeLessThanOrEqual(size.width);
        expect(py(level)).toBeGreaterThanOrEqual(0);
        expect(py(level)).toBeLessThanOrEqual(size.height);
      }
    },
  );
  it('the breach grows in three views to its full trapezoid', () => {
    const views = frontShapes(breach, section).filter(({ role }) => role !== 'body');
    expect(views.map(({ role }) => role)).toEqual(['growth', 'growth', 'opening']);
    const [left, bottomLeft, bottomRight] = views[2].points;
    expect(bottomRight[0] - bottomLeft[0]).toBeCloseTo(10, 9);
    expect(bottomLeft[1]).toBe(10);
    // One to one: as far out as it is high.
    expect(bottomLeft[0] - left[0]).toBeCloseTo(left[1] - 10, 9);
  });
  it('each barrel is drawn', () => {
    const culvert = { ...proposed('culvert'), barrels: 3, diameter: 1.2 } as CulvertBody;
    const openings = frontShapes(culvert, section).filter(({ role }) => role === 'opening');
    expect(openings.map(({ circle }) => circle?.radius)).toEqual([0.6, 0.6, 0.6]);
  });
  it('nothing is drawn of what is missing', () => {
    expect(frontShapes({ ...breach, bottomWidth: null }, section)).toHaveLength(1);
    expect(frontShapes({ ...breach, offsets: [], levels: [] }, section)).toEqual([]);
  });
});

describe('structures in the long section', () => {
  it('stand between foot and top', () => {
    const [mark] = structureMarks([breach]);
    expect(mark).toMatchObject({ kind: 'breach', chainage: 700, foot: 10 });
    expect(mark.top).toBe(Math.min(...breach.levels));
    expect(structureMarks([{ ...breach, chainage: null }])).toEqual([]);
  });
  it('names that would run into each other stand above each other', () => {
    const frame = { left: 40, right: 400, top: 20, bottom: 200 } as Parameters<
      typeof structureLabels
    >[1];
    const labels = structureLabels(
      [
        { x: 200, y: 150, text: 'Upper weir' },
        { x: 210, y: 150, text: 'Lower weir' },
      ],
      frame,
    );
    expect(Math.abs(labels[0].y - labels[1].y)).toBeGreaterThanOrEqual(16);
  });
});
