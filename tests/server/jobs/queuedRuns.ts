import { gzipSync } from 'node:zlib';
import type { Services } from '../../../server/composition';
import type { RunModel } from '../../../server/models/Run';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import type { FakeCase } from './fakeRunWorker';

/** Puts stand-ins for runs into the queue. */
export async function fakeQueue(services: Services) {
  const user = await buildUser(services, ['modeller']);
  const study = await buildStudy(services, user);
  const reach = await buildReach(services, study);
  const scenario = await buildScenario(services, reach);
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
  return { add };
}
