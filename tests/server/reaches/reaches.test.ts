import type { ReachModel } from '../../../server/models/Reach';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { plainSections } from '../../helpers/plainSections';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let modeller: UserModel;
let study: StudyModel;
let reach: ReachModel;
beforeAll(async () => {
  server = await startTestServer();
  modeller = await buildUser(server.services, ['modeller']);
}, 60_000);
beforeEach(async () => {
  study = await buildStudy(server.services, modeller);
  reach = await buildReach(server.services, study);
});
afterAll(() => server.stop());

const address = () => `/api/reaches/${reach.id}`;
const change = async (body: object, status = 200) =>
  (await (await server.signInAs(modeller)).patch(`${address()}/sections`).send(body).expect(status))
    .body;

test('a reach tells what follows from its sections', async () => {
  const api = await server.signInAs(modeller);
  const { body } = await api.get(address()).expect(200);
  expect(body).toMatchObject({
    name: 'Revision 1',
    revision: 1,
    sectionCount: 4,
    version: 1,
    studyId: study.id,
  });
  // By hand: bed 6 m, banks 3 m up, sides 1 in 2: A = 36 m², T = 18 m, P = 6 + 2·√45 m; K = A R^(2/3) / n with n 0.035.
  const perimeter = 6 + 2 * Math.sqrt(45);
  const { thalweg, leftBank, rightBank, bankfull } = body.sections[0];
  expect([thalweg, leftBank, rightBank]).toEqual([10, 13, 13]);
  expect(bankfull.depth).toBeCloseTo(3, 12);
  expect(bankfull.topWidth).toBeCloseTo(18, 12);
  expect(bankfull.area).toBeCloseTo(36, 12);
  expect(bankfull.conveyance).toBeCloseTo((36 * (36 / perimeter) ** (2 / 3)) / 0.035, 8);
});

test('banks and roughness of one section are set, and the version grows', async () => {
  const body = await change({
    version: 1,
    sectionIds: ['XS-02'],
    banks: [10, 48],
    roughness: [
      [0, 0.08],
      [10, 0.04],
    ],
  });
  expect(body.version).toBe(2);
  expect(body.updatedBy).toBe(modeller.name);
  expect(body.sections[1]).toMatchObject({
    banks: [10, 48],
    roughness: [
      [0, 0.08],
      [10, 0.04],
    ],
  });
  expect(body.sections[0]).toMatchObject({ banks: [20, 38] });
});

test('roughness by bank is set over many sections', async () => {
  const body = await change({
    version: 1,
    sectionIds: ['XS-01', 'XS-03'],
    roughnessByBank: { left: 0.05, channel: 0.03, right: 0.07 },
  });
  const expected = [
    [0, 0.05],
    [20, 0.03],
    [38, 0.07],
  ];
  expect(body.sections.map(({ roughness }: { roughness: unknown }) => roughness)).toEqual([
    expected,
    plainSections()[1].roughness,
    expected,
    plainSections()[3].roughness,
  ]);
});

test('banks are taken away again', async () => {
  const body = await change({ version: 1, sectionIds: ['XS-01'], banks: null });
  expect(body.sections[0].banks).toBeNull();
  expect(
    body.advice.map(({ code, sectionIds }: { code: string; sectionIds: string[] }) => [
      code,
      sectionIds,
    ]),
  ).toContainEqual(['noBanks', ['XS-01']]);
});

test('a change made on an older version is a conflict and changes nothing', async () => {
  await change({ version: 1, sectionIds: ['XS-01'], banks: [10, 48] });
  const { error } = await change({ version: 1, sectionIds: ['XS-01'], banks: [20, 38] }, 409);
  expect(error).toMatchObject({ code: 'conflict', details: { version: 2 } });
  const { body } = await (await server.signInAs(modeller)).get(address());
  expect(body.sections[0].banks).toEqual([10, 48]);
});

test('of two at once one wins and the other is told', async () => {
  const api = await server.signInAs(modeller);
  const send = () =>
    api.patch(`${address()}/sections`).send({ version: 1, sectionIds: ['XS-01'], banks: [10, 48] });
  const statuses = (await Promise.all([send(), send()])).map(({ status }) => status);
  expect(statuses.sort()).toEqual([200, 409]);
});

test.each([
  [{ banks: [38, 20] }, 'banks[1]'],
  [{ banks: [-5, 20] }, 'banks[0]'],
  [
    {
      roughness: [
        [0, 0.03],
        [0, 0.04],
      ],
    },
    'roughness[1][0]',
  ],
  [
    {
      roughness: [
        [0, 0.03],
        [70, 0.04],
      ],
    },
    'roughness[1][0]',
  ],
  [{ roughness: [[0, 1.5]] }, 'roughness[0][1]'],
  [{ sectionIds: ['XS-01', 'XS-99'] }, 'sectionIds'],
  [{ sectionIds: [] }, 'sectionIds'],
  [{ banks: null, roughnessByBank: { left: 0.05, channel: 0.03, right: 0.07 } }, 'roughnessByBank'],
  [
    { roughness: [[0, 0.03]], roughnessByBank: { left: 0.05, channel: 0.03, right: 0.07 } },
    'roughness',
  ],
])('%j is refused at its place', async (body, path) => {
  const { error } = await change({ version: 1, sectionIds: ['XS-01'], ...body }, 422);
  expect(error.faults.map((fault: { path: string }) => fault.path)).toContain(path);
});

test('what a scenario lacks is told anew when its reach changes', async () => {
  reach = await buildReach(
    server.services,
    study,
    plainSections().map((section) => ({ ...section, roughness: [] })),
  );
  const scenario = await buildScenario(server.services, reach);
  expect(scenario.faultCount).toBe(1);
  await change({
    version: 1,
    sectionIds: ['XS-01', 'XS-02', 'XS-03', 'XS-04'],
    roughnessByBank: { left: 0.05, channel: 0.03, right: 0.07 },
  });
  expect((await scenario.reload()).faultCount).toBe(0);
});

test('surveyors, clients and other firms see no reach', async () => {
  const people = [
    await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId }),
    await buildUser(server.services, ['client'], { firmId: modeller.firmId }),
    await buildUser(server.services, ['modeller']),
  ];
  await buildMember(server.services, study, people[0], 'surveyor');
  await buildMember(server.services, study, people[1], 'client');
  for (const person of people) {
    const api = await server.signInAs(person);
    await api.get(address()).expect(404);
    await api
      .patch(`${address()}/sections`)
      .send({ version: 1, sectionIds: ['XS-01'], banks: null })
      .expect(404);
  }
});
