import type { RequestHandler } from 'express';
import supertest from 'supertest';
import { buildApp } from '../../../server/app';
import { POLICIES, type Action } from '../../../server/policies/policies';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { EXPECTED_RIGHTS, PERSONAS } from './expectedRights';
import { EXPECTED_ROUTES } from './expectedRoutes';
import { listRoutes, type DeclaredRoute } from './listRoutes';
import { buildWorld, type World } from './world';

let server: TestServer;
let routes: DeclaredRoute[];
/** The same application with nothing behind its rights: every route answers 299 where it lets pass. */
let gates: ReturnType<typeof supertest>;
let ours: World;
let theirs: World;

beforeAll(async () => {
  server = await startTestServer();
  const app = buildApp(server.services);
  routes = listRoutes(app);
  for (const { layers } of routes) leaveOnlyGates(layers);
  gates = supertest(app);
  ours = await buildWorld(server.services);
  theirs = await buildWorld(server.services);
});
afterAll(() => server.stop());

function leaveOnlyGates(layers: DeclaredRoute['layers']): void {
  layers.forEach((layer, i) => {
    const isGate = layer.handle === server.services.authenticate || layer.handle.action;
    if (i === layers.length - 1)
      layer.handle = ((_req, res) => res.status(299).end()) as RequestHandler;
    else if (!isGate) layer.handle = ((_req, _res, next) => next()) as RequestHandler;
  });
}

const addressOf = (path: string, { ids }: World) =>
  `/api${path.replaceAll(/:(\w+)/g, (_all, name: string) => String(ids[name]))}`;
const ask = (method: string, path: string, token?: string) => {
  const request = gates[method.toLowerCase() as 'get'](path);
  return token ? request.set('Authorization', `Bearer ${token}`) : request;
};
const closed = () => routes.filter(({ actions }) => actions[0] !== 'public');

test('every route declares exactly one action, the one that is expected of it', () => {
  const declared = Object.fromEntries(routes.map(({ name, actions }) => [name, actions]));
  const expected = Object.fromEntries(
    Object.entries(EXPECTED_ROUTES).map(([name, action]) => [name, [action]]),
  );
  expect(declared).toEqual(expected);
  expect(routes).toHaveLength(Object.keys(EXPECTED_ROUTES).length);
});

test('every action of the table has a route, and every right is written down', () => {
  const used = new Set(Object.values(EXPECTED_ROUTES));
  const actions = Object.keys(POLICIES) as Action[];
  expect(actions.filter((action) => !used.has(action))).toEqual([]);
  expect(Object.keys(EXPECTED_RIGHTS).sort()).toEqual([...actions].sort());
});

test('nothing but what is public answers without a token', async () => {
  for (const { method, path, name } of closed()) {
    const { status } = await ask(method, addressOf(path, ours));
    expect([name, status]).toEqual([name, 401]);
  }
});

test.each(PERSONAS)(
  '%s: what is allowed and how it is refused, on every route',
  async (persona) => {
    const token = await server.tokenOf(ours.people[persona]);
    for (const { method, path, name, actions } of closed()) {
      const expected = EXPECTED_RIGHTS[actions[0] as Action][persona];
      const { status } = await ask(method, addressOf(path, ours), token);
      expect([name, status]).toEqual([name, expected === 'yes' ? 299 : expected]);
    }
  },
);

test.each(PERSONAS)('%s: records of another firm do not exist, on every route', async (persona) => {
  const token = await server.tokenOf(ours.people[persona]);
  for (const { method, path, name } of closed().filter((route) => route.path.includes(':'))) {
    const { status } = await ask(method, addressOf(path, theirs), token);
    expect([name, status]).toEqual([name, 404]);
  }
});

test('what does not exist and what may not be seen are told alike', async () => {
  const token = await server.tokenOf(ours.people.surveyorElsewhere);
  const real = await ask('GET', addressOf('/studies/:studyId', ours), token);
  const none = await ask('GET', '/api/studies/999999999', token);
  const odd = await ask('GET', '/api/studies/0x1', token);
  const said = [real, none, odd].map(({ body }) => ({ ...body.error, requestId: null }));
  expect(said[1]).toEqual(said[0]);
  expect(said[2]).toEqual(said[0]);
});
