import { readTimeTable, writeTimeTable } from '@/components/screens/scenarios/timeTable';

describe('a table against time as text', () => {
  it.each(['metric', 'usCustomary'] as const)('reads back what it writes, %s', (system) => {
    for (const quantity of ['flow', 'stage'] as const) {
      const values = [
        [0, 900, 7200, 51_234],
        [55, 61.25, 490.123, 40],
      ];
      const text = writeTimeTable(values, quantity, system);
      const reading = readTimeTable(text, quantity, system);
      expect(reading.faults).toEqual([]);
      reading.columns.forEach((column, at) =>
        column.forEach((value, row) =>
          expect(Math.abs(value / values[at][row] - 1) || 0).toBeLessThan(1e-8),
        ),
      );
    }
  });

  it('takes an empty text for an empty table', () => {
    expect(readTimeTable(' \n', 'flow', 'metric').columns).toEqual([[], []]);
    expect(writeTimeTable([[], []], 'flow', 'metric')).toBe('');
  });
});
