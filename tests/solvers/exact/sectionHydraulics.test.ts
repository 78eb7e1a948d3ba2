import { sectionProperties } from '@/server/solvers';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { hydraulicsAt, stripsBetween } from '../../helpers/solvers/polygonHydraulics';

/** Two programs of the same definitions, written apart. */
describe('hydraulics of surveyed sections', () => {
  it('agree with the independent ones at any stage', () => {
    for (const section of naturalReach(17, { length: 4000, spacing: 200, slope: 0.001 })) {
      const strips = stripsBetween(section, section, 0);
      const bed = Math.min(...section.points.map(([, elevation]) => elevation));
      for (const depth of [0.1, 0.7, 1.9, 3.4, 4.2, 6, 9]) {
        const expected = hydraulicsAt(strips, bed + depth);
        const found = sectionProperties(section, bed + depth);
        expect(found.area / expected.area).toBeCloseTo(1, 10);
        expect(found.topWidth / expected.topWidth).toBeCloseTo(1, 10);
        expect(found.conveyance / expected.conveyance).toBeCloseTo(1, 10);
      }
    }
  });
});
