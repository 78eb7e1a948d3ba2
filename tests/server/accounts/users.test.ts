import type { Role } from '../../../shared/accounts/roles';
import type { UserModel } from '../../../server/models/User';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { cookieOf } from '../../helpers/cookieOf';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.stop());

async function firmOf(...people: Role[][]): Promise<UserModel[]> {
  const firmId = (await buildFirm(server.services)).id;
  const users = [];
  for (const roles of people) users.push(await buildUser(server.services, roles, { firmId }));
  return users;
}
const change = async (by: UserModel, user: UserModel, body: object) =>
  (await server.signInAs(by)).patch(`/api/users/${user.id}`).send(body);

test('administrators see the people of their firm and of no other', async () => {
  const [administrator, modeller, client] = await firmOf(
    ['administrator'],
    ['modeller'],
    ['client'],
  );
  await buildUser(server.services, ['client']);
  const answer = await (await server.signInAs(administrator!)).get('/api/users').expect(200);
  const ids = answer.body.map(({ id }: { id: number }) => id).sort();
  expect(ids).toEqual([administrator!.id, modeller!.id, client!.id].sort());
  expect(Object.keys(answer.body[0]).sort()).toEqual(
    ['active', 'email', 'id', 'lastSignInAt', 'name', 'roles'].sort(),
  );
});

test('engineers see only with whom a study can be shared; guests see nobody', async () => {
  const [modeller, surveyor, client] = await firmOf(
    ['modeller'],
    ['surveyor'],
    ['client'],
    ['administrator'],
  );
  const seen = await (await server.signInAs(modeller!)).get('/api/users').expect(200);
  expect(seen.body.map(({ id }: { id: number }) => id).sort()).toEqual([surveyor!.id, client!.id]);
  await (await server.signInAs(surveyor!)).get('/api/users').expect(403);
  await (await server.signInAs(client!)).get('/api/users').expect(403);
});

test('a change of roles holds at once, and the session goes on', async () => {
  const [administrator, person] = await firmOf(['administrator'], ['modeller']);
  const session = await server.request
    .post('/api/auth/sign-in')
    .send({ email: person!.email, password: PASSWORD });
  const answer = await change(administrator!, person!, { roles: ['client', 'client'] });
  expect(answer.body.roles).toEqual(['client']);
  await server.request
    .get('/api/me')
    .set('Authorization', `Bearer ${session.body.accessToken}`)
    .expect(401);
  const renewed = await server.request
    .post('/api/auth/refresh')
    .set('Cookie', cookieOf(session)!)
    .expect(200);
  expect(renewed.body.me.roles).toEqual(['client']);
});

test('deactivation ends the sessions; made active again, the person signs in anew', async () => {
  const [administrator, person] = await firmOf(['administrator'], ['modeller']);
  const session = await server.request
    .post('/api/auth/sign-in')
    .send({ email: person!.email, password: PASSWORD });
  const refresh = () => server.request.post('/api/auth/refresh').set('Cookie', cookieOf(session)!);
  expect((await change(administrator!, person!, { active: false })).body.active).toBe(false);
  await refresh().expect(401);
  await server.request
    .get('/api/me')
    .set('Authorization', `Bearer ${session.body.accessToken}`)
    .expect(401);
  await change(administrator!, person!, { active: true });
  await refresh().expect(401);
  await server.request
    .post('/api/auth/sign-in')
    .send({ email: person!.email, password: PASSWORD })
    .expect(200);
});

test('a firm keeps an active administrator', async () => {
  const [first, second] = await firmOf(['administrator'], ['administrator', 'modeller']);
  expect((await change(first!, second!, { roles: ['modeller'] })).status).toBe(200);
  for (const body of [{ roles: ['modeller'] }, { active: false }]) {
    const answer = await change(first!, first!, body);
    expect(answer.status).toBe(409);
    expect(answer.body.error.message).toContain('active administrator');
  }
});

test('two administrators cannot demote each other at the same moment', async () => {
  const [first, second] = await firmOf(['administrator'], ['administrator']);
  const answers = await Promise.all([
    change(first!, second!, { roles: ['modeller'] }),
    change(second!, first!, { roles: ['modeller'] }),
  ]);
  const statuses = answers.map(({ status }) => status);
  expect(statuses.filter((status) => status === 200)).toHaveLength(1);
  const left = await server.services.models.User.findAll({ where: { firmId: first!.firmId } });
  expect(left.filter(({ roles }) => roles.includes('administrator'))).toHaveLength(1);
});

test('nobody of another firm is there, and only administrators change people', async () => {
  const [administrator, modeller, client] = await firmOf(
    ['administrator'],
    ['modeller'],
    ['client'],
  );
  const stranger = await buildUser(server.services, ['client']);
  expect((await change(administrator!, stranger, { active: false })).status).toBe(404);
  expect((await change(modeller!, client!, { active: false })).status).toBe(403);
  expect((await change(client!, modeller!, { active: false })).status).toBe(404);
  await (await server.signInAs(administrator!)).patch('/api/users/none').send({}).expect(404);
});

test('a person keeps their own profile', async () => {
  const [person] = await firmOf(['seniorEngineer']);
  const agent = await server.signInAs(person!);
  const profile = {
    name: 'R. Tesk',
    qualification: 'Chartered engineer',
    registrationNumber: '17',
  };
  const answer = await agent.patch('/api/me').send(profile).expect(200);
  expect(answer.body).toMatchObject(profile);
  expect((await agent.get('/api/me')).body).toMatchObject(profile);
  await agent.patch('/api/me').send({ ...profile, roles: ['administrator'] });
  expect((await agent.get('/api/me')).body.roles).toEqual(['seniorEngineer']);
  await agent.patch('/api/me').send({ name: '   ' }).expect(422);
});
