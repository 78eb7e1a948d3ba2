import type { Run } from '../../../shared/runs/types';
import type { UserModel } from '../../../server/models/User';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable, scenarioBody } from './buildRunnable';
import { readEvents } from './eventReader';
import { untilEnded } from './untilEnded';

jest.setTimeout(120_000);

/** Numerics that keep a worker busy for long. */
const LONG = { cellSize: 2, duration: 864_000, outputInterval: 600 };

let server: TestServer;
let user: UserModel;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let token: string;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  user = await buildUser(server.services, ['modeller']);
  api = await server.signInAs(user);
  token = await server.tokenOf(user);
});
afterAll(() => server.stop());

const ask = async (scenarioId: number): Promise<Run> =>
  (await api.post(`/api/scenarios/${scenarioId}/runs`).expect(201)).body;
const events = (runId: number, as = token) =>
  readEvents(`${server.url}/api/runs/${runId}/events`, as);
const get = async (runId: number): Promise<Run> =>
  (await api.get(`/api/runs/${runId}`).expect(200)).body;
async function until(met: () => boolean | Promise<boolean>): Promise<void> {
  while (!(await met())) await new Promise((resolve) => setTimeout(resolve, 20));
}

test('many requests at once are numbered one after another', async () => {
  const { scenario } = await buildRunnable(server.services, user);
  const runs = await Promise.all(Array.from({ length: 8 }, () => ask(scenario.id)));
  expect(runs.map((run) => run.number).sort()).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
  const other = await buildRunnable(server.services, user);
  expect((await ask(other.scenario.id)).number).toBe(1);
  await server.services.models.Run.destroy({ where: {} });
});

test('a scenario with faults is refused with each of them, and nothing is queued', async () => {
  const { scenario, study } = await buildRunnable(server.services, user);
  const body = scenarioBody(scenario.reachId, { duration: null });
  await scenario.update({ body: { ...body, downstream: { kind: 'normalDepth', slope: null } } });
  const { error } = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(422)).body;
  expect(error.code).toBe('scenarioIncomplete');
  const paths = error.faults.map((fault: { path: string }) => fault.path);
  expect(paths).toEqual(expect.arrayContaining(['downstream.slope', 'numerics.duration']));
  expect((await api.get(`/api/studies/${study.id}/runs`)).body).toEqual([]);
});

test('a scenario that is deleted while its run is asked for is a conflict, and nothing is queued', async () => {
  const { scenario, study } = await buildRunnable(server.services, user);
  const { models, runs } = server.services;
  await models.Scenario.destroy({ where: { id: scenario.id } });
  await expect(runs.request(user, scenario)).rejects.toMatchObject({ code: 'conflict' });
  expect(await models.Run.count({ where: { studyId: study.id } })).toBe(0);
});

test('the inputs of a run are frozen: what is changed later does not reach it', async () => {
  const { scenario, reach } = await buildRunnable(server.services, user);
  const run = await ask(scenario.id);
  const before = (await api.get(`/api/runs/${run.id}/case.json`)).text;
  await scenario.update({ body: scenarioBody(reach.id, { cellSize: 10 }), name: 'Changed' });
  const again = await ask(scenario.id);
  expect(again.caseHash).not.toBe(run.caseHash);
  expect((await api.get(`/api/runs/${run.id}/case.json`)).text).toBe(before);
  expect((await get(run.id)).scenarioName).toBe('1 in 100 year');
  await server.services.models.Run.destroy({ where: {} });
});

test('a queued run is cancelled at once, tried again, and then routed', async () => {
  const { scenario } = await buildRunnable(server.services, user);
  const { id } = await ask(scenario.id);
  await api.get(`/api/runs/${id}/summary`).expect(409);
  await api.post(`/api/runs/${id}/retry`).expect(409);

  const watching = await events(id);
  await until(() => watching.events.length > 0);
  expect(watching.events[0]).toMatchObject({ type: 'progress', state: 'queued', progress: 0 });
  const cancelled: Run = (await api.post(`/api/runs/${id}/cancel`).expect(200)).body;
  expect(cancelled).toMatchObject({ state: 'cancelled', may: ['run.read', 'run.retry'] });
  await watching.closed;
  expect(watching.events[watching.events.length - 1]).toEqual({
    type: 'ended',
    state: 'cancelled',
  });
  await api.post(`/api/runs/${id}/cancel`).expect(409);

  const queued: Run = (await api.post(`/api/runs/${id}/retry`).expect(200)).body;
  expect(queued).toMatchObject({
    state: 'queued',
    attempts: 0,
    finishedAt: null,
    caseHash: cancelled.caseHash,
    may: ['run.read', 'run.cancel'],
  });
  server.services.runs.start();
  expect((await untilEnded(server.services, id)).state).toBe('routed');
  await api.post(`/api/runs/${id}/retry`).expect(409);
});

