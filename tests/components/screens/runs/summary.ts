import type { PlacePeaks, RunSummary } from '@/shared/runs/types';

const peaks = (chainage: number): PlacePeaks => ({
  chainage,
  bed: 10,
  peakStage: 14.66,
  peakStageTime: 62_640 + chainage,
  peakFlow: 450,
  peakFlowTime: 62_000,
  peakDepth: 4.66,
  peakVelocity: 1.9,
  arrival: 22_020,
  attenuation: 0.08,
});

/** A summary of three sections and one station between them. */
export const summary = (change: Partial<RunSummary> = {}): RunSummary => ({
  runId: 12,
  times: { start: 0, end: 172_800, interval: 300, count: 577 },
  inflowPeak: { flow: 490, time: 43_200 },
  sections: [0, 500, 900].map((chainage, i) => ({ ...peaks(chainage), id: `XS-0${i + 1}` })),
  stations: [{ ...peaks(700), stationId: 1, name: 'Sallow Mill' }],
  levels: [],
  signed: null,
  volume: {
    initial: 1000,
    inflow: 45_000_000,
    lateral: 0,
    outflow: 44_999_000,
    final: 2000,
    error: 1e-6,
    relativeError: 2e-14,
  },
  structures: [],
  reservoir: null,
  warnings: [],
  arrivalRule: { message: 'Arrival: 0.1 m above the first stage.' },
  steps: 34_120,
  cellUpdates: 29_000_000,
  seconds: 12.3,
  cellCount: 36,
  cellSize: 25,
  ...change,
});
