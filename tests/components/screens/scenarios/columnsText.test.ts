import {
  readColumns,
  writeColumns,
  type TextColumn,
} from '@/components/screens/scenarios/columnsText';

const RATING: TextColumn[] = [
  { title: 'stage', quantity: 'elevation' },
  { title: 'flow', quantity: 'flow' },
];

describe('tables typed or pasted as text', () => {
  it.each([
    ['tabs and decimal commas', 'Stage\tFlow\n31,5\t0\n32,25\t120,5'],
    ['semicolons', 'Stage;Flow\n31,5;0\n32,25;120,5'],
    ['commas with decimal points', 'Stage,Flow\n31.5,0\n32.25,120.5'],
    ['commas and spaces', '31.5, 0\n32.25, 120.5'],
    ['spaces', '31.5 0\n\n32.25   120.5\n'],
    ['spaces with decimal commas', '31,5 0\n32,25 120,5'],
  ])('reads %s', (_, text) => {
    const reading = readColumns(text, RATING, 'metric');
    expect(reading.faults).toEqual([]);
    expect(reading.columns).toEqual([
      [31.5, 32.25],
      [0, 120.5],
    ]);
    expect(reading.understood).toBe('2 rows: stage in m, flow in m³/s.');
  });

  it('tells each fault by its line, all at once', () => {
    const { faults } = readColumns('stage\tflow\n31.5\t\nabc\t4\n33\t9', RATING, 'metric');
    expect(faults.map(({ message }) => message)).toEqual([
      'Line 2: flow is missing.',
      'Line 3: stage “abc” is not a number.',
    ]);
  });

  it('takes the units of the study, and writes what it would read', () => {
    const feet = readColumns('10\t100', RATING, 'usCustomary');
    expect(feet.columns[0][0]).toBeCloseTo(3.048, 12);
    expect(feet.columns[1][0]).toBeCloseTo(2.8316846592, 10);
    const text = writeColumns(feet.columns, RATING, 'usCustomary');
    expect(text).toBe('stage ft\tflow ft³/s\n10\t100');
    expect(readColumns(text, RATING, 'usCustomary').columns).toEqual(feet.columns);
    expect(writeColumns([[], []], RATING, 'metric')).toBe('');
  });
});
