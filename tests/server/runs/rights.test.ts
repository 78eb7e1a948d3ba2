import type { Role } from '../../../shared/accounts/roles';
import { buildUser } from '../../helpers/factories/buildUser';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildRunnable } from './buildRunnable';

let server: TestServer;
let ids: { study: number; scenario: number; run: number };
let firmId: number;

beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  const user = await buildUser(server.services, ['modeller']);
  firmId = user.firmId;
  const { study, scenario } = await buildRunnable(server.services, user);
  const run = await server.services.runs.request(user, scenario);
  ids = { study: study.id, scenario: scenario.id, run: run.id };
});
afterAll(() => server.stop());

/** Every address of runs, with the answer that an engineer of the firm gets for a queued run. */
const routes = (): ['get' | 'post', string, number][] => [
  ['get', `/api/studies/${ids.study}/runs`, 200],
  ['post', `/api/scenarios/${ids.scenario}/runs`, 201],
  ['get', `/api/runs/${ids.run}`, 200],
  ['get', `/api/runs/${ids.run}/summary`, 409],
  ['get', `/api/runs/${ids.run}/series?chainage=0`, 409],
  ['get', `/api/runs/${ids.run}/surface`, 409],
  ['get', `/api/runs/${ids.run}/case.json`, 200],
  ['get', `/api/runs/${ids.run}/results.csv`, 409],
  ['get', `/api/runs/${ids.run}/results.xlsx`, 409],
  ['post', `/api/runs/${ids.run}/retry`, 409],
];
const hidden = () => [...routes(), ['get', `/api/runs/${ids.run}/events`, 0] as const];

test.each<Role>(['modeller', 'seniorEngineer'])(
  'a %s of the firm may do all of it',
  async (role) => {
    const api = await server.signInAs(await buildUser(server.services, [role], { firmId }));
    for (const [method, path, status] of routes()) {
      expect([path, (await api[method](path)).status]).toEqual([path, status]);
    }
  },
);

test.each<[string, Role[], boolean]>([
  ['an engineer of another firm', ['modeller', 'seniorEngineer'], false],
  ['a surveyor who shares the study', ['surveyor'], true],
  ['a client who shares the study', ['client'], true],
  ['an administrator', ['administrator'], true],
])('for %s runs do not exist', async (_who, roles, sameFirm) => {
  const user = await buildUser(server.services, roles, sameFirm ? { firmId } : {});
  for (const as of ['surveyor', 'client'] as const) {
    if (roles.includes(as)) {
      await server.services.models.StudyMember.create({ studyId: ids.study, userId: user.id, as });
    }
  }
  const api = await server.signInAs(user);
  for (const [method, path] of [...hidden(), ['post', `/api/runs/${ids.run}/cancel`, 0] as const]) {
    const { status, body } = await api[method](path);
    expect([path, status, body.error.code]).toEqual([path, 404, 'notFound']);
  }
  const untouched = await server.services.models.Run.findByPk(ids.run, { rejectOnEmpty: true });
  expect(untouched.state).toBe('queued');
});

test('without a sign-in nothing is told', async () => {
  for (const [method, path] of hidden()) {
    expect([path, (await server.request[method](path)).status]).toEqual([path, 401]);
  }
});

test('what is no number is the address of nothing', async () => {
  const api = await server.signInAs(await buildUser(server.services, ['modeller'], { firmId }));
  for (const id of ['0', '-1', 'abc', '1e3', '999999999']) {
    await api.get(`/api/runs/${id}`).expect(404);
  }
});
