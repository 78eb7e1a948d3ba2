import type { CaseFile } from '../../../shared/case/caseFile';
import type { RunWarning } from '../../../shared/case/resultFile';
import { q, say } from '../../../shared/units/message';
import type { CellState } from '../geometry/cellState';
import type { CellTables } from '../geometry/cellTables';
import type { Grid } from '../geometry/grid';
import type { Laterals } from '../sources/laterals';
import type { LocalLosses } from '../sources/localLosses';
import { createSeries } from '../sources/series';
import type { StructureSet } from '../structures/structureSet';
import type { Workspace } from '../workspace';
import { steadyState } from './steadyState';

/** A given initial flow faster than this Froude number is no flow but a slip of the pen. */
const FASTEST_FROUDE = 10;

/** Puts the initial water into the cells. Tells whether it still has to settle. */
export function setInitialState(
  caseFile: CaseFile,
  workspace: Workspace,
  tables: CellTables,
  cellState: CellState,
  grid: Grid,
  laterals: Laterals,
  structures: StructureSet | null,
  localLosses: LocalLosses | null,
  warn: (warning: RunWarning) => void,
): boolean {
  const { n, area, flow, bed, stage, celerity, dryDepth } = workspace;
  const { initial } = caseFile;
  const put = (i: number, eta: number, q: number): void => {
    cellState.placeAtStage(i, Math.max(eta, bed[i]));
    flow[i] = stage[i] - bed[i] > dryDepth ? q : 0;
  };

  switch (initial.kind) {
    case 'still':
      for (let i = 1; i <= n; i++) put(i, initial.stage, 0);
      return false;
    case 'profile': {
      const stageAt = createSeries(initial.chainages, initial.stages);
      const flowAt = createSeries(initial.chainages, initial.flows);
      let limited = 0;
      for (let i = 1; i <= n; i++) {
        put(i, stageAt(grid.chainage[i - 1]), flowAt(grid.chainage[i - 1]));
        const most = FASTEST_FROUDE * area[i] * celerity[i];
        if (Math.abs(flow[i]) <= most) continue;
        flow[i] = Math.sign(flow[i]) * most;
        if (limited === 0) limited = i;
      }
      if (limited > 0) {
        const chainage = grid.chainage[limited - 1];
        warn({
          code: 'initialLimited',
          ...say`The initial profile asks for more flow than its water can carry, first at chainage ${q(chainage, 'chainage')}: it was cut to Froude number ${FASTEST_FROUDE}. Check its stages against the bed.`,
          chainage,
          time: 0,
        });
      }
      return false;
    }
    case 'dam': {
      const above = initial.stageAbove ?? -Infinity;
      const below = initial.stageBelow ?? -Infinity;
      for (let i = 1; i <= n; i++) {
        put(i, grid.chainage[i - 1] < initial.chainage ? above : below, 0);
      }
      const face = Math.round((initial.chainage - grid.start) / grid.dx) * grid.dx + grid.start;
      if (Math.abs(face - initial.chainage) > 1e-6 * grid.dx) {
        warn({
          code: 'damMoved',
          ...say`The dam stands at chainage ${q(initial.chainage, 'chainage', { decimals: 2 })}; the nearest boundary between cells is at ${q(face, 'chainage', { decimals: 2 })}, where the water is parted. Choose a cell size that divides the distance if that matters.`,
          chainage: face,
          time: 0,
        });
      }
      return false;
    }
    case 'steady': {
      const { stages, flows } = steadyState(
        caseFile,
        workspace,
        tables,
        grid,
        laterals,
        structures,
        localLosses,
      );
      for (let i = 1; i <= n; i++) put(i, stages[i], flows[i]);
      const moves = flows.some((q) => q > 0) || caseFile.upstream.kind === 'stage';
      if (!moves) {
        warn({
          code: 'initialDry',
          message:
            'Nothing flows in at the start, so the reach begins with still water up to the outlet stage and in ' +
            'its pools, and dry elsewhere. Start the inflow with a base flow if the river carries water.',
          chainage: null,
          time: 0,
        });
      }
      const shut = structures?.holdsUp(flows, stages) ?? null;
      if (!shut) return moves;
      warn({
        code: 'initialNotSettled',
        ...say`The start cannot be steady: ${shut.id} at chainage ${q(shut.chainage, 'chainage')} lets less through than flows to it then, however high the water stands. The run begins as if it passed and the water rises before it. Open it at the start, or give the initial state as still water or as a profile.`,
        chainage: shut.chainage,
        time: 0,
      });
      return false;
    }
  }
}
