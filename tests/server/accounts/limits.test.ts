import { createHash } from 'node:crypto';
import { waitAfter } from '../../../server/auth/attempts';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let shift = 0;
let address = 0;
const start = () =>
  startTestServer({ TRUST_PROXY: '1' }, { now: () => new Date(Date.now() + shift) });
beforeAll(async () => {
  server = await start();
});
beforeEach(() => {
  shift = 0;
  address += 1;
});
afterAll(() => server.stop());

/** Each test comes from an address of its own, told by the proxy in front. */
const post = (path: string, body: object) =>
  server.request.post(path).set('X-Forwarded-For', `192.0.2.${address}`).send(body);
const signIn = (email: string, password: string) => post('/api/auth/sign-in', { email, password });

test('the wait doubles from half a minute to a quarter of an hour', () => {
  const waits = [1, 4, 5, 6, 7, 8, 9, 10, 11, 1000].map(waitAfter);
  expect(waits).toEqual([0, 0, 30, 60, 120, 240, 480, 900, 900, 900]);
});

test('an account waits after five failures, with or without an account behind it', async () => {
  const user = await buildUser(server.services, ['modeller']);
  for (const email of [user.email, 'stranger@firm.example']) {
    for (let i = 0; i < 5; i++) await signIn(email, 'wrong').expect(401);
    const answer = await signIn(email, PASSWORD).expect(429);
    expect(answer.body.error.code).toBe('tooMany');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(25);
    expect(Number(answer.headers['retry-after'])).toBeLessThanOrEqual(30);
  }
});

test('after the wait the right password is taken and the count begins anew; a wrong one waits longer', async () => {
  const user = await buildUser(server.services, ['modeller']);
  for (let i = 0; i < 5; i++) await signIn(user.email, 'wrong');
  shift = 31_000;
  await signIn(user.email, 'wrong').expect(401);
  const answer = await signIn(user.email, PASSWORD).expect(429);
  expect(Number(answer.headers['retry-after'])).toBeGreaterThan(55);
  shift = 95_000;
  await signIn(user.email, PASSWORD).expect(200);
  for (let i = 0; i < 4; i++) await signIn(user.email, 'wrong').expect(401);
  await signIn(user.email, PASSWORD).expect(200);
});

test('many guesses at the same moment find no gap', async () => {
  const user = await buildUser(server.services, ['modeller']);
  const answers = await Promise.all(Array.from({ length: 12 }, () => signIn(user.email, 'wrong')));
  expect(answers.filter(({ status }) => status === 401)).toHaveLength(5);
  expect(answers.filter(({ status }) => status === 429)).toHaveLength(7);
});

test('the count is in the database: another server of the same product goes on with it', async () => {
  const user = await buildUser(server.services, ['modeller']);
  for (let i = 0; i < 5; i++) await signIn(user.email, 'wrong');
  const emailHash = createHash('sha256').update(user.email).digest('hex');
  const kept = await server.services.models.SignInAttempt.findByPk(emailHash);
  expect(kept!.count).toBe(5);
  expect(JSON.stringify(kept)).not.toContain(user.email);
});

test('old counts are forgotten', async () => {
  await signIn('stranger@firm.example', 'wrong');
  shift = 25 * 3_600_000;
  await server.services.accounts.sweep();
  expect(await server.services.models.SignInAttempt.count()).toBe(0);
});

test('an address is limited over all accounts; what succeeds does not count', async () => {
  const user = await buildUser(server.services, ['modeller']);
  for (let i = 0; i < 3; i++) await signIn(user.email, PASSWORD).expect(200);
  for (let i = 0; i < 30; i++) await signIn(`p${i}@firm.example`, 'wrong').expect(401);
  const answer = await signIn(user.email, PASSWORD).expect(429);
  expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
});

test('guesses at links are limited by address', async () => {
  const look = () => post('/api/invitations/look', { token: 'x'.repeat(43) });
  for (let i = 0; i < 30; i++) await look().expect(410);
  await look().expect(429);
});
