import type { SurveyField } from '../../../shared/surveys/types';
import {
  choose,
  HEADINGS,
  read,
  readText,
  sheetOf,
  soundRows,
  told,
  workbookOf,
  type Row,
} from '../../helpers/surveyRows';

test('a long table becomes sections in SI, by chainage', () => {
  const rows = soundRows();
  const reading = read(sheetOf([...rows.slice(10), ...rows.slice(0, 10)]));
  expect(told(reading)).toEqual([]);
  expect(reading).toMatchObject({ sectionCount: 3, pointCount: 15, decimal: 'point' });
  expect(reading.sections.map(({ id, chainage }) => [id, chainage])).toEqual([
    ['XS-01', 0],
    ['XS-02', 500],
    ['XS-03', 1000],
  ]);
  expect(reading.sections[0]).toEqual({
    id: 'XS-01',
    chainage: 0,
    points: [
      [0, 22],
      [5, 21],
      [10, 20],
      [15, 21],
      [20, 22],
    ],
    roughness: [],
    banks: null,
    coordinates: null,
  });
});

test('headings are found below titles, and in any order', () => {
  const rows = soundRows().map(([id, chainage, offset, level]): Row => [
    level,
    offset,
    null,
    id,
    chainage,
  ]);
  const reading = read(
    workbookOf({
      Main: [
        ['River Veshall, survey of November'],
        ['Surveyor', 'D. Hallam', null, 'Datum', 'local'],
        [],
        ['RL (m)', 'Dist. from left bank', 'Remarks', 'XS', 'Ch. [m]'],
        ...rows,
      ],
    }),
  );
  expect(told(reading)).toEqual([]);
  expect(reading.sheets[0]).toMatchObject({ layout: 'longTable', headingRow: 4 });
  expect(reading.sheets[0].columns.map(({ field }) => field)).toEqual([
    'elevation',
    'offset',
    null,
    'section',
    'chainage',
  ]);
  expect(reading.sheets[0].columns[0].sample).toEqual(['22', '21', '20']);
});

describe('spellings of headings', () => {
  const spellings: [SurveyField, string[]][] = [
    [
      'section',
      [
        'Section',
        'Cross-section',
        'XS ID',
        'Profile No.',
        'Querprofil',
        'Profil',
        'Sección',
        'Perfil',
      ],
    ],
    [
      'chainage',
      [
        'Chainage (m)',
        'Ch. [m]',
        'Station (m)',
        'River chainage',
        'Stationierung',
        'PK',
        'Progresiva',
      ],
    ],
    [
      'offset',
      [
        'Offset',
        'Dist. from left bank',
        'Distance (m)',
        'Abstand',
        'Distance rive gauche',
        'Distancia',
        'offset_m',
      ],
    ],
    [
      'elevation',
      [
        'Elevation',
        'Level',
        'RL',
        'Elev.',
        'Z',
        'Reduced level [m AOD]',
        'Höhe',
        'Cote',
        'Altitude',
        'Cota',
        'mAOD',
      ],
    ],
  ];
  const usual = ['Section', 'Chainage', 'Offset', 'Elevation'];
  test.each(spellings.flatMap(([field, words]) => words.map((word) => [word, field] as const)))(
    '%s is the %s',
    (word, field) => {
      const at = ['section', 'chainage', 'offset', 'elevation'].indexOf(field);
      const reading = read(sheetOf(soundRows(), usual.with(at, word)));
      expect(reading.sheets[0].columns[at]).toMatchObject({ heading: word, field });
      expect(told(reading)).toEqual([]);
      expect(reading.sectionCount).toBe(3);
    },
  );

  test.each([
    [
      ["Manning's n", 'Bank', 'Easting', 'Northing'],
      ['roughness', 'bank', 'easting', 'northing'],
    ],
    [
      ['n', 'Mark', 'E', 'N'],
      ['roughness', 'bank', 'easting', 'northing'],
    ],
    [
      ['Manning n', 'Ufer', 'Rechtswert', 'Hochwert'],
      ['roughness', 'bank', 'easting', 'northing'],
    ],
    [
      ['Rugosité', 'Berge', 'X', 'Y'],
      ['roughness', 'bank', 'easting', 'northing'],
    ],
  ])('%j', (headings, fields) => {
    const rows = soundRows().map((row, i): Row => [
      ...row,
      0.04,
      i % 5 === 1 ? 'L' : i % 5 === 3 ? 'R' : null,
      400 + i,
      900,
    ]);
    const reading = read(sheetOf(rows, [...HEADINGS, ...headings]));
    expect(reading.sheets[0].columns.slice(4).map(({ field }) => field)).toEqual(fields);
    expect(told(reading)).toEqual([]);
    expect(reading.sections[1]).toMatchObject({
      roughness: [[0, 0.04]],
      banks: [5, 15],
      coordinates: [
        [405, 900],
        [406, 900],
        [407, 900],
        [408, 900],
        [409, 900],
      ],
    });
  });

  test('a Strickler value is no roughness of ours', () => {
    const reading = read(
      sheetOf(
        soundRows().map((row) => [...row, 30]),
        [...HEADINGS, 'kSt'],
      ),
    );
    expect(reading.sheets[0].columns[4].field).toBeNull();
  });
});

