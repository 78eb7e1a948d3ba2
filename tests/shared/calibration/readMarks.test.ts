import { readMarks, type MarksOptions } from '../../../shared/calibration/readMarks';

const options: MarksOptions = {
  unitSystem: 'metric',
  flood: 'January 2024',
  reach: { from: 0, to: 21_400 },
};

test('two columns are enough; the rest has sensible values', () => {
  const { marks, faults, understood } = readMarks('10.6\t44.52\n13.1\t42.9', options);
  expect(faults).toEqual([]);
  expect(understood).toBe('2 marks; chainages in km, levels in m.');
  expect(marks[0]).toEqual({
    chainage: 10_600,
    level: 44.52,
    kind: 'other',
    confidence: 'fair',
    flood: 'January 2024',
    observedOn: null,
    note: '',
  });
});

test('columns by their headings in any order, with their units, quotes and decimal commas', () => {
  const text = [
    'Confidence;Level (m);Chainage (m);Kind;Surveyed on;Remark',
    'good;44,52;10600;debris line;9.1.2024;"Fence; left bank"',
    'P;42,90;13100;mud stain;2024-01-10;',
  ].join('\n');
  const { marks, faults, understood } = readMarks(text, options);
  expect(faults).toEqual([]);
  expect(understood).toContain('decimal comma');
  expect(marks).toMatchObject([
    {
      chainage: 10_600,
      level: 44.52,
      kind: 'debris',
      confidence: 'good',
      observedOn: '2024-01-09',
      note: 'Fence; left bank',
    },
    { chainage: 13_100, level: 42.9, kind: 'stain', confidence: 'poor', observedOn: '2024-01-10' },
  ]);
});

test('plain metres are known where kilometres would all lie off the reach', () => {
  const { marks, understood } = readMarks('10600\t44.52\n13100\t42.9', options);
  expect(understood).toContain('chainages in m,');
  expect(marks.map(({ chainage }) => chainage)).toEqual([10_600, 13_100]);
});

test('feet of a study in US customary units', () => {
  const { marks } = readMarks('1000\t100', { ...options, unitSystem: 'usCustomary' });
  expect(marks[0].chainage).toBeCloseTo(304.8, 9);
  expect(marks[0].level).toBeCloseTo(30.48, 9);
});

test('every fault is told by its line, and then nothing is taken', () => {
  const text = [
    'chainage (km)\tlevel (m)\tkind\tconfidence\tday',
    '10.6\thigh\tdebris\tgood\t2024-01-09',
    '30\t40\tdebris\tgood\t',
    '',
    '12\t41\tbanana\tgood\t',
    '12\t41\tstain\tmaybe\t2024-02-31',
    '\t41\tstain\tgood\t',
  ].join('\n');
  const { marks, faults } = readMarks(text, options);
  expect(marks).toEqual([]);
  expect(faults.map(({ message }) => message)).toEqual([
    'Line 2 has “high” for the level, which is no number.',
    'Line 3 lies off the reach, which goes from 0 km to 21.4 km.',
    'Line 5 has “banana” for what was seen. Write debris, stain, eyewitness, gauge peak or other.',
    'Line 6 has “maybe” for the confidence. Write good, fair or poor.',
    'Line 6 has “2024-02-31” for a day. Write it as 2024-01-09.',
    'Line 7 has no chainage.',
  ]);
});

test('a table without a level says so', () => {
  const { faults } = readMarks('chainage\tkind\n10.6\tdebris', options);
  expect(faults[0].message).toBe('Line 1 has no column for the level of the water.');
});
