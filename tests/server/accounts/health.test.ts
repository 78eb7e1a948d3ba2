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

test('a body that is no JSON is told as such, and names the request', async () => {
  const answer = await server.request
    .post('/api/auth/sign-in')
    .set('Content-Type', 'application/json')
    .send('{"email":')
    .expect(422);
  expect(answer.body.error.code).toBe('invalid');
  expect(answer.body.error.requestId).toBe(answer.headers['x-request-id']);
});

test('a body larger than is taken is 413', async () => {
  const answer = await server.request
    .post('/api/auth/sign-in')
    .send({ email: 'x'.repeat(5e6), password: 'y' })
    .expect(413);
  expect(answer.body.error.code).toBe('tooLarge');
});

test('answers are nobody’s to keep, and no other site may frame or feed the product', async () => {
  const { headers } = await server.request.get('/api/health');
  expect(headers['cache-control']).toBe('no-store');
  expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
  expect(headers['content-security-policy']).toContain("script-src 'self'");
  expect(headers['referrer-policy']).toBe('no-referrer');
  expect(headers['x-powered-by']).toBeUndefined();
});
