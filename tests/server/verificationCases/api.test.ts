import type {
  VerificationDetail,
  VerificationList,
  VerificationResult,
} from '@/shared/verificationCases/types';
import { packJson, unpackJson } from '../../../server/database/packedJson';
import type { UserModel } from '../../../server/models/User';
import { SOLVER_VERSION } from '../../../server/solvers';
import { PUBLISHED_CASES } from '../../../server/verificationCases';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { pdfPages } from '../reports/pdfText';

const CASES = ['uniform-mild', 'uniform-steep', 'surge-gate'];

let server: TestServer;
let modeller: UserModel;
let senior: UserModel;
let elsewhere: UserModel;

beforeAll(async () => {
  server = await startTestServer();
  const { services } = server;
  const firmId = (await buildFirm(services)).id;
  modeller = await buildUser(services, ['modeller'], { firmId });
  senior = await buildUser(services, ['seniorEngineer'], { firmId });
  elsewhere = await buildUser(services, ['modeller'], { firmId: (await buildFirm(services)).id });
});
afterAll(() => server.stop());

async function list(user: UserModel): Promise<VerificationList> {
  const answer = await (await server.signInAs(user)).get('/api/verification-cases');
  expect(answer.status).toBe(200);
  return answer.body as VerificationList;
}
const rowOf = ({ cases }: VerificationList, id: string) => cases.find((row) => row.id === id)!;

async function untilNothingIsOpen(): Promise<VerificationList> {
  for (let tries = 0; tries < 300; tries++) {
    const found = await list(modeller);
    const goesOn = found.cases.some(({ latest }) => latest?.state === 'running');
    if (found.open.length === 0 && !goesOn) return found;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error('The cases did not end.');
}

test('before anything was run every case is described and has no result, and there is no annex', async () => {
  const found = await list(modeller);
  expect(found.solver).toBe(SOLVER_VERSION);
  expect(found.cases.map(({ id }) => id)).toEqual(PUBLISHED_CASES.map(({ id }) => id));
  for (const { latest, result, source, setup } of found.cases) {
    expect([latest, result]).toEqual([null, null]);
    expect(source && setup).toBeTruthy();
  }
  const person = await server.signInAs(modeller);
  expect((await person.get('/api/verification-cases/annex.pdf')).status).toBe(409);
  const empty = await person.get('/api/verification-cases/result?caseId=surge-gate');
  expect((empty.body as VerificationDetail).result).toBeNull();
  expect((await person.get('/api/verification-cases/values.csv?caseId=surge-gate')).status).toBe(
    409,
  );
});

test('what is asked for is checked, and nothing is begun by what is refused', async () => {
  const person = await server.signInAs(modeller);
  const unknown = await person
    .post('/api/verification-cases/runs')
    .send({ caseIds: ['surge-gate', 'none'] });
  expect(unknown.status).toBe(422);
  expect(unknown.body.error.faults[0].path).toBe('caseIds[1]');
  expect((await person.post('/api/verification-cases/runs').send({ caseIds: [] })).status).toBe(
    422,
  );
  expect((await person.get('/api/verification-cases/result?caseId=none')).status).toBe(404);
  expect((await person.get('/api/verification-cases/result')).status).toBe(422);
  expect((await list(modeller)).open).toEqual([]);
});

test('cases wait, are not asked for twice, are routed on the queue, and are kept for the firm', async () => {
  const person = await server.signInAs(modeller);
  const begun = await person.post('/api/verification-cases/runs').send({ caseIds: CASES });
  expect(begun.status).toBe(201);
  expect(rowOf(begun.body, 'surge-gate').latest!.state).toBe('queued');
  expect((begun.body as VerificationList).open).toHaveLength(1);
  const again = await person.post('/api/verification-cases/runs').send({ caseIds: CASES });
  expect(again.status).toBe(409);

  server.services.tasks.start();
  const done = await untilNothingIsOpen();
  for (const id of CASES) {
    const { latest, result } = rowOf(done, id);
    expect(latest!.state).toBe('finished');
    expect(result).toMatchObject({
      within: true,
      solver: SOLVER_VERSION,
      isCurrent: true,
      requestedBy: modeller.name,
    });
  }
  expect(rowOf(done, 'still-wild').result).toBeNull();

  const detail = await (
    await server.signInAs(senior)
  ).get('/api/verification-cases/result?caseId=surge-gate');
  const { result } = detail.body as VerificationDetail;
  expect(result!.grids).toHaveLength(4);
  expect(result!.criteria.every(({ within }) => within)).toBe(true);
  // Behind the surge 1.9140650 m stand (jump conditions, computed apart from this program).
  expect(Math.abs(result!.curves.stage.computed.at(-20)! - 1.914065)).toBeLessThan(1e-3);

  const csv = await person.get('/api/verification-cases/values.csv?caseId=surge-gate');
  const lines = csv.text.trim().split('\r\n');
  expect(lines[0]).toBe(
    'chainage (m),bed (m),stage computed (m),stage exact (m),flow computed (m3/s),flow exact (m3/s)',
  );
  expect(lines).toHaveLength(1 + result!.curves.at.length);
  expect(Number(lines[1].split(',')[2])).toBe(result!.curves.stage.computed[0]);

  const pdf = await person
    .get('/api/verification-cases/annex.pdf?paper=LETTER')
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    });
  expect(pdf.status).toBe(200);
  const text = (await pdfPages(pdf.body as Buffer)).join(' ');
  expect(text).toContain('Annex: published cases');
  expect(text).toContain('A surge from a closed gate');
  expect(text).toContain('V. T. Chow (1959)');
  expect(text).toContain('within');
  expect(text).not.toContain('PRELIMINARY');
});

