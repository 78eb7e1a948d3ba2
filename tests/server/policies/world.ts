import type { Role } from '../../../shared/accounts/roles';
import type { Services } from '../../../server/composition';
import type { RunModel } from '../../../server/models/Run';
import type { UserModel } from '../../../server/models/User';
import { makeCode } from '../../../server/services/review/verificationCode';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { PERSONAS, type Persona } from './expectedRights';

const ROLE_OF: Record<Persona, Role> = {
  administrator: 'administrator',
  modeller: 'modeller',
  seniorEngineer: 'seniorEngineer',
  sender: 'surveyor',
  surveyor: 'surveyor',
  surveyorElsewhere: 'surveyor',
  client: 'client',
  clientElsewhere: 'client',
};

export interface World {
  people: Record<Persona, UserModel>;
  /** One record for each parameter of an address. */
  ids: Record<string, number>;
}

/** A firm with a person of every kind and one study with one of everything in it. */
export async function buildWorld(services: Services): Promise<World> {
  const { models } = services;
  const firmId = (await buildFirm(services)).id;
  const people = {} as Record<Persona, UserModel>;
  for (const persona of PERSONAS)
    people[persona] = await buildUser(services, [ROLE_OF[persona]], { firmId });
  const { modeller, sender, surveyor, client } = people;

  const study = await buildStudy(services, modeller);
  await buildMember(services, study, sender, 'surveyor');
  await buildMember(services, study, surveyor, 'surveyor');
  await buildMember(services, study, client, 'client');
  const reach = await buildReach(services, study);
  await models.SurveyRevision.update({ sentBy: sender.id }, { where: { studyId: study.id } });
  const refusal = await models.SurveyRefusal.create({
    studyId: study.id,
    fileName: 'survey.xlsx',
    faultCount: 0,
    faults: [],
    sentBy: sender.id,
    sentAt: new Date(),
  });
  const upload = await models.Upload.create({
    studyId: study.id,
    userId: sender.id,
    fileName: 'survey.xlsx',
    size: 100,
    startedAt: new Date(),
    expiresAt: new Date(Date.now() + 1e8),
  });
  const station = await models.Station.create({ studyId: study.id, name: 'Bridge', chainage: 10 });
  const mark = await models.Mark.create({
    studyId: study.id,
    chainage: 10,
    level: 12,
    kind: 'debris',
    confidence: 'good',
    flood: '',
    observedOn: null,
    note: '',
  });
  const gauge = await models.Gauge.create({
    studyId: study.id,
    name: 'Gauge',
    chainage: 10,
    flood: '',
    startsAt: null,
    stageCount: 0,
    flowCount: 0,
    peakStage: null,
    peakFlow: null,
    record: Buffer.alloc(0),
  });
  const scenario = await buildScenario(services, reach);
  const run = await models.Run.create({
    studyId: study.id,
    scenarioId: scenario.id,
    reachId: reach.id,
    number: 1,
    scenarioName: scenario.name,
    state: 'routed',
    caseBytes: Buffer.alloc(0),
    caseHash: `sha256:${'0'.repeat(64)}`,
    solverVersion: 'test',
    duration: 1,
    startsAt: null,
    inflow: { times: [], flows: [] },
    requestedBy: modeller.id,
    requestedAt: new Date(),
  });
  const taskSet = await models.TaskSet.create({
    firmId,
    studyId: study.id,
    scenarioId: scenario.id,
    runId: run.id,
    kind: 'ensemble',
    name: 'Ensemble',
    state: 'finished',
    settings: {},
    input: Buffer.alloc(0),
    caseHash: run.caseHash,
    solverVersion: 'test',
    requestedBy: modeller.id,
    requestedAt: new Date(),
  });
  const pointId = await issue(services, run, modeller, people.seniorEngineer);
  const invitation = await models.Invitation.create({
    firmId,
    email: 'guest@client.example',
    roles: ['client'],
    studyId: study.id,
    invitedById: modeller.id,
    expiresAt: new Date(Date.now() + 1e8),
  });
  return {
    people,
    ids: {
      userId: client.id,
      invitationId: invitation.id,
      studyId: study.id,
      stationId: station.id,
      markId: mark.id,
      gaugeId: gauge.id,
      surveyId: reach.surveyRevisionId,
      refusalId: refusal.id,
      uploadId: upload.id,
      reachId: reach.id,
      scenarioId: scenario.id,
      runId: run.id,
      pointId,
      taskSetId: taskSet.id,
      taskId: 1,
    },
  };
}

/** Signs and issues a run as it stands in the tables; answers the id of a point that was raised on it. */
async function issue(
  { models }: Services,
  run: RunModel,
  modeller: UserModel,
  senior: UserModel,
): Promise<number> {
  const at = new Date();
  const review = await models.Review.create({
    runId: run.id,
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
  const point = await models.ReviewPoint.create({
    reviewId: review.id,
    chainage: null,
    time: null,
    text: 'Why so?',
    state: 'closed',
    raisedBy: senior.id,
    raisedAt: at,
  });
  await models.SignOff.create({
    runId: run.id,
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
  await models.Issue.create({
    runId: run.id,
    issuedBy: modeller.id,
    at,
    stationIds: [],
    message: '',
  });
  return point.id;
}
