import type { ScenarioBody } from '../shared/scenarios/schemas';
import type { StationBody, StudyBody } from '../shared/studies/schemas';
import type { Section } from '../shared/surveys/types';
import { hashPassword } from '../server/auth/passwords';
import type { Services } from '../server/composition';
import { AppError } from '../server/errors';
import type { ScenarioModel } from '../server/models/Scenario';
import type { StudyModel } from '../server/models/Study';
import type { UserModel } from '../server/models/User';
import { DEMO_ACCOUNTS, DEMO_FIRM, DEMO_PASSWORD, OTHER_FIRM, type DemoAccount } from './accounts';
import { person } from './checks';
import { seedParts } from './parts';
import { lowerVeshall } from './reaches/lowerVeshall';
import { quenlowValley } from './reaches/quenlowValley';
import { damFailure, designFlood, gradualFailure, largerFlood } from './scenarios';
import { faultySurveyFile, surveyFile } from './surveyFiles';
import { VESHALL, VESHALL_STATIONS } from './veshall';

export { seedChecks } from './checks';
export { seedConfidence } from './confidence';

const QUENLOW: StudyBody = {
  title: 'Quenlow dam, sudden failure',
  clientName: 'Quenlow Water Board',
  place: 'Quenlow valley',
  verticalDatum: 'Veshall levelling datum 1974',
  coordinateSystem: 'Veshall valley grid, metres',
  unitSystem: 'metric',
  purpose: 'Arrival times and depths below the dam for the emergency plan.',
};
const QUENLOW_STATIONS: StationBody[] = [
  { name: 'Quenlow farm', chainage: 2260 },
  { name: 'Lower ford', chainage: 4460 },
];
const FILE_NAMES: Record<string, string> = {
  [VESHALL.title]: 'veshall_nov_mended.xlsx',
  [QUENLOW.title]: 'quenlow.xlsx',
};
const OSTRAND: StudyBody = {
  title: 'Mill Reach, Ostrand Vale',
  clientName: 'Ostrand County',
  place: 'Ostrand Vale',
  verticalDatum: 'County datum',
  coordinateSystem: '',
  unitSystem: 'usCustomary',
  purpose: '',
};

/**
 * Loads the demo data through the real services, and puts its runs into the real queue. Idempotent: what an interrupted start
 * has left is completed, and where all is there nothing is touched, so that what people change or delete stays so. What is
 * newer than the data directory is added once.
 */
export async function seedDemo(services: Services): Promise<void> {
  const { models } = services;
  // Made last: where it stands, everything does.
  if (!(await models.Study.findOne({ where: { title: OSTRAND.title } }))) await seedBase(services);
  const modeller = await person(services, 'Ines Corrow');
  const study = await models.Study.findOne({
    where: { title: VESHALL.title, ...(modeller && { firmId: modeller.firmId }) },
  });
  if (modeller && study) await seedParts(services, study, modeller);
}

async function seedBase(services: Services): Promise<void> {
  const users = await seedAccounts(services);
  const known = (name: string) => users.get(name)!;
  const [modeller, surveyor, client] = ['Ines Corrow', 'Dov Hallam', 'Maud Ferrin'].map(known);

  const veshall = await seedStudy(services, modeller, VESHALL, VESHALL_STATIONS);
  await share(services, veshall, surveyor, 'surveyor');
  await share(services, veshall, client, 'client');
  const river = lowerVeshall();
  await seedRefusal(services, veshall, surveyor, river);
  const flood = await seedScenario(services, veshall, surveyor, modeller, river, designFlood);
  const larger = await seedScenario(services, veshall, surveyor, modeller, river, largerFlood);
  await seedRun(services, modeller, flood);
  await seedRun(services, modeller, larger);

  const quenlow = await seedStudy(services, modeller, QUENLOW, QUENLOW_STATIONS);
  await share(services, quenlow, surveyor, 'surveyor');
  const valley = quenlowValley();
  const failure = await seedScenario(services, quenlow, surveyor, modeller, valley, damFailure);
  await seedRun(services, modeller, failure);
  const piping = await seedScenario(services, quenlow, surveyor, modeller, valley, gradualFailure);
  await seedRun(services, modeller, piping);

  await seedStudy(services, known('Lena Ostrand'), OSTRAND, []);
}

