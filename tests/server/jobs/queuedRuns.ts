import { gzipSync } from 'node:zlib';
import type { Services } from '../../../server/composition';
import type { RunModel } from '../../../server/models/Run';
import type { StudyModel } from '../../../server/models/Study';
import { scenarioSchema } from '../../../shared/scenarios/schemas';
import { buildUser } from '../../helpers/factories/buildUser';
import type { FakeCase } from './fakeRunWorker';

/** A study with one reach and one scenario, as rows only: enough to hang runs on. */
export async function buildStudyRows({ models }: Services, user: { id: number; firmId: number }) {
  const study = await models.Study.create({
    firmId: user.firmId,
    title: 'Lower Veshall',
    clientName: '',
    place: '',
    verticalDatum: '',
    unitSystem: 'metric',
    purpose: '',
    createdBy: user.id,
  });
  const bytes = gzipSync('[]');
  const counts = { sectionCount: 0, pointCount: 0, firstChainage: 0, lastChainage: 1 };
  const survey = await models.SurveyRevision.create({
    studyId: study.id,
    revision: 1,
    fileName: 'survey.xlsx',
    fileHash: '0'.repeat(64),
    file: bytes,
    sections: bytes,
    note: '',
    ...counts,
    sentBy: user.id,
    sentAt: new Date(),
  });
  const reach = await models.Reach.create({
    studyId: study.id,
    surveyRevisionId: survey.id,
    name: 'Revision 1',
    sections: bytes,
    ...counts,
    updatedBy: user.id,
  });
  const scenario = await models.Scenario.create({
    studyId: study.id,
    reachId: reach.id,
    name: '1 in 100 year',
    body: scenarioSchema.cast({
      name: '1 in 100 year',
      reachId: reach.id,
      upstream: { kind: 'wall' },
      downstream: { kind: 'open' },
      initial: { kind: 'steady' },
      numerics: { order: 2 },
    }) as never,
    peakInflow: null,
    faultCount: 0,
    updatedBy: user.id,
  });
  return { study, reach, scenario };
}

/** Puts stand-ins for runs into the queue. */
export async function fakeQueue(services: Services) {
  const user = await buildUser(services, ['modeller']);
  const { study, reach, scenario } = await buildStudyRows(services, user);
  let number = 0;
  const add = (fake: FakeCase, given: Partial<RunModel> = {}): Promise<RunModel> =>
    services.models.Run.create({
      studyId: study.id,
      scenarioId: scenario.id,
      reachId: reach.id,
      number: ++number,
      scenarioName: scenario.name,
      state: 'queued',
      caseBytes: gzipSync(JSON.stringify(fake)),
      caseHash: 'sha256:00',
      solverVersion: '1.0.0',
      duration: 100,
      startsAt: null,
      inflow: { times: [], flows: [] },
      requestedBy: user.id,
      requestedAt: new Date(),
      ...given,
    });
  return { user, study: study as StudyModel, reach, scenario, add };
}
