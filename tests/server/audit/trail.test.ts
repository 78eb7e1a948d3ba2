import type { AuditPage, AuditRow } from '../../../shared/audit/types';
import { ROUTE_WORDS, NOT_TOLD } from '../../../server/audit/routeWords';
import { verifyChain } from '../../../server/audit/verifyChain';
import type { UserModel } from '../../../server/models/User';
import { lowerVeshall } from '../../../seed/reaches/lowerVeshall';
import { faultySurveyFile, surveyFile } from '../../../seed/surveyFiles';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildRoutedRun } from '../../helpers/factories/buildRoutedRun';
import { buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { tokenIn } from '../../helpers/keptMail';
import { plainSections } from '../../helpers/plainSections';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { EXPECTED_ROUTES } from '../policies/expectedRoutes';

let server: TestServer;
let administrator: UserModel;
let modeller: UserModel;
let asAdministrator: Awaited<ReturnType<TestServer['signInAs']>>;
let asModeller: typeof asAdministrator;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0', TRUST_PROXY: '1' });
  const firmId = (await buildFirm(server.services)).id;
  administrator = await buildUser(server.services, ['administrator'], { firmId });
  modeller = await buildUser(server.services, ['modeller'], { firmId });
  asAdministrator = await server.signInAs(administrator);
  asModeller = await server.signInAs(modeller);
});
afterAll(() => server.stop());

const rows = async (query = ''): Promise<AuditRow[]> =>
  ((await asAdministrator.get(`/api/audit${query}`).expect(200)).body as AuditPage).rows;
const verify = () => verifyChain(server.services.sequelize, server.services.models);

test('every route that changes something or gives a file away has its words', () => {
  const files = /\.(pdf|csv|xlsx|json)$/;
  const named = Object.keys(EXPECTED_ROUTES).filter(
    (route) => !/^(GET|HEAD) /.test(route) || files.test(route),
  );
  expect(named.filter((route) => !ROUTE_WORDS[route] && !NOT_TOLD.has(route))).toEqual([]);
});

test('signing in, and being refused, with the address that it came from', async () => {
  const from = { 'X-Forwarded-For': '192.0.2.44' };
  const { email } = modeller;
  const post = (password: string) =>
    server.request.post('/api/auth/sign-in').set(from).send({ email, password });
  await post('wrong').expect(401);
  await post(PASSWORD).expect(200);
  const [done, refused] = await rows('?action=session');
  expect(done).toMatchObject({ actor: modeller.name, from: '192.0.2.44', outcome: 'done' });
  expect(refused).toMatchObject({ actor: email, from: '192.0.2.44', outcome: 'refused' });
});

test('what is done by links in mail is told of the person whose link it was', async () => {
  const { services } = server;
  await server.request
    .post('/api/auth/password-reset/request')
    .send({ email: modeller.email })
    .expect(202);
  const token = await tokenIn(services, modeller.email);
  const chosen = { token, password: PASSWORD };
  await server.request.post('/api/auth/password-reset/confirm').send(chosen).expect(204);
  asModeller = await server.signInAs(await modeller.reload());
  expect((await rows('?action=password')).map(({ action, actor }) => [action, actor])).toEqual([
    ['password.reset', modeller.name],
    ['password.resetAsked', modeller.email],
  ]);
  const email = 'new.client@client.example';
  const { study } = await buildRoutedRun(services, modeller);
  const offer = { email, roles: ['client'], studyId: study.id };
  await asModeller.post('/api/invitations').send(offer).expect(201);
  const accepted = {
    token: await tokenIn(services, email),
    name: 'New Client',
    password: PASSWORD,
  };
  await server.request.post('/api/invitations/accept').send(accepted).expect(200);
  expect((await rows('?action=invitation'))[0]).toMatchObject({
    action: 'invitation.accepted',
    actor: 'New Client',
    words: 'Invitation accepted by New Client, client',
  });
});

test('changes, downloads and refusals, by whom and to which record; reading is none of them', async () => {
  const { run, study } = await buildRoutedRun(server.services, modeller, 'Told study');
  const before = (await rows()).length;
  await asModeller.get(`/api/runs/${run.id}`).expect(200);
  expect(await rows()).toHaveLength(before);
  const body = {
    title: 'Told study',
    clientName: 'C',
    place: 'P',
    verticalDatum: 'D',
    unitSystem: 'metric',
    purpose: '',
  };
  await asModeller.patch(`/api/studies/${study.id}`).send(body).expect(200);
  await asModeller.get(`/api/runs/${run.id}/case.json`).expect(200);
  await asModeller.get(`/api/runs/${run.id}/results.csv`).expect(200);
  await asAdministrator.get(`/api/studies/${study.id}`).expect(404);
  await asModeller.get('/api/audit').expect(403);
  const told = (await rows()).slice(0, 5).reverse();
  expect(told.map(({ action, outcome }) => [action, outcome])).toEqual([
    ['study.changed', 'done'],
    ['run.caseTaken', 'done'],
    ['run.resultsTaken', 'done'],
    ['study.read', 'refused'],
    ['audit.read', 'refused'],
  ]);
  expect(told[0]).toMatchObject({
    actor: modeller.name,
    words: 'Study changed: Told study',
    record: { kind: 'study', id: study.id },
  });
  // What may not be seen is not named either.
  expect(told[3].words).not.toContain('Told study');
});