describe('units', () => {
  const first = (headings: Row, options = {}) => {
    const reading = read(sheetOf(soundRows(), headings), options);
    expect(told(reading)).toEqual([]);
    const [, second] = reading.sections;
    return [second.chainage, ...second.points[1]];
  };
  // International foot 0.3048 m and US survey foot 1200/3937 m, both exact: NIST SP 811, appendix B.8.
  test('each heading names its own', () => {
    expect(first(['Section', 'Chainage (km)', 'Offset (ft)', 'Level [m AOD]'])).toEqual([
      500_000, 1.524, 20,
    ]);
  });
  test('feet that one heading names hold for those that name none', () => {
    expect(first(['Section', 'Chainage', 'Offset', 'Elevation (ft)'])).toEqual([
      152.4, 1.524, 6.096,
    ]);
  });
  test('US survey feet', () => {
    const [chainage] = first([
      'Section',
      'Chainage (US ft)',
      'Offset (US survey ft)',
      'Elevation (ftUS)',
    ]);
    expect(chainage).toBeCloseTo((500 * 1200) / 3937, 4);
  });
  test('a study in US customary units means feet where nothing is said', () => {
    expect(first(['Section', 'Chainage', 'Offset', 'Elevation'], { defaultUnit: 'ft' })).toEqual([
      152.4, 1.524, 6.096,
    ]);
  });
  test('units in a row of their own', () => {
    const reading = read(
      workbookOf({
        Main: [
          ['Section', 'Chainage', 'Offset', 'Level'],
          [null, '(km)', '(m)', '(m)'],
          ...soundRows(),
        ],
      }),
    );
    expect(told(reading)).toEqual([]);
    expect(reading.sections[1].chainage).toBe(500_000);
  });
  test('stationing and numbers with their own unit', () => {
    const rows = soundRows().map(([id, , offset, level]): Row => {
      const chainage = { 'XS-01': '0+250', 'XS-02': '1+100.5', 'XS-03': '1.5 km' }[id as string]!;
      return [id, chainage, offset, level];
    });
    expect(read(sheetOf(rows)).sections.map(({ chainage }) => chainage)).toEqual([
      250, 1100.5, 1500,
    ]);
  });
  test('a unit that is not read is said', () => {
    const reading = read(
      sheetOf(soundRows(), ['Section', 'Chainage (m)', 'Offset (m)', 'Level (mm)']),
    );
    expect(told(reading)).toEqual(['Main 1 D: Unit mm is not read']);
  });
});

