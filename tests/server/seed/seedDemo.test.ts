import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../../../seed/accounts';
import { seedDemo } from '../../../seed';
import { startTestServer, type TestServer } from '../../helpers/testServer';

// Surveys are read in threads, which take seconds on a busy machine.
jest.setTimeout(240_000);

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0' });
  await seedDemo(server.services);
});
afterAll(() => server.stop());

const counts = async () => {
  const {
    Firm,
    User,
    Study,
    StudyMember,
    Station,
    SurveyRevision,
    SurveyRefusal,
    Reach,
    Scenario,
    Run,
  } = server.services.models;
  const of = await Promise.all(
    [
      Firm,
      User,
      Study,
      StudyMember,
      Station,
      SurveyRevision,
      SurveyRefusal,
      Reach,
      Scenario,
      Run,
    ].map((model) => (model as typeof Firm).count()),
  );
  return of.join(' ');
};

test('two firms, people of every role, three studies, three runs asked for', async () => {
  expect(await counts()).toBe('2 6 3 3 5 2 1 3 4 4');
  const roles = new Set(DEMO_ACCOUNTS.flatMap((account) => account.roles));
  expect([...roles].sort()).toEqual([
    'administrator',
    'client',
    'modeller',
    'seniorEngineer',
    'surveyor',
  ]);
});

test('loading it again changes nothing', async () => {
  const before = await counts();
  await seedDemo(server.services);
  expect(await counts()).toBe(before);
});

test('an older data directory is given what is newer, once, and keeps what a person changed', async () => {
  const { services } = server;
  const { AuditRow, Gauge, Mark, Reach, Station, Study } = services.models;
  const study = await Study.findOne({
    where: { title: 'Lower Veshall at Tornick' },
    rejectOnEmpty: true,
  });
  const where = { studyId: study.id };
  const parts = { action: 'demo.loaded' };
  expect(await AuditRow.count({ where: parts })).toBe(3);
  const working = () => Reach.findOne({ where: { ...where, name: 'Mill meadow lowered' } });
  expect((await working())?.version).toBe(2);
  // As if the directory were older than its marks, levels and geometry; one station was moved by a person since.
  await Promise.all([Mark.destroy({ where }), Gauge.destroy({ where })]);
  await (await working())!.destroy();
  await Station.update({ levels: null }, { where });
  await Station.update({ chainage: 13_150 }, { where: { ...where, name: 'Sallow Mill' } });
  // Nobody can take a row out of the trail: it is only not found, once.
  const told = jest.spyOn(AuditRow, 'findOne').mockResolvedValue(null);
  await seedDemo(services);
  told.mockRestore();
  expect([await Mark.count({ where }), await Gauge.count({ where })]).toEqual([15, 1]);
  expect((await working())?.version).toBe(2);
  const levels = (await services.stations.list(study.id)).map(({ name, levels }) => [
    name,
    levels?.length ?? 0,
  ]);
  expect(levels).toEqual([
    ['Tornick bridge', 2],
    ['Sallow Mill', 0],
    ['Gauge at Ebbick', 0],
  ]);
  // What a person deletes afterwards stays deleted.
  await Mark.destroy({ where });
  await seedDemo(services);
  expect(await Mark.count({ where })).toBe(0);
});

test('an interrupted start is completed', async () => {
  const { Study, Run } = server.services.models;
  const before = await counts();
  await Study.destroy({ where: { title: 'Mill Reach, Ostrand Vale' } });
  await Run.destroy({ where: { number: 1 } });
  await seedDemo(server.services);
  expect(await counts()).toBe(before);
});

test('every account signs in', async () => {
  for (const { email, name } of DEMO_ACCOUNTS.slice(0, 4)) {
    const { body } = await server.request
      .post('/api/auth/sign-in')
      .send({ email, password: DEMO_PASSWORD })
      .expect(200);
    expect(body.me.name).toBe(name);
  }
});

test('the survey that was sent back shows the slips at their rows, and its scenarios have no faults', async () => {
  const { SurveyRefusal, Scenario } = server.services.models;
  const refusal = await SurveyRefusal.findOne({ rejectOnEmpty: true });
  expect(refusal.faults.map(({ title }) => title)).toEqual([
    'Elevation is missing',
    expect.stringMatching(/^Offset goes back: /),
    expect.stringMatching(/^Elevation \d+\.?\d* is far from the rest$/),
    expect.stringMatching(/^Chainage [\d,]+ stands twice$/),
  ]);
  for (const scenario of await Scenario.findAll()) expect(scenario.faultCount).toBe(0);
});
