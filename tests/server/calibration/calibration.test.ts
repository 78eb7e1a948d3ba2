import { read, utils, write } from 'xlsx';
import type { SearchResult } from '../../../shared/calibration/search/types';
import { withFactors } from '../../../shared/calibration/search/withFactors';
import type {
  Mark,
  MarksReading,
  Observations,
  RunResiduals,
} from '../../../shared/calibration/types';
import type { CaseFile } from '../../../shared/case/caseFile';
import type { ResultFile } from '../../../shared/case/resultFile';
import type { RunSummary } from '../../../shared/runs/types';
import type { Scenario } from '../../../shared/scenarios/types';
import type { TaskSet } from '../../../shared/tasks/types';
import { routeCase } from '../../../server/solvers';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { pdfPages } from '../reports/pdfText';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

const FLOOD = 'January 2024';
/** The river is this much rougher than the modeller thought. */
const TRUTH = 1.25;
const WHOLE = { name: 'Whole reach', from: 0, to: 2000, part: 'all' as const, low: 0.6, high: 1.7 };

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let strangers: Awaited<ReturnType<TestServer['signInAs']>>;
let studyId: number;
let scenarioId: number;
let runId: number;
let truth: ResultFile;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  const { services } = server;
  const user = await buildUser(services, ['modeller']);
  api = await server.signInAs(user);
  strangers = await server.signInAs(await buildUser(services, ['modeller']));
  const { study, scenario } = await buildRunnable(services, user);
  [studyId, scenarioId] = [study.id, scenario.id];
  services.runs.start();
  services.tasks.start();
  runId = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body.id;
  await untilEnded(services, runId);
  const caseFile: CaseFile = (await api.get(`/api/runs/${runId}/case.json`)).body;
  truth = routeCase(withFactors(caseFile, [WHOLE], [TRUTH], caseFile.numerics.cellSize));
});
afterAll(() => server.stop());

const mark = (given: Partial<Mark> = {}) => ({
  chainage: 600,
  level: 22,
  kind: 'debris',
  confidence: 'good',
  flood: FLOOD,
  observedOn: '2024-01-09',
  note: '',
  ...given,
});
const observations = async (): Promise<Observations> =>
  (await api.get(`/api/studies/${studyId}/observations`).expect(200)).body;

test('a file of marks is read row by row and nothing of it is stored', async () => {
  const book = utils.book_new();
  const rows = [
    ['Flood marks'],
    [],
    ['chainage (m)', 'level (m)', 'kind', 'confidence', 'surveyed on'],
    [600, 22.4, 'debris', 'good', new Date(Date.UTC(2024, 0, 9))],
    [9000, 22.4, 'debris', 'good', ''],
    [700, 'wet', 'stain', 'poor', ''],
  ];
  utils.book_append_sheet(book, utils.aoa_to_sheet(rows.slice(2)), 'Marks');
  const readSheet = async (sheet: Buffer) =>
    (
      await api
        .post(`/api/studies/${studyId}/marks/read`)
        .field('flood', FLOOD)
        .attach('file', sheet, 'marks.xlsx')
        .expect(200)
    ).body as MarksReading;
  const refused = await readSheet(write(book, { type: 'buffer', bookType: 'xlsx' }));
  expect(refused.marks).toEqual([]);
  expect(refused.faults.map(({ message }) => message)).toEqual([
    'Line 3 lies off the reach, which goes from 0 m to 2000 m.',
    'Line 4 has “wet” for the level, which is no number.',
  ]);
  const good = utils.book_new();
  utils.book_append_sheet(good, utils.aoa_to_sheet(rows.slice(2, 4)), 'Marks');
  const reading = await readSheet(write(good, { type: 'buffer', bookType: 'xlsx' }));
  expect(reading.faults).toEqual([]);
  expect(reading.marks).toEqual([mark({ level: 22.4 })]);
  expect((await observations()).marks).toEqual([]);
});

