import type { Review } from '../../../shared/review/types';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  server.services.runs.start();
});
afterAll(() => server.stop());

test('a second run with a changed outlet is routed, and its effect stands in the checklist', async () => {
  const user = await buildUser(server.services, ['modeller']);
  const api = await server.signInAs(user);
  const { scenario } = await buildRunnable(server.services, user);
  const asked = await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201);
  const base = `/api/runs/${asked.body.id}/review`;
  await untilEnded(server.services, asked.body.id);
  const item = (review: Review) => review.checklist.find(({ id }) => id === 'outletInfluence')!;
  const probing: Review = (await api.post(`${base}/outlet-probe`).expect(200)).body;
  await api.post(`${base}/outlet-probe`).expect(409);
  const { runId } = probing.outletProbe!;
  expect((await untilEnded(server.services, runId)).state).toBe('routed');
  const review: Review = (await api.get(base).expect(200)).body;
  expect(review.outletProbe).toEqual({ runId, state: 'routed' });
  expect(item(review).outcome).not.toBe('asked');
  expect(item(review).finding).toMatch(
    /^Run 2 with half of the slope at the outlet moves the peak stage by at most \d\.\d{3} m, at Gauge\.$/,
  );
  const own: Review = (await api.get(`/api/runs/${runId}/review`).expect(200)).body;
  expect(own).toMatchObject({ triesOutletOf: asked.body.number, may: [] });
  expect((await api.get(`/api/runs/${runId}`).expect(200)).body.triesOutlet).toBe(true);
  const note = { method: 'M', assumptions: 'A', limits: 'L' };
  const refused = await api.post(`/api/runs/${runId}/review`).send(note).expect(409);
  expect(refused.body.error.message).toContain('only tries the outlet');
}, 120_000);
