import type { IssuedResult, QueueRow, Review } from '../../../shared/review/types';
import type { RunAlong, RunSummary } from '../../../shared/runs/types';
import type { StationLevel } from '../../../shared/studies/stationLevels';
import { keptMail } from '../../helpers/keptMail';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { PASSWORD } from '../../helpers/factories/buildUser';
import { buildRunOf } from '../../helpers/factories/buildRoutedRun';
import { buildChecked, sendAnswered, sign, statementOf, WORDS, type Checked } from './buildChecked';

let server: TestServer;
let checked: Checked;
let base: string;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  checked = await buildChecked(server);
  base = `/api/runs/${checked.run.id}/review`;
});
afterAll(() => server.stop());

const subjects = async (to: string) =>
  (await keptMail(server.services, to)).map(({ subject }) => subject);

test('before it is sent the checklist is there, with what the machine found and what it asks', async () => {
  const review: Review = (await checked.asModeller.get(base).expect(200)).body;
  expect(review).toMatchObject({ state: null, sentAt: null, points: [], signOff: null });
  expect(review.may.sort()).toEqual(['review.answer', 'review.send']);
  const outcomes = Object.fromEntries(review.checklist.map(({ id, outcome }) => [id, outcome]));
  expect(outcomes).toMatchObject({
    volumeBalance: 'good',
    timeStep: 'good',
    outletInfluence: 'asked',
    gridSize: 'asked',
    calibration: 'asked',
    warnings: 'look',
  });
  expect(review.obstacles).toContain('It was not sent for checking.');
});

test('sent: both sides are told, it stands in the queue, and the run says so', async () => {
  const { asModeller, asSenior, people, run, study } = checked;
  const sent: Review = (await asModeller.post(base).send(WORDS).expect(200)).body;
  expect(sent).toMatchObject({ state: 'inCheck', ...WORDS, sentTo: null });
  expect((await subjects(people.senior.email))[0]).toMatch(/^To check: run 1, /);
  expect((await subjects(people.modeller.email))[0]).toMatch(/^In check: run 1, /);
  const queue: QueueRow[] = (await asSenior.get('/api/reviews/queue').expect(200)).body;
  expect(queue).toEqual([
    expect.objectContaining({ runId: run.id, studyId: study.id, openPoints: 0, mine: false }),
  ]);
  expect((await asSenior.get(`/api/runs/${run.id}`)).body.review).toBe('inCheck');
  await asModeller.post(base).send(WORDS).expect(409);
});

test('points: raised at a place and a time, answered, reopened, closed', async () => {
  const { asModeller, asSenior } = checked;
  const raise = (body: object) => asSenior.post(`${base}/points`).send(body);
  await raise({ chainage: 9999, text: 'Off the reach' }).expect(422);
  await raise({ time: 1e6, text: 'After the end' }).expect(422);
  const raised: Review = (await raise({ chainage: 1000, time: 3600, text: 'Why?' }).expect(200))
    .body;
  const [{ id }] = raised.points;
  expect(raised.points[0]).toMatchObject({ chainage: 1000, time: 3600, state: 'open' });
  const statement = await statementOf(server, checked.run);
  const trySign = () => asSenior.post(`${base}/sign`).send({ statement, password: PASSWORD });
  expect((await trySign().expect(409)).body.error.message).toContain('One point is open.');

  await asModeller.post(`/api/points/${id}/answer`).send({ text: '' }).expect(422);
  await asModeller.post(`/api/points/${id}/close`).send({}).expect(403);
  await asModeller.post(`/api/points/${id}/answer`).send({ text: 'Because.' }).expect(200);
  expect((await trySign().expect(409)).body.error.message).toContain('answered and not closed');
  await asSenior.post(`/api/points/${id}/reopen`).send({ text: 'Not enough.' }).expect(200);
  await asModeller.post(`/api/points/${id}/answer`).send({ text: 'Because of this.' }).expect(200);
  const closed: Review = (await asSenior.post(`/api/points/${id}/close`).send({}).expect(200)).body;
  expect(closed.points[0].state).toBe('closed');
  expect(closed.points[0].entries.map(({ kind }) => kind)).toEqual([
    'answer',
    'reopened',
    'answer',
    'closed',
  ]);
});

