import type { ChildProcess } from 'node:child_process';
import type { EnsembleResult } from '../../../shared/confidence/types';
import { varyCase } from '../../../shared/confidence/varyCase';
import type { CaseFile } from '../../../shared/case/caseFile';
import { routeCase } from '../../../server/solvers';
import type { UserModel } from '../../../server/models/User';
import { buildUser } from '../../helpers/factories/buildUser';
import { killProcess, startServerProcess } from '../../helpers/serverProcess';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from '../runs/buildRunnable';
import { untilEnded } from '../runs/untilEnded';

jest.setTimeout(300_000);

/** Answers the API and computes nothing itself; the work is done by real server processes beside it. */
let server: TestServer;
let user: UserModel;
const children: ChildProcess[] = [];
const startProcess = () => {
  const child = startServerProcess(server);
  children.push(child);
  return child;
};

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  user = await buildUser(server.services, ['modeller']);
});
afterEach(() => Promise.all(children.splice(0).map(killProcess)));
afterAll(() => server.stop());

const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

test('a set whose server is killed in the middle is finished by the next, each member once, to the bit', async () => {
  const { services } = server;
  const api = await server.signInAs(user);
  const { scenario } = await buildRunnable(services, user, { cellSize: 20 });
  const runId = (await api.post(`/api/scenarios/${scenario.id}/runs`).expect(201)).body.id;
  const doomed = startProcess();
  await untilEnded(services, runId, 120);
  const asked = await api
    .post(`/api/runs/${runId}/confidence/ensemble`)
    .send({
      members: 20,
      seed: 3,
      parameters: [{ key: 'roughness', distribution: { kind: 'uniform', low: 0.9, high: 1.1 } }],
    })
    .expect(201);
  const { id } = asked.body;
  const tasks = async () => services.tasks.find.tasks(await services.tasks.find.again(id));
  for (;;) {
    const now = await tasks();
    if (now.filter(({ state }) => state === 'finished').length >= 4) break;
    await pause(20);
  }
  await killProcess(doomed);
  const left = await tasks();
  const done = left.filter(({ state }) => state === 'finished').map((task) => task.finishedAt);
  expect(done.length).toBeLessThan(21);

  startProcess();
  let set = await services.tasks.find.again(id);
  for (let k = 0; k < 1200 && (set.state === 'queued' || set.state === 'running'); k++) {
    await pause(100);
    set = await services.tasks.find.again(id);
  }
  expect(set).toMatchObject({ state: 'finished', failure: null });
  const after = await tasks();
  expect(after.map(({ state }) => state)).toEqual(Array(21).fill('finished'));
  // What was finished before was not computed again; what was cut off was begun a second time.
  expect(after.slice(0, done.length).map((task) => task.finishedAt)).toEqual(done);
  expect(after.filter(({ attempts }) => attempts > 1).length).toBeLessThanOrEqual(1);

  const caseFile: CaseFile = (await api.get(`/api/runs/${runId}/case.json`)).body;
  const result = await services.tasks.find.result<EnsembleResult>(set);
  const { drawn, stations } = result;
  for (const k of [0, 10, 19]) {
    const expected = routeCase(varyCase(caseFile, drawn[k].variation)).sections[3].peak;
    expect(stations[0].peakStages[k]).toBe(expected.stage);
    expect(stations[0].peakFlows[k]).toBe(expected.flow);
  }
});
