import type { RunComparison } from '../../../shared/comparison/types';
import type { RunSummary } from '../../../shared/runs/types';
import type { Scenario } from '../../../shared/scenarios/types';
import type { UserModel } from '../../../server/models/User';
import { buildMember } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let modeller: UserModel;
let studyId: number;
let scenarioId: number;
let runIds: number[];

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  const { services } = server;
  modeller = await buildUser(services, ['modeller']);
  api = await server.signInAs(modeller);
  const { study, scenario } = await buildRunnable(services, modeller);
  [studyId, scenarioId] = [study.id, scenario.id];
  services.runs.start();
  const copy = await api
    .post(`/api/scenarios/${scenario.id}/duplicate`)
    .send({ name: 'A fifth more', change: { kind: 'inflow', value: 1.2 } })
    .expect(201);
  runIds = [];
  for (const id of [scenario.id, (copy.body as Scenario).id]) {
    const { body } = await api.post(`/api/scenarios/${id}/runs`).expect(201);
    await untilEnded(services, body.id);
    runIds.push(body.id);
  }
});
afterAll(() => server.stop());

const compare = (runs: string) => api.get(`/api/studies/${studyId}/comparison`).query({ runs });

test('a copy is made with its change, or not at all', async () => {
  await api
    .post(`/api/scenarios/${scenarioId}/duplicate`)
    .send({ name: 'x', change: { kind: 'inflow', value: 0 } })
    .expect(422);
  await api
    .post(`/api/scenarios/${scenarioId}/duplicate`)
    .send({ name: 'x', change: { kind: 'weather', value: 2 } })
    .expect(422);
  const { body } = await api.post(`/api/scenarios/${scenarioId}/duplicate`).send({ name: 'Plain' });
  const plain: Scenario = body;
  expect(plain.body.upstream).toMatchObject({ flows: [20, 120, 30, 20] });
});

test('runs side by side: peaks of each at every place, and which inputs differ', async () => {
  const { body } = await compare(runIds.join(',')).expect(200);
  const comparison: RunComparison = body;
  expect(comparison.runs.map(({ scenarioName }) => scenarioName)).toEqual([
    '1 in 100 year',
    'A fifth more',
  ]);
  expect(comparison.sameReach).toBe(true);
  expect(comparison.differences.map(({ part, what }) => `${part}, ${what}`)).toEqual([
    'Inflow, peak',
    'Inflow, first value',
    'Inflow, table',
  ]);
  expect(comparison.differences[0].values).toEqual(['120 m³/s', '144 m³/s']);
  const mill = comparison.places.find(({ name }) => name === 'Mill')!;
  const summaries: RunSummary[] = await Promise.all(
    runIds.map(async (id) => (await api.get(`/api/runs/${id}/summary`)).body),
  );
  summaries.forEach(({ stations }, i) => {
    const { stationId: _, name: __, ...peaks } = stations.find(({ name }) => name === 'Mill')!;
    expect(mill.peaks[i]).toEqual(peaks);
  });
  expect(mill.peaks[1]!.peakStage).toBeGreaterThan(mill.peaks[0]!.peakStage);
});

test('refuses one run, five, the same twice, and those of another study or firm', async () => {
  const [a, b] = runIds;
  for (const runs of [`${a}`, `${a},${a}`, `${a},${b},3,4,5`, `${a},x`, `${a},999999`])
    await compare(runs).expect(422);
  const stranger = await server.signInAs(await buildUser(server.services, ['modeller']));
  await stranger
    .get(`/api/studies/${studyId}/comparison`)
    .query({ runs: `${a},${b}` })
    .expect(404);
});

test('is for engineers of the firm: to all others the study has no such thing', async () => {
  const { firmId } = modeller;
  const senior = await buildUser(server.services, ['seniorEngineer'], { firmId });
  const of = { query: { runs: runIds.join(',') }, path: `/api/studies/${studyId}/comparison` };
  const theirs = await (await server.signInAs(senior)).get(of.path).query(of.query).expect(200);
  expect((theirs.body as RunComparison).runs.map(({ id }) => id)).toEqual(runIds);
  const study = await server.services.models.Study.findByPk(studyId, { rejectOnEmpty: true });
  for (const role of ['client', 'surveyor', 'administrator'] as const) {
    const user = await buildUser(server.services, [role], { firmId });
    if (role !== 'administrator') await buildMember(server.services, study, user, role);
    await (await server.signInAs(user)).get(of.path).query(of.query).expect(404);
  }
  await server.request.get(of.path).query(of.query).expect(401);
});

test('a run of another study is refused as one that is not there; one without results as such', async () => {
  const { services } = server;
  const [a] = runIds;
  const other = await buildRunnable(services, modeller);
  const foreign = await api.post(`/api/scenarios/${other.scenario.id}/runs`).expect(201);
  await untilEnded(services, foreign.body.id);
  const [theirs, none] = await Promise.all([
    compare(`${a},${foreign.body.id}`).expect(422),
    compare(`${a},999999`).expect(422),
  ]);
  expect(theirs.body.error.faults).toEqual(none.body.error.faults);

  const run = await services.models.Run.findByPk(runIds[1], { rejectOnEmpty: true });
  await run.update({ state: 'failed' });
  const refused = await compare(runIds.join(',')).expect(409);
  expect(refused.body.error.message).toContain(`Run ${run.number} has no results`);
  await run.update({ state: 'routed' });
});

test('what differs is told in the units of the study; the numbers stay SI', async () => {
  const metric: RunComparison = (await compare(runIds.join(',')).expect(200)).body;
  const { Study } = server.services.models;
  const study = await Study.findByPk(studyId, { rejectOnEmpty: true });
  await study.update({ unitSystem: 'usCustomary' });
  const us: RunComparison = (await compare(runIds.join(',')).expect(200)).body;
  await study.update({ unitSystem: 'metric' });
  // 120 and 144 m³/s over 0.3048³ m³ a cubic foot.
  expect(us.differences[0].values).toEqual(['4,238 ft³/s', '5,085 ft³/s']);
  expect(us.places).toEqual(metric.places);
});
