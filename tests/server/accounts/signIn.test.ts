import jwt from 'jsonwebtoken';
import { fitsPassword } from '../../../server/auth/passwords';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { cookieOf, setCookieOf } from '../../helpers/cookieOf';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.stop());

const signIn = (email: string, password: string) =>
  server.request.post('/api/auth/sign-in').send({ email, password });

test('signs in, whatever the case of the address, and says who it is', async () => {
  const user = await buildUser(server.services, ['modeller', 'seniorEngineer']);
  const answer = await signIn(` ${user.email.toUpperCase()} `, PASSWORD).expect(200);
  expect(answer.body.expiresIn).toBe(600);
  expect(answer.body.me).toMatchObject({
    id: user.id,
    email: user.email,
    roles: ['modeller', 'seniorEngineer'],
    firm: { id: user.firmId },
  });
  expect(JSON.stringify(answer.body)).not.toContain('argon2');
  await server.request
    .get('/api/me')
    .set('Authorization', `Bearer ${answer.body.accessToken}`)
    .expect(200);
  await user.reload();
  expect(user.lastSignInAt).toBeInstanceOf(Date);
});

test('the refresh token is out of reach of scripts and other sites', async () => {
  const user = await buildUser(server.services, ['modeller']);
  const line = setCookieOf(await signIn(user.email, PASSWORD));
  expect(line).toContain('HttpOnly');
  expect(line).toContain('SameSite=Strict');
  expect(line).toContain('Path=/api/auth');
  expect(line).not.toContain('Secure');
});

test('over https the cookie is sent over https alone', async () => {
  const secure = await startTestServer({ PUBLIC_URL: 'https://spate.firm.example/' });
  try {
    const user = await buildUser(secure.services, ['modeller']);
    const answer = await secure.request
      .post('/api/auth/sign-in')
      .send({ email: user.email, password: PASSWORD });
    expect(setCookieOf(answer)).toContain('Secure');
  } finally {
    await secure.stop();
  }
});

test('a wrong password, a stranger and a deactivated account are told alike', async () => {
  const user = await buildUser(server.services, ['modeller']);
  const off = await buildUser(server.services, ['modeller'], { active: false });
  const answers = [
    await signIn(user.email, 'not the password at all'),
    await signIn('nobody@firm.example', PASSWORD),
    await signIn(off.email, PASSWORD),
  ];
  for (const answer of answers) {
    expect(answer.status).toBe(401);
    expect(cookieOf(answer)).toBeNull();
  }
  const bodies = answers.map(({ body }) => ({ ...body.error, requestId: null }));
  expect(bodies[1]).toEqual(bodies[0]);
  expect(bodies[2]).toEqual(bodies[0]);
  expect(bodies[0]!.code).toBe('signInFailed');
});

test('a stranger costs as much work as a wrong password', async () => {
  const { passwordHash } = await buildUser(server.services, ['modeller']);
  const took = async (hash: string | null) => {
    const start = performance.now();
    expect(await fitsPassword(hash, 'not the password at all')).toBe(false);
    return performance.now() - start;
  };
  await took(null);
  const [known, stranger]: [number[], number[]] = [[], []];
  for (let i = 0; i < 6; i++) {
    known.push(await took(passwordHash));
    stranger.push(await took(null));
  }
  // A hash takes tens of milliseconds; without it the answer would come in a hundredth of one. A tenth stands clear of both
  // on a busy machine.
  expect(Math.min(...stranger)).toBeGreaterThan(Math.min(...known) / 10);
});

test('every fault of the form is told at its place', async () => {
  const answer = await server.request.post('/api/auth/sign-in').send({ email: 'x', more: 1 });
  expect(answer.status).toBe(422);
  const paths = answer.body.error.faults.map(({ path }: { path: string }) => path);
  expect(paths).toEqual(expect.arrayContaining(['email', 'password']));
});

describe('an access token', () => {
  const me = (token: string) =>
    server.request.get('/api/me').set('Authorization', `Bearer ${token}`);

  test('is needed, and must be ours', async () => {
    await server.request.get('/api/me').expect(401);
    await me('nonsense').expect(401);
    const user = await buildUser(server.services, ['modeller']);
    const claims = jwt.decode(await server.tokenOf(user)) as jwt.JwtPayload;
    await me(jwt.sign(claims, 'another key')).expect(401);
    await me(jwt.sign(claims, '', { algorithm: 'none' })).expect(401);
  });

  test('runs out after ten minutes', async () => {
    const user = await buildUser(server.services, ['modeller']);
    const claims = jwt.decode(await server.tokenOf(user)) as jwt.JwtPayload;
    expect(claims.exp! - claims.iat!).toBe(600);
    const key = server.services.env.secrets.accessTokenKey;
    const now = Math.floor(Date.now() / 1000);
    await me(jwt.sign({ ...claims, exp: now + 60 }, key)).expect(200);
    await me(jwt.sign({ ...claims, exp: now - 1 }, key)).expect(401);
  });

  test('ends at once when the user is deactivated', async () => {
    const user = await buildUser(server.services, ['modeller']);
    const token = await server.tokenOf(user);
    await me(token).expect(200);
    await user.update({ active: false });
    const answer = await me(token).expect(401);
    expect(answer.body.error.code).toBe('unauthenticated');
  });
});

test('what another site’s page asks for is not done', async () => {
  const user = await buildUser(server.services, ['modeller']);
  const body = { email: user.email, password: PASSWORD };
  const post = () => server.request.post('/api/auth/sign-in');
  await post().set('Sec-Fetch-Site', 'cross-site').send(body).expect(403);
  await post().set('Sec-Fetch-Site', 'same-site').send(body).expect(403);
  await post().set('Origin', 'https://elsewhere.example').send(body).expect(403);
  await post().set('Sec-Fetch-Site', 'same-origin').send(body).expect(200);
  await post().set('Origin', server.services.env.publicUrl).send(body).expect(200);
});
