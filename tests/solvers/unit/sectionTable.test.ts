import { sectionProperties, sectionShape } from '../../../server/solvers';
import { createCellTables } from '../../../server/solvers/geometry/cellTables';
import { TABLE_STRIDE, writeSectionTable } from '../../../server/solvers/geometry/sectionTable';
import type { SectionInput } from '../../../shared/case/caseFile';
import { compound, natural, rectangle, trapezoid } from './sections';

function tablesOf(section: SectionInput) {
  const shape = sectionShape(section);
  const table = new Float64Array(TABLE_STRIDE);
  const levels = Int32Array.of(writeSectionTable(shape, table, 0));
  return {
    shape,
    tables: createCellTables({ table, levels, level: new Int32Array(1), gravity: 9.81 }),
  };
}

const SECTIONS: [string, SectionInput][] = [
  ['rectangle', rectangle(8)],
  ['trapezoid', trapezoid(6, 2)],
  ['triangle', trapezoid(0, 3)],
  ['compound', compound()],
  ['natural', natural('a', 0, 812.3)],
];

describe('the table of a section', () => {
  // Levels stand on the strongest kinks, so that between them the width is straight or nearly so.
  it.each(SECTIONS)('agrees with the polygon: %s', (_, section) => {
    const { shape, tables } = tablesOf(section);
    let worstArea = 0;
    let worstConveyance = 0;
    for (let y = 0.05; y < 14; y += 0.037) {
      const exact = sectionProperties(shape, shape.bed + y);
      const area = tables.areaAt(0, shape.bed + y);
      const conveyance = tables.conveyanceAt(0, shape.bed + y);
      worstArea = Math.max(worstArea, Math.abs(area / exact.area - 1));
      worstConveyance = Math.max(worstConveyance, Math.abs(conveyance / exact.conveyance - 1));
    }
    expect(worstArea).toBeLessThan(2e-4);
    expect(worstConveyance).toBeLessThan(6e-3);
  });

  it.each(SECTIONS)('turns back from area to stage: %s', (_, section) => {
    const { shape, tables } = tablesOf(section);
    for (let y = 0.001; y < 30; y *= 1.17) {
      const area = tables.areaAt(0, shape.bed + y);
      expect(tables.stageOf(0, area) - shape.bed).toBeCloseTo(y, 9);
    }
    expect(tables.stageOf(0, 0)).toBe(shape.bed);
  });

  it.each(SECTIONS)('has the integral of its own area as thrust: %s', (_, section) => {
    const { shape, tables } = tablesOf(section);
    // Simpson's rule is exact for a quadratic within a level and close across levels at this step.
    const h = 1e-3;
    let integral = 0;
    for (let y = 0; y < 5 - h / 2; y += h) {
      const a = (s: number): number => tables.areaAt(0, shape.bed + s);
      integral += (h / 6) * (a(y) + 4 * a(y + h / 2) + a(y + h));
    }
    expect(tables.thrustAt(0, shape.bed + 5) / integral).toBeCloseTo(1, 5);
  });

  it('knows the first moment of the trapezoid', () => {
    // ∫ A dη = b y²/2 + z y³/3
    const { tables } = tablesOf(trapezoid(6, 2));
    expect(tables.thrustAt(0, 3)).toBeCloseTo((6 * 9) / 2 + (2 * 27) / 3, 10);
  });

  it.each([
    ['rectangle', rectangle(8), 2],
    ['triangle', trapezoid(0, 2), 4],
  ])('runs a dry front at 2 m c: %s', (_, section, factor) => {
    // ω = ∫ c/A dA = 2 m c for A ~ h^m: Su and Barnes (1970), J. Hydraul. Div. ASCE 96 (HY3), recalled.
    const { tables } = tablesOf(section);
    const h = 4;
    const celerity = Math.sqrt((9.81 * tables.areaAt(0, h)) / tables.widthAt(0, h));
    expect(tables.frontSpeedAt(0, h) / (factor * celerity)).toBeCloseTo(1, 3);
  });
});
