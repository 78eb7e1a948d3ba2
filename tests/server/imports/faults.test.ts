import * as XLSX from 'xlsx';
import {
  HEADINGS,
  read,
  readText,
  sheetOf,
  soundRows,
  told,
  workbookOf,
  type Row,
} from '../../helpers/surveyRows';

/** The sound rows with one of them changed; `row` counts as the sheet does. */
function withCell(row: number, column: number, value: Row[number]): Row[] {
  const rows = soundRows();
  rows[row - 2][column] = value;
  return rows;
}
const detailOf = (reading: ReturnType<typeof read>) => reading.faults[0].detail;

test('all faults of a file are told at once, each at its place, and nothing is taken of it', () => {
  const rows = soundRows();
  rows[2][3] = null;
  rows[6][2] = -1;
  rows[11][3] = 190;
  for (const row of rows.slice(10)) row[1] = 500;
  const reading = read(sheetOf(rows));
  expect(told(reading)).toEqual([
    'Main 4 D: Elevation is missing',
    'Main 7-16 B: Chainage 500 stands twice',
    'Main 8 C: Offset goes back: −1 after 0',
    'Main 13 D: Elevation 190 is far from the rest',
  ]);
  expect(reading).toMatchObject({
    sectionCount: 3,
    pointCount: 15,
    sections: [],
    faultsNotListed: 0,
  });
});

describe('numbers', () => {
  test('a missing elevation names its neighbours', () => {
    expect(detailOf(read(sheetOf(withCell(4, 3, null))))).toBe(
      'Section XS-01, offset 10 m. Neighbours read 21 and 21.',
    );
  });
  test.each([
    [3, 'rock', 'Main 4 D: Elevation is not a number: “rock”'],
    [2, '12..5', 'Main 4 C: Offset is not a number: “12..5”'],
    [1, 'upstream', 'Main 4 B: Chainage is not a number: “upstream”'],
    [2, null, 'Main 4 C: Offset is missing'],
    [3, 18_000, 'Main 4 D: Elevation 18,000 cannot be'],
  ])('column %i with %j', (column, value, fault) => {
    expect(told(read(sheetOf(withCell(4, column, value))))).toEqual([fault]);
  });
  test('a number that the spreadsheet has made a date', () => {
    const [fault] = told(read(sheetOf(withCell(4, 3, new Date(Date.UTC(2026, 0, 21))))));
    expect(fault).toMatch(/^Main 4 D: Elevation is not a number: the date 2026-01-2/);
  });
  test('a failed formula, and a formula that was saved without its value', () => {
    const sheet = XLSX.utils.aoa_to_sheet([HEADINGS, ...soundRows()]);
    sheet['D4'] = { t: 'e', v: 0x17, w: '#REF!' };
    sheet['D5'] = { t: 's', f: 'D4+1', v: '' };
    const book = { SheetNames: ['Main'], Sheets: { Main: sheet } };
    const reading = read(XLSX.write(book, { type: 'buffer', bookType: 'xlsx' }));
    expect(told(reading)[0]).toBe('Main 4 D: Elevation is not a number: the failed formula #REF!');
    expect(told(reading)).toHaveLength(2);
  });
});

describe('offsets', () => {
  test('each step back is told, with the value before', () => {
    expect(told(read(sheetOf(withCell(5, 2, 9.5))))).toEqual([
      'Main 5 C: Offset goes back: 9.5 after 10.0',
    ]);
  });
  test('a section from right to left is told once', () => {
    const rows = soundRows().map(([id, chainage, offset, level]): Row => [
      id,
      chainage,
      id === 'XS-02' ? 20 - (offset as number) : offset,
      level,
    ]);
    expect(told(read(sheetOf(rows)))).toEqual(['Main 7-11 C: Offsets run backwards']);
  });
  test('a wall is no fault; a section without width is', () => {
    expect(told(read(sheetOf(withCell(3, 2, 0))))).toEqual([]);
    const flat = soundRows().map((row): Row =>
      row[0] === 'XS-02' ? [row[0], row[1], 7, row[3]] : row,
    );
    expect(told(read(sheetOf(flat)))).toEqual(['Main 7-11 C: Section XS-02 has no width']);
  });
});

describe('elevations far from the rest', () => {
  test.each([
    [210, 'fault'],
    [2.1, 'fault'],
    [0.021, 'fault'],
    [95, 'fault'],
    [41, 'doubt'],
  ] as const)('%f beside 20 to 22 m is a %s', (value, severity) => {
    const reading = read(sheetOf(withCell(4, 3, value)));
    expect(reading.faults).toHaveLength(1);
    expect(reading.faults[0]).toMatchObject({ row: 4, column: 'D', severity });
    expect(reading.sections).toHaveLength(severity === 'doubt' ? 3 : 0);
  });
  test('a gorge is no fault', () => {
    const levels = [62, 55, 41, 20, 58];
    const rows = soundRows().map(([id, chainage, offset], i): Row => [
      id,
      chainage,
      offset,
      levels[i % 5],
    ]);
    expect(read(sheetOf(rows)).faults).toEqual([]);
  });
});

