import { compareFlood } from '../../../shared/calibration/compareFlood';
import type { RunResiduals } from '../../../shared/calibration/types';
import { conflict, invalid } from '../../errors';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { ObservationsService } from '../observations';
import type { buildRuns } from '../runs';
import { floodOfRun } from './floodOfRun';
import { observedFlood } from './observedFlood';

interface Needs {
  observations: ObservationsService;
  runs: Pick<ReturnType<typeof buildRuns>, 'results'>;
}

/** Runs against what was observed. */
export function buildReadResiduals({ models }: Platform, { observations, runs }: Needs) {
  const { Gauge, Mark, ReportedFlood, SignOff } = models;

  const reportedOf = async (runId: number) => (await ReportedFlood.findByPk(runId))?.flood ?? null;

  async function floodsOf(studyId: number): Promise<string[]> {
    const where = { studyId };
    const [marks, gauges] = await Promise.all([Mark.findAll({ where }), Gauge.findAll({ where })]);
    return [...new Set([...marks, ...gauges].map(({ flood }) => flood))];
  }

  /**
   * Against the named flood; without a name against the one that is reported, else the first. Throws `conflict` where
   * the run is not routed, `invalid` where nothing was observed of that flood.
   */
  async function read(run: RunModel, wanted?: string): Promise<RunResiduals> {
    const blocks = runs.results.open(run);
    const reported = await reportedOf(run.id);
    const floods = await floodsOf(run.studyId);
    const flood = wanted ?? reported ?? floods[0] ?? '';
    if (wanted !== undefined && !floods.includes(wanted))
      throw invalid([{ path: 'flood', message: 'Nothing was observed of that flood.' }]);
    const compared = await compareFlood(
      await observedFlood(observations, run.studyId, flood),
      await floodOfRun(blocks),
      run.startsAt?.toISOString() ?? null,
    );
    return { runId: run.id, flood, reported, ...compared };
  }

  /** Chooses what the report prints. Throws `conflict` once the run is signed: its report stands. */
  async function report(run: RunModel, flood: string | null): Promise<void> {
    if (await SignOff.findOne({ where: { runId: run.id } }))
      throw conflict(`Run ${run.number} is signed. What its report says no longer changes.`);
    if (flood === null) {
      await ReportedFlood.destroy({ where: { runId: run.id } });
      return;
    }
    if (!(await floodsOf(run.studyId)).includes(flood))
      throw invalid([{ path: 'flood', message: 'Nothing was observed of that flood.' }]);
    await ReportedFlood.upsert({ runId: run.id, flood });
  }

  /** What the report of the run prints; null where nothing was chosen. */
  async function ofReport(run: RunModel): Promise<RunResiduals | null> {
    const flood = await reportedOf(run.id);
    const known = flood !== null && (await floodsOf(run.studyId)).includes(flood);
    return known ? read(run, flood) : null;
  }

  return { read, report, ofReport };
}
