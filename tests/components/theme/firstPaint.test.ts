import { readFileSync } from 'node:fs';
import path from 'node:path';
import { keepThemeChoice, type ThemeChoice } from '@/components/theme/themeChoice';
import { COLOURS } from '@/components/theme/tokens';

const read = (name: string) =>
  readFileSync(path.resolve(__dirname, '../../../public', name), 'utf8');
const script = read('firstPaint.js');

function firstPaint(choice: ThemeChoice, deviceIsDark: boolean): boolean {
  document.documentElement.className = '';
  keepThemeChoice(choice);
  window.matchMedia = () => ({ matches: deviceIsDark }) as MediaQueryList;
  new Function(script)();
  return document.documentElement.classList.contains('dark');
}

test.each([
  ['system', false, false],
  ['system', true, true],
  ['light', true, false],
  ['dark', false, true],
] as const)('%s on a device that is dark: %s', (choice, deviceIsDark, dark) => {
  expect(firstPaint(choice, deviceIsDark)).toBe(dark);
});

test('the page begins on the paper of its theme, in the style that the theme replaces', () => {
  const page = read('index.html').toUpperCase();
  const style = page.slice(page.indexOf('<STYLE ID="SPATE-PAGE-STYLE">'), page.indexOf('</STYLE>'));
  expect(style).toContain(COLOURS.light.paper);
  expect(style).toContain(COLOURS.dark.paper);
});
