import { execFileSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import path from 'node:path';
import { read, utils } from 'xlsx';
import type { Run, RunRow, RunSeries, RunSummary } from '../../../shared/runs/types';
import type { CaseFile } from '../../../shared/case/caseFile';
import type { ResultFile } from '../../../shared/case/resultFile';
import { decodeSurface } from '../../../shared/runs/surfaceBlock';
import { caseHash, routeCase } from '../../../server/solvers';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from './buildRunnable';
import { untilEnded } from './untilEnded';

jest.setTimeout(90_000);

let server: TestServer;
let api: Awaited<ReturnType<TestServer['signInAs']>>;
let studyId: number;
let run: Run;
let caseFile: CaseFile;
let expected: ResultFile;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '1' });
  const user = await buildUser(server.services, ['modeller'], { name: 'Ines Corrow' });
  api = await server.signInAs(user);
  const { study, scenario } = await buildRunnable(server.services, user);
  studyId = study.id;
  server.services.runs.start();
  const { body } = await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201);
  await untilEnded(server.services, body.id);
  run = (await api.get(`/api/runs/${body.id}`).expect(200)).body;
  caseFile = (await api.get(`/api/runs/${run.id}/case.json`).expect(200)).body;
  expected = routeCase(caseFile);
});
afterAll(() => server.stop());

const binary = (path: string) =>
  api
    .get(path)
    .buffer(true)
    .parse((res, done) => {
      const pieces: Buffer[] = [];
      res.on('data', (piece: Buffer) => pieces.push(piece));
      res.on('end', () => done(null, Buffer.concat(pieces)));
    });

test('a run says what it computed and what may be done with it', async () => {
  expect(run).toMatchObject({
    number: 1,
    state: 'routed',
    progress: 1,
    secondsLeft: null,
    attempts: 1,
    failure: null,
    studyTitle: 'Lower Veshall',
    scenarioName: '1 in 100 year',
    requestedBy: 'Ines Corrow',
    startsAt: '2026-11-14T06:00:00.000Z',
    duration: 7200,
    solverVersion: expected.solver,
    inflow: { times: [0, 1800, 5400, 7200], flows: [20, 120, 30, 20] },
    may: ['run.read'],
  });
  const outlet = expected.sections[3].peak;
  expect(run.peakStage).toBe(outlet.stage);
  expect(run.peakFlow).toBe(outlet.flow);
  const rows: RunRow[] = (await api.get(`/api/studies/${studyId}/runs`).expect(200)).body;
  expect(rows.map((row) => [row.id, row.number, row.peakStage])).toEqual([
    [run.id, 1, outlet.stage],
  ]);
});

test('the case file is the frozen one: its SHA-256 is the hash of the run', async () => {
  const { text, headers } = await api.get(`/api/runs/${run.id}/case.json`).expect(200);
  expect(`sha256:${createHash('sha256').update(text).digest('hex')}`).toBe(run.caseHash);
  expect(caseHash(JSON.parse(text))).toBe(run.caseHash);
  expect(expected.caseHash).toBe(run.caseHash);
  expect(headers['content-disposition']).toBe('attachment; filename=run-1-case.json');
});

test('series at the sections are those of the solver in this process, to the bit', async () => {
  for (const section of expected.sections) {
    const { body } = await api
      .get(`/api/runs/${run.id}/series`)
      .query({ chainage: section.chainage })
      .expect(200);
    const series = body as RunSeries;
    expect(series.sectionId).toBe(section.id);
    expect(series.times).toEqual(expected.times);
    expect(series.stage).toEqual(section.stage);
    expect(series.depth).toEqual(section.depth);
    expect(series.flow).toEqual(section.flow);
    expect(series.velocity).toEqual(section.velocity);
    expect(series.peaks).toMatchObject({
      peakStage: section.peak.stage,
      peakStageTime: section.peak.stageTime,
      peakFlow: section.peak.flow,
      peakDepth: section.peak.depth,
      arrival: section.arrival,
    });
  }
});

test('the command line gives the same result for the downloaded case, to the bit', async () => {
  const { text } = await api.get(`/api/runs/${run.id}/case.json`).expect(200);
  const output = execFileSync(
    process.execPath,
    ['--require', 'tsx/cjs', 'server/solvers/cli/route.ts', '-'],
    {
      cwd: path.resolve(__dirname, '../../..'),
      input: text,
      stdio: ['pipe', 'pipe', 'ignore'],
      maxBuffer: 1e8,
    },
  );
  const { seconds: _mine, ...routed } = JSON.parse(output.toString()) as ResultFile;
  const { seconds: _theirs, ...here } = expected;
  expect(routed).toEqual(JSON.parse(JSON.stringify(here)));
});

test('between sections they lie between the neighbouring cells', async () => {
  const { body } = await api.get(`/api/runs/${run.id}/series`).query({ chainage: 1000 });
  const { cells } = expected;
  // Cells of 50 m have their middles at 25, 75, …: 1,000 is half-way between 975 and 1,025.
  const [a, b] = [cells.chainage.indexOf(975), cells.chainage.indexOf(1025)];
  const series = body as RunSeries;
  expect(series.peaks.peakStage).toBeCloseTo((cells.peakStage[a] + cells.peakStage[b]) / 2, 10);
  const last = series.stage.length - 1;
  expect(series.stage[last]).toBeCloseTo((cells.finalStage[a] + cells.finalStage[b]) / 2, 5);
  expect(series.flow[last]).toBeCloseTo((cells.finalFlow[a] + cells.finalFlow[b]) / 2, 4);
});

