import type { ReservoirInput } from '../../../shared/case/structures';
import { createSeries } from '../sources/series';

/** A reservoir with a level surface: dV/dt = inflow - release, by Heun's method like the reach. */
export interface LevelPool {
  stage(): number;
  /** m³ */
  volume(): number;
  /** dV/dη (m²) */
  surface(): number;
  inflow(time: number): number;
  /** The whole Euler step with the release (m³/s) at its start … */
  predict(time: number, dt: number, release: number): void;
  /** … the second-order step with the release at its predicted end … */
  correct(time: number, dt: number, release: number): void;
  /** … or the Euler step alone. */
  accept(time: number, dt: number, release: number): void;
  /** m³ that came and went */
  balance(): { initial: number; inflow: number; release: number; final: number };
}

export function createLevelPool(input: ReservoirInput): LevelPool {
  const { stages, volumes } = input;
  const inflow = createSeries(input.inflow.times, input.inflow.flows);
  const initial = volumeAt(input.initialStage);
  let volume = initial;
  let old = initial;
  let halfInflow = 0;
  let halfRelease = 0;
  let came = 0;
  let went = 0;

  function rowOf(values: readonly number[], value: number): number {
    let k = 0;
    while (k + 2 < values.length && value >= values[k + 1]) k++;
    return k;
  }

  function volumeAt(stage: number): number {
    const k = rowOf(stages, stage);
    return (
      volumes[k] +
      ((stage - stages[k]) * (volumes[k + 1] - volumes[k])) / (stages[k + 1] - stages[k])
    );
  }

  return {
    stage() {
      const k = rowOf(volumes, volume);
      return (
        stages[k] +
        ((volume - volumes[k]) * (stages[k + 1] - stages[k])) / (volumes[k + 1] - volumes[k])
      );
    },
    volume: () => volume,
    surface() {
      const k = rowOf(volumes, volume);
      return (volumes[k + 1] - volumes[k]) / (stages[k + 1] - stages[k]);
    },
    inflow,
    predict(time, dt, release) {
      old = volume;
      halfInflow = inflow(time);
      halfRelease = release;
      volume = old + dt * (halfInflow - release);
    },
    correct(time, dt, release) {
      const into = 0.5 * (halfInflow + inflow(time));
      const out = 0.5 * (halfRelease + release);
      volume = old + dt * (into - out);
      came += dt * into;
      went += dt * out;
    },
    accept(_time, dt, release) {
      came += dt * halfInflow;
      went += dt * release;
    },
    balance: () => ({ initial, inflow: came, release: went, final: volume }),
  };
}
