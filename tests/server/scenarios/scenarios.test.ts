import type { ScenarioBody } from '../../../shared/scenarios/schemas';
import type { ReachModel } from '../../../server/models/Reach';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let modeller: UserModel;
let study: StudyModel;
let reach: ReachModel;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  modeller = await buildUser(server.services, ['modeller']);
  study = await buildStudy(server.services, modeller);
  reach = await buildReach(server.services, study);
}, 60_000);
afterAll(() => server.stop());

const asModeller = () => server.signInAs(modeller);
const create = async (name = 'Flood') =>
  (
    await (
      await asModeller()
    )
      .post(`/api/studies/${study.id}/scenarios`)
      .send({ name, reachId: reach.id })
      .expect(201)
  ).body;
const flood: ScenarioBody['upstream'] = {
  kind: 'generated',
  shape: 'nrcs',
  baseFlow: 10,
  peakFlow: 60,
  timeToPeak: 7200,
  recessionRatio: null,
  gammaExponent: null,
};

test('a new scenario starts from what fits the reach, and tells what is missing', async () => {
  const made = await create();
  expect(made).toMatchObject({
    name: 'Flood',
    reachId: reach.id,
    version: 1,
    peakInflow: null,
    faultCount: 3,
    runCount: 0,
  });
  expect(made.body.downstream).toEqual({ kind: 'normalDepth', slope: 0.001 });
  expect(made.body.numerics).toMatchObject({ cellSize: made.proposals.cellSize, order: 2 });
  expect(made.faults.map(({ path }: { path: string }) => path)).toEqual([
    'upstream.baseFlow',
    'upstream.peakFlow',
    'upstream.timeToPeak',
  ]);
});

test('it is stored as it is, complete or not, and comes back the same', async () => {
  const api = await asModeller();
  const made = await create();
  const body = {
    ...made.body,
    name: '1 in 100 year',
    upstream: flood,
    startsAt: '2026-11-14T00:00:00.000Z',
  };
  const saved = await api.put(`/api/scenarios/${made.id}`).send({ version: 1, body }).expect(200);
  expect(saved.body).toMatchObject({
    name: '1 in 100 year',
    version: 2,
    peakInflow: 60,
    faultCount: 0,
    faults: [],
  });
  expect(saved.body.body).toEqual(body);
  const incomplete = { ...body, downstream: { kind: 'normalDepth', slope: null } };
  const again = await api
    .put(`/api/scenarios/${made.id}`)
    .send({ version: 2, body: incomplete })
    .expect(200);
  expect(again.body.faults).toEqual([
    { path: 'downstream.slope', message: 'Give the slope at the outlet.' },
  ]);
  const list = (await api.get(`/api/studies/${study.id}/scenarios`)).body;
  expect(list[0]).toMatchObject({ id: made.id, faultCount: 1, peakInflow: 60 });
});

test('saving on an older version is a conflict', async () => {
  const api = await asModeller();
  const made = await create();
  const send = () => api.put(`/api/scenarios/${made.id}`).send({ version: 1, body: made.body });
  const statuses = (await Promise.all([send(), send()])).map(({ status }) => status);
  expect(statuses.sort()).toEqual([200, 409]);
});

test('shapes that are none are refused', async () => {
  const api = await asModeller();
  const made = await create();
  for (const [change, path] of [
    [{ upstream: { kind: 'tsunami' } }, 'body.upstream'],
    [{ upstream: { ...flood, peakFlow: 'much' } }, 'body.upstream.peakFlow'],
    [{ name: ' ' }, 'body.name'],
    [{ initial: undefined }, 'body.initial'],
    [{ downstream: null }, 'body.downstream'],
    [{ numerics: { ...made.body.numerics, order: 3 } }, 'body.numerics.order'],
  ] as const) {
    const { body } = await api
      .put(`/api/scenarios/${made.id}`)
      .send({ version: 1, body: { ...made.body, ...change } })
      .expect(422);
    expect(body.error.faults.map((fault: { path: string }) => fault.path)).toContain(path);
  }
});

test('the reach is one of the study', async () => {
  const api = await asModeller();
  const elsewhere = await buildReach(server.services, await buildStudy(server.services, modeller));
  await api
    .post(`/api/studies/${study.id}/scenarios`)
    .send({ name: 'Flood', reachId: elsewhere.id })
    .expect(422);
  const made = await create();
  const body = { ...made.body, reachId: elsewhere.id };
  const refused = await api.put(`/api/scenarios/${made.id}`).send({ version: 1, body }).expect(422);
  expect(refused.body.error.faults[0].path).toBe('body.reachId');
});

test('a copy stands on its own', async () => {
  const api = await asModeller();
  const original = await buildScenario(server.services, reach);
  const copy = await api
    .post(`/api/scenarios/${original.id}/duplicate`)
    .send({ name: 'A fifth more' })
    .expect(201);
  expect(copy.body).toMatchObject({ name: 'A fifth more', version: 1, runCount: 0 });
  expect(copy.body.body).toEqual({ ...original.body, name: 'A fifth more' });
  await api.delete(`/api/scenarios/${copy.body.id}`).expect(204);
  await api.get(`/api/scenarios/${copy.body.id}`).expect(404);
  await api.get(`/api/scenarios/${original.id}`).expect(200);
});

test('one that was run stays', async () => {
  const api = await asModeller();
  const scenario = await buildScenario(server.services, reach);
  await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201);
  expect((await api.get(`/api/scenarios/${scenario.id}`)).body.runCount).toBe(1);
  const { body } = await api.delete(`/api/scenarios/${scenario.id}`).expect(409);
  expect(body.error.message).toMatch(/has a run/);
});

test('surveyors, clients and other firms see no scenario', async () => {
  const scenario = await buildScenario(server.services, reach);
  const people = [
    await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId }),
    await buildUser(server.services, ['client'], { firmId: modeller.firmId }),
    await buildUser(server.services, ['modeller']),
  ];
  await buildMember(server.services, study, people[0], 'surveyor');
  await buildMember(server.services, study, people[1], 'client');
  for (const person of people) {
    const api = await server.signInAs(person);
    await api.get(`/api/studies/${study.id}/scenarios`).expect(404);
    await api.get(`/api/scenarios/${scenario.id}`).expect(404);
    await api
      .put(`/api/scenarios/${scenario.id}`)
      .send({ version: 1, body: scenario.body })
      .expect(404);
    await api.post(`/api/scenarios/${scenario.id}/duplicate`).send({ name: 'x' }).expect(404);
    await api.delete(`/api/scenarios/${scenario.id}`).expect(404);
  }
});
