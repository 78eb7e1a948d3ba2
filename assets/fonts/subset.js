/* global __dirname */
/** Makes the three weights that ship with the application from the full TrueType files of the package:
 *  `node assets/fonts/subset.js`. Every layout feature is kept, for the figures that line up. */
const { readFile, writeFile, copyFile } = require('node:fs/promises');
const { dirname, join } = require('node:path');
const subsetFont = require('subset-font');

const PACKAGE = dirname(require.resolve('@expo-google-fonts/source-sans-3/package.json'));
const WEIGHTS = {
  regular: '400Regular/SourceSans3_400Regular.ttf',
  semibold: '600SemiBold/SourceSans3_600SemiBold.ttf',
  bold: '700Bold/SourceSans3_700Bold.ttf',
};

/** Latin with its accents, Greek for formulas, and the signs that texts and numbers here use. */
const RANGES = [
  [0x20, 0x7e],
  [0xa0, 0x17f],
  [0x218, 0x21b],
  [0x300, 0x30c],
  [0x391, 0x3c9],
  [0x1e80, 0x1e85],
  [0x2010, 0x2027],
  [0x2030, 0x203a],
  [0x2070, 0x209c],
  [0x20ac, 0x20ac],
  [0x2190, 0x2199],
  [0x2200, 0x2265],
  [0x25a0, 0x25cf],
  [0x2713, 0x2713],
];
const text = RANGES.flatMap(([from, to]) =>
  Array.from({ length: to - from + 1 }, (_, i) => String.fromCodePoint(from + i)),
).join('');

async function main() {
  for (const [weight, file] of Object.entries(WEIGHTS)) {
    const full = await readFile(join(PACKAGE, file));
    const subset = await subsetFont(full, text, { targetFormat: 'woff2' });
    await writeFile(join(__dirname, `SourceSans3-${weight}.woff2`), subset);
  }
  await copyFile(join(PACKAGE, 'LICENSE_FONT'), join(__dirname, 'LICENSE'));
}

main();