test('returned with the reason, and sent again', async () => {
  const { asModeller, asSenior, people } = checked;
  await asSenior.post(`${base}/return`).send({ reason: '' }).expect(422);
  const reason = 'The inflow has no source.';
  const returned: Review = (await asSenior.post(`${base}/return`).send({ reason }).expect(200))
    .body;
  expect(returned).toMatchObject({ state: 'returned', returnReason: reason });
  expect((await keptMail(server.services, people.modeller.email)).at(-1)!.text).toContain(reason);
  expect((await asSenior.get('/api/reviews/queue')).body).toEqual([]);
  const again = await sendAnswered(checked);
  expect(again).toMatchObject({ state: 'inCheck', returnReason: null });
  expect(again.obstacles).toEqual([]);
  await asModeller
    .post(`${base}/issue`)
    .send({ stationIds: [1] })
    .expect(409);
});

test('signing asks for the statement word for word, the password, and a name with its standing', async () => {
  const { asSenior, people } = checked;
  const statement = await statementOf(server, checked.run);
  const post = (body: object) => asSenior.post(`${base}/sign`).send(body);
  const wrong = await post({ statement, password: 'a wrong one' }).expect(422);
  expect(wrong.body.error.faults).toEqual([expect.objectContaining({ path: 'password' })]);
  await post({ statement: 'I have looked at it.', password: PASSWORD }).expect(422);
  const asOther = await server.signInAs(people.other);
  const bare = await asOther
    .post(`${base}/sign`)
    .send({ statement, password: PASSWORD })
    .expect(409);
  expect(bare.body.error.details.obstacles).toHaveLength(2);

  const signed = await sign(server, checked);
  expect(signed).toMatchObject({
    state: 'signed',
    signOff: {
      by: { id: people.senior.id, name: people.senior.name },
      qualification: 'Chartered Engineer',
      registrationNumber: 'R-1',
      statement,
      caseHash: checked.run.caseHash,
      solverVersion: checked.run.solverVersion,
      withdrawal: null,
    },
  });
  expect(signed.signOff!.verificationCode).toMatch(
    /^([0-9A-HJKMNP-TV-Z]{4}-){3}[0-9A-HJKMNP-TV-Z]{4}$/,
  );
  expect((await subjects(people.modeller.email)).at(-1)).toMatch(/^Signed: /);
});

test('from then on no route changes anything of it, for any role', async () => {
  const { asModeller, asSenior } = checked;
  const before: Review = (await asSenior.get(base)).body;
  const point = before.points[0].id;
  await asModeller.post(base).send(WORDS).expect(409);
  await asModeller.put(`${base}/answers`).send({ answers: [] }).expect(409);
  await asSenior.post(`${base}/points`).send({ text: 'Late' }).expect(409);
  await asSenior.post(`/api/points/${point}/reopen`).send({ text: 'Late' }).expect(409);
  await asSenior.post(`${base}/return`).send({ reason: 'Late' }).expect(409);
  await asModeller.post(`${base}/outlet-probe`).expect(409);
  await asModeller.post(`/api/runs/${checked.run.id}/retry`).expect(409);
  await checked.people.senior.update({ qualification: 'Another', name: 'Another' });
  await checked.stations[0].update({ name: 'Renamed' });
  expect((await asSenior.get(base)).body).toEqual(before);
});

test('its results and its files are read at the stations and levels of the signature', async () => {
  const { asSenior, run, stations } = checked;
  const road: StationLevel = { kind: 'road', level: 1, note: 'Of today' };
  await stations[1].update({ levels: [road] });
  const read = async (path: string) => asSenior.get(`/api/runs/${run.id}/${path}`).expect(200);
  const summary: RunSummary = (await read('summary')).body;
  expect(summary.stations.map(({ name }) => name)).not.toContain('Renamed');
  expect(summary.levels).toEqual([]);
  expect(summary.signed!.differs).toEqual([
    { name: summary.stations[0].name, what: 'renamed' },
    { name: stations[1].name, what: 'levels' },
  ]);
  const along: RunAlong = (await read('along?threshold=rise&value=0.1')).body;
  expect(along.stations.map(({ name }) => name)).toEqual(summary.stations.map(({ name }) => name));
  expect((await read('levels.csv')).text.trim().split('\r\n')).toHaveLength(1);
  expect((await read('results.csv')).text).not.toContain('Renamed');
  await stations[1].update({ levels: [] });
});

