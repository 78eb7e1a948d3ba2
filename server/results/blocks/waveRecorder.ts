import type { RunOutput } from '../../solvers';
import { WAVE_LIMITS } from './blockTypes';
import { evenly } from './evenly';

/** The wave at the kept cells: [cell * moments + moment], stage in m, flow in m³/s, velocity in m/s. */
export interface RecordedWave {
  /** Indexes of the kept cells. */
  cells: Int32Array;
  /** Indexes of the kept output times. */
  moments: Int32Array;
  stage: Float64Array;
  flow: Float32Array;
  velocity: Float32Array;
}

/**
 * Keeps what the long section needs while the run goes on, so that memory does not grow with cells times output times.
 * The first output tells the number of cells.
 */
export function recordWave(outputCount: number) {
  const moments = evenly(outputCount, WAVE_LIMITS.moments);
  let wave: RecordedWave | null = null;
  let next = 0;

  return {
    add({ index, stage, flow, velocity }: RunOutput): void {
      wave ??= room(stage.length, moments);
      if (next >= moments.length || index !== moments[next]) return;
      for (let k = 0; k < wave.cells.length; k++) {
        const at = k * moments.length + next;
        const cell = wave.cells[k];
        wave.stage[at] = stage[cell];
        wave.flow[at] = flow[cell];
        wave.velocity[at] = velocity[cell];
      }
      next += 1;
    },
    /** Throws where outputs are missing. */
    finish(): RecordedWave {
      if (!wave || next !== moments.length) {
        throw new Error(`The wave has ${next} of ${moments.length} moments.`);
      }
      return wave;
    },
  };
}

function room(cellCount: number, moments: Int32Array): RecordedWave {
  const cells = evenly(cellCount, WAVE_LIMITS.cells);
  const size = cells.length * moments.length;
  return {
    cells,
    moments,
    stage: new Float64Array(size),
    flow: new Float32Array(size),
    velocity: new Float32Array(size),
  };
}
