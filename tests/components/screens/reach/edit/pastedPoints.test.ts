import { marksAt } from '@/components/screens/reach/edit/marksAt';
import { pastedPoints } from '@/components/screens/reach/edit/pastedPoints';
import { plainSections } from '@/tests/helpers/plainSections';

const [section] = plainSections();

describe('points pasted from a spreadsheet', () => {
  it('go over those from the cell on, two columns or one', () => {
    const both = pastedPoints(section, 6, 0, '50\t13,4\n60\t16,2', 'metric');
    expect(both).toMatchObject({ rows: 2, faults: [] });
    expect(both.section!.points.slice(6)).toEqual([
      [50, 13.4],
      [60, 16.2],
    ]);
    const levels = pastedPoints(section, 3, 1, '9.8\n9.9\n', 'metric');
    expect(levels.section!.points[3]).toEqual([26, 9.8]);
    expect(levels.section!.points[4]).toEqual([32, 9.9]);
  });

  it('are read in the units of the study, a heading passed over', () => {
    const pasted = pastedPoints(section, 0, 0, 'Offset\tLevel\n0\t100', 'usCustomary');
    expect(pasted.section!.points[0]).toEqual([0, expect.closeTo(30.48, 10)]);
  });

  it('that cannot be read leave everything as it was, and say where', () => {
    const pasted = pastedPoints(section, 0, 0, '0\t12\n5\tx', 'metric');
    expect(pasted.section).toBeNull();
    expect(pasted.faults[0]).toMatch(/Line 2/);
    expect(pastedPoints(section, 0, 0, ' ', 'metric').faults).toHaveLength(1);
  });
});

test('what stands on a point is said beside it', () => {
  expect(marksAt(section, 20)).toEqual(['left bank', 'n 0.035 from here']);
  expect(marksAt({ ...section, storage: [{ from: 0, to: 10 }] }, 10)).toEqual(['storage ends']);
  expect(marksAt(section, 5)).toEqual([]);
});