test('marks are added all or none, changed and removed; those of other firms do not exist', async () => {
  const post = (marks: object[]) => api.post(`/api/studies/${studyId}/marks`).send({ marks });
  await post([mark(), { ...mark(), kind: 'guess' }]).expect(422);
  expect((await observations()).marks).toEqual([]);
  const [made] = (await post([mark(), mark({ chainage: 100 })]).expect(201)).body as Mark[];
  await strangers.patch(`/api/marks/${made.id}`).send(mark()).expect(404);
  await strangers
    .post(`/api/studies/${studyId}/marks`)
    .send({ marks: [mark()] })
    .expect(404);
  await api
    .patch(`/api/marks/${made.id}`)
    .send(mark({ level: 23 }))
    .expect(200);
  const { marks, floods } = await observations();
  expect(marks.map(({ chainage, level }) => [chainage, level])).toEqual([
    [100, 22],
    [600, 23],
  ]);
  expect(floods).toEqual([FLOOD]);
  for (const { id } of marks) await api.delete(`/api/marks/${id}`).expect(204);
});

test('a gauge needs a record whose times grow', async () => {
  const gauge = { name: 'Gauge', chainage: 1300, flood: FLOOD, startsAt: null, flow: null };
  const post = (stage: object | null) =>
    api.post(`/api/studies/${studyId}/gauges`).send({ ...gauge, stage });
  await post(null).expect(422);
  await post({ times: [0, 60, 60], values: [1, 2, 3] }).expect(422);
  const { body } = await post({ times: [0, 60], values: [1, 2] }).expect(201);
  expect(body).toMatchObject({ stageCount: 2, flowCount: 0, peakStage: 2, peakFlow: null });
  await strangers.get(`/api/gauges/${body.id}`).expect(404);
  await api.delete(`/api/gauges/${body.id}`).expect(204);
});

