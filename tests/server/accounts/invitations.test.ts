import type { Role } from '../../../shared/accounts/roles';
import type { UserModel } from '../../../server/models/User';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { cookieOf } from '../../helpers/cookieOf';
import { keptMail, tokenIn } from '../../helpers/keptMail';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let shift = 0;
let firmId: number;
let administrator: UserModel;
let modeller: UserModel;
let studyId: number;
beforeAll(async () => {
  server = await startTestServer({ TRUST_PROXY: '1' }, { now: () => new Date(Date.now() + shift) });
  firmId = (await buildFirm(server.services, { name: 'Alder & Reed' })).id;
  administrator = await buildUser(server.services, ['administrator'], { firmId });
  modeller = await buildUser(server.services, ['modeller'], { firmId, name: 'Mo Deller' });
  studyId = (await makeStudy(modeller)).id;
});
afterEach(() => {
  shift = 0;
});
afterAll(() => server.stop());

const makeStudy = (creator: UserModel) =>
  server.services.models.Study.create({
    firmId: creator.firmId,
    title: 'Low bridge',
    clientName: '',
    place: '',
    verticalDatum: 'local',
    unitSystem: 'metric',
    purpose: '',
    createdBy: creator.id,
  });

let count = 0;
const address = () => `guest${++count}@client.example`;
const invite = async (by: UserModel, email: string, roles: Role[], study: number | null = null) =>
  (await server.signInAs(by)).post('/api/invitations').send({ email, roles, studyId: study });
const post = (path: string, body: object) =>
  server.request.post(path).set('X-Forwarded-For', `192.0.2.${count}`).send(body);
const accept = (token: string) =>
  post('/api/invitations/accept', { token, name: 'New Person', password: PASSWORD });

test('an administrator invites; the person looks, accepts, and is signed in', async () => {
  const email = address();
  const made = await invite(administrator, email, ['modeller', 'administrator']);
  expect(made.status).toBe(201);
  expect(made.body).toMatchObject({ email, acceptedAt: null, invitedBy: administrator.name });
  const [message] = await keptMail(server.services, email);
  expect(message!.text).toContain('Alder & Reed as modeller and administrator');
  const token = await tokenIn(server.services, email);
  const seen = await post('/api/invitations/look', { token }).expect(200);
  expect(seen.body).toEqual({
    email,
    firmName: 'Alder & Reed',
    roles: ['modeller', 'administrator'],
  });
  const session = await accept(token).expect(200);
  expect(session.body.me).toMatchObject({
    email,
    name: 'New Person',
    firm: { id: firmId },
    roles: ['modeller', 'administrator'],
  });
  expect(cookieOf(session)).not.toBeNull();
  await post('/api/auth/sign-in', { email, password: PASSWORD }).expect(200);
  await accept(token).expect(410);
  await post('/api/invitations/look', { token }).expect(410);
  const list = await (await server.signInAs(administrator)).get('/api/invitations').expect(200);
  expect(list.body[0]).toMatchObject({ email, acceptedAt: expect.any(String) });
});

test('a modeller invites surveyors and clients to a study, and nobody else', async () => {
  const email = address();
  expect((await invite(modeller, email, ['client'], studyId)).status).toBe(201);
  const [message] = await keptMail(server.services, email);
  expect(message!.text).toContain('Mo Deller invites you to the study “Low bridge”');
  const session = await accept(await tokenIn(server.services, email)).expect(200);
  const members = await server.services.models.StudyMember.findAll({ where: { studyId } });
  expect(members.map(({ userId, as }) => [userId, as])).toContainEqual([
    session.body.me.id,
    'client',
  ]);

  expect((await invite(modeller, address(), ['modeller'], studyId)).status).toBe(403);
  expect((await invite(modeller, address(), ['client', 'administrator'], studyId)).status).toBe(
    403,
  );
  const nowhere = await invite(modeller, address(), ['client']);
  expect(nowhere.status).toBe(422);
  expect(nowhere.body.error.faults[0].path).toBe('studyId');
});

test('surveyors and clients invite nobody', async () => {
  for (const role of ['surveyor', 'client'] as const) {
    const user = await buildUser(server.services, [role], { firmId });
    expect((await invite(user, address(), ['client'], studyId)).status).toBe(403);
    await (await server.signInAs(user)).get('/api/invitations').expect(403);
  }
});

