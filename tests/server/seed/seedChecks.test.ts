import type { IssuedResult, QueueRow } from '../../../shared/review/types';
import { seedChecks, seedDemo } from '../../../seed';
import { emailOf } from '../../helpers/accounts';
import { startTestServer, type TestServer } from '../../helpers/testServer';

// Both floods are really routed.
jest.setTimeout(400_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '2' });
  await seedDemo(server.services);
  server.services.runs.start();
  await seedChecks(server.services);
});
afterAll(() => server.stop());

const signInAs = async (name: string) =>
  server.signInAs(
    await server.services.models.User.findOne({
      where: { email: emailOf(name) },
      rejectOnEmpty: true,
    }),
  );

test('the design flood is signed and issued, the larger one waits with an open point', async () => {
  const senior = await signInAs('Rurik Tesk');
  const queue: QueueRow[] = (await senior.get('/api/reviews/queue').expect(200)).body;
  expect(queue).toEqual([expect.objectContaining({ runNumber: 2, openPoints: 1, mine: true })]);
  const { review } = (await senior.get(`/api/runs/${queue[0].runId - 1}`).expect(200)).body;
  expect(review).toBe('issued');
  const client = await signInAs('Maud Ferrin');
  const address = `/api/studies/${queue[0].studyId}/issued`;
  const [result]: IssuedResult[] = (await client.get(address).expect(200)).body;
  expect(result.signedBy).toBe('Rurik Tesk');
  expect(result.stations.map(({ name }) => name)).toEqual([
    'Tornick bridge',
    'Sallow Mill',
    'Gauge at Ebbick',
  ]);
});

test('done again it changes nothing', async () => {
  const { AuditRow, ReviewPoint, SignOff } = server.services.models;
  const counts = async () => [
    await AuditRow.count(),
    await ReviewPoint.count(),
    await SignOff.count(),
  ];
  const before = await counts();
  await seedChecks(server.services);
  expect(await counts()).toEqual(before);
});
