import { surfaceProfile } from '@/server/solvers/exact/graduallyVariedFlow';
import { prismaticReach } from '@/server/solvers/exact/prismaticReach';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { buildSections, trapezoidPoints } from '../../helpers/solvers/caseBuilders';
import { naturalProfile } from '../../helpers/solvers/naturalProfile';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { hydraulicsAt, stripsBetween, type Strip } from '../../helpers/solvers/polygonHydraulics';

/** The hydraulics that the solver is compared with must themselves be right. */
describe('hydraulics of a polygon', () => {
  const corners: [number, number][] = [
    [0, 10],
    [0, 3],
    [100, 3],
    [100, 0],
    [120, 0],
    [120, 3],
    [220, 3],
    [220, 10],
  ];
  const zones = [0, 0, 1, 1, 1, 2, 2];
  const compound: Strip[] = zones.map((zone, i) => ({
    from: corners[i],
    to: corners[i + 1],
    manning: zone === 1 ? 0.03 : 0.06,
    zone,
  }));

  // Channel 20 m wide between vertical banks of 3 m, plains of 100 m between vertical outer walls; conveyance by
  // subdivision (Chow 1959, sec. 6-5), computed apart from this program.
  it.each([
    [2, 40, 1874.2948],
    [3.5, 170, 5562.1645],
    [4, 280, 8952.6028],
    [6, 720, 31483.2593],
  ])('compound section at %f m: %f m², K = %f', (stage, area, conveyance) => {
    const found = hydraulicsAt(compound, stage);
    expect(found.area).toBeCloseTo(area, 9);
    expect(found.conveyance).toBeCloseTo(conveyance, 3);
  });

  it('has its top width as the slope of its area', () => {
    const [a, b] = naturalReach(1, { length: 200, spacing: 200, slope: 0.001 });
    const strips = stripsBetween(a, b, 0.3);
    for (const stage of [0.9, 2.1, 3.6, 4.4, 6.2]) {
      const rate =
        (hydraulicsAt(strips, stage + 1e-5).area - hydraulicsAt(strips, stage - 1e-5).area) / 2e-5;
      expect(rate).toBeCloseTo(hydraulicsAt(strips, stage).topWidth, 2);
    }
  });

  it('gives the surveyed sections back at both ends of a ruled surface', () => {
    const [a, b] = naturalReach(1, { length: 200, spacing: 200, slope: 0.001 });
    const own = hydraulicsAt(stripsBetween(b, b, 0), 5);
    const end = hydraulicsAt(stripsBetween(a, b, 1), 5);
    expect(end.area).toBeCloseTo(own.area, 9);
    expect(end.conveyance).toBeCloseTo(own.conveyance, 6);
  });

  it('carries the profile of a prismatic channel as the prismatic integrator does', () => {
    const sections = buildSections(0, 600, 4, 0.025, (x) =>
      trapezoidPoints(6.096, 2, 0.0016 * (600 - x), 6),
    );
    const places = [550, 430, 310, 100];
    const found = naturalProfile(sections, 9.81, 11.3267, 1.524, places);
    const reach = prismaticReach(trapezoid(6.096, 2), 0.025, 0.0016, () => 11.3267);
    const exact = surfaceProfile(reach, 9.81, [0, ...places.map((x) => x - 600)], 1.524).slice(1);
    found.forEach((stage, i) => expect(stage).toBeCloseTo(exact[i], 6));
  });
});
