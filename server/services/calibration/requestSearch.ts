import type { ObservedFlood } from '../../../shared/calibration/compareFlood';
import type { SearchBody, SearchSettings } from '../../../shared/calibration/search/types';
import { withFactors } from '../../../shared/calibration/search/withFactors';
import type { CaseFile } from '../../../shared/case/caseFile';
import { faultsIn } from '../../../shared/case/validate/faults';
import { validateCase } from '../../../shared/case/validateCase';
import type { Fault } from '../../../shared/errors';
import type { UnitSystem } from '../../../shared/units/units';
import { invalid } from '../../errors';
import type { CalibrationInput } from '../../jobs/tasks/calibration/calibrationKind';
import type { RunModel } from '../../models/Run';
import type { TaskSetModel } from '../../models/TaskSet';
import type { ObservationsService } from '../observations';
import type { buildRuns } from '../runs';
import { assertRouted } from '../runs/readResults';
import type { buildTasks } from '../tasks';
import { observedFlood } from './observedFlood';

interface Needs {
  observations: ObservationsService;
  runs: Pick<ReturnType<typeof buildRuns>, 'exports'>;
  tasks: Pick<ReturnType<typeof buildTasks>, 'create'>;
}

/** Puts a search for roughness multipliers into the queue; it varies the frozen case of a routed run. */
export function buildRequestSearch({ observations, runs, tasks }: Needs) {
  /** Throws `conflict` where the run is not routed, `invalid` where a stretch or the observations cannot be used. */
  return async (
    actor: { id: number; firmId: number },
    run: RunModel,
    body: SearchBody,
  ): Promise<TaskSetModel> => {
    assertRouted(run);
    const all = await observedFlood(observations, run.studyId, body.flood);
    const observed = chosen(all, body.use);
    if (observed.marks.length === 0 && observed.gauges.length === 0)
      throw invalid([
        { path: 'use', message: 'Nothing of this kind was observed of that flood. Choose more.' },
      ]);
    const caseFile = JSON.parse((await runs.exports.caseFile(run)).toString('utf8')) as CaseFile;
    const { stretches, evaluations } = body;
    const runCells = caseFile.numerics.cellSize;
    const cellSize = runCells * body.coarser;
    const ones = stretches.map(() => 1);
    const varied = withFactors(caseFile, stretches, ones, cellSize);
    const faults = faultsOf(varied, caseFile, run.study!.unitSystem);
    if (faults.length > 0) throw invalid(faults);
    const settings: SearchSettings = { ...body, cells: { search: cellSize, run: runCells } };
    const startsAt = run.startsAt?.toISOString() ?? null;
    const input: CalibrationInput = {
      caseFile,
      observed,
      startsAt,
      stretches,
      evaluations,
      cellSize,
    };
    return tasks.create(actor, {
      kind: 'calibration',
      name: body.name,
      studyId: run.studyId,
      scenarioId: run.scenarioId,
      runId: run.id,
      caseHash: run.caseHash,
      settings,
      input,
      members: [{ label: body.name, payload: null }],
    });
  };
}

const chosen = ({ marks, gauges }: ObservedFlood, use: SearchBody['use']): ObservedFlood => ({
  marks: use.marks ? marks : [],
  gauges: gauges
    .map((gauge) => ({
      ...gauge,
      stage: use.gaugeStage ? gauge.stage : null,
      flow: use.gaugeFlow ? gauge.flow : null,
    }))
    .filter(({ stage, flow }) => stage || flow),
});

/** Faults of the case at the stretches that cause them. */
function faultsOf(
  varied: CaseFile,
  { roughnessFactors = [] }: CaseFile,
  system: UnitSystem,
): Fault[] {
  const before = roughnessFactors.length;
  return faultsIn(system, validateCase(varied).faults).map(({ path, message }) => {
    const k = /^roughnessFactors\[(\d+)\](?:\.(from|to))?/.exec(path);
    if (!k) return { path: 'coarser', message };
    return { path: `stretches[${Number(k[1]) - before}].${k[2] ?? 'to'}`, message };
  });
}
