import { COLOURS, type Colours, type Scheme } from '@/components/theme/tokens';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them (w3.org/TR/WCAG22, definitions). */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const s = parseInt(hex.slice(at, at + 2), 16) / 255;
    return s <= 0.04045 ? s / 12.92 : ((s + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(a: string, b: string): number {
  const [low, high] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return (high + 0.05) / (low + 0.05);
}

test('the measure itself: black on white is 21:1, #767676 on white 4.54:1', () => {
  expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 6);
  expect(contrast('#767676', '#FFFFFF')).toBeCloseTo(4.54, 2);
});

const TEXT: [keyof Colours, keyof Colours][] = [
  ['ink', 'paper'],
  ['ink', 'card'],
  ['soft', 'paper'],
  ['soft', 'card'],
  ['water', 'paper'],
  ['water', 'card'],
  ['earth', 'card'],
  ['earth', 'earthTint'],
  ['ochre', 'paper'],
  ['ochre', 'ochreTint'],
  ['brick', 'paper'],
  ['brick', 'card'],
  ['brick', 'brickTint'],
  ['moss', 'card'],
  ['moss', 'mossTint'],
  ['ink', 'line'],
  ['ink', 'waterTint'],
  ['ink', 'earthTint'],
  ['ink', 'ochreTint'],
  ['ink', 'brickTint'],
  ['ink', 'mossTint'],
];

describe.each<Scheme>(['light', 'dark'])('%s', (scheme) => {
  const colours = COLOURS[scheme];
  test.each(TEXT)('%s can be read on %s (4.5:1, criterion 1.4.3)', (text, ground) => {
    expect(contrast(colours[text], colours[ground])).toBeGreaterThanOrEqual(4.5);
  });
  test.each<keyof Colours>(['paper', 'card'])(
    'controls stand out on %s (3:1, criterion 1.4.11)',
    (ground) => {
      expect(contrast(colours.edge, colours[ground])).toBeGreaterThanOrEqual(3);
    },
  );
});
