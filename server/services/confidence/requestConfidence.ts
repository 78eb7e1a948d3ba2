import type { CaseFile } from '../../../shared/case/caseFile';
import { CASE_LIMITS } from '../../../shared/case/caseLimits';
import { PARAMETERS, parametersOf } from '../../../shared/confidence/parameters';
import { cellsOf, PLANS, type PlannedMember } from '../../../shared/confidence/planMembers';
import {
  CONFIDENCE_LIMITS,
  type ConfidenceKind,
  type SettingsOf,
} from '../../../shared/confidence/schemas';
import type { ConfidenceInput, NamedPlace } from '../../../shared/confidence/types';
import type { Fault } from '../../../shared/errors';
import { invalid } from '../../errors';
import type { RunModel } from '../../models/Run';
import type { TaskSetModel } from '../../models/TaskSet';
import { assertRouted } from '../runs/readResults';
import type { buildRuns } from '../runs';
import type { buildTasks } from '../tasks';
import { placesAlong } from './placesAlong';

interface Needs {
  runs: ReturnType<typeof buildRuns>;
  tasks: ReturnType<typeof buildTasks>;
}

const TITLES: Record<ConfidenceKind, string> = {
  convergence: 'Cell-size convergence',
  sensitivity: 'Sensitivity',
  ensemble: 'Ensemble',
};

export function buildRequestConfidence({ runs, tasks }: Needs) {
  /** Those of the study by their ids; the last section where none is chosen. */
  async function chosenStations(
    { studyId }: RunModel,
    ids: readonly number[],
    { sections }: CaseFile,
  ): Promise<{ stations: NamedPlace[]; faults: Fault[] }> {
    const last = sections[sections.length - 1];
    if (ids.length === 0)
      return { stations: [{ name: last.id, chainage: last.chainage }], faults: [] };
    const known = await runs.results.stations(studyId);
    const stations: NamedPlace[] = [];
    const faults: Fault[] = [];
    ids.forEach((id, k) => {
      const station = known.find((one) => one.id === id);
      const path = `stationIds[${k}]`;
      if (!station)
        faults.push({ path, message: 'The study has no such station any more; choose again.' });
      else if (station.chainage < sections[0].chainage || station.chainage > last.chainage)
        faults.push({ path, message: `${station.name} does not lie on the reach of this run.` });
      else stations.push({ name: station.name, chainage: station.chainage });
    });
    return { stations, faults };
  }

  /**
   * Puts a set of the run's frozen case into the queue. Throws `conflict` where the run is not routed, `invalid` with the
   * place of each fault where the settings do not fit the case.
   */
  return async <K extends ConfidenceKind>(
    actor: { id: number; firmId: number },
    run: RunModel,
    kind: K,
    settings: SettingsOf[K],
  ): Promise<TaskSetModel> => {
    assertRouted(run);
    const caseFile = JSON.parse((await runs.exports.caseFile(run)).toString('utf8')) as CaseFile;
    const { stations, faults } = await chosenStations(run, settings.stationIds, caseFile);
    const members = PLANS[kind](settings, caseFile);
    faults.push(...parameterFaults(settings, caseFile), ...cellFaults(kind, members, caseFile));
    if (faults.length > 0)
      throw invalid(faults, 'Nothing was started: the settings do not fit this run.');
    const input: ConfidenceInput = {
      caseFile,
      stations,
      places: placesAlong(caseFile, stations),
      series: kind === 'ensemble',
    };
    return tasks.create(actor, {
      kind,
      name: settings.name || `${TITLES[kind]} of run ${run.number}: ${run.scenarioName}`,
      studyId: run.studyId,
      scenarioId: run.scenarioId,
      runId: run.id,
      caseHash: run.caseHash,
      settings,
      input,
      members,
    });
  };
}

function parameterFaults(settings: SettingsOf[ConfidenceKind], caseFile: CaseFile): Fault[] {
  if (!('parameters' in settings)) return [];
  const known = new Set(parametersOf(caseFile).map(({ key }) => key));
  return settings.parameters.flatMap(({ key }, k) =>
    known.has(key)
      ? []
      : [
          {
            path: `parameters[${k}].key`,
            message: `${PARAMETERS[key].label}: the case of this run has nothing of it to vary.`,
          },
        ],
  );
}

function cellFaults(kind: ConfidenceKind, members: PlannedMember[], caseFile: CaseFile): Fault[] {
  const path = kind === 'convergence' ? 'finest' : 'cellSize';
  const counts = members.map(
    ({ payload }) =>
      cellsOf(caseFile, payload.variation.cellSize ?? caseFile.numerics.cellSize).cells,
  );
  const fewest = Math.min(...counts);
  if (Math.max(...counts) > CASE_LIMITS.cells)
    return [{ path, message: `The finest grid would have more than ${CASE_LIMITS.cells} cells.` }];
  if (fewest < CONFIDENCE_LIMITS.coarsestCells)
    return [
      {
        path,
        message: `The coarsest grid would have ${fewest} cells; ${CONFIDENCE_LIMITS.coarsestCells} or more tell something. Use smaller cells.`,
      },
    ];
  return [];
}
