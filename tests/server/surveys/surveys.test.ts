import { createHash } from 'node:crypto';
import * as XLSX from 'xlsx';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { unpackJson } from '../../../server/database/packedJson';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { keptMail } from '../../helpers/keptMail';
import { sheetOf, soundRows, HEADINGS } from '../../helpers/surveyRows';
import { startTestServer, type TestServer } from '../../helpers/testServer';

// Reading a file starts a thread, which takes seconds on a busy machine.
jest.setTimeout(120_000);

let server: TestServer;
let modeller: UserModel;
let surveyor: UserModel;
let study: StudyModel;
beforeAll(async () => {
  server = await startTestServer();
  modeller = await buildUser(server.services, ['modeller']);
  surveyor = await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId });
});
beforeEach(async () => {
  study = await buildStudy(server.services, modeller);
  await buildMember(server.services, study, surveyor, 'surveyor');
});
afterAll(() => server.stop());

type Api = Awaited<ReturnType<TestServer['signInAs']>>;
const surveys = () => `/api/studies/${study.id}/surveys`;
const send = (
  api: Api,
  bytes: Buffer,
  fields: Record<string, string> = {},
  name = 'survey.xlsx',
  path = surveys(),
) => {
  const request = api.post(path).attach('file', bytes, name);
  for (const [key, value] of Object.entries(fields)) request.field(key, value);
  return request;
};
const faulty = () => {
  const rows = soundRows();
  rows[2][3] = null;
  return sheetOf(rows);
};

test('reading stores nothing, with faults or without', async () => {
  const api = await server.signInAs(surveyor);
  const good = await send(
    api,
    sheetOf(soundRows()),
    {},
    'veshall.xlsx',
    `${surveys()}/read`,
  ).expect(200);
  expect(good.body).toMatchObject({
    fileName: 'veshall.xlsx',
    sectionCount: 3,
    pointCount: 15,
    faults: [],
  });
  const bad = await send(api, faulty(), {}, 'veshall.xlsx', `${surveys()}/read`).expect(200);
  expect(bad.body.faults[0]).toMatchObject({ row: 4, column: 'D', title: 'Elevation is missing' });
  expect((await api.get(surveys())).body).toEqual({ revisions: [], refusals: [] });
});

test('what is accepted is a numbered revision with its reach', async () => {
  const api = await server.signInAs(modeller);
  const bytes = sheetOf(soundRows());
  const first = await send(api, bytes, { note: 'November' }, 'Veshall Überlauf.xlsx').expect(201);
  expect(first.body).toMatchObject({
    revision: 1,
    fileName: 'Veshall Überlauf.xlsx',
    fileHash: createHash('sha256').update(bytes).digest('hex'),
    note: 'November',
    sectionCount: 3,
    pointCount: 15,
    firstChainage: 0,
    lastChainage: 1000,
    sentBy: modeller.name,
  });
  const second = await send(api, sheetOf(soundRows().slice(0, 10))).expect(201);
  expect(second.body.revision).toBe(2);

  const { body } = await api.get(`/api/surveys/${first.body.id}`).expect(200);
  expect(body.sections).toHaveLength(3);
  expect(body.sections[0].points[0]).toEqual([0, 22]);
  const reaches = await api.get(`/api/studies/${study.id}/reaches`).expect(200);
  expect(
    reaches.body.map(({ name, revision }: { name: string; revision: number }) => [name, revision]),
  ).toEqual([
    ['Revision 2', 2],
    ['Revision 1', 1],
  ]);
  const stored = await server.services.models.SurveyRevision.unscoped().findByPk(first.body.id);
  expect(stored!.file.equals(bytes)).toBe(true);
});