test('what was written with the change is not written twice, however it was sent', async () => {
  const study = await buildStudy(server.services, modeller);
  const file = surveyFile(plainSections());
  const send = (bytes: Buffer) =>
    asModeller
      .post(`/api/studies/${study.id}/surveys`)
      .set('X-Forwarded-For', '192.0.2.45')
      .attach('file', bytes, 'survey.xlsx');
  await send(file).expect(201);
  await send(file).expect(409);
  await send(faultySurveyFile(lowerVeshall())).expect(422);
  const told = await rows('?action=survey');
  expect(told.map(({ action, from, outcome }) => [action, from, outcome]).reverse()).toEqual([
    ['survey.accepted', '192.0.2.45', 'done'],
    ['survey.sent', '192.0.2.45', 'refused'],
    ['survey.refused', '192.0.2.45', 'refused'],
  ]);
  expect(told[2].words).toBe(`Revision 1 of ${study.title} taken in`);
});

test('filtered by person and action, page by page, and as CSV', async () => {
  for (let i = 0; i < 101; i++)
    await server.services.audit.note({ action: 'test.many', words: `=${i}`, actor: modeller });
  const first: AuditPage = (await asAdministrator.get('/api/audit?action=test')).body;
  expect(first.rows).toHaveLength(100);
  const rest = await rows(`?action=test&before=${first.next}`);
  expect(rest.map(({ words }) => words)).toEqual(['=0']);
  expect(await rows('?actor=nobody%25')).toEqual([]);
  const { text } = await asAdministrator.get('/api/audit.csv?action=test').expect(200);
  expect(text.split('\r\n')).toHaveLength(103);
  // No spreadsheet takes it for a formula.
  expect(text).toContain(",'=0,");
  expect((await rows())[0]).toMatchObject({ action: 'audit.taken' });
});

test('another firm reads nothing of it', async () => {
  const stranger = await server.signInAs(await buildUser(server.services, ['administrator']));
  expect((await stranger.get('/api/audit')).body).toEqual({ rows: [], next: null });
});

test('many at once make one chain; a change that is undone leaves no row', async () => {
  const { audit, models, sequelize } = server.services;
  const before = await models.AuditRow.count();
  const note = (k: number) => audit.note({ action: 'test.atOnce', words: `${k}`, actor: modeller });
  await Promise.all(Array.from({ length: 25 }, (_, k) => note(k)));
  const undone = sequelize.transaction(async (transaction) => {
    await audit.note({ action: 'test.undone', words: '', actor: modeller }, transaction);
    throw new Error('undone');
  });
  await expect(undone).rejects.toThrow('undone');
  expect(await models.AuditRow.count()).toBe(before + 25);
  expect(await verify()).toEqual({ holds: true, rows: before + 25 });
});

test('the database refuses to change it, and whoever gets around that is found out', async () => {
  const { models, sequelize } = server.services;
  const run = (sql: string) => sequelize.query(sql);
  await expect(run("UPDATE audit_rows SET words = 'x'")).rejects.toThrow('only added to');
  await expect(run('DELETE FROM audit_rows')).rejects.toThrow('only added to');
  await expect(run('DELETE FROM audit_head')).rejects.toThrow('keeps its end');

  await run('DROP TRIGGER audit_rows_refuse_update');
  await run('DROP TRIGGER audit_rows_refuse_delete');
  const last = (await models.AuditRow.findOne({ order: [['id', 'DESC']], rejectOnEmpty: true })).id;
  const middle = (await models.AuditRow.findOne({ order: ['id'], offset: 5, rejectOnEmpty: true }))
    .id;
  const { words } = await models.AuditRow.findByPk(middle, { rejectOnEmpty: true });
  await run(`UPDATE audit_rows SET words = 'something else' WHERE id = ${middle}`);
  expect(await verify()).toEqual({ holds: false, rows: 5, brokenAt: middle });
  await models.AuditRow.update({ words }, { where: { id: middle } });
  expect((await verify()).holds).toBe(true);
  await run(`DELETE FROM audit_rows WHERE id = ${last}`);
  expect(await verify()).toMatchObject({ holds: false, brokenAt: null });
  await run(`DELETE FROM audit_rows WHERE id = ${middle}`);
  expect(await verify()).toMatchObject({ holds: false, rows: 5 });
});
