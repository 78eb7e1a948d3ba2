import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.stop());

test('health tells that server and database answer', async () => {
  const answer = await server.request.get('/api/health').expect(200);
  expect(answer.body).toEqual({ ok: true, version: '1.0.0' });
});

test('an address that is none is a JSON 404', async () => {
  const answer = await server.request.get('/api/nothing').expect(404);
  expect(answer.body.error.code).toBe('notFound');
});

test('a user comes back as it was stored', async () => {
  const user = await buildUser(server.services, ['modeller', 'client']);
  const found = await server.services.models.User.findByPk(user.id, { include: 'firm' });
  expect(found!.id).toBe(user.id);
  expect(typeof found!.id).toBe('number');
  expect(found!.roles).toEqual(['modeller', 'client']);
  expect(found!.active).toBe(true);
  expect(typeof found!.firm!.id).toBe('number');
});
