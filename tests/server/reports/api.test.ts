import { createHash } from 'node:crypto';
import type { ReportRow } from '../../../shared/reports/types';
import type { Verification } from '../../../shared/review/types';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildChecked, sendAnswered, sign, type Checked } from '../review/buildChecked';
import { pdfPages } from './pdfText';

jest.setTimeout(180_000);

let server: TestServer;
let checked: Checked;
beforeAll(async () => {
  server = await startTestServer({ PUBLIC_URL: 'https://spate.example' });
  checked = await buildChecked(server);
});
afterAll(() => server.stop());

type Api = Checked['asModeller'];
const address = () => `/api/runs/${checked.run.id}/report.pdf`;
async function take(api: Api, paper?: string): Promise<Buffer> {
  const request = api.get(address()).query(paper ? { paper } : {});
  const { body } = await request.buffer(true).responseType('blob').expect(200);
  return body;
}
const rows = async (): Promise<ReportRow[]> =>
  (await checked.asSenior.get(`/api/runs/${checked.run.id}/reports`).expect(200)).body;
const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

it('is preliminary before the signature, drawn without holding up the server, and not kept', async () => {
  let ticks = 0;
  const ticking = setInterval(() => ticks++, 20);
  const response = await checked.asModeller.get(address()).responseType('blob').expect(200);
  clearInterval(ticking);
  expect(response.headers['content-type']).toBe('application/pdf');
  expect(response.headers['content-disposition']).toContain('run-1-report.pdf');
  for (const page of await pdfPages(response.body)) expect(page).toContain('PRELIMINARY');
  expect(ticks).toBeGreaterThan(10);
  expect(await rows()).toEqual([]);
});

it('takes the words of the check as they stand', async () => {
  await sendAnswered(checked);
  const text = (await pdfPages(await take(checked.asSenior))).join(' ');
  expect(text).toContain('Finite volumes.');
  expect(text).toContain('Modeller: Looked at.');
  expect(text).toContain('Client Council');
});

it('is kept with its hash from the signature on: the same bytes for everybody, on both papers', async () => {
  const { signOff } = await sign(server, checked);
  const [first, second] = await Promise.all([take(checked.asSenior), take(checked.asModeller)]);
  expect(first.equals(second)).toBe(true);
  const letter = await take(checked.asModeller, 'LETTER');
  const kept = await rows();
  expect(
    kept.map(({ paper, standing, hash, bytes }) => ({ paper, standing, hash, bytes })),
  ).toEqual(
    expect.arrayContaining([
      { paper: 'A4', standing: 'signed', hash: sha256(first), bytes: first.length },
      { paper: 'LETTER', standing: 'signed', hash: sha256(letter), bytes: letter.length },
    ]),
  );
  expect(kept).toHaveLength(2);
  const pages = await pdfPages(first);
  expect(kept[0].pages).toBeGreaterThan(5);
  const text = pages.join(' ');
  expect(text).not.toContain('PRELIMINARY');
  expect(text).toContain(`https://spate.example/verify/${signOff!.verificationCode}`);

  const told: Verification = (
    await server.request.get(`/api/verification/${signOff!.verificationCode}`).expect(200)
  ).body;
  expect([...told.reportHashes].sort()).toEqual([sha256(first), sha256(letter)].sort());
});

it('carries the published cases as its last pages where that is asked for, and is kept so as well', async () => {
  const { asModeller, firmId, run } = checked;
  const plain = await take(asModeller);
  const withAnnex = () => asModeller.get(address()).query({ annex: 'true' });
  const none = await withAnnex().expect(409);
  expect(none.body.error.message).toContain('Run the cases first');

  await asModeller.post('/api/verification-cases/runs').send({ caseIds: ['uniform-mild'] });
  server.services.tasks.start();
  while ((await server.services.verificationCases.find.finished(firmId)).length === 0)
    await new Promise((resolve) => setTimeout(resolve, 50));
  const response = await withAnnex().buffer(true).responseType('blob').expect(200);
  expect(response.headers['content-disposition']).toContain('run-1-report-with-annex.pdf');
  const pdf: Buffer = response.body;
  const [before, after] = [await pdfPages(plain), await pdfPages(pdf)];
  expect(after.length).toBeGreaterThan(before.length + 1);
  after.forEach((page, k) => expect(page).toContain(`${k + 1} of ${after.length}`));
  const annex = after.slice(before.length);
  expect(annex[0]).toContain('Annex: published cases');
  expect(annex[0]).toContain('what is signed in the report above is the run');
  // What stands before it is the report as it is without.
  const text = after.slice(0, before.length).join(' ');
  expect(text.replace(/\d+ of \d+/g, '')).toBe(before.join(' ').replace(/\d+ of \d+/g, ''));

  const again = await withAnnex().buffer(true).responseType('blob').expect(200);
  expect((again.body as Buffer).equals(pdf)).toBe(true);
  expect((await take(asModeller)).equals(plain)).toBe(true);
  const kept = await rows();
  expect(kept.find(({ annex: has, paper }) => has && paper === 'A4')!.hash).toBe(sha256(pdf));
  expect(kept.filter(({ annex: has }) => !has)).toHaveLength(2);
  const { verificationCode } = (await server.services.models.SignOff.findOne({
    where: { runId: run.id },
  }))!;
  const told: Verification = (
    await server.request.get(`/api/verification/${verificationCode}`).expect(200)
  ).body;
  expect(told.reportHash).toBe(sha256(plain));
  expect(told.reportHashes).toContain(sha256(pdf));
  const trail = await server.services.models.AuditRow.findAll({ where: { firmId } });
  expect(trail.map(({ words }) => words).join('\n')).toMatch(
    /Report downloaded with the annex of published cases: run 1, /,
  );
});

