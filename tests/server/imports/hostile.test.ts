import { randomBytes } from 'node:crypto';
import { deflateRawSync } from 'node:zlib';
import * as XLSX from 'xlsx';
import { ImportError } from '../../../server/imports/importError';
import { readInWorker } from '../../../server/imports/readInWorker';
import { packStored } from '../../../server/imports/workbook/packStored';
import { unzipWorkbook } from '../../../server/imports/workbook/unzipWorkbook';
import { HEADINGS, read, readText, sheetOf, soundRows, told } from '../../helpers/surveyRows';

const task = {
  kind: 'survey',
  options: { fileName: 'survey.xlsx', choice: null, defaultUnit: 'm' },
} as const;

function refused(bytes: Buffer): ImportError {
  try {
    read(bytes);
  } catch (error) {
    if (error instanceof ImportError) return error;
    throw error;
  }
  throw new Error('It was read.');
}

/** An archive with one deflated part, whose directory may lie about its size. */
function zipOf(name: string, content: Buffer, declared = content.length): Buffer {
  const packed = deflateRawSync(content, { level: 1 });
  const stored = packStored([{ name, content: packed }]);
  const directory = stored.lastIndexOf(Buffer.from([0x50, 0x4b, 0x01, 0x02]));
  stored.writeUInt16LE(8, 8);
  stored.writeUInt32LE(declared, 22);
  stored.writeUInt16LE(8, directory + 10);
  stored.writeUInt32LE(declared, directory + 24);
  return stored;
}

const replacePart = (bytes: Buffer, name: RegExp, edit: (xml: string) => string): Buffer =>
  packStored(
    unzipWorkbook(bytes).map((part) =>
      name.test(part.name)
        ? { ...part, content: Buffer.from(edit(part.content.toString())) }
        : part,
    ),
  );

describe('files that are no spreadsheet', () => {
  test.each([
    ['nothing', Buffer.alloc(0), /empty/],
    ['a PDF', Buffer.from('%PDF-1.7 …'), /a PDF/],
    ['a picture', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]), /a picture/],
    ['noise', randomBytes(4000), /not a spreadsheet/],
    [
      'an older binary workbook',
      Buffer.concat([Buffer.from('d0cf11e0a1b11ae1', 'hex'), Buffer.alloc(600)]),
      /older binary/,
    ],
    [
      'a locked workbook',
      Buffer.concat([
        Buffer.from('d0cf11e0a1b11ae1', 'hex'),
        Buffer.from('EncryptedPackage', 'utf16le'),
      ]),
      /password/,
    ],
    [
      'an archive',
      packStored([{ name: 'photo.jpg', content: Buffer.from('x') }]),
      /packed archive/,
    ],
    ['half a workbook', sheetOf(soundRows()).subarray(0, 900), /damaged/],
  ])('%s', (_, bytes, words) => {
    const error = refused(bytes);
    expect(error.code).toBe('unreadable');
    expect(error.message).toMatch(words);
  });
  test('more than the limit of bytes', () => {
    expect(refused(Buffer.alloc(20 * 1024 * 1024 + 1, 65)).code).toBe('tooLarge');
  });
});

describe('bombs', () => {
  const zeros = Buffer.alloc(210 * 1024 * 1024, 32);
  test('that declare what they unpack to', () => {
    expect(refused(zipOf('xl/workbook.xml', zeros)).code).toBe('tooLarge');
  });
  test('that lie about it', () => {
    expect(refused(zipOf('xl/workbook.xml', zeros, 1000)).code).toBe('tooLarge');
  });
  test('parts that are never needed are never unpacked', () => {
    const parts = unzipWorkbook(sheetOf(soundRows()));
    const bytes = packStored([
      ...parts,
      { name: 'xl/media/image1.png', content: Buffer.alloc(100) },
    ]);
    expect(unzipWorkbook(bytes).map(({ name }) => name)).not.toContain('xl/media/image1.png');
    expect(told(read(bytes))).toEqual([]);
  });
  test('two parts of one name', () => {
    const parts = unzipWorkbook(sheetOf(soundRows()));
    expect(refused(packStored([...parts, parts[0]])).code).toBe('unreadable');
  });
  test('declarations that expand', () => {
    const bytes = replacePart(sheetOf(soundRows()), /sheet1\.xml$/, (xml) =>
      xml.replace(
        '<worksheet',
        '<!DOCTYPE lolz [<!ENTITY lol "lol"><!ENTITY lol2 "&lol;&lol;">]><worksheet',
      ),
    );
    expect(refused(bytes)).toMatchObject({
      code: 'unreadable',
      message: expect.stringMatching(/declarations/),
    });
  });
  test('more rows than any survey', () => {
    const bytes = replacePart(sheetOf(soundRows()), /sheet1\.xml$/, (xml) =>
      xml.replace('</sheetData>', `${'<row r="99"/>'.repeat(1_000_001)}</sheetData>`),
    );
    expect(refused(bytes).code).toBe('tooLarge');
  });
  test('one cell in the last corner of the sheet', () => {
    const bytes = replacePart(sheetOf(soundRows()), /sheet1\.xml$/, (xml) =>
      xml
        .replace(/<dimension ref="[^"]*"/, '<dimension ref="A1:XFD1048576"')
        .replace(
          '</sheetData>',
          '<row r="1048576"><c r="XFD1048576"><v>1</v></c></row></sheetData>',
        ),
    );
    expect(told(read(bytes))).toEqual([]);
  });
});