describe('text files', () => {
  const lines = (separator: string, comma = false) =>
    [
      HEADINGS,
      ...soundRows().map(([id, chainage, offset, level]) => [
        id,
        chainage,
        (offset as number) + 0.5,
        (level as number) + 0.25,
      ]),
    ]
      .map((row) =>
        row
          .map((cell) =>
            comma && typeof cell === 'number' ? String(cell).replace('.', ',') : cell,
          )
          .join(separator),
      )
      .join('\r\n');

  test.each([
    ['commas', lines(',')],
    ['tabs', lines('\t')],
    ['semicolons and decimal commas', lines(';', true)],
    ['tabs and decimal commas', lines('\t', true)],
    ['a mark of UTF-8', `\ufeff${lines(',')}`],
  ])('%s', (_, text) => {
    const reading = readText(text);
    expect(told(reading)).toEqual([]);
    expect(reading.sections[2].points[1]).toEqual([5.5, 19.25]);
  });

  test.each([
    ['UTF-16 with a mark', Buffer.from(`\ufeff${lines('\t')}`, 'utf16le')],
    ['UTF-16 without', Buffer.from(lines('\t'), 'utf16le')],
    ['UTF-16 big-endian', Buffer.from(`\ufeff${lines(';', true)}`, 'utf16le').swap16()],
  ])('%s', (_, bytes) => expect(read(bytes).sections).toHaveLength(3));

  test('Latin-1', () => {
    const text = lines(';', true).replace('Elevation (m)', 'Höhe (m)');
    const reading = read(Buffer.from(text, 'latin1'));
    expect(reading.sheets[0].columns[3]).toMatchObject({ heading: 'Höhe (m)', field: 'elevation' });
    expect(told(reading)).toEqual([]);
  });

  test('quoted fields, thousands marks and odd minus signs', () => {
    const rows = ['"Section","Chainage, m","Offset","Level"'];
    for (const [chainage, id] of [
      ['"1,250.0"', 'A'],
      ['"2,500.0"', '"B ""weir"""'],
    ])
      for (const [offset, level] of [
        ['-5.0', '-0.25'],
        ['0', '−1.50'],
        ['5', '–0.30'],
      ])
        rows.push(`${id},${chainage},${offset},${level}`);
    const reading = readText(rows.join('\n'));
    expect(told(reading)).toEqual([]);
    expect(reading.sections.map(({ id, chainage }) => [id, chainage])).toEqual([
      ['A', 1250],
      ['B "weir"', 2500],
    ]);
    expect(reading.sections[0].points).toEqual([
      [-5, -0.25],
      [0, -1.5],
      [5, -0.3],
    ]);
  });

  test('commas that may part thousands or decimals are asked about, once', () => {
    const text = lines('\t', true)
      .replace(/(\d),\d+/g, '$1')
      .replace(/\t22$/gm, '\t22,125')
      .replace(/\t19$/gm, '\t19,125');
    const doubtful = text.replace(/\t(\d+)(\r|$)/gm, '\t$1,125$2');
    const reading = readText(doubtful);
    expect(told(reading).filter((fault) => fault.includes('have decimals?'))).toHaveLength(1);
    const chosen = readText(doubtful, { choice: choose([], 'comma') });
    expect(told(chosen)).toEqual([]);
    expect(chosen.decimal).toBe('comma');
  });
});

describe('one sheet a section', () => {
  const table: Row[] = [
    ['Offset (m)', 'Level (m)'],
    [0, 12],
    [5, 9],
    [10, 12],
  ];
  test('id and chainage from labelled cells, or from the name of the sheet', () => {
    const reading = read(
      workbookOf({
        Cover: [['Lower Veshall'], ['Surveyed in November']],
        'Sheet A': [['Section', 'XS-01'], ['Chainage (km)', 1.25], [], ...table],
        'XS-02': [['Chainage: 2,000.5 m'], ...table],
        'XS-03 ch 3250': table,
        'XS-04 (4.1 km)': table,
      }),
    );
    expect(told(reading)).toEqual([]);
    expect(reading.sheets.map(({ layout }) => layout)).toEqual([
      'ignored',
      'section',
      'section',
      'section',
      'section',
    ]);
    expect(reading.sections.map(({ id, chainage }) => [id, chainage])).toEqual([
      ['XS-01', 1250],
      ['XS-02', 2000.5],
      ['XS-03 ch 3250', 3250],
      ['XS-04 (4.1 km)', 4100],
    ]);
  });
  test('a chainage in a column of its own', () => {
    const withColumn = (chainage: number): Row[] => [
      ['Ch', 'Offset', 'Level'],
      [chainage, 0, 12],
      [null, 5, 9],
      [null, 10, 12],
    ];
    const reading = read(workbookOf({ A: withColumn(100), B: withColumn(300) }));
    expect(told(reading)).toEqual([]);
    expect(reading.sections.map(({ id, chainage }) => [id, chainage])).toEqual([
      ['A', 100],
      ['B', 300],
    ]);
  });
  test('a sheet without its chainage', () => {
    const reading = read(workbookOf({ 'XS-01': [['Chainage', 5], ...table], 'XS-02': table }));
    expect(told(reading)).toEqual(['XS-02: Chainage is missing']);
  });
  test('one id on two sheets', () => {
    const reading = read(
      workbookOf({
        A: [['Section', 'X'], ['Chainage', 5], ...table],
        B: [['Section', 'X'], ['Chainage', 9], ...table],
      }),
    );
    expect(told(reading)).toEqual(['B: Section X stands in two places']);
  });
});

