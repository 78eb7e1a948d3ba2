import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.stop());

test('a new firm begins with an administrator who sets the password by a link', async () => {
  const { firms } = server.services.accounts;
  const email = 'first@weirhouse.example';
  const link = new URL(await firms.open('Weirhouse', 'Fay First', email));
  expect(link.pathname).toBe('/reset');

  const password = 'a lock on every sluice';
  await server.request
    .post('/api/auth/password-reset/confirm')
    .send({ token: link.searchParams.get('token'), password })
    .expect(204);
  const session = await server.request
    .post('/api/auth/sign-in')
    .send({ email, password })
    .expect(200);
  expect(session.body.me).toMatchObject({ roles: ['administrator'], firm: { name: 'Weirhouse' } });

  const told = await server.services.models.AuditRow.findAll({ where: { action: 'firm.opened' } });
  expect(told).toHaveLength(1);
  expect(told[0].words).toBe('Firm opened with Fay First as its administrator');

  await expect(firms.open('Weirhouse', 'Other', 'other@weirhouse.example')).rejects.toMatchObject({
    code: 'conflict',
  });
  await expect(firms.open('Mill House', 'Fay First', email)).rejects.toMatchObject({
    code: 'conflict',
  });
  expect(await server.services.models.Firm.count({ where: { name: 'Mill House' } })).toBe(0);
});