test('issued: the client is told and sees the chosen stations alone', async () => {
  const { asClient, asModeller, people, run, stations, study } = checked;
  const address = `/api/studies/${study.id}/issued`;
  expect((await asClient.get(address).expect(200)).body).toEqual([]);
  await asClient.post(`/api/issued/${run.id}/read`).expect(404);
  await asModeller
    .post(`${base}/issue`)
    .send({ stationIds: [999999] })
    .expect(422);
  const stationIds = [stations[0].id];
  await asModeller.post(`${base}/issue`).send({ stationIds, message: 'As agreed.' }).expect(200);
  await asModeller.post(`${base}/issue`).send({ stationIds }).expect(409);
  const mail = (await keptMail(server.services, people.client.email)).at(-1)!;
  expect(mail.subject).toBe(`Result issued: ${study.title}`);
  expect(mail.text).toContain('As agreed.');

  const [result]: IssuedResult[] = (await asClient.get(address).expect(200)).body;
  expect(result).toMatchObject({ runId: run.id, withdrawn: null, readAt: null });
  expect(result.stations).toHaveLength(1);
  const [mill] = result.stations;
  // By hand: bed 49.5 m, depth 1 m and 2 m more at the peak, which comes after 500/2 + 1800 s; banks 4 m above the bed.
  expect(mill).toMatchObject({ name: 'Mill', chainage: 500, leavesBanks: false });
  expect(mill.peakStage).toBeCloseTo(52.5, 6);
  expect(mill.peakStageTime).toBeCloseTo(2050, 6);
  expect(mill.withinBanksAgain).toBeNull();
  expect(mill.hazard).toMatchObject({ label: 'H6' });

  await asClient.post(`/api/issued/${run.id}/read`).expect(204);
  await asClient.post(`/api/issued/${run.id}/read`).expect(204);
  expect((await asClient.get(address)).body[0].readAt).not.toBeNull();
  const { reads }: Review = (await asModeller.get(base)).body;
  expect(reads).toEqual([expect.objectContaining({ by: people.client.name })]);
  for (const path of [`/api/runs/${run.id}`, base, `/api/runs/${run.id}/results.csv`])
    await asClient.get(path).expect(404);
});

test('a new run of the scenario replaces it, and both say so', async () => {
  const { asSenior, people, scenario, stations, study } = checked;
  const run = await buildRunOf(server.services, people.modeller, scenario);
  const next = { ...checked, run };
  await sendAnswered(next);
  const signed = await sign(server, next);
  expect(signed.signOff).toMatchObject({ supersedesRunNumber: 1, supersededByRunNumber: null });
  const old: Review = (await asSenior.get(base)).body;
  expect(old.signOff!.supersededByRunNumber).toBe(2);
  const told = await server.request.get(`/api/verification/${old.signOff!.verificationCode}`);
  expect(told.body).toMatchObject({ standing: 'superseded' });
  const issue = { stationIds: [stations[1].id] };
  await asSenior.post(`/api/runs/${run.id}/review/issue`).send(issue).expect(200);
  const shown = await checked.asClient.get(`/api/studies/${study.id}/issued`);
  expect(shown.body.map(({ runId }: IssuedResult) => runId)).toEqual([run.id]);
});

test('withdrawn: the record is kept, the client is told, and it cannot be undone', async () => {
  const { asClient, asModeller, asSenior, people, study } = checked;
  const reason = 'The datum was wrong.';
  await asModeller.post(`${base}/withdraw`).send({ reason }).expect(403);
  const withdrawn: Review = (await asSenior.post(`${base}/withdraw`).send({ reason }).expect(200))
    .body;
  expect(withdrawn).toMatchObject({
    state: 'withdrawn',
    may: [],
    signOff: { withdrawal: { reason } },
  });
  await asSenior.post(`${base}/withdraw`).send({ reason }).expect(409);
  const mail = (await keptMail(server.services, people.client.email)).at(-1)!;
  expect(mail.subject).toBe(`Withdrawn, do not use: ${study.title}`);
  expect(mail.text).toContain(reason);
  expect((await asClient.get(`/api/studies/${study.id}/issued`)).status).toBe(200);
});
