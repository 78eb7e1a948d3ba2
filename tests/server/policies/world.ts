import type { Role } from '../../../shared/accounts/roles';
import type { Services } from '../../../server/composition';
import type { UserModel } from '../../../server/models/User';
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
  const station = await models.Station.create({ studyId: study.id, name: 'Bridge', chainage: 10 });
  const scenario = await buildScenario(services, reach);
  const run = await models.Run.create({
    studyId: study.id,
    scenarioId: scenario.id,
    reachId: reach.id,
    number: 1,
    scenarioName: scenario.name,
    state: 'cancelled',
    caseBytes: Buffer.alloc(0),
    caseHash: `sha256:${'0'.repeat(64)}`,
    solverVersion: 'test',
    duration: 1,
    startsAt: null,
    inflow: { times: [], flows: [] },
    requestedBy: modeller.id,
    requestedAt: new Date(),
  });
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
      surveyId: reach.surveyRevisionId,
      refusalId: refusal.id,
      reachId: reach.id,
      scenarioId: scenario.id,
      runId: run.id,
    },
  };
}
