import type { CaseFile } from '../../../shared/case/caseFile';
import type {
  ConfidenceOptions,
  ConvergenceResult,
  EnsembleResult,
  SensitivityResult,
} from '../../../shared/confidence/types';
import { gridConvergence } from '../../../shared/confidence/gridConvergence';
import { varyCase } from '../../../shared/confidence/varyCase';
import { canonical } from '../../../shared/case/canonical';
import { routeCase } from '../../../server/solvers';
import type { TaskSet, TaskSetRow } from '../../../shared/tasks/types';
import type { UserModel } from '../../../server/models/User';
import { makeCode } from '../../../server/services/review/verificationCode';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

let server: TestServer;
let modeller: UserModel;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let studyId: number;
let runId: number;
let caseFile: CaseFile;
let options: ConfidenceOptions;

/** A real run of 2 km, routed by the real queue; sets of it by the real threads. */
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  server.services.runs.start();
  server.services.tasks.start();
  modeller = await buildUser(server.services, ['modeller']);
  api = await server.signInAs(modeller);
  const { study, scenario } = await buildRunnable(server.services, modeller, { cellSize: 25 });
  studyId = study.id;
  runId = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body.id;
  await untilEnded(server.services, runId);
  caseFile = (await api.get(`/api/runs/${runId}/case.json`).expect(200)).body;
  options = (await api.get(`/api/runs/${runId}/confidence`).expect(200)).body;
});
afterAll(() => server.stop());