test('the summary has peaks at sections and stations, the balance and the rule of arrival', async () => {
  const { body } = await api.get(`/api/runs/${run.id}/summary`).expect(200);
  const summary = body as RunSummary;
  expect(summary.inflowPeak).toEqual({ flow: 120, time: 1800 });
  expect(summary.sections.map((s) => s.peakStage)).toEqual(
    expected.sections.map((s) => s.peak.stage),
  );
  expect(summary.stations.map((s) => s.name)).toEqual(['Mill', 'Gauge']);
  expect(summary.stations[1].peakStage).toBe(expected.sections[2].peak.stage);
  expect(summary.stations[1].attenuation).toBe(1 - expected.sections[2].peak.flow / 120);
  expect(summary.volume).toEqual(expected.volume);
  expect(summary.warnings).toEqual(expected.warnings);
  expect(summary.arrivalRule.message).toBe(expected.arrivalThreshold.text);
  expect(summary).toMatchObject({ cellCount: 40, cellSize: 50, steps: expected.steps });
});

test('the surface comes decimated, compressed, and is not sent again to who has it', async () => {
  const path = `/api/runs/${run.id}/surface?places=20&moments=15`;
  const response = await binary(path).expect(200);
  expect(response.headers['content-encoding']).toBe('gzip');
  const body = response.body as Buffer;
  const surface = decodeSurface(new Uint8Array(body).buffer);
  expect([surface.places, surface.moments]).toEqual([20, 15]);
  expect(Array.from(surface.chainages)).toEqual(expect.arrayContaining([0, 600, 1300, 2000]));
  const at = Array.from(surface.chainages).indexOf(1300);
  const last = surface.moments - 1;
  const { stage, peak } = expected.sections[2];
  expect(surface.stage[last * surface.places + at]).toBeCloseTo(stage[stage.length - 1], 5);
  expect(surface.peakStage[at]).toBeCloseTo(peak.stage, 5);
  expect(surface.leftBank[at]).toBeCloseTo(20 - 1.3 + 3, 5);

  const tag = response.headers['etag'];
  await api.get(path).set('If-None-Match', tag).expect(304);
  await api.get(`${path}1`).set('If-None-Match', tag).expect(200);
});

test('CSV and workbook hold the same numbers as the screen', async () => {
  const { text, headers } = await api.get(`/api/runs/${run.id}/results.csv`).expect(200);
  expect(headers['content-type']).toBe('text/csv; charset=utf-8');
  const rows = text
    .trimEnd()
    .split('\r\n')
    .map((line) => line.split(','));
  const column = (title: string) => rows[0].indexOf(title);
  const gauge = rows.filter((row) => row[0] === 'Gauge');
  expect(gauge.map((row) => Number(row[column('stage (m)')]))).toEqual(expected.sections[2].stage);
  expect(Number(gauge[0][column('peak stage (m)')])).toBe(expected.sections[2].peak.stage);

  const xlsx = await binary(`/api/runs/${run.id}/results.xlsx`).expect(200);
  const book = read(xlsx.body as Buffer);
  const peaks = utils.sheet_to_json<Record<string, unknown>>(book.Sheets['Peaks']);
  expect(peaks.map((row) => row['Place'])).toEqual([
    'XS-01',
    'XS-02',
    'Mill',
    'XS-03',
    'Gauge',
    'XS-04',
  ]);
  expect(peaks[4]['Peak stage (m)']).toBe(expected.sections[2].peak.stage);
});

test('what is asked off the reach or without sense is said to be so', async () => {
  const off = await api.get(`/api/runs/${run.id}/series?chainage=2100`).expect(422);
  expect(off.body.error.message).toContain('chainage 0 m to 2,000 m');
  await api.get(`/api/runs/${run.id}/series`).expect(422);
  await api.get(`/api/runs/${run.id}/series?chainage=abc`).expect(422);
  await api.get(`/api/runs/${run.id}/surface?places=1000000`).expect(422);
});

test('hazard and arrival by a threshold of one’s own stand at every section and station', async () => {
  const along = (query: object) => api.get(`/api/runs/${run.id}/along`).query(query);
  const { body } = await along({ threshold: 'rise', value: 0.1 }).expect(200);
  expect(body).toMatchObject({ threshold: 'rise', value: 0.1, interval: 120 });
  expect(body.stations.map(({ name }: { name: string }) => name)).toEqual(['Mill', 'Gauge']);
  // The run's own rule is the same rise, told at every step: apart by less than an output interval.
  expected.sections.forEach(({ id, arrival }, i) => {
    expect(body.sections[i].id).toBe(id);
    expect(Math.abs(body.sections[i].arrival - arrival!)).toBeLessThan(120);
    expect(body.sections[i].hazard).toMatch(/^H[1-6]$/);
  });
  const byFlow = (await along({ threshold: 'flow', value: 95 }).expect(200)).body.sections;
  const [first] = expected.sections;
  const k = first.flow.findIndex((flow) => flow > 95);
  expect(byFlow[0].arrival).toBeGreaterThan(expected.times[k - 1]);
  expect(byFlow[0].arrival).toBeLessThanOrEqual(expected.times[k]);
  const never = (await along({ threshold: 'stage', value: 1000 }).expect(200)).body.sections;
  expect(never.every(({ arrival }: { arrival: number | null }) => arrival === null)).toBe(true);
  await along({ threshold: 'rise', value: 0 }).expect(422);
  await along({ threshold: 'colour', value: 1 }).expect(422);
});