test('a study of another firm does not exist; nor does one for an administrator alone', async () => {
  const stranger = await buildUser(server.services, ['modeller']);
  const theirs = await makeStudy(stranger);
  expect((await invite(modeller, address(), ['client'], theirs.id)).status).toBe(404);
  expect((await invite(administrator, address(), ['client'], studyId)).status).toBe(404);
});

test('open invitations of a firm to one address are accepted together', async () => {
  const second = await makeStudy(modeller);
  const email = address();
  await invite(modeller, email, ['client'], studyId);
  await invite(modeller, email, ['surveyor'], second.id);
  const session = await accept(await tokenIn(server.services, email)).expect(200);
  expect(session.body.me.roles.sort()).toEqual(['client', 'surveyor']);
  const members = await server.services.models.StudyMember.findAll({
    where: { userId: session.body.me.id },
    order: [['studyId', 'ASC']],
  });
  expect(members.map(({ studyId: id, as }) => [id, as])).toEqual([
    [studyId, 'client'],
    [second.id, 'surveyor'],
  ]);
});

test('whoever has an account in the firm is not invited again', async () => {
  const answer = await invite(administrator, modeller.email, ['client']);
  expect(answer.status).toBe(409);
});

test('an account in another firm is not told to who invites, only to its owner', async () => {
  const elsewhere = await buildUser(server.services, ['client']);
  expect((await invite(administrator, elsewhere.email, ['modeller'])).status).toBe(201);
  const token = await tokenIn(server.services, elsewhere.email);
  const answer = await accept(token).expect(409);
  expect(answer.body.error.code).toBe('conflict');
  await elsewhere.reload();
  expect(elsewhere.firmId).not.toBe(firmId);
  // Nothing of the attempt is kept: the link still stands.
  await post('/api/invitations/look', { token }).expect(200);
});

test('a link holds for seven days; sent again, the earlier one ends', async () => {
  const email = address();
  const made = await invite(administrator, email, ['modeller']);
  const first = await tokenIn(server.services, email);
  const agent = await server.signInAs(administrator);
  await agent.post(`/api/invitations/${made.body.id}/resend`).expect(204);
  const second = await tokenIn(server.services, email);
  await post('/api/invitations/look', { token: first }).expect(410);
  shift = 7 * 86_400_000 + 60_000;
  await accept(second).expect(410);
  shift = 7 * 86_400_000 - 60_000;
  await accept(second).expect(200);
});

test('withdrawn, it is gone from the list and its link is dead', async () => {
  const email = address();
  const made = await invite(administrator, email, ['modeller']);
  const token = await tokenIn(server.services, email);
  const agent = await server.signInAs(administrator);
  await agent.delete(`/api/invitations/${made.body.id}`).expect(204);
  await agent.delete(`/api/invitations/${made.body.id}`).expect(404);
  await post('/api/invitations/look', { token }).expect(410);
  await accept(token).expect(410);
  const list = await agent.get('/api/invitations');
  expect(list.body.map((row: { email: string }) => row.email)).not.toContain(email);
});

test('others see and change only the invitations that they made', async () => {
  const colleague = await buildUser(server.services, ['seniorEngineer'], { firmId });
  const made = await invite(modeller, address(), ['client'], studyId);
  const theirs = await server.signInAs(colleague);
  expect((await theirs.get('/api/invitations')).body).toEqual([]);
  await theirs.delete(`/api/invitations/${made.body.id}`).expect(404);
  await theirs.post(`/api/invitations/${made.body.id}/resend`).expect(404);
  await (await server.signInAs(modeller)).delete(`/api/invitations/${made.body.id}`).expect(204);
});

test('an accepted invitation is neither withdrawn nor sent again', async () => {
  const email = address();
  const made = await invite(administrator, email, ['modeller']);
  await accept(await tokenIn(server.services, email)).expect(200);
  const agent = await server.signInAs(administrator);
  await agent.delete(`/api/invitations/${made.body.id}`).expect(409);
  await agent.post(`/api/invitations/${made.body.id}/resend`).expect(409);
});

test('of two acceptances at the same moment one makes the account', async () => {
  const email = address();
  await invite(administrator, email, ['modeller']);
  const token = await tokenIn(server.services, email);
  const answers = await Promise.all([accept(token), accept(token)]);
  expect(answers.map(({ status }) => status).sort()).toEqual([200, 410]);
  expect(await server.services.models.User.count({ where: { email } })).toBe(1);
});
