import type { Section } from '../../shared/surveys/types';
import { exampleSections } from './exampleSections';
import { writeWorkbook, type SheetRows, type SheetToWrite } from './writeWorkbook';

const COLUMNS: [heading: string, need: string, meaning: string][] = [
  ['Section', 'needed', 'Id of the cross-section, the same in all its rows.'],
  ['Chainage (m)', 'needed', 'Distance along the reach; grows downstream. One value a section.'],
  [
    'Offset (m)',
    'needed',
    'Distance across, from the left end to the right, looking downstream. Never goes back.',
  ],
  ['Elevation (m)', 'needed', "Level of the ground above the study's datum."],
  ["Manning's n", 'if known', 'Roughness from this point on to the next value. Blank: as before.'],
  ['Bank', 'if known', 'L at the left bank and R at the right: two marks a section, or none.'],
  ['Easting (m)', 'if known', 'Map coordinate of the point; give both or neither.'],
  ['Northing (m)', 'if known', 'Map coordinate of the point; give both or neither.'],
];
const HEADINGS = COLUMNS.map(([heading]) => heading);
const WIDTHS = HEADINGS.map(() => 14);

const NOTES: SheetToWrite = {
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
    ...COLUMNS.map(([heading, need, meaning]) => [heading, need, meaning]),
  ],
};

/** Headings alone. */
export const blankTemplate = (): Buffer =>
  writeWorkbook([{ name: 'Survey', widths: WIDTHS, rows: [HEADINGS] }, NOTES]);

/** One long table with a few sections of an invented river. */
export const longTableExample = (): Buffer => writeWorkbook([longTable(exampleSections()), NOTES]);

/** The same, one sheet a section. */
export const sectionSheetsExample = (): Buffer =>
  writeWorkbook([
    ...exampleSections().map((section) => ({
      name: section.id,
      widths: WIDTHS,
      rows: [
        ['Section', section.id],
        ['Chainage (m)', section.chainage],
        [],
        HEADINGS.slice(2),
        ...pointRows(section),
      ],
    })),
    NOTES,
  ]);

/** Sections as the long table of the template; also how demo surveys are handed in. */
export const longTable = (sections: Section[]): SheetToWrite => ({
  name: 'Survey',
  widths: WIDTHS,
  rows: [
    HEADINGS,
    ...sections.flatMap((section) =>
      pointRows(section).map((row) => [section.id, section.chainage, ...row]),
    ),
  ],
});

function pointRows({ points, roughness, banks, coordinates }: Section): SheetRows {
  return points.map(([offset, elevation], i) => {
    const zone = roughness.findLast(([from]) => from <= offset);
    const mark = banks && offset === banks[0] ? 'L' : banks && offset === banks[1] ? 'R' : null;
    return [offset, elevation, zone?.[1] ?? null, mark, ...(coordinates?.[i] ?? [null, null])];
  });
}
