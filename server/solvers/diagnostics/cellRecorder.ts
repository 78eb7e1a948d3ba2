import { ARRIVAL_RISE, type CellResults } from '../../../shared/case/resultFile';
import type { Grid } from '../geometry/grid';
import type { Workspace } from '../workspace';
import { waterVelocity } from './waterVelocity';

/** Follows every cell at every step: peaks, their times, arrivals. */
export interface CellRecorder {
  follow(time: number): void;
  /** One entry a cell of this moment, overwritten by the next call */
  snapshot(): { stage: Float64Array; flow: Float64Array; velocity: Float64Array };
  results(): CellResults;
}

export function createCellRecorder(workspace: Workspace, grid: Grid): CellRecorder {
  const { n, flow: cellFlow, stage, bed, dryDepth, faceFlow } = workspace;
  // Velocity is that of what flows.
  const area = workspace.parts?.flowArea ?? workspace.area;
  const initialStage = new Float64Array(n);
  const peakStage = new Float64Array(n).fill(-Infinity);
  const peakStageTime = new Float64Array(n);
  const peakFlow = new Float64Array(n);
  const peakFlowTime = new Float64Array(n);
  const peakVelocity = new Float64Array(n);
  const arrival = new Float64Array(n).fill(NaN);
  const arrivalStage = new Float64Array(n);
  const view = {
    stage: new Float64Array(n),
    flow: new Float64Array(n),
    velocity: new Float64Array(n),
  };
  const { abs } = Math;
  let started = false;

  function start(): void {
    started = true;
    for (let i = 1; i <= n; i++) {
      initialStage[i - 1] = wetStage(i);
      arrivalStage[i - 1] = initialStage[i - 1] + ARRIVAL_RISE;
    }
  }

  function wetStage(i: number): number {
    return stage[i] - bed[i] > dryDepth ? stage[i] : bed[i];
  }

  return {
    follow(time) {
      if (!started) start();
      for (let i = 1; i <= n; i++) {
        const k = i - 1;
        const eta = stage[i];
        if (eta - bed[i] <= dryDepth) continue;
        if (eta > peakStage[k]) {
          peakStage[k] = eta;
          peakStageTime[k] = time;
          if (eta >= arrivalStage[k]) {
            arrivalStage[k] = Infinity;
            arrival[k] = time;
          }
        }
        const flow = 0.5 * (faceFlow[i - 1] + faceFlow[i]);
        const size = abs(flow);
        if (size > abs(peakFlow[k])) {
          peakFlow[k] = flow;
          peakFlowTime[k] = time;
        }
        const most = abs(peakVelocity[k]) * area[i];
        if (size > most && abs(cellFlow[i]) > most) {
          peakVelocity[k] = waterVelocity(flow, cellFlow[i], area[i]);
        }
      }
    },
    snapshot() {
      for (let i = 1; i <= n; i++) {
        const k = i - 1;
        const wet = stage[i] - bed[i] > dryDepth;
        view.stage[k] = wet ? stage[i] : bed[i];
        view.flow[k] = wet ? 0.5 * (faceFlow[i - 1] + faceFlow[i]) : 0;
        view.velocity[k] = wet ? waterVelocity(view.flow[k], cellFlow[i], area[i]) : 0;
      }
      return view;
    },
    results() {
      const { stage: finalStage, flow: finalFlow } = this.snapshot();
      for (let k = 0; k < n; k++) if (peakStage[k] === -Infinity) peakStage[k] = bed[k + 1];
      return {
        chainage: [...grid.chainage],
        bed: Array.from(bed.subarray(1, n + 1)),
        initialStage: [...initialStage],
        peakStage: [...peakStage],
        peakStageTime: [...peakStageTime],
        peakDepth: Array.from(peakStage, (eta, k) => eta - bed[k + 1]),
        peakFlow: [...peakFlow],
        peakFlowTime: [...peakFlowTime],
        peakVelocity: [...peakVelocity],
        arrival: Array.from(arrival, (time) => (Number.isNaN(time) ? null : time)),
        finalStage: [...finalStage],
        finalDepth: Array.from(finalStage, (eta, k) => eta - bed[k + 1]),
        finalFlow: [...finalFlow],
      };
    },
  };
}
