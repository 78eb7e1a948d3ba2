import * as XLSX from 'xlsx';
import { buildUser } from '../../helpers/factories/buildUser';
import { workbookOf, type Row } from '../../helpers/surveyRows';
import { startTestServer, type TestServer } from '../../helpers/testServer';

// Reading a file starts a thread, which takes seconds on a busy machine.
jest.setTimeout(120_000);

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
beforeAll(async () => {
  server = await startTestServer();
  api = await server.signInAs(await buildUser(server.services, ['modeller']));
});
afterAll(() => server.stop());

const send = (bytes: Buffer, name: string, quantity = 'flow') =>
  api
    .post('/api/tables/read')
    .attach('file', bytes, name)
    .field('quantity', quantity)
    .field('unitSystem', 'metric');

test('a text file is read as pasted text is', async () => {
  const { body } = await send(
    Buffer.from('Zeit (h);Abfluss (m³/s)\n0;10,5\n1,5;20,25\n', 'latin1'),
    'flut.csv',
  ).expect(200);
  expect(body).toMatchObject({ times: [0, 5400], values: [10.5, 20.25], faults: [] });
});

test('a workbook: the first sheet of numbers, below its titles', async () => {
  const bytes = workbookOf({
    Cover: [['Design flood']],
    Flood: [
      ['1 in 100 year'],
      [],
      [null, 'Time (h)', 'Flow (m3/s)'],
      [null, 0, 55],
      [null, 14, 490.5],
      [null, 48, 60],
    ],
  });
  const { body } = await send(bytes, 'flood.xlsx').expect(200);
  expect(body).toMatchObject({ times: [0, 50_400, 172_800], values: [55, 490.5, 60], faults: [] });
  expect(body.understood).toBe('Sheet Flood: 3 rows; times in hours; values in m³/s.');
});

test('dates, and times of day, as a workbook keeps them', async () => {
  const at = (day: number, hour: number) => new Date(Date.UTC(2026, 10, day, hour));
  const rows: Row[] = [
    ['When', 'Stage'],
    [at(14, 6), 12.5],
    [at(14, 18), 13.25],
    [at(15, 6), 12.75],
  ];
  const dates = XLSX.utils.aoa_to_sheet(rows, { cellDates: true, UTC: true });
  const bytes = XLSX.write(
    { SheetNames: ['S'], Sheets: { S: dates } },
    { type: 'buffer', bookType: 'xlsx' },
  );
  const { body } = await send(bytes, 'stage.xlsx', 'stage').expect(200);
  expect(body).toMatchObject({
    times: [0, 43_200, 86_400],
    values: [12.5, 13.25, 12.75],
    faults: [],
  });

  const clock = XLSX.utils.aoa_to_sheet([
    ['Time', 'Q'],
    [0, 1],
    [0.25, 2],
    [1.5, 3],
  ]);
  for (const cell of ['A2', 'A3', 'A4']) clock[cell].z = '[h]:mm';
  const book = { SheetNames: ['S'], Sheets: { S: clock } };
  const times = await send(XLSX.write(book, { type: 'buffer', bookType: 'xlsx' }), 'q.xlsx').expect(
    200,
  );
  expect(times.body).toMatchObject({ times: [0, 21_600, 129_600], values: [1, 2, 3], faults: [] });
});

test('faults keep the row of the sheet', async () => {
  const { body } = await send(
    workbookOf({ S: [['Flood'], ['h', 'Q'], [0, 1], [1, 'rain'], [2, 3]] }),
    'q.xlsx',
  ).expect(200);
  expect(body.faults).toEqual([
    { path: 'lines[4]', message: 'Line 4 has “rain” for a value, which is no number.' },
  ]);
});

test('what is no table is refused, and the form is checked', async () => {
  await send(workbookOf({ S: [['nothing']] }), 'q.xlsx').expect(422);
  await send(Buffer.from('%PDF-1.7'), 'q.pdf').expect(422);
  await send(Buffer.from('0 1'), 'q.csv', 'temperature').expect(422);
  const surveyor = await server.signInAs(await buildUser(server.services, ['surveyor']));
  await surveyor.post('/api/tables/read').attach('file', Buffer.from('0 1'), 'q.csv').expect(403);
});