describe('sections', () => {
  test('torn in two', () => {
    const rows = soundRows();
    rows.push(...rows.splice(3, 2));
    expect(told(read(sheetOf(rows)))).toEqual(['Main 15 A: Section XS-01 stands in two places']);
  });
  test('torn over two sheets', () => {
    const rows = soundRows();
    const reading = read(
      workbookOf({ One: [HEADINGS, ...rows.slice(0, 13)], Two: [HEADINGS, ...rows.slice(13)] }),
    );
    expect(told(reading)).toEqual(['Two 2 A: Section XS-03 stands in two places']);
  });
  test('fewer than three points', () => {
    expect(told(read(sheetOf(soundRows().slice(0, 12))))).toEqual([
      'Main 12-13: Section XS-03 has two points',
    ]);
  });
  test('a chainage that changes within, and one that is missing', () => {
    expect(told(read(sheetOf(withCell(9, 1, 510))))).toEqual([
      'Main 9 B: Chainage changes within a section: 510 after 500',
    ]);
    const bare = soundRows().map((row): Row =>
      row[0] === 'XS-02' ? [row[0], null, row[2], row[3]] : row,
    );
    expect(told(read(sheetOf(bare)))).toEqual(['Main 7 B: Chainage is missing']);
  });
  test('points that belong to none', () => {
    const rows = soundRows().map((row, i): Row => (i < 2 ? [null, ...row.slice(1)] : row));
    expect(told(read(sheetOf(rows)))).toEqual(['Main 2-3 A: Section is missing']);
  });
  test('only one', () => {
    expect(told(read(sheetOf(soundRows().slice(0, 5))))).toEqual([
      'Main 2-6: Only one section was found',
    ]);
  });
  test('no column of chainages', () => {
    const rows = soundRows().map(([id, , offset, level]): Row => [id, offset, level]);
    expect(told(read(sheetOf(rows, ['Section', 'Offset', 'Level'])))[0]).toBe(
      'Main 1: No column for the chainage',
    );
  });
  test('too many points', () => {
    const long = Array.from({ length: 2001 }, (_, i): Row => ['XS-01', 0, i, 20]);
    expect(told(read(sheetOf([...long, ...soundRows().slice(5)])))).toEqual([
      'Main 2-2002: Section XS-01 has 2,001 points',
    ]);
  });
  test('too many sections', () => {
    const rows = Array.from({ length: 501 }, (_, s) =>
      [0, 5, 10].map((y): Row => [`S${s}`, 10 * s, y, 20 - 0.01 * s]),
    ).flat();
    expect(told(read(sheetOf(rows)))).toEqual(['Main 1502: The file has 501 sections']);
  });
  test('a bed that climbs downstream is doubted', () => {
    const rows = soundRows().map(([id, chainage, offset, level]): Row => [
      id,
      1000 - (chainage as number),
      offset,
      level,
    ]);
    expect(told(read(sheetOf(rows)), 'doubt')).toEqual([
      'Main B: The bed climbs as chainage grows',
    ]);
  });
});

test('walls at the ends go up outwards', () => {
  const rows = soundRows();
  rows[1][2] = 0;
  rows[0][3] = 20.5;
  expect(told(read(sheetOf(rows)))).toEqual(['Main 2: The wall at the left end falls outwards']);
  const up = soundRows();
  up[3][2] = 20;
  expect(told(read(sheetOf(up)))).toEqual([]);
});
test('ids and chainages that are too long', () => {
  const rows = soundRows().map((row): Row =>
    row[0] === 'XS-02' ? ['X'.repeat(101), ...row.slice(1)] : row,
  );
  expect(told(read(sheetOf(rows)))).toEqual(['Main 7: Section id is too long']);
  const far = soundRows().map((row): Row =>
    row[0] === 'XS-03' ? [row[0], 2e7, row[2], row[3]] : row,
  );
  expect(told(read(sheetOf(far)))).toEqual(['Main 12 B: Chainage 20,000,000 cannot be']);
});

