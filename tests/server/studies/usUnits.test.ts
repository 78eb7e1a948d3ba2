import { read, utils } from 'xlsx';
import type { Reach } from '../../../shared/reaches/types';
import type { RunSummary } from '../../../shared/runs/types';
import { sayIn } from '../../../shared/units/message';
import { failureFields } from '../../../server/models/failure';
import { RunFailed } from '../../../server/solvers';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

jest.setTimeout(60_000);

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let made: Awaited<ReturnType<typeof buildRunnable>>;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  const user = await buildUser(server.services, ['modeller']);
  api = await server.signInAs(user);
  made = await buildRunnable(server.services, user);
  await made.study.update({ unitSystem: 'usCustomary' });
});
afterAll(() => server.stop());

/** A length, speed, area, volume or flow in SI. */
const SI = /\d (k?m|m\/s|m²|m³|m³\/s)(?![\p{L}\d])/u;

test('what is wrong with a scenario is told in feet, where it is shown and where a run is refused', async () => {
  const { id, body, version } = made.scenario;
  const wrong = { ...body, numerics: { ...body.numerics, dryDepth: 0.5 } };
  // 0.1 m is 0.328 ft.
  const fault = {
    path: 'numerics.dryDepth',
    message: 'The dry depth lies above 0 and not above 0.33 ft.',
  };
  const saved = await api.put(`/api/scenarios/${id}`).send({ version, body: wrong }).expect(200);
  expect(saved.body.faults).toEqual([fault]);
  const refused = await api.post(`/api/scenarios/${id}/runs`).expect(422);
  expect(refused.body.error.faults).toEqual([fault]);
  await api
    .put(`/api/scenarios/${id}`)
    .send({ version: version + 1, body })
    .expect(200);
});

test('a run warns in feet on screen and in the workbook, in metres in its own record', async () => {
  server.services.runs.start();
  const { scenario } = made;
  // Far more water than the sections hold.
  const body = {
    ...scenario.body,
    upstream: { kind: 'table', times: [0, 1800, 7200], flows: [20, 2500, 2500] },
  };
  await api
    .put(`/api/scenarios/${scenario.id}`)
    .send({ version: scenario.version + 2, body })
    .expect(200);
  const { id } = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body;
  await untilEnded(server.services, id);
  const summary: RunSummary = (await api.get(`/api/runs/${id}/summary`).expect(200)).body;
  const warning = summary.warnings.find(({ code }) => code === 'aboveSurvey')!;
  expect(warning.message).toMatch(/: by [\d.]+ m at/);
  const inMetres = Number(/by ([\d.]+) m/.exec(warning.message)![1]);
  const inFeet = Number(/by ([\d.]+) ft/.exec(sayIn('usCustomary', warning))![1]);
  // Both are rounded to two decimals.
  expect(Math.abs(inFeet * 0.3048 - inMetres)).toBeLessThan(0.007);

  const { body: file } = await api
    .get(`/api/runs/${id}/results.xlsx`)
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    })
    .expect(200);
  const sheet = utils.sheet_to_csv(read(file as Buffer).Sheets['Warnings']);
  expect(sheet).toContain(`by ${inFeet.toFixed(2)} ft`);
  expect(sheet).toContain('when the stage is 0.33 ft above');
  expect(sheet).not.toMatch(SI);
});

test('advice on the reach can be told without a metre', async () => {
  const reach: Reach = (await api.get(`/api/reaches/${made.reach.id}`).expect(200)).body;
  const told = reach.advice.flatMap((one) => [
    sayIn('usCustomary', one),
    sayIn('usCustomary', { message: one.reason, parts: one.reasonParts }),
  ]);
  // Sections 2297 ft apart where 20 widths are fewer.
  expect(told.join(' ')).toContain('lie 2,297 ft apart');
  expect(told.filter((words) => SI.test(words))).toEqual([]);
});

test('why a run failed is told in feet; what failed before there were quantities stays as it was', async () => {
  const { models } = server.services;
  const { id } = (await api.post(`/api/scenarios/${made.scenario.id}/runs`).expect(201)).body;
  await untilEnded(server.services, id);
  const { said } = new RunFailed('the velocity grew.', 5, 304.8);
  await models.Run.update({ state: 'failed', ...failureFields(said) }, { where: { id } });
  const told = async () => (await api.get(`/api/runs/${id}`).expect(200)).body.failure as string;
  // 304.8 m are 1000 ft exactly (NIST SP 811, app. B.8).
  expect(await told()).toBe('The run failed at chainage 1,000.0 ft at 5.0 s: the velocity grew.');
  await models.Run.update({ failureParts: null }, { where: { id } });
  expect(await told()).toBe('The run failed at chainage 304.8 m at 5.0 s: the velocity grew.');
});

test('a place off the reach and banks off a section are refused in feet', async () => {
  const { id } = (await api.post(`/api/scenarios/${made.scenario.id}/runs`).expect(201)).body;
  await untilEnded(server.services, id);
  const off = (await api.get(`/api/runs/${id}/series?chainage=9999`).expect(422)).body.error;
  expect(off.message).toContain('from chainage 0 ft to 6,562 ft');
  const reach: Reach = (await api.get(`/api/reaches/${made.reach.id}`).expect(200)).body;
  const refused = await api
    .patch(`/api/reaches/${made.reach.id}/sections`)
    .send({ version: reach.version, sectionIds: ['XS-01'], banks: [-10, 35] })
    .expect(422);
  // The section is 50 m wide.
  expect(refused.body.error.faults[0].message).toContain('which runs from 0.0 to 164.0 ft');
});