async function ended(setId: number): Promise<TaskSet> {
  for (let k = 0; k < 1000; k++) {
    const set: TaskSet = (await api.get(`/api/task-sets/${setId}`).expect(200)).body;
    if (set.state !== 'queued' && set.state !== 'running') return set;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('The set has not ended.');
}
const ask = (kind: string, body: object) =>
  api.post(`/api/runs/${runId}/confidence/${kind}`).send(body);
const stationIds = () => options.stations.map(({ stationId }) => stationId);

test('tells what can be varied of the run', () => {
  expect(options).toMatchObject({ cellSize: 25, cells: 80, length: 2000, runNumber: 1 });
  expect(options.stations.map(({ name }) => name)).toEqual(['Mill', 'Gauge']);
  expect(options.parameters.map(({ key }) => key)).toEqual([
    'roughness',
    'peakFlow',
    'outletSlope',
  ]);
});

test('three grids: order and index are those of the values, and the finest is the run itself', async () => {
  const asked = await ask('convergence', { stationIds: stationIds() }).expect(201);
  const set = await ended(asked.body.id);
  expect(set).toMatchObject({
    kind: 'convergence',
    state: 'finished',
    total: 3,
    finished: 3,
    runId,
    runNumber: 1,
    progress: 1,
    name: 'Cell-size convergence of run 1: 1 in 100 year',
  });
  const result: ConvergenceResult = (await api.get(`/api/task-sets/${set.id}/result`)).body;
  expect(result.grids.map(({ cellSize }) => cellSize)).toEqual([25, 50, 100]);
  const { sections } = routeCase(caseFile);
  const gauge = result.stations[1];
  expect(gauge.peakStage.values[0]).toBe(sections[2].peak.stage);
  expect(gauge.peakFlow.values[0]).toBe(sections[2].peak.flow);
  const values = gauge.peakStage.values as [number, number, number];
  const expected = gridConvergence(values, [25, 50, 100]);
  expect(gauge.peakStage.convergence).toEqual(expected);
  expect(gauge.peakStage.band).toBeCloseTo(expected.gciFine! * values[0], 12);
  // Second-order scheme, smooth flood: some millimetres between the finest two.
  expect(Math.abs(result.widest.difference)).toBeLessThan(0.05);
  expect(result.along.chainage).toHaveLength(result.along.band.length);

  const csv = await api.get(`/api/task-sets/${set.id}/result.csv`).expect(200);
  const lines = csv.text.trim().split('\r\n');
  expect(lines[0]).toContain('grid 1: 25 m,grid 2: 50 m,grid 3: 100 m');
  expect(lines[1].split(',').slice(0, 5)).toEqual([
    'Mill',
    '1000',
    'peak stage',
    'm',
    String(result.stations[0].peakStage.values[0]),
  ]);
  const listed: TaskSetRow[] = (
    await api.get(`/api/studies/${studyId}/task-sets?kind=convergence`).expect(200)
  ).body;
  expect(listed.map(({ id }) => id)).toEqual([set.id]);
  expect((await api.get(`/api/studies/${studyId}/task-sets?kind=ensemble`)).body).toEqual([]);
});

test('sensitivity: rougher is higher and later, more is higher, and a side that cannot be routed spoils nothing', async () => {
  const asked = await ask('sensitivity', {
    stationIds: stationIds(),
    cellSize: 50,
    parameters: [
      { key: 'roughness', low: 0.8, high: 1.2 },
      { key: 'peakFlow', low: 0.9, high: 1.1 },
      { key: 'outletSlope', low: 0.5, high: 5000 },
    ],
  }).expect(201);
  const set = await ended(asked.body.id);
  expect(set).toMatchObject({ state: 'finished', total: 7, finished: 6, failed: 1 });
  const failed = set.tasks.find(({ state }) => state === 'failed')!;
  expect(failed.label).toBe('Slope at the outlet × 5000');
  expect(failed.failure).toContain('downstream.slope');
  const { base, rows }: SensitivityResult = (await api.get(`/api/task-sets/${set.id}/result`)).body;
  const [rough, peak, slope] = rows;
  expect(rough.low.stations![0].peakStage).toBeLessThan(base[0].peakStage);
  expect(rough.high.stations![0].peakStage).toBeGreaterThan(base[0].peakStage);
  expect(rough.high.stations![0].arrival).toBeGreaterThan(base[0].arrival!);
  expect(peak.low.stations![1].peakFlow).toBeLessThan(base[1].peakFlow);
  expect(peak.high.stations![1].peakFlow).toBeGreaterThan(base[1].peakFlow);
  // A flatter end holds the water up.
  expect(slope.low.stations![1].peakStage).toBeGreaterThanOrEqual(base[1].peakStage);
  expect(slope.high.stations).toBeNull();
});

test('ensemble: bands lie in order, hold their members, and a member can be computed again from its case', async () => {
  const asked = await ask('ensemble', {
    stationIds: stationIds(),
    cellSize: 100,
    members: 20,
    seed: 11,
    parameters: [
      { key: 'roughness', distribution: { kind: 'lognormal', median: 1, spread: 1.2 } },
      { key: 'peakFlow', distribution: { kind: 'normal', mean: 1, deviation: 0.1 } },
    ],
  }).expect(201);
  const set = await ended(asked.body.id);
  expect(set).toMatchObject({ state: 'finished', total: 21, finished: 21 });
  const result: EnsembleResult = (await api.get(`/api/task-sets/${set.id}/result`)).body;
  expect(result).toMatchObject({ members: 20, failed: 0, cellSize: 100 });
  const [mill] = result.stations;
  expect(mill.stage.p50).toHaveLength(result.times.length);
  result.times.forEach((_, k) => {
    expect(mill.stage.p5[k]).toBeLessThanOrEqual(mill.stage.p50[k]);
    expect(mill.flow.p50[k]).toBeLessThanOrEqual(mill.flow.p95[k]);
  });
  // By hand: with 20 members the 5 % band lies 0.95 of the way from the lowest to the second.
  const sorted = [...mill.peakStages].sort((a, b) => a - b);
  const at = result.along.chainage.indexOf(mill.chainage);
  expect(result.along.peakStage.p5[at]).toBeCloseTo(sorted[0] + 0.95 * (sorted[1] - sorted[0]), 10);

  const task = set.tasks[result.drawn[3].index];
  const again = await api.get(`/api/task-sets/${set.id}/members/${task.id}/case.json`).expect(200);
  expect(again.text).toBe(canonical(varyCase(caseFile, result.drawn[3].variation)));
  const { peak } = routeCase(again.body).sections[2];
  expect(peak.stage).toBe(result.stations[1].peakStages[3]);
  await api.get(`/api/task-sets/${set.id}/members/999999/case.json`).expect(404);

  const members = await api.get(`/api/task-sets/${set.id}/result.csv?part=members`).expect(200);
  expect(members.text.trim().split('\r\n')).toHaveLength(21);
});

test('refuses what does not fit the run, at its place, and stores nothing', async () => {
  const before = await server.services.models.TaskSet.count();
  const pathsOf = async (kind: string, body: object) => {
    const { error } = (await ask(kind, body).expect(422)).body;
    return error.faults.map(({ path }: { path: string }) => path);
  };
  const roughness = { key: 'roughness', low: 0.8, high: 1.2 };
  expect(await pathsOf('sensitivity', { cellSize: 500, parameters: [roughness] })).toEqual([
    'cellSize',
  ]);
  expect(await pathsOf('sensitivity', { cellSize: 0.01, parameters: [roughness] })).toEqual([
    'cellSize',
  ]);
  const breach = { key: 'breachTime', low: 0.5, high: 2 };
  expect(await pathsOf('sensitivity', { parameters: [breach] })).toEqual(['parameters[0].key']);
  expect(await pathsOf('convergence', { stationIds: [987654321] })).toEqual(['stationIds[0]']);
  expect(await pathsOf('ensemble', { members: 501, seed: 1, parameters: [] })).toEqual(
    expect.arrayContaining(['members', 'parameters']),
  );
  expect(await server.services.models.TaskSet.count()).toBe(before);
});

test('nobody of another firm, no surveyor and no client sees that there is a set', async () => {
  const { id } = (await ask('convergence', {}).expect(201)).body;
  const others = [
    await buildUser(server.services, ['modeller']),
    await buildUser(server.services, ['surveyor', 'client'], { firmId: modeller.firmId }),
  ];
  for (const other of others) {
    const theirs = await server.signInAs(other);
    for (const path of ['', '/result', '/result.csv'])
      await theirs.get(`/api/task-sets/${id}${path}`).expect(404);
    await theirs.post(`/api/task-sets/${id}/cancel`).expect(404);
    await theirs.post(`/api/runs/${runId}/confidence/convergence`).send({}).expect(404);
    await theirs.get(`/api/studies/${studyId}/task-sets`).expect(404);
  }
  await ended(id);
});

test('what a signed run reports of a set stays as it is', async () => {
  const { models } = server.services;
  const parameters = [{ key: 'outletSlope', low: 0.5, high: 5000 }];
  const asked = await ask('sensitivity', { cellSize: 100, parameters }).expect(201);
  const set = await ended(asked.body.id);
  expect(set).toMatchObject({ state: 'finished', failed: 1, may: ['taskSet.retry'] });
  const senior = await buildUser(server.services, ['seniorEngineer'], { firmId: modeller.firmId });
  const run = await models.Run.findByPk(runId, { rejectOnEmpty: true });
  const at = new Date();
  const review = await models.Review.create({
    runId,
    state: 'inCheck',
    sentBy: modeller.id,
    sentTo: null,
    sentAt: at,
    method: '',
    assumptions: '',
    limits: '',
    answers: {},
    returnReason: null,
    outletProbeRunId: null,
  });
  await models.SignOff.create({
    runId,
    reviewId: review.id,
    signedBy: senior.id,
    signerName: senior.name,
    qualification: 'Engineer',
    registrationNumber: '1',
    statement: 'Checked.',
    at,
    caseHash: run.caseHash,
    solverVersion: run.solverVersion,
    verificationCode: makeCode(),
    supersedesRunId: null,
    record: Buffer.alloc(0),
  });
  const refused = await api.post(`/api/task-sets/${set.id}/retry`).expect(409);
  const { body } = await api.get(`/api/task-sets/${set.id}`).expect(200);
  expect(body).toMatchObject({ may: [], whyNoRetry: refused.body.error.message });
  expect(body.whyNoRetry).toContain('Ask for a new set instead');
});
