import { read, utils } from 'xlsx';
import type { CaseFile } from '../../../shared/case/caseFile';
import type { ResultFile } from '../../../shared/case/resultFile';
import type {
  Run,
  RunReservoirSeries,
  RunStructureSeries,
  RunSummary,
} from '../../../shared/runs/types';
import type { ReservoirEnd, ScenarioBody } from '../../../shared/scenarios/schemas';
import { newStructure } from '../../../shared/scenarios/structures/newStructure';
import type { BreachBody } from '../../../shared/scenarios/structures/schemas';
import { routeCase } from '../../../server/solvers';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { pdfPages } from '../reports/pdfText';
import { buildRunnable, SECTIONS } from './buildRunnable';
import { untilEnded } from './untilEnded';

jest.setTimeout(60_000);

/** A pool of 0.9 million m³ that stands 8 m above the bed, and a weir below. */
const POOL: ReservoirEnd = {
  kind: 'reservoir',
  storage: { stages: [20, 24, 28, 30], volumes: [0, 2e5, 9e5, 1.5e6] },
  initialStage: 28,
  inflow: { kind: 'table', times: [0], flows: [3] },
  spillway: { stages: [27.5, 30], flows: [0, 40] },
};
const WHERE = { sections: SECTIONS, upstream: POOL, taken: [] };
const DAM: BreachBody = {
  ...(newStructure('breach', { ...WHERE, chainage: 0 }) as BreachBody),
  id: 'Upper dam',
  trigger: 'time',
  triggerTime: 600,
  bottomWidth: 9,
  sideSlope: 1,
  formationTime: 900,
  estimate: 'froehlich2008',
  note: 'Homogeneous fill.',
};

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let stranger: typeof api;
let run: Run;
let summary: RunSummary;
let expected: ResultFile;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  const user = await buildUser(server.services, ['modeller']);
  api = await server.signInAs(user);
  stranger = await server.signInAs(await buildUser(server.services, ['modeller']));
  const { scenario } = await buildRunnable(server.services, user, { duration: 5400 });
  const { body: stored } = await api.get(`/api/scenarios/${scenario.id}`).expect(200);
  const body: ScenarioBody = {
    ...stored.body,
    upstream: POOL,
    structures: [DAM, newStructure('weir', { ...WHERE, chainage: 1000 })],
  };
  const saved = await api
    .put(`/api/scenarios/${scenario.id}`)
    .send({ version: stored.version, body });
  expect(saved.body).toMatchObject({ faults: [] });
  server.services.runs.start();
  const asked = await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201);
  await untilEnded(server.services, asked.body.id);
  run = (await api.get(`/api/runs/${asked.body.id}`).expect(200)).body;
  expect(run.failure).toBeNull();
  summary = (await api.get(`/api/runs/${run.id}/summary`).expect(200)).body;
  const caseFile: CaseFile = (await api.get(`/api/runs/${run.id}/case.json`).expect(200)).body;
  expected = routeCase(caseFile);
});
afterAll(() => server.stop());

test('the summary tells of each structure and of the reservoir what the solver computed', () => {
  expect(run.state).toBe('routed');
  const [dam, spillway, weir] = summary.structures;
  expect(spillway).toMatchObject({
    kind: 'spillway',
    regimes: [{ time: 0, regime: 'rating' }, {}],
  });
  expect(dam).toMatchObject({
    id: 'Upper dam',
    kind: 'breach',
    chainage: 0,
    foot: 20,
    top: 30,
    note: expect.stringMatching(/Froehlich 2008.* Homogeneous fill\.$/),
    peak: expected.structures![0].peak,
    breach: { width: 9, bottom: 20 },
  });
  // It begins at 600 s; outputs stand 120 s apart.
  expect(Math.abs(dam.breach!.begins! - 600)).toBeLessThanOrEqual(120);
  expect(dam.regimes[0]).toEqual({ time: 0, regime: 'dry' });
  expect(dam.regimes.map(({ regime }) => regime)).toContain('free');
  expect(weir).toMatchObject({ kind: 'weir', chainage: 1000 });
  expect(summary.reservoir!.balance.relativeError).toBeLessThan(1e-12);
  expect(summary.inflowPeak!.flow).toBe(Math.max(...expected.reservoir!.release));
  expect(run.inflow.flows).toContain(summary.inflowPeak!.flow);
});

test('values against time are those of the solver, to the bit', async () => {
  const read = async <T>(path: string): Promise<T> =>
    (await api.get(`/api/runs/${run.id}/${path}`).expect(200)).body;
  const dam = await read<RunStructureSeries>('structures/1');
  const { flow, stageUp, stageDown, regime, breach } = expected.structures![0];
  expect(dam).toEqual({ times: expected.times, flow, stageUp, stageDown, regime, breach });
  const { breach: none } = await read<RunStructureSeries>('structures/3');
  expect(none).toBeUndefined();
  const { stage, volume, inflow, release } = expected.reservoir!;
  expect(await read<RunReservoirSeries>('reservoir')).toEqual({
    times: expected.times,
    stage,
    volume,
    inflow,
    release,
  });
});

test('what is not there, or is not theirs, does not exist', async () => {
  await api.get(`/api/runs/${run.id}/structures/4`).expect(404);
  await api.get(`/api/runs/${run.id}/structures/0`).expect(404);
  for (const path of ['structures/1', 'reservoir', 'structures.csv'])
    await stranger.get(`/api/runs/${run.id}/${path}`).expect(404);
});

test('files carry them', async () => {
  const csv = (await api.get(`/api/runs/${run.id}/structures.csv`).expect(200)).text;
  const lines = csv.trim().split('\r\n');
  // Two structures, the spillway and the reservoir at each output time, below the headings.
  expect(lines).toHaveLength(1 + 4 * expected.times.length);
  expect(lines[0]).toContain('breach bottom (m)');
  const bytes = await api
    .get(`/api/runs/${run.id}/results.xlsx`)
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    });
  const book = read(bytes.body, { type: 'buffer' });
  expect(book.SheetNames).toEqual(expect.arrayContaining(['Structures', 'Reservoir']));
  const rows = utils.sheet_to_json<Record<string, number | string>>(book.Sheets.Structures);
  const dam = rows.filter(({ Structure }) => Structure === 'Upper dam');
  expect(Math.max(...dam.map((row) => Number(row['Flow (m3/s)'])))).toBe(
    Math.max(...expected.structures![0].flow),
  );
});

test('the report prints what the breach is founded on, its peak and its regime', async () => {
  const pdf = await api
    .get(`/api/runs/${run.id}/report.pdf`)
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    })
    .expect(200);
  const text = (await pdfPages(pdf.body)).join(' ').replace(/\s+/g, ' ');
  expect(text).toContain('Failing dam Upper dam');
  expect(text).toContain('Homogeneous fill.');
  expect(text).toContain('Greatest flow');
  expect(text).toContain('free flow over the crest');
});
