import { decimalMark } from '../../../shared/numbers/decimalMark';
import { parseNumber } from '../../../shared/numbers/parseNumber';

describe('a number as people write it', () => {
  test.each([
    ['12.5', 12.5],
    ['-0.25', -0.25],
    ['−3', -3],
    ['+4', 4],
    ['.5', 0.5],
    ['1,250', 1250],
    ['1,250,000.75', 1_250_000.75],
    ["1'250.5", 1250.5],
    ['1 250', 1250],
    ['1\u202f250.5', 1250.5],
    ['1.2e3', 1200],
  ])('%s with a point', (text, value) => expect(parseNumber(text, 'point')).toBe(value));
  test.each([
    ['12,5', 12.5],
    ['1.250,5', 1250.5],
    ['1 250,5', 1250.5],
    ['1.250', 1250],
  ])('%s with a comma', (text, value) => expect(parseNumber(text, 'comma')).toBe(value));
  test.each(['', 'abc', '1,25', '12,3456', '1.2.3', '--5', '5-', '1e999', 'NaN', '0x10'])(
    '%j is none',
    (text) => {
      expect(parseNumber(text, 'point')).toBeNull();
    },
  );
});

describe('the decimal mark of a file', () => {
  test.each([
    [['1.25', '3.5'], 'point', null],
    [['1,25', '3,5'], 'comma', null],
    [['1.250,5'], 'comma', null],
    [['1,250.5', '2,000'], 'point', null],
    [['1,250,000'], 'point', null],
    [['1.250.000', '3'], 'comma', null],
    [['0,125'], 'comma', null],
    [['12', '13'], 'point', null],
    [['38,125', '38,400'], 'point', '38,125'],
    [['38,125', '1,5'], 'comma', null],
    [['38.125', '38.400'], 'point', null],
  ])('%j', (texts, mark, unclear) => expect(decimalMark(texts, null)).toEqual({ mark, unclear }));
  test('what the file is like decides where its numbers do not', () => {
    expect(decimalMark(['38,125'], 'comma')).toEqual({ mark: 'comma', unclear: null });
  });
});