test('another firm, and who is no engineer, sees nothing of it', async () => {
  const theirs = await list(elsewhere);
  expect(theirs.cases.every(({ result, latest }) => result === null && latest === null)).toBe(true);
  const person = await server.signInAs(elsewhere);
  const detail = await person.get('/api/verification-cases/result?caseId=surge-gate');
  expect((detail.body as VerificationDetail).result).toBeNull();
  expect((await person.get('/api/verification-cases/annex.pdf')).status).toBe(409);
  for (const role of ['client', 'surveyor', 'administrator'] as const) {
    const other = await buildUser(server.services, [role], { firmId: modeller.firmId });
    const refused = await (await server.signInAs(other)).get('/api/verification-cases');
    expect(refused.status).toBe(403);
  }
});

test('a result of an older version, one outside its bounds and one that stopped are shown as such', async () => {
  const { Task, TaskSet } = server.services.models;
  const person = await server.signInAs(modeller);
  const change = async (label: string, with_: (result: VerificationResult) => object) => {
    const first = await Task.unscoped().findOne({ where: { label } });
    const result = await unpackJson<VerificationResult>(first!.result!);
    const set = (await TaskSet.unscoped().findByPk(first!.setId))!;
    const { id: _set, ...ofSet } = set.get({ plain: true });
    const { id: _task, ...ofTask } = first!.get({ plain: true });
    const made = await TaskSet.create(ofSet);
    await Task.create({
      ...ofTask,
      setId: made.id,
      result: await packJson({ ...result, ...with_(result) }),
    });
  };
  await change('uniform-mild', () => ({ solver: '0.9.0' }));
  await change('uniform-steep', ({ criteria }) => ({
    within: false,
    criteria: criteria.map((criterion) => ({ ...criterion, within: false })),
  }));
  const found = await list(modeller);
  expect(rowOf(found, 'uniform-mild').result).toMatchObject({ solver: '0.9.0', isCurrent: false });
  expect(rowOf(found, 'uniform-steep').result).toMatchObject({ within: false, isCurrent: true });

  const pdf = await server.services.verificationCases.annex(modeller.firmId, 'A4');
  const text = (await pdfPages(pdf)).join(' ');
  expect(text).toContain('1 of 3 cases lie outside their bounds');
  expect(text).toContain('0.9.0, older');
  expect(text).toContain('OUTSIDE');

  const last = await Task.findOne({ where: { label: 'surge-gate' } });
  const set = (await TaskSet.unscoped().findByPk(last!.setId))!;
  const { id: _set, ...ofSet } = set.get({ plain: true });
  const made = await TaskSet.create({ ...ofSet, state: 'failed' });
  await Task.create({
    setId: made.id,
    position: 0,
    part: 'member',
    label: 'surge-gate',
    state: 'failed',
    failure: 'velocity grew at chainage 12 m',
    payload: await packJson({ caseId: 'surge-gate' }),
  });
  const row = rowOf(await list(modeller), 'surge-gate');
  expect(row.latest).toMatchObject({
    state: 'failed',
    failure: 'velocity grew at chainage 12 m',
  });
  // What was found before still stands.
  expect(row.result!.within).toBe(true);

  // It can be run again, and cancelled.
  const begun = await person.post('/api/verification-cases/runs').send({ caseIds: ['still-wild'] });
  const [{ id }] = (begun.body as VerificationList).open;
  expect((await person.post(`/api/task-sets/${id}/cancel`)).status).toBe(200);
  expect(rowOf(await untilNothingIsOpen(), 'still-wild').latest!.state).toBe('cancelled');
});
