import path from 'node:path';
import pino from 'pino';
import type { TaskSetKind } from '../../../shared/tasks/types';
import { taskDispatcher, type TaskDispatcher } from '../../../server/jobs/tasks/taskDispatcher';
import { taskQueue, type TaskClaim } from '../../../server/jobs/tasks/taskQueue';
import { unpackJson } from '../../../server/database/packedJson';
import type { TaskSetModel } from '../../../server/models/TaskSet';
import type { UserModel } from '../../../server/models/User';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { fakeQueue } from '../jobs/queuedRuns';
import type { FakeMember } from './fakeTaskWorker';

const timing = { beat: 40, lease: 1500 };
const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

let server: TestServer;
let user: UserModel;
let queue: ReturnType<typeof taskQueue>;
let runs: Awaited<ReturnType<typeof fakeQueue>>;
let busyRuns = 0;
const started: TaskDispatcher[] = [];

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  user = await buildUser(server.services, ['modeller']);
  const { sequelize, models } = server.services;
  queue = taskQueue(sequelize, models, timing);
  runs = await fakeQueue(server.services);
});
afterEach(async () => {
  await Promise.all(started.splice(0).map((dispatcher) => dispatcher.stop()));
  const { Run, TaskSet } = server.services.models;
  await TaskSet.destroy({ where: {} });
  await Run.destroy({ where: {} });
  busyRuns = 0;
});
afterAll(() => server.stop());

function start(slots = 1): TaskDispatcher {
  const dispatcher = taskDispatcher({
    queue,
    log: pino({ level: 'silent' }),
    timing,
    slots,
    busyRuns: () => busyRuns,
    gathers: () => true,
    workerFile: path.join(__dirname, 'fakeTaskWorker.ts'),
  });
  dispatcher.start();
  started.push(dispatcher);
  return dispatcher;
}

const adds = (value: number, after = 0): FakeMember => ({ does: 'adds', after, value });
const make = (members: FakeMember[], kind: TaskSetKind = 'ensemble'): Promise<TaskSetModel> =>
  server.services.tasks.create(user, {
    kind,
    name: 'A set',
    settings: {},
    input: { offset: 100 },
    members: members.map((payload, k) => ({ label: `Member ${k + 1}`, payload })),
  });
const tasksOf = () => server.services.tasks;
async function untilEnded(set: TaskSetModel, seconds = 30): Promise<TaskSetModel> {
  for (const until = Date.now() + 1000 * seconds; Date.now() < until; await pause(20)) {
    const now = await tasksOf().find.again(set.id);
    if (now.state !== 'queued' && now.state !== 'running') return now;
  }
  throw new Error('The set has not ended.');
}

test('members are computed, what fails does not spoil the rest, and all is gathered', async () => {
  const set = await make([adds(1), { does: 'fails', after: 0, value: 0 }, adds(3)]);
  const dispatcher = start(2);
  const ended = await untilEnded(set);
  expect(ended.state).toBe('finished');
  // Each has the shared input: 101 + 103.
  expect(await tasksOf().find.result(ended)).toEqual({ sum: 204, failed: 1 });
  expect(await tasksOf().find.counts(ended)).toEqual({
    total: 3,
    finished: 2,
    failed: 1,
    progress: 1,
  });
  const [, failed] = await tasksOf().find.tasks(ended);
  expect(failed).toMatchObject({
    state: 'failed',
    failure: 'The wall of the channel is missing.',
    attempts: 1,
  });

  // The one that failed can be tried again; the others stay, and the result is made anew.
  await tasksOf().change.retry(ended);
  dispatcher.wake();
  const again = await untilEnded(set);
  expect(await tasksOf().find.result(again)).toEqual({ sum: 204, failed: 1 });
  expect((await tasksOf().find.tasks(again)).map(({ attempts }) => attempts)).toEqual([1, 1, 1]);
});

test('a long member that is broken off goes on from what it had kept, as does one that was cancelled', async () => {
  const set = await make([{ does: 'counts', after: 20, value: 60 }]);
  const notesOf = async () => {
    const where = { setId: set.id, part: 'member' as const };
    return (await server.services.models.Task.unscoped().findOne({ where }))!.notes;
  };
  const untilNoted = async (but: Buffer | null) => {
    for (;;) {
      const notes = await notesOf();
      if (notes && !but?.equals(notes)) return notes;
      await pause(20);
    }
  };
  const first = start();
  const noted = await untilNoted(null);
  await first.stop();
  const second = start();
  await untilNoted(noted);
  await tasksOf().change.cancel(set);
  second.cancel(set.id);
  const stopped = await untilEnded(set);
  while ((await tasksOf().find.tasks(set))[0].state === 'running') await pause(20);
  const counted = await unpackJson<number>((await notesOf())!);
  expect(counted).toBeGreaterThan(1);
  await tasksOf().change.retry(stopped);
  second.wake();
  const ended = await untilEnded(set);
  expect(await tasksOf().find.result(ended)).toEqual({ sum: 60 - counted, failed: 0 });
  expect(await notesOf()).toBeNull();
});

