import type { Review } from '../../../shared/review/types';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildChecked, sendAnswered, sign, statementOf, type Checked } from './buildChecked';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
});
afterAll(() => server.stop());

/** What the database answers to a statement. */
const tell = (sql: string, ...replacements: unknown[]): Promise<string> =>
  server.services.sequelize.query(sql, { replacements }).then(
    () => 'done',
    (error: Error) => error.message,
  );

const insertSignOff = (checked: Checked, by: number, change: object = {}) => {
  const { run } = checked;
  const values = {
    run_id: run.id,
    signed_by: by,
    signer_name: 'N',
    qualification: 'Q',
    registration_number: 'R',
    statement: 'S',
    at: '2026-01-01',
    case_hash: run.caseHash,
    solver_version: run.solverVersion,
    verification_code: String(Math.random()).slice(2, 18).padEnd(16, '0'),
    record: '',
    ...change,
  };
  const names = Object.keys(values);
  return tell(
    `INSERT INTO sign_offs (review_id, ${names.join(', ')})
     SELECT id, ${names.map(() => '?').join(', ')} FROM reviews WHERE run_id = ${run.id}`,
    ...Object.values(values),
  );
};

test('nobody signs a run that they asked for: neither by the API nor in the database', async () => {
  const checked = await buildChecked(server);
  const { modeller } = checked.people;
  await modeller.update({
    roles: ['modeller', 'seniorEngineer'],
    qualification: 'Chartered Engineer',
    registrationNumber: 'R-2',
  });
  const both = { ...checked, asModeller: await server.signInAs(modeller) };
  const review = await sendAnswered(both);
  expect(review.may).not.toContain('review.sign');
  const statement = await statementOf(server, checked.run);
  await both.asModeller
    .post(`/api/runs/${checked.run.id}/review/sign`)
    .send({ statement, password: PASSWORD })
    .expect(403);
  expect(await insertSignOff(checked, modeller.id)).toContain('Nobody signs a run');
  expect(await server.services.models.SignOff.count({ where: { runId: checked.run.id } })).toBe(0);
});

test('the database refuses a signature over open points, over something else, or by a stranger', async () => {
  const checked = await buildChecked(server);
  const { senior } = checked.people;
  await sendAnswered(checked);
  const base = `/api/runs/${checked.run.id}/review`;
  await checked.asSenior.post(`${base}/points`).send({ text: 'Open' }).expect(200);
  expect(await insertSignOff(checked, senior.id)).toContain('Points of the check are open');
  const point: Review['points'][number] = (await checked.asSenior.get(base)).body.points[0];
  await checked.asSenior.post(`/api/points/${point.id}/close`).send({}).expect(200);
  expect(await insertSignOff(checked, senior.id, { case_hash: 'sha256:other' })).toContain(
    'not what was routed',
  );
  const stranger = await buildUser(server.services, ['seniorEngineer']);
  expect(await insertSignOff(checked, stranger.id)).toContain('Only people of the firm');
  expect(await insertSignOff(checked, senior.id)).toBe('done');
});

test('an unasked-for issue, withdrawal or confirmation is refused by the database', async () => {
  const { people, run } = await buildChecked(server);
  const at = "'2026-01-01'";
  const by = people.senior.id;
  expect(
    await tell(
      `INSERT INTO issues (run_id, issued_by, at, station_ids, message) VALUES (${run.id}, ${by}, ${at}, '[]', '')`,
    ),
  ).toContain('Only what is signed and not withdrawn');
  expect(
    await tell(
      `INSERT INTO withdrawals (run_id, withdrawn_by, at, reason) VALUES (${run.id}, ${by}, ${at}, '')`,
    ),
  ).toContain('Only what is signed is withdrawn');
  expect(
    await tell(`INSERT INTO client_reads (run_id, user_id, at) VALUES (${run.id}, ${by}, ${at})`),
  ).toContain('Only what is issued is read');
});

test('what is signed is kept by the database itself, table by table', async () => {
  const checked = await buildChecked(server);
  const { people, run, stations } = checked;
  await sendAnswered(checked);
  const base = `/api/runs/${run.id}/review`;
  await checked.asSenior.post(`${base}/points`).send({ text: 'One' }).expect(200);
  const { id: pointId } = (await checked.asSenior.get(base)).body.points[0];
  await checked.asSenior.post(`/api/points/${pointId}/close`).send({}).expect(200);
  await sign(server, checked);
  await checked.asSenior
    .post(`${base}/issue`)
    .send({ stationIds: [stations[0].id] })
    .expect(200);
  await checked.asClient.post(`/api/issued/${run.id}/read`).expect(204);
  await checked.asSenior.post(`${base}/withdraw`).send({ reason: 'Wrong.' }).expect(200);

  const where = `WHERE run_id = ${run.id}`;
  const ofReview = `WHERE review_id = (SELECT id FROM reviews ${where})`;
  const statements = [
    `UPDATE runs SET case_bytes = '' WHERE id = ${run.id}`,
    `UPDATE runs SET peak_stage = 0 WHERE id = ${run.id}`,
    `DELETE FROM runs WHERE id = ${run.id}`,
    `UPDATE run_blocks SET bytes = '' ${where}`,
    `DELETE FROM run_blocks ${where}`,
    `INSERT INTO run_blocks (run_id, kind, part, bytes) VALUES (${run.id}, 'facts', 9, '')`,
    `UPDATE reviews SET method = '' ${where}`,
    `DELETE FROM reviews ${where}`,
    `UPDATE review_points SET state = 'open' ${ofReview}`,
    `DELETE FROM review_points ${ofReview}`,
    `UPDATE review_point_entries SET text = '' WHERE point_id = ${pointId}`,
    `DELETE FROM review_point_entries WHERE point_id = ${pointId}`,
    `INSERT INTO review_point_entries (point_id, kind, text, written_by, at)
     VALUES (${pointId}, 'reopened', '', ${people.senior.id}, '2026-01-01')`,
    ...['sign_offs', 'issues', 'withdrawals', 'client_reads'].flatMap((table) => [
      `UPDATE ${table} SET at = '2020-01-01' ${where}`,
      `DELETE FROM ${table} ${where}`,
    ]),
  ];
  for (const sql of statements)
    expect([sql, await tell(sql)]).toEqual([
      sql,
      expect.stringMatching(/is signed; nothing of it changes|are kept as they are/),
    ]);
});

test('passwords are not tried here faster than at the door', async () => {
  const checked = await buildChecked(server);
  await sendAnswered(checked);
  const statement = await statementOf(server, checked.run);
  const post = (password: string) =>
    checked.asSenior.post(`/api/runs/${checked.run.id}/review/sign`).send({ statement, password });
  for (let i = 0; i < 5; i++) await post('wrong').expect(422);
  await post(PASSWORD).expect(429);
});
