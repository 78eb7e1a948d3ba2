import { freezeCase } from '../../../server/services/runs/freezeCase';
import { SOLVER_VERSION } from '../../../server/solvers';
import type { Services } from '../../../server/composition';
import type { RunModel } from '../../../server/models/Run';
import type { UserModel } from '../../../server/models/User';
import { sampleBlocks } from '../../server/results/sampleRun';
import { buildReach } from './buildReach';
import { buildScenario } from './buildScenario';
import { buildStudy } from './buildStudy';

/** A run of the user's firm with stored results that are easy to check by hand, and two stations on it. */
export async function buildRoutedRun(
  services: Services,
  requester: UserModel,
  studyTitle?: string,
) {
  const { models } = services;
  const study = await buildStudy(
    services,
    requester,
    studyTitle === undefined ? {} : { title: studyTitle },
  );
  const reach = await buildReach(services, study);
  const scenario = await buildScenario(services, reach);
  const stations = [];
  for (const [name, chainage] of [
    ['Mill', 500],
    ['Bridge', 1000],
  ] as const)
    stations.push(await models.Station.create({ studyId: study.id, name, chainage }));
  const run = await buildRunOf(services, requester, scenario);
  return { study, reach, scenario, stations, run };
}

/** One more routed run of a scenario. */
export async function buildRunOf(
  { models }: Services,
  requester: UserModel,
  scenario: { id: number; studyId: number; reachId: number; name: string },
): Promise<RunModel> {
  const { caseFile, encoded } = sampleBlocks();
  const { studyId } = scenario;
  const now = new Date();
  const run = await models.Run.create({
    studyId,
    scenarioId: scenario.id,
    reachId: scenario.reachId,
    number: (await models.Run.count({ where: { studyId } })) + 1,
    scenarioName: scenario.name,
    state: 'routed',
    ...(await freezeCase(caseFile)),
    solverVersion: SOLVER_VERSION,
    duration: caseFile.numerics.duration,
    startsAt: null,
    inflow: { times: [], flows: [] },
    requestedBy: requester.id,
    requestedAt: now,
    startedAt: now,
    finishedAt: now,
  });
  for (const { bytes, kind, part } of encoded)
    await models.RunBlock.create({ runId: run.id, kind, part, bytes: Buffer.from(bytes) });
  return run;
}
