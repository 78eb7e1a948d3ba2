import path from 'node:path';
import pino from 'pino';
import type { RunEvent } from '../../../shared/runs/types';
import { runDispatcher, type RunDispatcher } from '../../../server/jobs/dispatcher';
import { progressHub } from '../../../server/jobs/progressHub';
import { runQueue } from '../../../server/jobs/queue';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { fakeQueue } from './queuedRuns';

const timing = { beat: 100, lease: 3000 };
const workerFile = path.join(__dirname, 'fakeRunWorker.ts');

let server: TestServer;
let runs: Awaited<ReturnType<typeof fakeQueue>>;
const dispatchers: RunDispatcher[] = [];
const hub = progressHub();

/** A server process as far as the queue is concerned. */
function startDispatcher(slots = 2): RunDispatcher {
  const { sequelize, models } = server.services;
  const queue = runQueue(sequelize, models, timing);
  const log = pino({ level: 'silent' });
  const dispatcher = runDispatcher({ queue, models, hub, log, timing, slots, workerFile });
  dispatchers.push(dispatcher);
  dispatcher.start();
  return dispatcher;
}

const reload = async (id: number) => (await server.services.models.Run.findByPk(id))!;
async function until(id: number, states: string[], seconds = 20) {
  const deadline = Date.now() + 1000 * seconds;
  for (;;) {
    const run = await reload(id);
    if (states.includes(run.state)) return run;
    if (Date.now() > deadline) throw new Error(`Run ${id} is still ${run.state}.`);
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

jest.setTimeout(60_000);
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  runs = await fakeQueue(server.services);
});
afterEach(async () => {
  await Promise.all(dispatchers.splice(0).map((dispatcher) => dispatcher.stop()));
  await server.services.models.Run.destroy({ where: {} });
});
afterAll(() => server.stop());

test('a run is taken, watched and stored; its events come in order and end once', async () => {
  const run = await runs.add({ does: 'routes', after: 600 });
  const events: RunEvent[] = [];
  hub.subscribe(run.id, (event) => events.push(event));
  startDispatcher();
  const done = await until(run.id, ['routed']);
  expect(done).toMatchObject({ attempts: 1, progress: 1, peakStage: 4, peakFlow: 5 });
  await new Promise((resolve) => setTimeout(resolve, 300));
  const progress = events.flatMap((event) => (event.type === 'progress' ? [event.progress] : []));
  expect(progress.length).toBeGreaterThan(5);
  expect(progress).toEqual([...progress].sort((a, b) => a - b));
  expect(events.filter((event) => event.type === 'ended')).toEqual([
    { type: 'ended', state: 'routed' },
  ]);
  expect(events[events.length - 1].type).toBe('ended');
  expect(hub.latest(run.id)).toBeNull();
});

test('no more runs go on at once than there are slots, and all are finished once by two servers', async () => {
  const ids: number[] = [];
  for (let k = 0; k < 8; k++) ids.push((await runs.add({ does: 'routes', after: 300 })).id);
  startDispatcher(2);
  startDispatcher(1);
  let most = 0;
  for (const id of ids) {
    most = Math.max(most, await server.services.models.Run.count({ where: { state: 'running' } }));
    expect(await until(id, ['routed'], 40)).toMatchObject({ attempts: 1 });
  }
  expect(most).toBeGreaterThan(1);
  expect(most).toBeLessThanOrEqual(3);
  expect(await server.services.models.RunBlock.count()).toBe(8);
});

test('a failure of the computation is final and says where, when and why', async () => {
  const run = await runs.add({ does: 'fails', after: 0 });
  startDispatcher();
  const failed = await until(run.id, ['failed']);
  expect(failed.attempts).toBe(1);
  expect(failed.failure).toBe('The run failed at chainage 10.0 m at 5.0 s: too steep.');
});

test.each(['throws', 'exits'] as const)(
  'a worker that %s is begun again at most twice, then the run fails in words',
  async (does) => {
    const run = await runs.add({ does, after: 0 });
    startDispatcher();
    const failed = await until(run.id, ['failed'], 50);
    expect(failed.attempts).toBe(3);
    const why = {
      throws: 'a fault in the program',
      exits: 'its thread ended with code 7',
    };
    expect(failed.failure).toContain(why[does]);
  },
);

test.each(['routes', 'isStuck'] as const)(
  'a cancel ends a run that %s within a second',
  async (does) => {
    const run = await runs.add({ does, after: 30_000 });
    const dispatcher = startDispatcher();
    await until(run.id, ['running']);
    await new Promise((resolve) => setTimeout(resolve, 800));
    const asked = Date.now();
    await run.update({ cancelRequested: true });
    dispatcher.cancel(run.id);
    await until(run.id, ['cancelled']);
    expect(Date.now() - asked).toBeLessThan(1000);
  },
);

test('a cancel asked of another server is seen at the next beat', async () => {
  const run = await runs.add({ does: 'routes', after: 30_000 });
  startDispatcher();
  await until(run.id, ['running']);
  const asked = Date.now();
  await run.update({ cancelRequested: true });
  await until(run.id, ['cancelled']);
  expect(Date.now() - asked).toBeLessThan(1000);
});

test('a run that was given to another server is stopped here and left alone', async () => {
  const run = await runs.add({ does: 'routes', after: 30_000 });
  startDispatcher();
  await until(run.id, ['running']);
  const leaseUntil = new Date(Date.now() + 3_600_000);
  await run.update({ leaseOwner: 'another', leaseUntil });
  const deadline = Date.now() + 5000;
  while (hub.latest(run.id) && Date.now() < deadline) {
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
  expect(hub.latest(run.id)).toBeNull();
  expect(await reload(run.id)).toMatchObject({ state: 'running', leaseOwner: 'another' });
});

test('results that cannot be stored are said to be so, after three attempts', async () => {
  const run = await runs.add({ does: 'routesTwice', after: 0 });
  startDispatcher();
  const failed = await until(run.id, ['failed'], 55);
  expect(failed.attempts).toBe(3);
  expect(failed.failure).toContain('could not be stored in the database');
  expect(await server.services.models.RunBlock.count({ where: { runId: run.id } })).toBe(0);
});

test('a server that stops in order puts its runs back; the next one finishes them', async () => {
  const run = await runs.add({ does: 'routes', after: 1500 });
  const first = startDispatcher();
  await until(run.id, ['running']);
  await first.stop();
  expect(await reload(run.id)).toMatchObject({ state: 'queued', attempts: 0 });
  startDispatcher();
  expect(await until(run.id, ['routed'])).toMatchObject({ attempts: 1 });
});
