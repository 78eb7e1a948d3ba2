import { pasteTable, type TableOptions } from '../../../shared/scenarios/pasteTable';

const paste = (text: string, options: Partial<TableOptions> = {}) =>
  pasteTable(text, { quantity: 'flow', unitSystem: 'metric', ...options });

describe('separators, decimals and headings', () => {
  test.each([
    ['tabs', '0\t10\n0.5\t12.5\n1\t20'],
    ['commas', '0,10\n0.5,12.5\n1,20'],
    ['semicolons and decimal commas', '0;10\n0,5;12,5\n1;20'],
    ['tabs and decimal commas', '0\t10\n0,5\t12,5\n1\t20'],
    ['spaces', '0 10\n0.5   12.5\n1 20'],
    ['spaces and decimal commas', '0,0 10,0\n0,5 12,5\n1,0 20,0'],
    ['a heading', 'Time (h)\tFlow (m3/s)\n0\t10\n0.5\t12.5\n1\t20'],
    ['blank lines and carriage returns', '0\t10\r\n\r\n0.5\t12.5\r\n1\t20\r\n'],
    ['a further column', 'h,Rain,Discharge\n0,1,10\n0.5,2,12.5\n1,0,20'],
  ])('%s', (_, text) => {
    expect(paste(text)).toMatchObject({
      times: [0, 1800, 3600],
      values: [10, 12.5, 20],
      faults: [],
    });
  });
  test('thousands', () => {
    expect(paste('0\t1,250.5\n1\t2,000.0').values).toEqual([1250.5, 2000]);
  });
});

describe('times', () => {
  test.each([
    ['t (s)\tQ\n0\t1\n90\t2', [0, 90]],
    ['Time [min]\tQ\n0\t1\n90\t2', [0, 5400]],
    ['Days;Q\n0;1\n0,5;2', [0, 43_200]],
    ['06:00\t1\n06:30\t2\n07:15\t3', [0, 1800, 4500]],
    ['22:00\t1\n23:30\t2\n01:00\t3\n22:30\t4', [0, 5400, 10_800, 88_200]],
    ['0:00\t1\n24:00\t2\n30:15\t3', [0, 86_400, 108_900]],
    ['2026-11-14 06:00\t1\n2026-11-14T07:00\t2\n2026-11-15 06:00\t3', [0, 3600, 86_400]],
    ['14/11/2026 06:00,1\n14/11/2026 07:00,2', [0, 3600]],
    ['14.11.2026;06:00;1,5\n14.11.2026;07:30;2,5', [0, 5400]],
    ['2026-02-28\t1\n2026-03-01\t2', [0, 86_400]],
  ])('%j', (text, times) => {
    const reading = paste(text);
    expect(reading.faults).toEqual([]);
    expect(reading.times).toEqual(times);
  });
  test('dates that read both ways follow the others, and else the country', () => {
    const day = '4/11/2026 00:00\t1\n5/11/2026 00:00\t2';
    expect(paste(day).times).toEqual([0, 86_400]);
    expect(paste(day, { unitSystem: 'usCustomary' }).times).toEqual([0, 30 * 86_400]);
    expect(paste(`${day}\n14/11/2026 00:00\t3`, { unitSystem: 'usCustomary' }).times).toEqual([
      0,
      86_400,
      10 * 86_400,
    ]);
    expect(paste(day).understood).toMatch(/day first/);
  });
  test('hours are understood where nothing is said, and it is told', () => {
    expect(paste('0 1\n2 3').understood).toBe('2 rows; times in hours; values in m³/s.');
    expect(paste('0 1\n2 3', { timeUnit: 'min' }).times).toEqual([0, 120]);
  });
});

describe('units of the values', () => {
  // One cubic foot is 0.028316846592 m³, exact by the international foot: NIST SP 811, appendix B.8.
  test('by the study, or by the heading', () => {
    expect(paste('0 100\n1 200', { unitSystem: 'usCustomary' }).values[0]).toBeCloseTo(
      2.8316846592,
      10,
    );
    expect(paste('h\tQ (cfs)\n0\t100\n1\t200').values[0]).toBeCloseTo(2.8316846592, 10);
    expect(paste('h\tQ (l/s)\n0\t1500\n1\t200').values).toEqual([1.5, 0.2]);
    expect(paste('h\tStage (ft)\n0\t10\n1\t12', { quantity: 'stage' }).values).toEqual([
      3.048,
      12 * 0.3048,
    ]);
    expect(paste('h\tQ (m³/s)\n0\t1\n1\t2', { unitSystem: 'usCustomary' }).values).toEqual([1, 2]);
  });
});

describe('faults are told by line, all of them, and nothing is taken', () => {
  test('each in its words', () => {
    const reading = paste('Time\tFlow\n0\t10\n1\tmany\nsoon\t12\n3\t\n3\t13\n2\t14\n4');
    expect(reading.times).toEqual([]);
    expect(reading.faults.map(({ message }) => message)).toEqual([
      'Line 3 has “many” for a value, which is no number.',
      'Line 4 has “soon” for a time. Write hours, hh:mm, or a date and time.',
      'Line 5 has no value.',
      'Line 6 has the time of the line before. Each time stands once.',
      'Line 7 goes back in time. Times grow from line to line.',
      'Line 8 has one column. Give a time and a value.',
    ]);
    expect(reading.faults[0].path).toBe('lines[3]');
  });
  test.each(['', '  \n\n', 'Time\tFlow'])('%j', (text) => {
    expect(paste(text).faults).toHaveLength(1);
  });
  test('a day that is none', () => {
    expect(paste('2026-02-28 00:00\t1\n2026-02-30 00:00\t2').faults[0].message).toMatch(
      /^Line 2 has “2026-02-30/,
    );
  });
  test('more rows than are taken', () => {
    const text = Array.from({ length: 20_001 }, (_, i) => `${i}\t1`).join('\n');
    expect(paste(text).faults[0].message).toMatch(/^Line 20001 goes beyond 20,000 rows/);
  });
});