it('says the same after names of the study and its people have changed', async () => {
  const before = await take(checked.asSenior);
  await checked.study.update({ title: 'Another title' });
  expect((await take(checked.asSenior)).equals(before)).toBe(true);
});

it('is refused any change by the database', async () => {
  const { sequelize } = server.services;
  for (const statement of ["UPDATE reports SET hash = REPEAT('0', 64)", 'DELETE FROM reports'])
    await expect(sequelize.query(statement)).rejects.toThrow('Reports are kept as they were made.');
  const copy = (change: string) =>
    sequelize.query(
      `INSERT INTO reports (run_id, standing, paper, hash, bytes, pages, pdf, created_at)
       SELECT run_id, ${change}, bytes, pages, pdf, created_at FROM reports WHERE paper = 'A4'`,
    );
  await expect(copy("'withdrawn', 'A4', hash")).rejects.toThrow('as its signature stands');
  await expect(copy("'preliminary', 'A4', hash")).rejects.toThrow('as its signature stands');
  await expect(copy("'signed', 'A3', REPEAT('0', 64)")).rejects.toThrow('not that of the report');
  await expect(copy("'signed', 'A4', hash")).rejects.toThrow();
});

it('is marked after a withdrawal; what was signed stays kept', async () => {
  const signed = await take(checked.asSenior);
  await checked.asSenior
    .post(`/api/runs/${checked.run.id}/review/withdraw`)
    .send({ reason: 'The inflow was of another catchment.' })
    .expect(200);
  const marked = await take(checked.asSenior);
  const pages = await pdfPages(marked);
  for (const page of pages) expect(page).toContain('WITHDRAWN');
  expect(pages[0]).toContain('The inflow was of another catchment.');
  // Drawn after the study was renamed: the record of the signature goes first.
  expect(pages.join(' ')).not.toContain('Another title');
  const kept = await rows();
  expect(kept.filter(({ standing }) => standing === 'signed').map(({ hash }) => hash)).toContain(
    sha256(signed),
  );
  expect(kept.find(({ standing, paper }) => standing === 'withdrawn' && paper === 'A4')!.hash).toBe(
    sha256(marked),
  );
});

it('is not there for clients, surveyors and other firms, and only on paper that is known', async () => {
  const { firmId } = checked;
  const surveyor = await buildUser(server.services, ['surveyor'], { firmId });
  const stranger = await buildUser(server.services, ['seniorEngineer']);
  for (const api of [
    checked.asClient,
    await server.signInAs(surveyor),
    await server.signInAs(stranger),
  ]) {
    await api.get(address()).expect(404);
    await api.get(`/api/runs/${checked.run.id}/reports`).expect(404);
  }
  await server.request.get(address()).expect(401);
  const { body } = await checked.asModeller.get(address()).query({ paper: 'A3' }).expect(422);
  expect(body.error.faults).toEqual([{ path: 'paper', message: 'Choose A4 or LETTER.' }]);
});

it('needs results', async () => {
  const { run } = await buildChecked(server);
  await run.update({ state: 'failed' });
  const modeller = await server.services.models.User.findByPk(run.requestedBy, {
    rejectOnEmpty: true,
  });
  const api = await server.signInAs(modeller);
  await api.get(`/api/runs/${run.id}/report.pdf`).expect(409);
});