async function seedAccounts({ models }: Services): Promise<Map<string, UserModel>> {
  const firms = new Map<string, number>();
  for (const name of [DEMO_FIRM, OTHER_FIRM]) {
    const [firm] = await models.Firm.findOrCreate({ where: { name } });
    firms.set(name, firm.id);
  }
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const users = new Map<string, UserModel>();
  for (const account of DEMO_ACCOUNTS) {
    const { firm, email, ...rest }: DemoAccount = account;
    const [user] = await models.User.findOrCreate({
      where: { email },
      defaults: { ...rest, email, firmId: firms.get(firm)!, passwordHash },
    });
    users.set(account.name, user);
  }
  return users;
}

async function seedStudy(
  { models, studies, stations }: Services,
  creator: UserModel,
  body: StudyBody,
  places: StationBody[],
): Promise<StudyModel> {
  const { firmId } = creator;
  const known = await models.Study.findOne({ where: { firmId, title: body.title } });
  const study = known ?? (await studies.create(creator, body));
  const there = new Set((await stations.list(study.id)).map(({ name }) => name));
  for (const place of places) if (!there.has(place.name)) await stations.create(study, place);
  return study;
}

async function share(
  { members }: Services,
  study: StudyModel,
  { id: userId }: UserModel,
  as: 'surveyor' | 'client',
) {
  await members.put(study, { userId, as });
}

/** The first attempt at the survey, as it was sent back. */
async function seedRefusal(
  { models, surveys }: Services,
  study: StudyModel,
  actor: UserModel,
  sections: Section[],
) {
  if ((await models.SurveyRefusal.count({ where: { studyId: study.id } })) > 0) return;
  const file = { name: 'veshall_nov.xlsx', bytes: faultySurveyFile(sections) };
  try {
    await surveys.accept({ study, actor, file, choice: null, note: '' });
  } catch (error) {
    if (!(error instanceof AppError && error.code === 'surveyRefused')) throw error;
    return;
  }
  throw new Error('The faulty demo survey was taken in.');
}

/** The survey taken in, its reach, and the scenario on it. */
async function seedScenario(
  { models, surveys, scenarios }: Services,
  study: StudyModel,
  surveyor: UserModel,
  modeller: UserModel,
  sections: Section[],
  bodyOf: (reachId: number, sections: Section[]) => ScenarioBody,
): Promise<ScenarioModel> {
  const studyId = study.id;
  if ((await models.SurveyRevision.count({ where: { studyId } })) === 0) {
    const file = { name: FILE_NAMES[study.title], bytes: surveyFile(sections) };
    const note = 'November survey.';
    await surveys.accept({ study, actor: surveyor, file, choice: null, note });
  }
  if ((await models.Reach.count({ where: { studyId } })) === 0) {
    const revision = await models.SurveyRevision.findOne({
      where: { studyId },
      rejectOnEmpty: true,
    });
    await surveys.decide(revision, modeller, { decision: 'accepted', remarks: '' });
  }
  const reach = await models.Reach.findOne({
    where: { studyId, copiedFrom: null },
    rejectOnEmpty: true,
  });
  const body = bodyOf(reach.id, sections);
  const known = await models.Scenario.findOne({
    where: { studyId, name: body.name },
    include: 'updater',
  });
  const scenario =
    known ?? (await scenarios.create(study, modeller, { name: body.name, reachId: reach.id }));
  if (scenario.version > 1) return scenario;
  return scenarios.save(scenario, modeller, { version: scenario.version, body });
}

async function seedRun({ models, runs }: Services, modeller: UserModel, scenario: ScenarioModel) {
  const count = await models.Run.count({ where: { scenarioId: scenario.id } });
  if (count === 0) await runs.request(modeller, scenario);
}
