import { parseTyped, typedText } from '@/components/ui/parseTyped';

test.each([
  ['44.66', 44.66],
  ['44,66', 44.66],
  ['1,5', 1.5],
  ['1 250,5', 1250.5],
  ['1 250', 1250],
  ['1,250.5', 1250.5],
  ['1,250,000', 1_250_000],
  ["1'250", 1250],
  ['−3', -3],
  ['-0.5', -0.5],
  ['.5', 0.5],
  ['2.5e3', 2500],
])('%p reads as %p', (text, value) => {
  expect(parseTyped(text)).toBe(value);
});

test('a single comma is the decimal sign, even before three digits', () => {
  expect(parseTyped('1,250')).toBe(1.25);
});

test.each(['', '  '])('%p is empty', (text) => expect(parseTyped(text)).toBeNull());

test.each(['abc', '1.2.3', '1,2,3', '1.250,5', '--2', '0x10', '12 m'])(
  '%p cannot be read',
  (text) => {
    expect(parseTyped(text)).toBeNaN();
  },
);

test('a value is shown without needless zeros or floating-point dust', () => {
  expect(typedText(0.1 + 0.2)).toBe('0.3');
  expect(typedText(10600 / 1000)).toBe('10.6');
  expect(typedText(null)).toBe('');
});
