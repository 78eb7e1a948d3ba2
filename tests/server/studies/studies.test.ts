import type { UserModel } from '../../../server/models/User';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let modeller: UserModel;
beforeAll(async () => {
  server = await startTestServer();
  modeller = await buildUser(server.services, ['modeller']);
}, 60_000);
afterAll(() => server.stop());

const BODY = {
  title: 'Lower Veshall',
  clientName: 'Tornick Council',
  place: 'Tornick',
  verticalDatum: 'Local',
  unitSystem: 'metric',
  purpose: 'Levels at the bridge.',
};
const colleague = (roles: Parameters<typeof buildUser>[1]) =>
  buildUser(server.services, roles, { firmId: modeller.firmId });

test('a study is made, read, changed and listed', async () => {
  const api = await server.signInAs(modeller);
  const made = await api.post('/api/studies').send(BODY).expect(201);
  expect(made.body).toMatchObject({ ...BODY, createdBy: modeller.name });
  expect(made.body.counts).toEqual({
    surveyRevision: null,
    surveysWaiting: 0,
    sections: null,
    scenarios: 0,
    runs: 0,
  });
  expect(made.body.may).toEqual(
    expect.arrayContaining(['study.change', 'survey.send', 'run.request']),
  );
  const changed = await api
    .patch(`/api/studies/${made.body.id}`)
    .send({ ...BODY, title: 'Upper Veshall' })
    .expect(200);
  expect(changed.body.title).toBe('Upper Veshall');
  const list = await api.get('/api/studies').expect(200);
  expect(list.body[0]).toMatchObject({
    id: made.body.id,
    title: 'Upper Veshall',
    surveyRevision: null,
    runCount: 0,
  });
});

test('all faults of a body are told', async () => {
  const api = await server.signInAs(modeller);
  const { body } = await api
    .post('/api/studies')
    .send({ unitSystem: 'furlongs', colour: 'red' })
    .expect(422);
  expect(body.error.faults.map(({ path }: { path: string }) => path)).toEqual(
    expect.arrayContaining(['title', 'verticalDatum', 'unitSystem']),
  );
});

test('surveyors and clients see what is shared with them, and little of it', async () => {
  const [surveyor, client, stranger] = await Promise.all([
    colleague(['surveyor']),
    colleague(['client']),
    colleague(['surveyor']),
  ]);
  const study = await buildStudy(server.services, modeller);
  await buildReach(server.services, study);
  await buildMember(server.services, study, surveyor, 'surveyor');
  await buildMember(server.services, study, client, 'client');
  for (const [person, may] of [
    [surveyor, ['study.read', 'survey.read', 'survey.send']],
    [client, ['study.read']],
  ] as const) {
    const api = await server.signInAs(person);
    const { body } = await api.get(`/api/studies/${study.id}`).expect(200);
    expect(body.may).toEqual(may);
    expect(body.counts).toBeNull();
    const list = await api.get('/api/studies').expect(200);
    expect(list.body).toEqual([
      expect.objectContaining({ id: study.id, surveyRevision: null, runCount: null }),
    ]);
    await api.patch(`/api/studies/${study.id}`).send(BODY).expect(403);
    await api.get(`/api/studies/${study.id}/stations`).expect(404);
    await api.get(`/api/studies/${study.id}/reaches`).expect(404);
  }
  const outside = await server.signInAs(stranger);
  await outside.get(`/api/studies/${study.id}`).expect(404);
  expect((await outside.get('/api/studies')).body).toEqual([]);
});

test('another firm sees nothing, and an administrator without an engineer’s role no studies', async () => {
  const study = await buildStudy(server.services, modeller);
  const other = await server.signInAs(
    await buildUser(server.services, ['modeller', 'seniorEngineer']),
  );
  await other.get(`/api/studies/${study.id}`).expect(404);
  await other.patch(`/api/studies/${study.id}`).send(BODY).expect(404);
  await other
    .post(`/api/studies/${study.id}/stations`)
    .send({ name: 'x', chainage: 1 })
    .expect(404);
  expect((await other.get('/api/studies')).body).toEqual([]);
  const administrator = await server.signInAs(await colleague(['administrator']));
  expect((await administrator.get('/api/studies').expect(200)).body).toEqual([]);
  await administrator.get(`/api/studies/${study.id}`).expect(404);
});

test('members are put in, changed and taken out', async () => {
  const api = await server.signInAs(modeller);
  const study = await buildStudy(server.services, modeller);
  const both = await colleague(['surveyor', 'client']);
  const members = `/api/studies/${study.id}/members`;
  const put = await api.put(members).send({ userId: both.id, as: 'surveyor' }).expect(200);
  expect(put.body).toEqual([
    expect.objectContaining({ userId: both.id, name: both.name, as: 'surveyor' }),
  ]);
  const again = await api.put(members).send({ userId: both.id, as: 'client' }).expect(200);
  expect(again.body).toEqual([expect.objectContaining({ as: 'client' })]);
  await api.delete(`${members}/${both.id}`).expect(204);
  await api.delete(`${members}/${both.id}`).expect(404);
  expect((await api.get(members)).body).toEqual([]);
});

test('nobody of another firm, inactive, or without the role becomes a member', async () => {
  const api = await server.signInAs(modeller);
  const study = await buildStudy(server.services, modeller);
  const strangers = [
    await buildUser(server.services, ['surveyor']),
    await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId, active: false }),
    await colleague(['client']),
  ];
  for (const { id: userId } of strangers)
    await api.put(`/api/studies/${study.id}/members`).send({ userId, as: 'surveyor' }).expect(422);
});

test('stations are named places by chainage', async () => {
  const api = await server.signInAs(modeller);
  const study = await buildStudy(server.services, modeller);
  const stations = `/api/studies/${study.id}/stations`;
  await api.post(stations).send({ name: 'Sallow Mill', chainage: 13_100 }).expect(201);
  const bridge = await api
    .post(stations)
    .send({ name: 'Tornick bridge', chainage: 10_600 })
    .expect(201);
  expect((await api.get(stations)).body.map(({ name }: { name: string }) => name)).toEqual([
    'Tornick bridge',
    'Sallow Mill',
  ]);
  const { body } = await api
    .patch(`/api/stations/${bridge.body.id}`)
    .send({ name: 'Old bridge', chainage: 10_610 })
    .expect(200);
  expect(body).toEqual({ id: bridge.body.id, name: 'Old bridge', chainage: 10_610, levels: [] });
  await api.delete(`/api/stations/${bridge.body.id}`).expect(204);
  await api.patch(`/api/stations/${bridge.body.id}`).send({ name: 'x', chainage: 1 }).expect(404);
  await api.post(stations).send({ name: ' ' }).expect(422);
});

test('a study has a bounded number of stations', async () => {
  const api = await server.signInAs(modeller);
  const study = await buildStudy(server.services, modeller);
  await server.services.models.Station.bulkCreate(
    Array.from({ length: 100 }, (_, i) => ({ studyId: study.id, name: `S${i}`, chainage: i })),
  );
  await api
    .post(`/api/studies/${study.id}/stations`)
    .send({ name: 'One more', chainage: 5 })
    .expect(409);
});
