import type { IssuedResult } from '../../../shared/review/types';
import type { RunSummary } from '../../../shared/runs/types';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildChecked, sendAnswered, sign, type Checked } from '../review/buildChecked';

let server: TestServer;
let checked: Checked;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  checked = await buildChecked(server);
}, 60_000);
afterAll(() => server.stop());

const bridge = () => checked.stations[1];
const summary = async (): Promise<RunSummary> =>
  (await checked.asModeller.get(`/api/runs/${checked.run.id}/summary`).expect(200)).body;
const put = (levels: unknown) =>
  checked.asModeller
    .patch(`/api/stations/${bridge().id}`)
    .send({ name: 'Bridge', chainage: 1000, levels });

test('a level that is no level is told at its line, and nothing of it is kept', async () => {
  const { body } = await put([
    { kind: 'soffit', level: 12, note: '' },
    { kind: 'roof', level: null, note: '' },
  ]).expect(422);
  const paths = body.error.faults.map(({ path }: { path: string }) => path);
  expect(paths).toEqual(expect.arrayContaining(['levels[1].kind', 'levels[1].level']));
  expect((await summary()).levels).toEqual([]);
});

test('freeboard is the level less the peak; a name alone changed leaves the levels', async () => {
  const { peakStage } = (await summary()).stations.find(({ name }) => name === 'Bridge')!;
  await put([
    { kind: 'soffit', level: peakStage + 0.4, note: '' },
    { kind: 'road', level: peakStage - 0.001, note: ' Mill Lane ' },
  ]).expect(200);
  await checked.asModeller
    .patch(`/api/stations/${bridge().id}`)
    .send({ name: 'Old bridge', chainage: 1000 })
    .expect(200);
  const [road, soffit] = (await summary()).levels;
  expect(road).toMatchObject({ name: 'Old bridge', kind: 'road', note: 'Mill Lane' });
  expect(road.freeboard).toBeCloseTo(-0.001, 9);
  expect(road.passedAt).not.toBeNull();
  expect(soffit).toMatchObject({ kind: 'soffit', passedAt: null, passedFor: 0 });
  expect(soffit.freeboard).toBeCloseTo(0.4, 9);
});

test('engineers and the client see the levels that were signed, whatever became of them since', async () => {
  await sendAnswered(checked);
  await sign(server, checked);
  await put([]).expect(200);
  const { levels } = await summary();
  expect(levels.map(({ kind }) => kind)).toEqual(['road', 'soffit']);
  await checked.asSenior
    .post(`/api/runs/${checked.run.id}/review/issue`)
    .send({ stationIds: [bridge().id] })
    .expect(200);
  const shown = await checked.asClient.get(`/api/studies/${checked.study.id}/issued`).expect(200);
  const [{ stations }] = shown.body as IssuedResult[];
  expect(stations[0].levels.map(({ kind }) => kind)).toEqual(['road', 'soffit']);
});
