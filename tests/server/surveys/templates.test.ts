import {
  blankTemplate,
  longTableExample,
  sectionSheetsExample,
} from '../../../server/workbooks/surveyTemplates';
import { buildUser } from '../../helpers/factories/buildUser';
import { read, told } from '../../helpers/surveyRows';
import { startTestServer } from '../../helpers/testServer';

test('the blank template has headings that are understood, and no points', () => {
  const reading = read(blankTemplate('metric'));
  expect(reading.sheets.map(({ layout }) => layout)).toEqual(['longTable', 'ignored']);
  expect(reading.sheets[0].columns.map(({ field }) => field)).toEqual([
    'section',
    'chainage',
    'offset',
    'elevation',
    'roughness',
    'bank',
    'easting',
    'northing',
  ]);
  expect(told(reading)).toEqual(['Survey: The table has no points']);
});

test('the filled examples are taken in as they are, and say the same', () => {
  const [long, sheets] = [read(longTableExample('metric')), read(sectionSheetsExample('metric'))];
  for (const reading of [long, sheets]) {
    expect(reading.faults).toEqual([]);
    expect(reading.sectionCount).toBe(4);
    expect(reading.sections[0]).toMatchObject({
      banks: [22, 41],
      roughness: [
        [0, 0.055],
        [22, 0.035],
        [41, 0.05],
      ],
    });
    expect(reading.sections[0].coordinates).toHaveLength(12);
  }
  expect(sheets.sections).toEqual(long.sections);
});

test('those in feet are taken in as feet', () => {
  for (const reading of [longTableExample, sectionSheetsExample].map((of) =>
    read(of('usCustomary')),
  )) {
    expect(reading.faults).toEqual([]);
    const [first, second] = reading.sections;
    // 22 m are 72.18 ft, 180 m are 590.55 ft: to the hundredth of a foot, 3 mm.
    expect(first.banks![0]).toBeCloseTo(72.18 * 0.3048, 3);
    expect(second.chainage).toBeCloseTo(590.55 * 0.3048, 3);
  }
  expect(read(blankTemplate('usCustomary')).sheets[0].columns[1]).toMatchObject({ unit: 'ft' });
});

test('they are downloaded by those who send surveys', async () => {
  const server = await startTestServer();
  try {
    const api = await server.signInAs(await buildUser(server.services, ['surveyor']));
    for (const name of ['survey.xlsx', 'survey-example.xlsx', 'survey-sections-example.xlsx']) {
      const { headers } = await api.get(`/api/templates/${name}`).expect(200);
      expect(headers['content-disposition']).toBe(`attachment; filename=${name}`);
      expect(headers['content-type']).toMatch(/spreadsheetml/);
    }
    const { body } = await api
      .get('/api/templates/survey-example.xlsx?units=usCustomary')
      .responseType('blob')
      .expect(200);
    expect(read(body as Buffer).sheets[0].columns[2]).toMatchObject({ unit: 'ft' });
    await api.get('/api/templates/survey.xlsx?units=fathoms').expect(422);
    const client = await server.signInAs(await buildUser(server.services, ['client']));
    await client.get('/api/templates/survey.xlsx').expect(403);
    await server.request.get('/api/templates/survey.xlsx').expect(401);
  } finally {
    await server.stop();
  }
});
