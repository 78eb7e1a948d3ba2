import type { ChildProcess } from 'node:child_process';
import { Op } from 'sequelize';
import type { CaseFile } from '../../../shared/case/caseFile';
import type { RunSeries } from '../../../shared/runs/types';
import { routeCase } from '../../../server/solvers';
import type { UserModel } from '../../../server/models/User';
import { buildUser } from '../../helpers/factories/buildUser';
import { killProcess, startServerProcess } from '../../helpers/serverProcess';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from './buildRunnable';
import { readEvents } from './eventReader';
import { untilEnded } from './untilEnded';

jest.setTimeout(300_000);

/** Some seconds of computing: time enough to be killed in the middle. */
const SECONDS_LONG = { cellSize: 10, duration: 100_000, outputInterval: 1000 };

/** Answers the API and computes nothing itself; the work is done by real server processes beside it. */
let server: TestServer;
let user: UserModel;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
const children: ChildProcess[] = [];

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  user = await buildUser(server.services, ['modeller']);
  api = await server.signInAs(user);
});
afterEach(() => Promise.all(children.splice(0).map(killProcess)));
afterAll(() => server.stop());

function startProcess(): ChildProcess {
  const child = startServerProcess(server);
  children.push(child);
  return child;
}

const find = (id: number) => server.services.models.Run.findByPk(id, { rejectOnEmpty: true });
async function untilUnderWay(id: number, attempts = 1): Promise<void> {
  for (;;) {
    const run = await find(id);
    if (run.state === 'running' && run.attempts === attempts && run.progress > 0.02) return;
    if (run.state === 'routed' || run.state === 'failed') throw new Error(`Already ${run.state}.`);
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

/** Kinds and parts of what is stored of a run. */
const stored = async (runId: number) =>
  (
    await server.services.models.RunBlock.findAll({
      where: { runId },
      attributes: ['kind', 'part'],
      order: ['kind', 'part'],
    })
  ).map(({ kind, part }) => `${kind}/${part}`);

test('killed in the middle, the run finishes after the next start, once, with the same bits', async () => {
  const { scenario } = await buildRunnable(server.services, user, SECONDS_LONG);
  const { id } = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body;
  const watching = await readEvents(
    `${server.url}/api/runs/${id}/events`,
    await server.tokenOf(user),
  );
  const first = startProcess();
  await untilUnderWay(id);
  await killProcess(first);
  expect(await find(id)).toMatchObject({ state: 'running', attempts: 1 });
  expect(await stored(id)).toEqual([]);

  startProcess();
  const run = await untilEnded(server.services, id, 240);
  expect(run).toMatchObject({ state: 'routed', attempts: 2, failure: null });

  // Whoever watched, on a server that did not compute it, saw it begin anew and end once.
  await watching.closed;
  const seen = watching.events;
  expect(seen.some((event) => event.type === 'progress' && event.state === 'running')).toBe(true);
  expect(seen.filter((event) => event.type === 'ended')).toEqual([
    { type: 'ended', state: 'routed' },
  ]);

  const blocks = await stored(id);
  expect(new Set(blocks).size).toBe(blocks.length);
  expect(blocks.filter((name) => name.startsWith('series'))).toHaveLength(4);
  expect(blocks.filter((name) => name === 'facts/0' || name === 'places/0')).toHaveLength(2);

  const caseFile: CaseFile = (await api.get(`/api/runs/${id}/case.json`).expect(200)).body;
  const expected = routeCase(caseFile).sections[3];
  const series: RunSeries = (await api.get(`/api/runs/${id}/series?chainage=2000`)).body;
  expect(series.stage).toEqual(expected.stage);
  expect(series.flow).toEqual(expected.flow);
  expect(series.peaks.peakStage).toBe(expected.peak.stage);
});

test('of two servers one dies; the other finishes what it left, and each run once', async () => {
  const { scenario } = await buildRunnable(server.services, user, SECONDS_LONG);
  const ask = async () =>
    (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body.id as number;
  const ids = [await ask(), await ask(), await ask()];
  const doomed = startProcess();
  startProcess();
  // Each computes one at a time: two under way are one in each.
  const underWay = () =>
    server.services.models.Run.count({ where: { state: 'running', progress: { [Op.gt]: 0.02 } } });
  while ((await underWay()) < 2) await new Promise((resolve) => setTimeout(resolve, 20));
  await killProcess(doomed);
  const runs = [];
  for (const id of ids) runs.push(await untilEnded(server.services, id, 240));
  expect(runs.map((run) => run.state)).toEqual(['routed', 'routed', 'routed']);
  expect(runs.map((run) => run.attempts).sort()).toEqual([1, 1, 2]);
  const blocks = await Promise.all(ids.map(stored));
  expect(blocks[1]).toEqual(blocks[0]);
  expect(blocks[2]).toEqual(blocks[0]);
});

test('a run that takes its server down a third time is not begun again, and says why', async () => {
  const { scenario } = await buildRunnable(server.services, user, SECONDS_LONG);
  const { id } = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body;
  for (let attempt = 1; attempt <= 3; attempt++) {
    const child = startProcess();
    await untilUnderWay(id, attempt);
    await killProcess(child);
    // The lease of the dead need not be waited out three times.
    await server.services.models.Run.update({ leaseUntil: new Date(0) }, { where: { id } });
  }
  startProcess();
  const run = await untilEnded(server.services, id, 60);
  expect(run).toMatchObject({ state: 'failed', attempts: 3 });
  expect(run.failure).toContain('begun 3 times');
  expect(run.failure).toContain('the server stopped while it was running');
  expect(await stored(id)).toEqual([]);
});