describe('poison', () => {
  test('names of the language as sheets, headings and ids', () => {
    const rows = soundRows().map((row) => [...row, 'polluted', 'polluted']);
    for (const row of rows) if (row[0] === 'XS-02') row[0] = '__proto__';
    const sheet = XLSX.utils.aoa_to_sheet([[...HEADINGS, '__proto__', 'constructor'], ...rows]);
    const reading = read(
      replacePart(
        XLSX.write(
          { SheetNames: ['Main'], Sheets: { Main: sheet } },
          { type: 'buffer', bookType: 'xlsx' },
        ),
        /workbook\.xml$/,
        (xml) => xml.replace('name="Main"', 'name="__proto__"'),
      ),
    );
    expect(told(reading)).toEqual([]);
    expect(reading.sections.map(({ id }) => id)).toEqual(['XS-01', '__proto__', 'XS-03']);
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
    expect(Object.keys(Object.prototype)).toEqual([]);
  });
  test('formulas are not evaluated: what was saved with them counts', () => {
    const sheet = XLSX.utils.aoa_to_sheet([HEADINGS, ...soundRows()]);
    sheet['D4'] = { t: 'n', v: 20.5, f: 'HYPERLINK("http://intruder.example")' };
    const reading = read(
      XLSX.write(
        { SheetNames: ['Main'], Sheets: { Main: sheet } },
        { type: 'buffer', bookType: 'xlsx' },
      ),
    );
    expect(reading.sections[0].points[2]).toEqual([10, 20.5]);
  });
  test('text that looks like a formula stays text', () => {
    const text = [
      HEADINGS.join(','),
      ...soundRows().map((row) => row.join(',').replace('XS-02', '=1+1')),
    ].join('\n');
    expect(readText(text).sections[1].id).toBe('=1+1');
  });
  test('a line of one hundred thousand digits, and one of commas, do not stall', () => {
    const started = Date.now();
    readText(
      `${HEADINGS.join(',')}\nXS-01,0,${'1'.repeat(100_000)},5\nXS-01,0,${'1,'.repeat(50_000)}\n${' '.repeat(100_000)}x`,
    );
    expect(Date.now() - started).toBeLessThan(2000);
  });
});

describe('the thread', () => {
  // Starting a thread takes seconds on a busy machine.
  jest.setTimeout(120_000);
  const limits = { seconds: 60, heapMb: 512 };
  test('reads as the same code does here', async () => {
    const bytes = sheetOf(soundRows());
    expect(await readInWorker(bytes, task, limits)).toEqual(read(bytes));
  });
  test('carries the words of a refusal', async () => {
    await expect(readInWorker(Buffer.from('%PDF-1.4'), task, limits)).rejects.toMatchObject({
      code: 'unreadable',
    });
  });
  test('ends when its time is up', async () => {
    await expect(
      readInWorker(sheetOf(soundRows()), task, { ...limits, seconds: 0.01 }),
    ).rejects.toMatchObject({ code: 'timeout' });
  });
  test('ends when its memory is full, and the next file is read', async () => {
    const rows = Array.from({ length: 300_000 }, (_, i) => `S${i},${i},${i},${i},text ${i}`);
    const huge = Buffer.from([HEADINGS.join(','), ...rows].join('\n'));
    await expect(readInWorker(huge, task, { seconds: 120, heapMb: 48 })).rejects.toMatchObject({
      code: 'tooLarge',
    });
    expect((await readInWorker(sheetOf(soundRows()), task, limits)).sectionCount).toBe(3);
  });
});
