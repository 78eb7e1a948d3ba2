import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { cookieOf } from '../../helpers/cookieOf';
import { keptMail, tokenIn } from '../../helpers/keptMail';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let shift = 0;
beforeAll(async () => {
  server = await startTestServer(
    { PUBLIC_URL: 'http://spate.firm.example' },
    { now: () => new Date(Date.now() + shift) },
  );
});
afterEach(() => {
  shift = 0;
});
afterAll(() => server.stop());

const NEXT = 'another long password';
const signIn = (email: string, password: string) =>
  server.request.post('/api/auth/sign-in').send({ email, password });
const me = (token: string) => server.request.get('/api/me').set('Authorization', `Bearer ${token}`);
const ask = (email: string) =>
  server.request.post('/api/auth/password-reset/request').send({ email });
const confirm = (token: string, password = NEXT) =>
  server.request.post('/api/auth/password-reset/confirm').send({ token, password });

describe('change', () => {
  test('keeps this session, ends the others, and tells the owner', async () => {
    const user = await buildUser(server.services, ['modeller']);
    const here = await signIn(user.email, PASSWORD);
    const there = await signIn(user.email, PASSWORD);
    await server.request
      .post('/api/auth/password')
      .set('Authorization', `Bearer ${here.body.accessToken}`)
      .send({ current: PASSWORD, next: NEXT })
      .expect(204);
    await me(here.body.accessToken).expect(200);
    await me(there.body.accessToken).expect(401);
    await server.request.post('/api/auth/refresh').set('Cookie', cookieOf(here)!).expect(200);
    await signIn(user.email, PASSWORD).expect(401);
    await signIn(user.email, NEXT).expect(200);
    const [told] = await keptMail(server.services, user.email);
    expect(told!.subject).toContain('was changed');
  });

  test('needs the present password, and a long one', async () => {
    const user = await buildUser(server.services, ['client']);
    const agent = await server.signInAs(user);
    const wrong = await agent.post('/api/auth/password').send({ current: 'no', next: NEXT });
    expect(wrong.status).toBe(422);
    expect(wrong.body.error.faults[0].path).toBe('current');
    const short = await agent.post('/api/auth/password').send({ current: PASSWORD, next: 'short' });
    expect(short.body.error.faults[0]).toMatchObject({ path: 'next' });
    await signIn(user.email, PASSWORD).expect(200);
  });

  test('guesses at the present password wait like those at the door', async () => {
    const agent = await server.signInAs(await buildUser(server.services, ['client']));
    const guess = () => agent.post('/api/auth/password').send({ current: 'no', next: NEXT });
    for (let i = 0; i < 5; i++) await guess().expect(422);
    await guess().expect(429);
  });
});

describe('reset', () => {
  test('by a link that works once and ends every session', async () => {
    const user = await buildUser(server.services, ['modeller']);
    const session = await signIn(user.email, PASSWORD);
    await ask(user.email.toUpperCase()).expect(202);
    const [message] = await keptMail(server.services, user.email);
    expect(message!.links[0]).toMatch(/^http:\/\/spate\.firm\.example\/reset\?token=[\w-]{43}$/);
    const token = await tokenIn(server.services, user.email);
    await confirm(token).expect(204);
    await me(session.body.accessToken).expect(401);
    await server.request.post('/api/auth/refresh').set('Cookie', cookieOf(session)!).expect(401);
    await signIn(user.email, PASSWORD).expect(401);
    await signIn(user.email, NEXT).expect(200);
    const again = await confirm(token, 'a third long password').expect(410);
    expect(again.body.error.code).toBe('gone');
  });

  test('is answered alike for a stranger, to whom nothing is sent', async () => {
    const user = await buildUser(server.services, ['modeller']);
    const known = await ask(user.email);
    const stranger = await ask('stranger@firm.example');
    expect([known.status, known.text]).toEqual([stranger.status, stranger.text]);
    expect(await keptMail(server.services, 'stranger@firm.example')).toEqual([]);
    const off = await buildUser(server.services, ['modeller'], { active: false });
    await ask(off.email).expect(202);
    expect(await keptMail(server.services, off.email)).toEqual([]);
  });

  test('a link holds for an hour, and a later one ends it', async () => {
    const user = await buildUser(server.services, ['modeller']);
    await ask(user.email);
    const first = await tokenIn(server.services, user.email);
    await ask(user.email);
    const second = await tokenIn(server.services, user.email);
    expect(second).not.toBe(first);
    await confirm(first).expect(410);
    shift = 3_601_000;
    await confirm(second).expect(410);
    shift = 3_500_000;
    await confirm(second).expect(204);
  });

  test('of two at the same moment one succeeds', async () => {
    const user = await buildUser(server.services, ['modeller']);
    await ask(user.email);
    const token = await tokenIn(server.services, user.email);
    const answers = await Promise.all([confirm(token), confirm(token)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([204, 410]);
  });

  test('does nothing for who was deactivated meanwhile', async () => {
    const user = await buildUser(server.services, ['modeller']);
    await ask(user.email);
    const token = await tokenIn(server.services, user.email);
    await user.update({ active: false });
    await confirm(token).expect(410);
    await user.update({ active: true });
    await signIn(user.email, PASSWORD).expect(200);
  });

  test('lifts the wait of an account', async () => {
    const user = await buildUser(server.services, ['modeller']);
    for (let i = 0; i < 5; i++) await signIn(user.email, 'wrong').expect(401);
    await signIn(user.email, PASSWORD).expect(429);
    await ask(user.email);
    await confirm(await tokenIn(server.services, user.email)).expect(204);
    await signIn(user.email, NEXT).expect(200);
  });
});
