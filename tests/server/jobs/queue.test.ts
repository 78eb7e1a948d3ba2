import { runQueue, type Claim, type Ending } from '../../../server/jobs/queue';
import { recoverExpired } from '../../../server/jobs/recovery';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { fakeQueue } from './queuedRuns';

const timing = { beat: 50, lease: 400 };
const routes = { does: 'routes', after: 0 } as const;
const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

let server: TestServer;
let runs: Awaited<ReturnType<typeof fakeQueue>>;
let queue: ReturnType<typeof runQueue>;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  runs = await fakeQueue(server.services);
  queue = runQueue(server.services.sequelize, server.services.models, timing);
});
afterAll(() => server.stop());
beforeEach(() => server.services.models.Run.destroy({ where: {} }));

const reload = async (id: number) => (await server.services.models.Run.findByPk(id))!;
const blockCount = (runId: number) => server.services.models.RunBlock.count({ where: { runId } });
const block = { kind: 'facts', part: 0, bytes: new Uint8Array([1, 2, 3]) } as const;
const routed: Ending = {
  state: 'routed',
  blocks: [block],
  solver: '1.0.1',
  peakStage: 1,
  peakFlow: 2,
};

test('many claimers at once take each run exactly once, the oldest first', async () => {
  for (let k = 0; k < 12; k++) await runs.add(routes);
  const rivals = Array.from({ length: 30 }, () => queue.claim());
  const claims = (await Promise.all(rivals)).filter((claim): claim is Claim => claim !== null);
  expect(claims).toHaveLength(12);
  expect(new Set(claims.map((claim) => claim.runId)).size).toBe(12);
  expect(new Set(claims.map((claim) => claim.token)).size).toBe(12);
  expect(await queue.claim()).toBeNull();

  const [first, second] = [await runs.add(routes), await runs.add(routes)];
  expect((await queue.claim())!.runId).toBe(first.id);
  expect((await queue.claim())!.runId).toBe(second.id);
});

test('a claim waits for no row that another transaction holds', async () => {
  const [first, second] = [await runs.add(routes), await runs.add(routes)];
  await server.services.sequelize.transaction(async (transaction) => {
    await server.services.models.Run.findByPk(first.id, { lock: true, transaction });
    expect((await queue.claim())!.runId).toBe(second.id);
  });
});

test('a lease that is renewed holds; one that is not runs out, and its run is queued again', async () => {
  const { id } = await runs.add(routes);
  const claim = (await queue.claim())!;
  for (let k = 0; k < 4; k++) {
    await pause(150);
    expect(await queue.renew(claim, 0.1 * k, 5)).toBe('held');
    expect(await recoverExpired(queue, server.services.models)).toEqual([]);
  }
  expect((await reload(id)).progress).toBeCloseTo(0.3);
  await pause(500);
  expect(await recoverExpired(queue, server.services.models)).toEqual([
    { runId: id, state: 'queued', failure: null },
  ]);
  expect(await queue.renew(claim, 0.5, 1)).toBe('lost');
  expect((await queue.claim())!.attempts).toBe(2);
});

test('only who holds the claim can store results, once', async () => {
  const { id } = await runs.add(routes);
  const stale = (await queue.claim())!;
  await pause(500);
  await recoverExpired(queue, server.services.models);
  const claim = (await queue.claim())!;
  expect(await queue.finish(stale, routed)).toBe(false);
  expect(await blockCount(id)).toBe(0);
  const rivals = await Promise.all([queue.finish(claim, routed), queue.finish(claim, routed)]);
  expect(rivals.filter(Boolean)).toHaveLength(1);
  expect(await blockCount(id)).toBe(1);
  const run = await reload(id);
  expect(run).toMatchObject({
    state: 'routed',
    solverVersion: '1.0.1',
    peakStage: 1,
    leaseOwner: null,
  });
  expect(run.finishedAt).toBeInstanceOf(Date);
});

test('results that cannot be stored whole leave nothing behind', async () => {
  const { id } = await runs.add(routes);
  const claim = (await queue.claim())!;
  const twice: Ending = { ...routed, blocks: [block, block] };
  await expect(queue.finish(claim, twice)).rejects.toThrow();
  expect(await blockCount(id)).toBe(0);
  expect((await reload(id)).state).toBe('running');
});

test('a cancel that comes while a run finishes still counts', async () => {
  const run = await runs.add(routes);
  const claim = (await queue.claim())!;
  await run.update({ cancelRequested: true });
  expect(await queue.renew(claim, 0.9, 1)).toBe('cancelRequested');
  expect(await queue.finish(claim, routed)).toBe(true);
  expect(await reload(run.id)).toMatchObject({ state: 'cancelled' });
  expect(await blockCount(run.id)).toBe(0);
});

test('a run that breaks off a third time fails and says why', async () => {
  const { id } = await runs.add(routes);
  for (let attempt = 1; attempt <= 3; attempt++) {
    const claim = (await queue.claim())!;
    expect(claim.attempts).toBe(attempt);
    await queue.abandon(claim, 'the power went out');
    const [recovered] = await recoverExpired(queue, server.services.models);
    expect(recovered.state).toBe(attempt < 3 ? 'queued' : 'failed');
  }
  expect(await queue.claim()).toBeNull();
  const run = await reload(id);
  expect(run.state).toBe('failed');
  expect(run.failure).toContain('begun 3 times');
  expect(run.failure).toContain('the power went out');
  expect(run.finishedAt).not.toBeNull();
});

test('a run put back by a server that stops in order does not count as begun', async () => {
  const { id } = await runs.add(routes);
  await queue.release((await queue.claim())!);
  expect(await reload(id)).toMatchObject({ state: 'queued', attempts: 0, leaseOwner: null });
});

test('a run that was to be cancelled when its server died is cancelled', async () => {
  const run = await runs.add(routes);
  const claim = (await queue.claim())!;
  await run.update({ cancelRequested: true });
  await queue.abandon(claim, 'the server stopped');
  expect(await recoverExpired(queue, server.services.models)).toMatchObject([
    { state: 'cancelled' },
  ]);
});