test('a set of which no member comes to a result says why', async () => {
  const set = await make([{ does: 'fails', after: 0, value: 0 }]);
  start();
  const { state, failure } = await untilEnded(set);
  expect(state).toBe('failed');
  expect(failure).toContain('The wall of the channel is missing.');
});

test('sets take turns, whatever their size', async () => {
  const long = await make(Array.from({ length: 8 }, (_, k) => adds(k)));
  const short = await make([adds(1), adds(2)], 'sensitivity');
  const order: number[] = [];
  for (let claim = await queue.claim(); claim; claim = await queue.claim()) order.push(claim.setId);
  const [a, b] = [long.id, short.id];
  expect(order).toEqual([a, b, a, b, a, a, a, a, a, a]);
});

test('each task is claimed once, by however many at the same time', async () => {
  await make(Array.from({ length: 10 }, (_, k) => adds(k)));
  const claims = (await Promise.all(Array.from({ length: 25 }, () => queue.claim()))).filter(
    (claim): claim is TaskClaim => claim !== null,
  );
  expect(new Set(claims.map(({ taskId }) => taskId)).size).toBe(claims.length);
  for (let claim = await queue.claim(); claim; claim = await queue.claim()) claims.push(claim);
  expect(new Set(claims.map(({ taskId }) => taskId)).size).toBe(10);
  expect(claims).toHaveLength(10);
});

test('runs go before tasks', async () => {
  const set = await make([adds(1, 200), adds(2)]);
  const { id } = await runs.add({ does: 'routes', after: 0 });
  expect(await queue.claim()).toBeNull();
  await server.services.models.Run.update({ state: 'running' }, { where: { id } });
  busyRuns = 1;
  const dispatcher = start(1);
  await pause(300);
  expect((await tasksOf().find.again(set.id)).state).toBe('queued');
  busyRuns = 0;
  dispatcher.wake();
  expect((await untilEnded(set)).state).toBe('finished');
});

test('cancelled, what waits never begins and what goes on stops; its late result is not kept', async () => {
  const set = await make([
    adds(1),
    adds(2, 60_000),
    adds(3),
    { does: 'isStuck', after: 60_000, value: 0 },
  ]);
  const dispatcher = start(3);
  for (;;) {
    const states = (await tasksOf().find.tasks(set)).map(({ state }) => state);
    if (states.join() === 'finished,running,finished,running') break;
    await pause(20);
  }
  expect((await tasksOf().find.counts(set)).progress).toBeGreaterThanOrEqual(0.5);
  await tasksOf().change.cancel(set);
  dispatcher.cancel(set.id);
  for (let k = 0; k < 200; k++) {
    if (!(await tasksOf().find.tasks(set)).some(({ state }) => state === 'running')) break;
    await pause(20);
  }
  expect((await tasksOf().find.tasks(set)).map(({ state }) => state)).toEqual([
    'finished',
    'cancelled',
    'finished',
    'cancelled',
  ]);
  await expect(tasksOf().find.result(await tasksOf().find.again(set.id))).rejects.toMatchObject({
    code: 'conflict',
  });
  await expect(tasksOf().change.cancel(set)).rejects.toMatchObject({ code: 'conflict' });
});

test('a member whose thread dies three times fails and says so; the others finish', async () => {
  const set = await make([{ does: 'exits', after: 0, value: 0 }, adds(5)]);
  start(1);
  const ended = await untilEnded(set);
  expect(ended.state).toBe('finished');
  const [dead] = await tasksOf().find.tasks(ended);
  expect(dead).toMatchObject({ state: 'failed', attempts: 3 });
  expect(dead.failure).toContain('begun 3 times');
});

test('what a stopped server held is begun again by the next, and counts as not begun', async () => {
  const set = await make([adds(1, 400), adds(2)]);
  const first = start(1);
  while ((await tasksOf().find.tasks(set))[0].state !== 'running') await pause(10);
  await first.stop();
  started.splice(0);
  expect((await tasksOf().find.tasks(set))[0]).toMatchObject({ state: 'queued', attempts: 0 });
  start(1);
  const ended = await untilEnded(set);
  expect(await tasksOf().find.result(ended)).toEqual({ sum: 203, failed: 0 });
});
