import type { Section } from '../../shared/surveys/types';
import { fromSi, UNITS, type UnitSystem } from '../../shared/units/units';
import { exampleSections } from './exampleSections';
import { writeWorkbook, type SheetRows, type SheetToWrite } from './writeWorkbook';

type Heading = [heading: string, need: string, meaning: string];

/** `unit` of every length, as it stands in the headings. */
const columnsIn = (unit: string): Heading[] => [
  ['Section', 'needed', 'Id of the cross-section, the same in all its rows.'],
  [
    `Chainage (${unit})`,
    'needed',
    'Distance along the reach; grows downstream. One value a section.',
  ],
  [
    `Offset (${unit})`,
    'needed',
    'Distance across, from the left end to the right, looking downstream. Never goes back.',
  ],
  [`Elevation (${unit})`, 'needed', "Level of the ground above the study's datum."],
  ["Manning's n", 'if known', 'Roughness from this point on to the next value. Blank: as before.'],
  ['Bank', 'if known', 'L at the left bank and R at the right: two marks a section, or none.'],
  [`Easting (${unit})`, 'if known', 'Map coordinate of the point; give both or neither.'],
  [`Northing (${unit})`, 'if known', 'Map coordinate of the point; give both or neither.'],
];
const symbolOf = (system: UnitSystem) => UNITS[system].length.symbol;
const headingsIn = (system: UnitSystem) => columnsIn(symbolOf(system)).map(([heading]) => heading);
const WIDTHS = columnsIn('m').map(() => 14);

const notesIn = (system: UnitSystem): SheetToWrite => ({
  name: 'Notes',
  widths: [16, 12, 90],
  rows: [
    ['How to fill in this workbook'],
    [],
    [
      'One row is one point. Rows of a section stand together, its points in order across the river.',
    ],
    ['Units stand in the headings: m, km, ft or US ft. Change them to what you measured in.'],
    ['Columns may stand in any order; headings in other usual spellings are understood as well.'],
    ['This sheet is passed over when the file is read.'],
    [],
    ...columnsIn(symbolOf(system)),
  ],
});

/** Headings alone. */
export const blankTemplate = (system: UnitSystem): Buffer =>
  writeWorkbook([{ name: 'Survey', widths: WIDTHS, rows: [headingsIn(system)] }, notesIn(system)]);

/** One long table with a few sections of an invented river. */
export const longTableExample = (system: UnitSystem): Buffer =>
  writeWorkbook([longTable(exampleSections(), system), notesIn(system)]);

/** The same, one sheet a section. */
export const sectionSheetsExample = (system: UnitSystem): Buffer =>
  writeWorkbook([
    ...exampleSections().map((section) => ({
      name: section.id,
      widths: WIDTHS,
      rows: [
        ['Section', section.id],
        [`Chainage (${symbolOf(system)})`, lengthIn(section.chainage, system)],
        [],
        headingsIn(system).slice(2),
        ...pointRows(section, system),
      ],
    })),
    notesIn(system),
  ]);

/** Sections as the long table of the template; also how demo surveys are handed in. */
export const longTable = (sections: Section[], system: UnitSystem = 'metric'): SheetToWrite => ({
  name: 'Survey',
  widths: WIDTHS,
  rows: [
    headingsIn(system),
    ...sections.flatMap((section) =>
      pointRows(section, system).map((row) => [
        section.id,
        lengthIn(section.chainage, system),
        ...row,
      ]),
    ),
  ],
});

/** Metric ones as they are; in feet to the hundredth, as they are measured. */
const lengthIn = (metres: number, system: UnitSystem): number =>
  system === 'metric' ? metres : Math.round(fromSi(metres, 'length', system) * 100) / 100;

function pointRows(
  { points, roughness, banks, coordinates }: Section,
  system: UnitSystem,
): SheetRows {
  const told = (metres: number) => lengthIn(metres, system);
  return points.map(([offset, elevation], i) => {
    const zone = roughness.findLast(([from]) => from <= offset);
    const mark = banks && offset === banks[0] ? 'L' : banks && offset === banks[1] ? 'R' : null;
    return [
      told(offset),
      told(elevation),
      zone?.[1] ?? null,
      mark,
      ...(coordinates?.[i].map(told) ?? [null, null]),
    ];
  });
}