describe('a person chooses the match', () => {
  const odd = ['Who', 'Where', 'Across', 'Up'];
  test('headings that say nothing are shown, with what stands below', () => {
    const reading = read(sheetOf(soundRows(), odd));
    expect(told(reading)).toEqual(['Main 1: There is no column for the offset and the elevation']);
    expect(
      reading.sheets[0].columns.map(({ heading, field, sample }) => [heading, field, sample[0]]),
    ).toEqual([
      ['Who', null, 'XS-01'],
      ['Where', null, '0'],
      ['Across', null, '0'],
      ['Up', null, '22'],
    ]);
  });
  test('and read as chosen, in the chosen units', () => {
    const choice = choose([
      { column: 0, field: 'section', unit: null },
      { column: 1, field: 'chainage', unit: 'km' },
      { column: 2, field: 'offset', unit: 'ft' },
      { column: 3, field: 'elevation', unit: 'm' },
    ]);
    for (const headings of [odd, []]) {
      const reading = read(sheetOf(soundRows(), headings), { choice });
      expect(told(reading)).toEqual([]);
      expect(reading.sections[1]).toMatchObject({ chainage: 500_000 });
      expect(reading.sections[1].points[1]).toEqual([1.524, 20]);
    }
  });
  test('two columns for one thing are asked about, and settled by passing one over', () => {
    const rows = soundRows().map((row) => [...row, 99]);
    const headings = [...HEADINGS, 'Level'];
    expect(told(read(sheetOf(rows, headings)))).toEqual([
      'Main 1 E: Two columns read as elevation',
    ]);
    const reading = read(sheetOf(rows, headings), {
      choice: choose([{ column: 4, field: null, unit: null }]),
    });
    expect(told(reading)).toEqual([]);
    expect(reading.sections[0].points[0]).toEqual([0, 22]);
  });
  test('a chosen column takes its field from the one that its heading had put there', () => {
    const rows = soundRows().map((row) => [...row, 50]);
    const reading = read(sheetOf(rows, [...HEADINGS, 'As built']), {
      choice: choose([{ column: 4, field: 'elevation', unit: 'm' }]),
    });
    expect(told(reading)).toEqual([]);
    expect(reading.sections[0].points[0]).toEqual([0, 50]);
  });
});

test('blank sections and chainages mean the ones above; repeated headings and blank rows are passed over', () => {
  const rows = soundRows().map((row, i): Row => (i % 5 === 0 ? row : [null, null, row[2], row[3]]));
  rows.splice(5, 0, HEADINGS, [], [null, null, null, null, 'checked by RT']);
  const reading = read(sheetOf(rows));
  expect(told(reading)).toEqual([]);
  expect(reading.sections.map(({ points }) => points.length)).toEqual([5, 5, 5]);
});

test('without a column of sections the chainage tells them apart', () => {
  const reading = read(
    sheetOf(
      soundRows().map((row) => row.slice(1)),
      HEADINGS.slice(1),
    ),
  );
  expect(told(reading)).toEqual([]);
  expect(reading.sections.map(({ id }) => id)).toEqual(['0', '500', '1000']);
});

test('roughness holds from its point on; the first one given holds from the left end', () => {
  const n = [null, 0.06, 0.035, null, 0.06];
  const reading = read(
    sheetOf(
      soundRows().map((row, i) => [...row, n[i % 5]]),
      [...HEADINGS, 'n'],
    ),
  );
  expect(reading.sections[0].roughness).toEqual([
    [0, 0.06],
    [10, 0.035],
    [20, 0.06],
  ]);
});
