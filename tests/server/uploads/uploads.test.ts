import { Upload } from 'tus-js-client';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { LIMITS } from '../../../shared/limits';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { sheetOf, soundRows } from '../../helpers/surveyRows';
import { startTestServer, type TestServer } from '../../helpers/testServer';

/** The protocol: tus.io/protocols/resumable-upload, 1.0.0; its own client is the check from outside. */
let server: TestServer;
let surveyor: UserModel;
let study: StudyModel;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let today = new Date('2026-12-01T08:00:00Z');
beforeAll(async () => {
  server = await startTestServer({}, { now: () => today });
  const modeller = await buildUser(server.services, ['modeller']);
  surveyor = await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId });
  study = await buildStudy(server.services, modeller);
  await buildMember(server.services, study, surveyor, 'surveyor');
  api = await server.signInAs(surveyor);
});
afterAll(() => server.stop());

const uploads = () => `/api/studies/${study.id}/uploads`;
const surveys = () => `/api/studies/${study.id}/surveys`;
const TUS = { 'Tus-Resumable': '1.0.0' };
const named = (name: string) => `filename ${Buffer.from(name).toString('base64')}`;
const begin = async (size: number, name = 'survey.xlsx') => {
  const request = api.post(uploads()).set(TUS);
  return request.set('Upload-Length', String(size)).set('Upload-Metadata', named(name));
};
const part = (address: string, place: number, bytes: Buffer, as = api) =>
  as
    .patch(address)
    .set({ ...TUS, 'Upload-Offset': String(place) })
    .type('application/offset+octet-stream')
    .send(bytes);
const idOf = (address: string) => Number(address.split('/').at(-1));

test('the client of the protocol sends a file in parts, and it is read and taken in', async () => {
  const bytes = sheetOf(soundRows());
  const token = await server.tokenOf(surveyor);
  const address = await new Promise<string>((resolve, reject) => {
    const upload = new Upload(bytes, {
      endpoint: `${server.url}${uploads()}`,
      chunkSize: 4096,
      headers: { Authorization: `Bearer ${token}` },
      metadata: { filename: 'Überlauf.xlsx' },
      onError: reject,
      onSuccess: () => resolve(upload.url!),
    });
    upload.start();
  });
  const uploadId = idOf(address);
  expect((await api.get(uploads())).body).toEqual([
    expect.objectContaining({ id: uploadId, fileName: 'Überlauf.xlsx', received: bytes.length }),
  ]);
  const { body: reading } = await api.post(`${surveys()}/read`).send({ uploadId }).expect(200);
  expect(reading).toMatchObject({ fileName: 'Überlauf.xlsx', sectionCount: 3, faults: [] });
  const { body: taken } = await api.post(surveys()).send({ uploadId, note: 'N' }).expect(201);
  expect(taken).toMatchObject({ revision: 1, fileName: 'Überlauf.xlsx', note: 'N' });
  const kept = await server.services.models.SurveyRevision.unscoped().findByPk(taken.id);
  expect(kept!.file.equals(bytes)).toBe(true);
  // Nothing of the way in is left.
  await api.post(surveys()).send({ uploadId }).expect(404);
  expect(await server.services.models.UploadPart.count()).toBe(0);
});

test('it goes on where it stopped, and a part at the wrong place is refused with the right one', async () => {
  const bytes = sheetOf(soundRows());
  const { headers } = await begin(bytes.length);
  const address: string = headers['location'];
  await part(address, 0, bytes.subarray(0, 1000)).expect(204).expect('Upload-Offset', '1000');
  const wrong = await part(address, 500, bytes.subarray(500, 900)).expect(409);
  expect(wrong.body.error.details).toEqual({ received: 1000 });
  await api.head(address).set(TUS).expect(200).expect('Upload-Offset', '1000');
  const early = await api
    .post(`${surveys()}/read`)
    .send({ uploadId: idOf(address) })
    .expect(409);
  expect(early.body.error.message).toMatch(/1000 of \d+ bytes have arrived/);
  await part(address, 1000, bytes.subarray(1000)).expect(204);
  await part(address, bytes.length, Buffer.from('more')).expect(413);
  await api
    .post(`${surveys()}/read`)
    .send({ uploadId: idOf(address) })
    .expect(200);
  await api.delete(address).set(TUS).expect(204);
  await api.head(address).set(TUS).expect(404);
});

test('two of the same part at once leave one', async () => {
  const { headers } = await begin(2000);
  const address: string = headers['location'];
  const both = [0, 1].map(() => part(address, 0, Buffer.alloc(2000, 65)));
  const answers = await Promise.all(both);
  expect(answers.map(({ status }) => status).sort()).toEqual([204, 409]);
});

test('of a refused file nothing is kept but the refusal', async () => {
  const rows = soundRows();
  rows[2][3] = null;
  const bytes = sheetOf(rows);
  const { headers } = await begin(bytes.length, 'faulty.xlsx');
  const address: string = headers['location'];
  await part(address, 0, bytes).expect(204);
  await api
    .post(surveys())
    .send({ uploadId: idOf(address) })
    .expect(422);
  await api.head(address).set(TUS).expect(404);
});

test('what is too large, empty, nameless or of another version is refused before it travels', async () => {
  const large = await begin(LIMITS.upload.bytes + 1);
  expect(large.status).toBe(413);
  expect(large.body.error.message).toMatch(/20 MB is the most/);
  expect((await begin(0)).status).toBe(422);
  await api.post(uploads()).set(TUS).set('Upload-Length', '10').expect(422);
  await api
    .post(uploads())
    .set('Tus-Resumable', '0.2.2')
    .expect(412)
    .expect('Tus-Version', '1.0.0');
  const { headers } = await begin(10);
  await api.patch(headers['location']).set(TUS).send({ bytes: 'x' }).expect(422);
});

test("another person's upload is not there, neither to go on with nor to hand in", async () => {
  const other = await buildUser(server.services, ['surveyor'], { firmId: surveyor.firmId });
  await buildMember(server.services, study, other, 'surveyor');
  const stranger = await server.signInAs(other);
  const { headers } = await begin(10);
  const address: string = headers['location'];
  await stranger.head(address).set(TUS).expect(404);
  await part(address, 0, Buffer.alloc(10), stranger).expect(404);
  await part(address, 0, Buffer.alloc(10)).expect(204);
  await stranger
    .post(`${surveys()}/read`)
    .send({ uploadId: idOf(address) })
    .expect(404);
  expect((await stranger.get(uploads())).body).toEqual([]);
});

test('of many that were begun the oldest make room; what nobody goes on with is forgotten in a day', async () => {
  for (let i = 0; i < LIMITS.upload.openPerUser + 3; i++) await begin(10);
  expect((await api.get(uploads())).body).toHaveLength(LIMITS.upload.openPerUser);
  today = new Date(today.getTime() + (LIMITS.upload.keptHours + 1) * 3_600_000);
  // Sessions ran out meanwhile, too.
  api = await server.signInAs(surveyor);
  expect((await api.get(uploads())).body).toEqual([]);
  await begin(10);
  expect(await server.services.models.Upload.count()).toBe(1);
});
