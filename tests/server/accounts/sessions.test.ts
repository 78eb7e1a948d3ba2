import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { cookieOf, setCookieOf } from '../../helpers/cookieOf';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let shift = 0;
beforeAll(async () => {
  server = await startTestServer({}, { now: () => new Date(Date.now() + shift) });
});
afterEach(() => {
  shift = 0;
});
afterAll(() => server.stop());

const refresh = (cookie: string) => server.request.post('/api/auth/refresh').set('Cookie', cookie);
const me = (token: string) => server.request.get('/api/me').set('Authorization', `Bearer ${token}`);

async function signedIn() {
  const user = await buildUser(server.services, ['modeller']);
  const signIn = async () => {
    const answer = await server.request
      .post('/api/auth/sign-in')
      .send({ email: user.email, password: PASSWORD })
      .expect(200);
    return { cookie: cookieOf(answer)!, token: answer.body.accessToken as string };
  };
  return { user, signIn, ...(await signIn()) };
}

test('refreshing gives a new pair and the person', async () => {
  const { cookie, user } = await signedIn();
  const answer = await refresh(cookie).expect(200);
  expect(answer.body.me.id).toBe(user.id);
  expect(cookieOf(answer)).not.toBe(cookie);
  await me(answer.body.accessToken).expect(200);
});

test('without a cookie, and with one that is not ours, nobody is signed in', async () => {
  await server.request.post('/api/auth/refresh').expect(401);
  await refresh('spate_refresh=made-up').expect(401);
});

test('a chain of refreshes goes on', async () => {
  let { cookie } = await signedIn();
  for (let i = 0; i < 5; i++) cookie = cookieOf(await refresh(cookie).expect(200))!;
});

test('the use of an old token ends its family, the newest token and the access token with it', async () => {
  const { cookie, signIn } = await signedIn();
  const other = await signIn();
  const renewed = await refresh(cookie).expect(200);
  await refresh(cookie).expect(401);
  await refresh(cookieOf(renewed)!).expect(401);
  await me(renewed.body.accessToken).expect(401);
  // Another device is another family.
  await refresh(other.cookie).expect(200);
});

test('of many refreshes with one token at the same moment at most one succeeds, and the family ends', async () => {
  const { cookie } = await signedIn();
  const answers = await Promise.all([1, 2, 3, 4].map(() => refresh(cookie)));
  const won = answers.filter(({ status }) => status === 200);
  expect(won).toHaveLength(1);
  await refresh(cookieOf(won[0]!)!).expect(401);
});

test('tokens are stored as hashes', async () => {
  const { cookie, user } = await signedIn();
  const kept = await server.services.models.RefreshToken.findOne({ where: { userId: user.id } });
  expect(kept!.tokenHash).toMatch(/^[0-9a-f]{64}$/);
  expect(cookie).not.toContain(kept!.tokenHash);
});

test('a refresh token holds for thirty days, and what has run out is forgotten', async () => {
  const { cookie, user } = await signedIn();
  const { models, accounts } = server.services;
  shift = 30 * 86_400_000 - 60_000;
  await accounts.sweep();
  expect(await models.RefreshToken.count({ where: { userId: user.id } })).toBe(1);
  shift = 30 * 86_400_000 + 60_000;
  await refresh(cookie).expect(401);
  await accounts.sweep();
  expect(await models.RefreshToken.count({ where: { userId: user.id } })).toBe(0);
});

test('signing out ends this device alone', async () => {
  const { cookie, token, signIn } = await signedIn();
  const other = await signIn();
  const answer = await server.request.post('/api/auth/sign-out').set('Cookie', cookie).expect(204);
  expect(setCookieOf(answer)).toMatch(/^spate_refresh=;.*Expires=Thu, 01 Jan 1970/);
  await refresh(cookie).expect(401);
  await me(token).expect(401);
  await me(other.token).expect(200);
  await server.request.post('/api/auth/sign-out').expect(204);
});

test('signing out everywhere ends every device', async () => {
  const { cookie, token, signIn } = await signedIn();
  const other = await signIn();
  await server.request
    .post('/api/auth/sign-out-everywhere')
    .set('Authorization', `Bearer ${token}`)
    .expect(204);
  await me(token).expect(401);
  await me(other.token).expect(401);
  await refresh(cookie).expect(401);
  await refresh(other.cookie).expect(401);
});
