import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { startWorker } from '../../../server/jobs/startWorker';
import type { FakeCase } from './fakeRunWorker';

jest.setTimeout(60_000);
const file = path.join(__dirname, 'fakeRunWorker.ts');
const start = (fake: FakeCase, heapMegabytes?: number) =>
  startWorker(file, gzipSync(JSON.stringify(fake)), () => {}, heapMegabytes);

test('a worker that needs too much memory ends alone, and says so', async () => {
  const { outcome } = start({ does: 'eatsMemory', after: 0 }, 48);
  expect(await outcome).toEqual({
    type: 'broken',
    why: 'it needed more memory than a run may take',
  });
});

test('a worker file that does not start breaks its run, not the server', async () => {
  const { outcome } = startWorker(path.join(__dirname, 'missing.js'), gzipSync('{}'), () => {});
  expect(await outcome).toMatchObject({ type: 'broken' });
});

test('a worker that is killed has not told how the run ended', async () => {
  const worker = start({ does: 'isStuck', after: 30_000 });
  await worker.kill();
  expect(await worker.outcome).toMatchObject({ type: 'broken' });
});

test('a cancel before the thread has begun still cancels', async () => {
  const worker = start({ does: 'routes', after: 30_000 });
  worker.cancel();
  worker.cancel();
  expect(await worker.outcome).toEqual({ type: 'cancelled' });
});