test('while it computes the water moves on the screen; a cancel ends it within a second', async () => {
  const { scenario } = await buildRunnable(server.services, user, LONG);
  const { id } = await ask(scenario.id);
  const watching = await events(id);
  expect(watching.status).toBe(200);
  expect(watching.headers.get('content-type')).toMatch('text/event-stream');
  expect(watching.headers.get('content-encoding')).toBeNull();

  const surfaces = () =>
    watching.events.flatMap((e) => (e.type === 'progress' && e.surface ? [e.surface] : []));
  await until(() => surfaces().length >= 3);
  const [first] = surfaces();
  expect(first.chainages.length).toBeLessThanOrEqual(300);
  expect(first.stage).toHaveLength(first.chainages.length);
  first.stage.forEach((stage, k) => expect(stage).toBeGreaterThanOrEqual(first.bed[k]));
  expect(surfaces().map((s) => s.stage.join())).not.toEqual(
    surfaces().map(() => first.stage.join()),
  );
  const progress = watching.events.flatMap((e) => (e.type === 'progress' ? [e.progress] : []));
  expect(progress).toEqual([...progress].sort((a, b) => a - b));
  const seconds = (watching.at[watching.at.length - 1] - watching.at[0]) / 1000;
  expect(surfaces().length).toBeLessThanOrEqual(4 * seconds + 3);

  // Who comes later sees the picture at once, and is told of the end as well.
  const late = await events(id);
  await until(() => late.events.length > 0);
  expect(late.events[0]).toMatchObject({ type: 'progress', state: 'running' });
  expect(late.events[0].type === 'progress' && late.events[0].surface).toBeTruthy();
  expect(server.services.runs.watchers()).toBe(2);

  const asked = Date.now();
  await api.post(`/api/runs/${id}/cancel`).expect(200);
  await Promise.all([watching.closed, late.closed]);
  expect(Date.now() - asked).toBeLessThan(1000);
  for (const { events: seen } of [watching, late]) {
    expect(seen.filter((event) => event.type === 'ended')).toHaveLength(1);
    expect(seen[seen.length - 1]).toMatchObject({ type: 'ended', state: 'cancelled' });
  }
  expect(await get(id)).toMatchObject({ state: 'cancelled' });
  await until(() => server.services.runs.watchers() === 0);
});

test('a run that has ended says so at once and closes', async () => {
  const { scenario } = await buildRunnable(server.services, user);
  const { id } = await ask(scenario.id);
  await untilEnded(server.services, id);
  const watching = await events(id);
  await watching.closed;
  expect(watching.events).toEqual([{ type: 'ended', state: 'routed' }]);
});

test('who goes away is forgotten; whose sign-in ends is shown no more', async () => {
  const { scenario } = await buildRunnable(server.services, user, LONG);
  const { id } = await ask(scenario.id);
  const leaving = await events(id);
  await until(() => leaving.events.length > 0);
  leaving.close();
  await until(() => server.services.runs.watchers() === 0);

  const colleague = await buildUser(server.services, ['modeller'], { firmId: user.firmId });
  const watching = await events(id, await server.tokenOf(colleague));
  await until(() => watching.events.length > 0);
  await colleague.update({ active: false });
  await watching.closed;
  expect(watching.events.filter((event) => event.type === 'ended')).toEqual([]);
  await until(() => server.services.runs.watchers() === 0);
  await api.post(`/api/runs/${id}/cancel`).expect(200);
  expect((await untilEnded(server.services, id)).state).toBe('cancelled');
});

test('a run that the solver gives up fails in words, without a second attempt', async () => {
  // Thirty years in steps of a hundredth of a second: the solver sees that it would not end.
  const endless = { cellSize: 0.5, duration: 9e8, outputInterval: 1e6 };
  const { scenario, reach } = await buildRunnable(server.services, user);
  const body = { ...scenarioBody(reach.id, endless), initial: { kind: 'still', stage: 21 } };
  await scenario.update({ body: body as typeof scenario.body });
  const { id } = await ask(scenario.id);
  const watching = await events(id);
  await watching.closed;
  const run = await get(id);
  expect(run).toMatchObject({ state: 'failed', attempts: 1, may: ['run.read', 'run.retry'] });
  expect(run.failure).toMatch(/^The run failed.* at \d+\.\d s: ./);
  expect(watching.events[watching.events.length - 1]).toEqual({
    type: 'ended',
    state: 'failed',
  });
  const { error } = (await api.get(`/api/runs/${id}/summary`).expect(409)).body;
  expect(error.message).toContain('has no results');
});
