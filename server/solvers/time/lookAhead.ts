import type { CaseFile } from '../../../shared/case/caseFile';
import { createEndSection } from '../boundaries/endSection';
import type { CellTables } from '../geometry/cellTables';
import { createSeries } from '../sources/series';
import type { LevelPool } from '../structures/levelPool';
import type { Workspace } from '../workspace';

/** A step may be this much too long for what comes at its end; what stands at its start bounds it as a rule. */
const SLACK = 2;
/** Most that a pool may rise over a step (m): its release can begin within it. */
const POOL_RISE = 0.1;
/** An inflow that grows by more than this over a step is looked at. */
const SUDDEN = 1.5;
const HALVINGS = 60;

/**
 * Shortens a step (s), which ends at `latest` at the latest, over which water comes to an end where there was none: a dry reach has no wave to bound the step
 * by, and all that flows in during a long one would stand in the first cell at its end.
 */
export function createLookAhead(
  { upstream, downstream }: CaseFile,
  workspace: Workspace,
  tables: CellTables,
  courant: number,
  pool: LevelPool | null,
): (time: number, dt: number, latest: number) => number {
  const { n, dx, bed, stage: cellStage, dryDepth } = workspace;
  const most = SLACK * courant * dx;
  /** Distance (m) that comes to pass at an end in a step of dt that ends at a time */
  const runs: ((time: number, dt: number) => number)[] = [];

  const stageRun = (
    section: number,
    cell: number,
    { times, stages }: { times: number[]; stages: number[] },
  ): void => {
    const { celerityAt } = createEndSection(workspace, tables, section);
    const stage = createSeries(times, stages);
    runs.push((time, dt) => {
      if (cellStage[cell] - bed[cell] > dryDepth) return 0;
      const eta = stage(time + dt);
      return eta > bed[section] ? 2 * dt * celerityAt(eta) : 0;
    });
  };
  if (upstream.kind === 'inflow') {
    const { criticalStage, celerityAt } = createEndSection(workspace, tables, 0);
    const inflow = createSeries(upstream.times, upstream.flows);
    runs.push((time, dt) => {
      const flow = inflow(time + dt);
      return flow > SUDDEN * inflow(time) ? 2 * dt * celerityAt(criticalStage(flow)) : 0;
    });
  }
  if (upstream.kind === 'stage') stageRun(0, 1, upstream);
  if (downstream.kind === 'stage') stageRun(n + 1, n, downstream);

  return function lookAhead(time, dt, latest) {
    let step = Math.min(dt, latest - time);
    for (let k = 0; k < HALVINGS; k++) {
      const isLong =
        runs.some((run) => run(time, step) > most) ||
        (pool !== null && step * pool.inflow(time + step) > POOL_RISE * pool.surface());
      if (!isLong) return step === latest - time ? dt : step;
      step *= 0.5;
    }
    return step;
  };
}
