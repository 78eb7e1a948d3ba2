import { countFaults, faultCell, faultPlace } from '@/components/screens/survey/faultPlace';

const place = (
  row: number | null,
  lastRow: number | null,
  column: string | null,
  sheet = 'Main',
) => ({
  sheet,
  row,
  lastRow,
  column,
});

describe('the place of a fault', () => {
  it.each([
    [place(218, null, 'D'), 'row 218, D', 'Sheet Main, row 218, D'],
    [place(218, 218, 'D'), 'row 218, D', 'Sheet Main, row 218, D'],
    [place(1204, 1239, null), 'rows 1204–1239', 'Sheet Main, rows 1204–1239'],
    [place(null, null, 'D'), 'column D', 'Sheet Main, column D'],
    [place(null, null, null), '', 'Sheet Main'],
    [place(null, null, null, ''), '', 'The file'],
  ])('%j', (where, cell, line) => {
    expect(faultCell(where)).toBe(cell);
    expect(faultPlace(where)).toBe(line);
  });

  it('counts faults and doubts apart, with those not listed', () => {
    const fault = { severity: 'fault' as const };
    const doubt = { severity: 'doubt' as const };
    expect(countFaults([fault])).toBe('1 fault');
    expect(countFaults([fault, fault, doubt])).toBe('2 faults and 1 doubt');
    expect(countFaults([fault], 1200)).toBe('1,201 faults');
    expect(countFaults([])).toBe('no faults');
  });
});