describe('with what a rougher river left behind', () => {
  beforeAll(async () => {
    const marks = truth.sections.map(({ chainage, peak }, i) =>
      mark({
        chainage,
        level: peak.stage,
        kind: i === 0 ? 'stain' : 'debris',
        confidence: i === 3 ? 'poor' : 'good',
      }),
    );
    await api.post(`/api/studies/${studyId}/marks`).send({ marks }).expect(201);
    // Told by the clock, an hour after the run begins.
    const { stage, flow } = truth.sections[2];
    const from = truth.times.findIndex((time) => time === 1200);
    const times = truth.times.slice(from).map((time) => time - 1200);
    const record = (values: number[]) => ({ times, values: values.slice(from) });
    await api
      .post(`/api/studies/${studyId}/gauges`)
      .send({
        name: 'Gauge',
        chainage: 1300,
        flood: FLOOD,
        startsAt: '2026-11-14T06:20:00.000Z',
        stage: record(stage),
        flow: record(flow),
      })
      .expect(201);
  });

  const residuals = async (query = {}): Promise<RunResiduals> =>
    (await api.get(`/api/runs/${runId}/residuals`).query(query).expect(200)).body;

  test('residuals are computed less observed, with means by hand from the summary', async () => {
    const { sections }: RunSummary = (await api.get(`/api/runs/${runId}/summary`)).body;
    const found = await residuals();
    expect(found).toMatchObject({ flood: FLOOD, reported: null });
    const expected = sections.map(({ peakStage }, i) => peakStage - truth.sections[i].peak.stage);
    expect(found.marks.map(({ residual }) => residual)).toEqual(
      expected.map((e) => expect.closeTo(e, 9)),
    );
    expect(found.all!.mean).toBeCloseTo(expected.reduce((a, b) => a + b) / 4, 9);
    expect(found.all!.mean).toBeLessThan(-0.1); // the smoother river stands lower
    expect(
      found.byConfidence.map(({ confidence, summary }) => [confidence, summary.count]),
    ).toEqual([
      ['good', 3],
      ['poor', 1],
    ]);
    const [stage, flow] = found.gauges;
    expect([stage.quantity, flow.quantity]).toEqual(['stage', 'flow']);
    expect(stage.figures!.efficiency).toBeLessThan(1);
    expect(stage.figures!.peak!.error).toBeCloseTo(
      Math.max(...truth.sections[2].stage) * -1 + sections[2].peakStage,
      2,
    );
    // The rougher river is slower: the run is early.
    expect(stage.figures!.peak!.delay).toBeLessThan(0);
    await api.get(`/api/runs/${runId}/residuals`).query({ flood: 'Nobody saw it' }).expect(422);
    await strangers.get(`/api/runs/${runId}/residuals`).expect(404);
  });

  test('what is chosen stands in the report and in the workbook; the CSV has every mark', async () => {
    const put = (flood: string | null) => api.put(`/api/runs/${runId}/observed`).send({ flood });
    await put('Nobody saw it').expect(422);
    await put(FLOOD).expect(200);
    expect((await residuals()).reported).toBe(FLOOD);
    const pdf = await binary(`/api/runs/${runId}/report.pdf`);
    const text = (await pdfPages(pdf)).join(' ');
    for (const words of [
      'Observed against computed',
      FLOOD,
      'Nash and Sutcliffe',
      'Stage at Gauge',
    ])
      expect(text).toContain(words);
    const book = read(await binary(`/api/runs/${runId}/results.xlsx`), { type: 'buffer' });
    expect(book.SheetNames).toContain('Observed');
    const { text: csv } = await api.get(`/api/runs/${runId}/residuals.csv`).expect(200);
    const rows = csv.split('\r\n').map((line) => line.split(','));
    const first = rows.findIndex(([head]) => head.startsWith('Mark at chainage')) + 1;
    const { marks } = await residuals();
    expect(rows.slice(first, first + 4).map((row) => Number(row[3]))).toEqual(
      marks.map(({ residual }) => residual),
    );
    await put(null).expect(200);
    expect(read(await binary(`/api/runs/${runId}/results.xlsx`)).SheetNames).not.toContain(
      'Observed',
    );
  });

  test('a search finds the roughness that made them, and only a person applies it', async () => {
    const search = {
      name: 'One multiplier',
      flood: FLOOD,
      use: { marks: true, gaugeStage: true, gaugeFlow: false },
      stretches: [WHOLE],
      evaluations: 25,
      coarser: 1,
    };
    const post = (body: object) => api.post(`/api/runs/${runId}/calibrations`).send(body);
    const off = { ...search, stretches: [{ ...WHOLE, to: 9000 }] };
    expect((await post(off).expect(422)).body.error.faults[0].path).toBe('stretches[0].to');
    await post({ ...search, flood: 'Nobody saw it' }).expect(422);
    await strangers.post(`/api/runs/${runId}/calibrations`).send(search).expect(404);

    const { id } = (await post(search).expect(201)).body as TaskSet;
    await strangers.post(`/api/task-sets/${id}/scenario`).send({ name: 'x' }).expect(404);
    const set = await untilDone(id);
    expect(set).toMatchObject({ state: 'finished', kind: 'calibration', failure: null });
    const result: SearchResult = (await api.get(`/api/task-sets/${id}/result`).expect(200)).body;
    // The settled simplex is within 0.4 % of its middle.
    expect(Math.abs(result.best.factors[0] / TRUTH - 1)).toBeLessThan(0.01);
    expect(result.best.misfit).toBeLessThan(0.05 * result.before.misfit!);
    expect(result.after.all!.rms).toBeLessThan(0.02);
    expect(result.evaluations[0]).toMatchObject({ purpose: 'before', factors: [1] });
    expect(result.evaluations.filter(({ purpose }) => purpose !== 'flatness').length).toBeLessThan(
      26,
    );
    const [flat] = result.flatness;
    expect(flat.atBound).toBeNull();
    expect(flat.curvature!).toBeGreaterThan(0);
    expect(flat.range!.low).toBeLessThan(TRUTH);
    expect(flat.range!.high).toBeGreaterThan(TRUTH);

    const before: Scenario = (await api.get(`/api/scenarios/${scenarioId}`)).body;
    expect(before.body.roughnessFactors ?? []).toEqual([]);
    const made = (
      await api.post(`/api/task-sets/${id}/scenario`).send({ name: 'Calibrated' }).expect(201)
    ).body as { scenarioId: number; changed: boolean };
    expect(made.changed).toBe(false);
    const after: Scenario = (await api.get(`/api/scenarios/${made.scenarioId}`)).body;
    expect(after).toMatchObject({ name: 'Calibrated', faultCount: 0 });
    expect(after.body.roughnessFactors).toEqual([
      {
        from: 0,
        to: 2000,
        part: 'all',
        depths: [0],
        factors: [Number(result.best.factors[0].toFixed(3))],
      },
    ]);
  });
});

async function binary(path: string): Promise<Buffer> {
  const { body } = await api
    .get(path)
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    })
    .expect(200);
  return body;
}

async function untilDone(id: number): Promise<TaskSet> {
  const deadline = Date.now() + 60_000;
  for (;;) {
    const set: TaskSet = (await api.get(`/api/task-sets/${id}`).expect(200)).body;
    if (set.state !== 'queued' && set.state !== 'running') return set;
    if (Date.now() > deadline) throw new Error(`The set is still ${set.state}.`);
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
}