test('of a refused file only the refusal is kept', async () => {
  const api = await server.signInAs(surveyor);
  const { body } = await send(api, faulty(), {}, '=cmd.xlsx').expect(422);
  expect(body.error.code).toBe('surveyRefused');
  expect(body.error.message).toMatch(/^Not taken in: 1 fault\./);
  expect(body.error.details).toMatchObject({
    sectionCount: 3,
    sections: [],
    faults: [{ title: 'Elevation is missing' }],
  });
  const list = (await api.get(surveys())).body;
  expect(list.revisions).toEqual([]);
  expect(list.refusals).toEqual([
    expect.objectContaining({ fileName: '=cmd.xlsx', faultCount: 1, sentBy: surveyor.name }),
  ]);
  const { SurveyRevision, Reach } = server.services.models;
  expect(await SurveyRevision.count({ where: { studyId: study.id } })).toBe(0);
  expect(await Reach.count({ where: { studyId: study.id } })).toBe(0);

  const file = await api
    .get(`/api/refusals/${list.refusals[0].id}/faults.xlsx`)
    .responseType('blob')
    .expect(200);
  expect(file.headers['content-disposition']).toBe('attachment; filename=faults.xlsx');
  const sheet = XLSX.read(file.body).Sheets['Faults'];
  const rows = XLSX.utils.sheet_to_json<unknown[]>(sheet, { header: 1 });
  expect(rows[3].slice(0, 6)).toEqual(['Main', 4, undefined, 'D', 'Fault', 'Elevation is missing']);
  // A name that begins like a formula is text, not a formula.
  expect(sheet['B1']).toMatchObject({ t: 's', v: '=cmd.xlsx' });
  expect(sheet['B1'].f).toBeUndefined();
});

test('the match that a person chose is used, and checked', async () => {
  const api = await server.signInAs(surveyor);
  const odd = sheetOf(soundRows(), ['A', 'B', 'C', 'D']);
  const columns = ['section', 'chainage', 'offset', 'elevation'].map((field, column) => ({
    column,
    field,
    unit: column === 0 ? null : 'ft',
  }));
  const match = JSON.stringify({ columns, decimal: 'auto' });
  const made = await send(api, odd, { match }).expect(201);
  expect(made.body.lastChainage).toBeCloseTo(304.8, 6);
  await send(api, odd, { match: '{not json' }).expect(422);
  const bad = await send(api, odd, {
    match: JSON.stringify({ columns: [{ column: 0, field: 'colour' }] }),
  }).expect(422);
  expect(bad.body.error).toMatchObject({ code: 'invalid', faults: [{ path: 'columns[0].field' }] });
});

test('a study in US customary units reads feet where the file names none', async () => {
  const { body } = await (async () => {
    study = await buildStudy(server.services, modeller, { unitSystem: 'usCustomary' });
    const api = await server.signInAs(modeller);
    return send(
      api,
      sheetOf(
        soundRows(),
        HEADINGS.map((heading) => String(heading).replace(' (m)', '')),
      ),
    ).expect(201);
  })();
  expect(body.lastChainage).toBeCloseTo(304.8, 6);
});

test('the newest revision sent again is not stored twice', async () => {
  const api = await server.signInAs(modeller);
  const bytes = sheetOf(soundRows());
  await send(api, bytes).expect(201);
  const { body } = await send(api, bytes).expect(409);
  expect(body.error.message).toMatch(/revision 1 already/);
});

test('two that arrive at once get two numbers', async () => {
  const api = await server.signInAs(modeller);
  const [a, b] = await Promise.all([
    send(api, sheetOf(soundRows())).expect(201),
    send(api, sheetOf(soundRows().slice(0, 10))).expect(201),
  ]);
  expect([a.body.revision, b.body.revision].sort()).toEqual([1, 2]);
});

test('what cannot be read at all, and what is too large, is said', async () => {
  const api = await server.signInAs(modeller);
  const pdf = await send(api, Buffer.from('%PDF-1.7'), {}, 'survey.pdf').expect(422);
  expect(pdf.body.error).toMatchObject({
    code: 'unreadable',
    message: expect.stringMatching(/a PDF/),
  });
  await send(api, Buffer.alloc(20 * 1024 * 1024 + 1, 65)).expect(413);
  const none = await api.post(surveys()).field('note', 'no file').expect(422);
  expect(none.body.error.faults).toEqual([{ path: 'file', message: 'Choose a file.' }]);
});

test('a surveyor sees their own alone', async () => {
  const own = await server.signInAs(surveyor);
  const engineer = await server.signInAs(modeller);
  const mine = await send(own, sheetOf(soundRows())).expect(201);
  const theirs = await send(engineer, sheetOf(soundRows().slice(0, 10))).expect(201);
  await send(engineer, faulty()).expect(422);
  const list = (await own.get(surveys()).expect(200)).body;
  expect(list.revisions.map(({ id }: { id: number }) => id)).toEqual([mine.body.id]);
  expect(list.refusals).toEqual([]);
  await own.get(`/api/surveys/${mine.body.id}`).expect(200);
  await own.get(`/api/surveys/${theirs.body.id}`).expect(404);
  const all = (await engineer.get(surveys())).body;
  expect(all.revisions).toHaveLength(2);
  await own.get(`/api/refusals/${all.refusals[0].id}/faults.xlsx`).expect(404);
  await own.get(`/api/studies/${study.id}/scenarios`).expect(404);
});