describe('bank marks', () => {
  const withMarks = (marks: (string | null)[]) =>
    read(
      sheetOf(
        soundRows().map((row, i) => [...row, i < 5 ? marks[i] : null]),
        [...HEADINGS, 'Bank'],
      ),
    );
  test.each([
    [[null, 'L', null, null, null], ['Main 3 E: Right bank is not marked']],
    [[null, null, null, 'RB', null], ['Main 5 E: Left bank is not marked']],
    [[null, 'R', null, 'L', null], ['Main 3 E: Bank marks are swapped']],
    [[null, 'L', null, 'L', null], ['Main 5 E: Bank marks do not tell left from right']],
    [['L', 'L', null, 'R', null], ['Main 5 E: Section XS-01 has 3 bank marks']],
    [[null, 'left', null, 'right', null], []],
    [[null, 'x', null, 'x', null], []],
    [[null, 'TLB', null, 'TRB', null], []],
  ])('%j', (marks, faults) => expect(told(withMarks(marks))).toEqual(faults));
  test('other marks are named and passed over', () => {
    const reading = withMarks([null, 'L', 'CL', 'R', 'fence']);
    expect(told(reading)).toEqual([]);
    expect(reading.faults[0]).toMatchObject({ severity: 'doubt', row: 4, column: 'E' });
    expect(detailOf(reading)).toMatch(/^CL, fence are passed over/);
    expect(reading.sections[0].banks).toEqual([5, 15]);
  });
});

describe('roughness and coordinates', () => {
  const withN = (n: Row[number]) =>
    read(
      sheetOf(
        soundRows().map((row, i) => [...row, i === 1 ? n : 0.04]),
        [...HEADINGS, 'n'],
      ),
    );
  test.each([
    [0, "Main 3 E: Manning's n of 0 cannot be"],
    [-0.03, "Main 3 E: Manning's n of −0.03 cannot be"],
    [30, "Main 3 E: Manning's n of 30 cannot be"],
    ['smooth', "Main 3 E: Manning's n is not a number: “smooth”"],
  ])('n of %j', (n, fault) => expect(told(withN(n))).toEqual([fault]));
  test('an unusual n is doubted', () => {
    expect(told(withN(0.4), 'doubt')).toEqual(["Main 3 E: Manning's n of 0.4 is unusual"]);
  });
  test('coordinates stand at every point or at none', () => {
    const rows = soundRows().map((row, i) => [
      ...row,
      i < 10 ? 4000 + i : null,
      i < 10 && i !== 3 ? 900 : null,
    ]);
    expect(told(read(sheetOf(rows, [...HEADINGS, 'Easting', 'Northing'])))).toEqual([
      'Main 5 F: Northing is missing',
    ]);
  });
});

describe('the file', () => {
  test('no table', () => {
    expect(told(read(workbookOf({ Notes: [['Nothing here']] })))).toEqual([
      'Notes: No table was found',
    ]);
    expect(told(readText('Dear Ines,\nthe survey follows.\n'))[0]).toMatch(/No table was found$/);
  });
  test('a hidden sheet is passed over, and said', () => {
    const book = XLSX.read(
      workbookOf({ Main: [HEADINGS, ...soundRows()], Old: [HEADINGS, ...soundRows()] }),
    );
    book.Workbook = { Sheets: [{ Hidden: 0 }, { Hidden: 1 }] };
    const reading = read(XLSX.write(book, { type: 'buffer', bookType: 'xlsx' }));
    expect(told(reading)).toEqual([]);
    expect(told(reading, 'doubt')).toEqual(['Old: The sheet is hidden']);
  });
  test('hidden rows are read, and said', () => {
    const sheet = XLSX.utils.aoa_to_sheet([HEADINGS, ...soundRows()]);
    sheet['!rows'] = [];
    sheet['!rows'][4] = { hidden: true };
    const book = { SheetNames: ['Main'], Sheets: { Main: sheet } };
    const reading = read(XLSX.write(book, { type: 'buffer', bookType: 'xlsx' }));
    expect(told(reading, 'doubt')).toEqual(['Main 5: A hidden row was read']);
    expect(reading.pointCount).toBe(15);
  });
  test('merged ids and chainages', () => {
    const rows = soundRows().map((row, i): Row =>
      i % 5 === 0 ? row : [null, null, row[2], row[3]],
    );
    const sheet = XLSX.utils.aoa_to_sheet([HEADINGS, ...rows]);
    sheet['!merges'] = [0, 5, 10].flatMap((r) =>
      [0, 1].map((c) => ({ s: { r: r + 1, c }, e: { r: r + 5, c } })),
    );
    const book = { SheetNames: ['Main'], Sheets: { Main: sheet } };
    expect(told(read(XLSX.write(book, { type: 'buffer', bookType: 'xlsx' })))).toEqual([]);
  });
  test('a sheet that looks like a table and is none is doubted', () => {
    const reading = read(
      workbookOf({
        Main: [HEADINGS, ...soundRows()],
        Levels: [
          ['Point', 'Level'],
          [1, 20],
          [2, 21],
        ],
      }),
    );
    expect(told(reading, 'doubt')).toEqual(['Levels: The sheet was passed over']);
  });
  test('more faults than are listed are counted', () => {
    const rows = soundRows()
      .slice(0, 5)
      .concat(Array.from({ length: 700 }, (_, i): Row => ['XS-02', 500, i, null]));
    const reading = read(sheetOf(rows));
    expect(reading.faults).toHaveLength(500);
    expect(reading.faultsNotListed).toBe(200);
  });
});