test('clients, strangers and other firms neither send nor see', async () => {
  const made = await send(await server.signInAs(modeller), sheetOf(soundRows())).expect(201);
  const client = await buildUser(server.services, ['client'], { firmId: modeller.firmId });
  await buildMember(server.services, study, client, 'client');
  const asClient = await server.signInAs(client);
  await send(asClient, sheetOf(soundRows())).expect(403);
  const stranger = await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId });
  const other = await buildUser(server.services, ['modeller']);
  for (const person of [stranger, other]) {
    const api = await server.signInAs(person);
    await send(api, sheetOf(soundRows())).expect(404);
    await send(api, sheetOf(soundRows()), {}, 'survey.xlsx', `${surveys()}/read`).expect(404);
  }
  for (const person of [client, stranger, other]) {
    const api = await server.signInAs(person);
    await api.get(surveys()).expect(404);
    await api.get(`/api/surveys/${made.body.id}`).expect(404);
  }
});

test('an accepted revision does not change when its reach does', async () => {
  const api = await server.signInAs(modeller);
  const made = await send(api, sheetOf(soundRows())).expect(201);
  const [reach] = (await api.get(`/api/studies/${study.id}/reaches`)).body;
  await api
    .patch(`/api/reaches/${reach.id}/sections`)
    .send({ version: 1, sectionIds: ['XS-01'], banks: [5, 15] })
    .expect(200);
  const revision = await server.services.models.SurveyRevision.unscoped().findByPk(made.body.id);
  const [section] = await unpackJson<{ banks: unknown }[]>(revision!.sections);
  expect(section.banks).toBeNull();
});

test('a hand-in of a surveyor waits for an engineer, who accepts it or returns it with remarks', async () => {
  const [own, engineer] = [await server.signInAs(surveyor), await server.signInAs(modeller)];
  const reaches = async () => (await engineer.get(`/api/studies/${study.id}/reaches`)).body;
  const first = await send(own, sheetOf(soundRows()), { note: 'High water' }).expect(201);
  expect(first.body.decision).toBeNull();
  expect(await reaches()).toEqual([]);
  const [told] = (await keptMail(server.services, modeller.email)).slice(-1);
  expect(told.subject).toBe(`Survey handed in: ${study.title}`);
  expect(told.text).toContain('High water');
  expect(told.links[0]).toMatch(
    new RegExp(`/studies/${study.id}/survey\\?revision=${first.body.id}$`),
  );

  const decide = (id: number, body: object, api = engineer) =>
    api.post(`/api/surveys/${id}/decision`).send(body);
  await decide(first.body.id, { decision: 'accepted' }, own).expect(403);
  const bare = await decide(first.body.id, { decision: 'returned', remarks: ' ' }).expect(422);
  expect(bare.body.error.faults[0].path).toBe('remarks');
  const remarks = 'XS-02 stands 0.4 m too high: check the instrument height.';
  const returned = await decide(first.body.id, { decision: 'returned', remarks }).expect(200);
  expect(returned.body.decision).toMatchObject({
    decision: 'returned',
    remarks,
    by: modeller.name,
  });
  expect(await reaches()).toEqual([]);
  const mail = (await keptMail(server.services, surveyor.email)).at(-1)!;
  expect(mail.subject).toBe(`Survey returned: ${study.title}`);
  expect(mail.text).toContain(remarks);
  expect((await own.get(surveys())).body.revisions[0].decision.remarks).toBe(remarks);

  // The same file may come again after a return, but not while it waits.
  const second = await send(own, sheetOf(soundRows())).expect(201);
  await send(own, sheetOf(soundRows())).expect(409);
  await decide(second.body.id, { decision: 'accepted' }).expect(200);
  expect(await reaches()).toHaveLength(1);
  const good = (await keptMail(server.services, surveyor.email)).at(-1)!;
  expect(good.subject).toBe(`Survey accepted: ${study.title}`);
  await decide(second.body.id, { decision: 'returned', remarks }).expect(409);
  // What was returned may be accepted after all.
  await decide(first.body.id, { decision: 'accepted' }).expect(200);
  expect(await reaches()).toHaveLength(2);
});
