import type { CaseFile } from '../../../shared/case/caseFile';
import type { ResultFile } from '../../../shared/case/resultFile';
import { encodeRun } from '../../../server/results/blocks/encodeRun';
import { runBlocks } from '../../../server/results/blocks/runBlocks';
import { recordWave } from '../../../server/results/blocks/waveRecorder';

/** A straight channel of three sections with a bed that falls 1 m a km, banks 4 m above it. */
export function sampleCase(): CaseFile {
  const section = (id: string, chainage: number) => {
    const bed = 50 - chainage / 1000;
    return {
      id,
      chainage,
      points: [
        [0, bed + 6],
        [10, bed + 4],
        [12, bed],
        [20, bed],
        [22, bed + 4.5],
        [30, bed + 6],
      ] as [number, number][],
      roughness: [[0, 0.04]] as [number, number][],
      banks: [10, 22] as [number, number],
    };
  };
  return {
    format: 'spate-case/1',
    title: 'A straight channel',
    sections: [section('XS-01', 0), section('=XS-02', 1000), section('XS-03', 2500)],
    upstream: { kind: 'inflow', times: [0, 1800, 7200], flows: [10, 100, 10] },
    downstream: { kind: 'normalDepth', slope: 0.001 },
    laterals: [],
    structures: [],
    initial: { kind: 'steady' },
    numerics: { cellSize: 25, duration: 7200, outputInterval: 60 },
  };
}

/** Stage and flow of a wave that travels at 2 m/s: not hydraulics, but easy to check by hand. */
export const depthAt = (x: number, t: number) =>
  1 + 2 * Math.exp(-(((t - x / 2 - 1800) / 900) ** 2));
export const flowAt = (x: number, t: number) => 20 * depthAt(x, t);
const bedAt = (x: number) => 50 - x / 1000;

/** A result of the right form with `cellCount` cells and outputs each `interval` seconds up to two hours. */
export function sampleResult(caseFile: CaseFile, cellCount = 100, interval = 60): ResultFile {
  const times = Array.from({ length: 7200 / interval + 1 }, (_, k) => k * interval);
  const chainage = Array.from({ length: cellCount }, (_, k) => ((k + 0.5) * 2500) / cellCount);
  const peakTime = (x: number) => x / 2 + 1800;
  return {
    format: 'spate-result/1',
    caseHash: 'sha256:00',
    solver: '1.0.0',
    times,
    arrivalThreshold: { text: 'Stage 0.1 m above the initial one.', rise: 0.1, depth: 0.1 },
    sections: caseFile.sections.map(({ id, chainage: x }) => ({
      id,
      chainage: x,
      bed: bedAt(x),
      stage: times.map((t) => bedAt(x) + depthAt(x, t)),
      depth: times.map((t) => depthAt(x, t)),
      flow: times.map((t) => flowAt(x, t)),
      area: times.map((t) => 10 * depthAt(x, t)),
      velocity: times.map(() => 2),
      froude: times.map(() => 0.4),
      peak: {
        stage: bedAt(x) + 3,
        stageTime: peakTime(x),
        flow: 60,
        flowTime: peakTime(x),
        depth: 3,
        velocity: 2,
      },
      arrival: peakTime(x) - 1200,
    })),
    cells: {
      chainage,
      bed: chainage.map(bedAt),
      initialStage: chainage.map((x) => bedAt(x) + depthAt(x, 0)),
      peakStage: chainage.map((x) => bedAt(x) + 3),
      peakStageTime: chainage.map(peakTime),
      peakDepth: chainage.map(() => 3),
      peakFlow: chainage.map(() => 60),
      peakFlowTime: chainage.map(peakTime),
      peakVelocity: chainage.map(() => 2),
      arrival: chainage.map((x) => (x > 2400 ? null : peakTime(x) - 1200)),
      finalStage: chainage.map((x) => bedAt(x) + depthAt(x, 7200)),
      finalDepth: chainage.map((x) => depthAt(x, 7200)),
      finalFlow: chainage.map((x) => flowAt(x, 7200)),
    },
    volume: {
      initial: 1000,
      inflow: 500,
      lateral: 0,
      outflow: 400,
      final: 1100,
      error: 0,
      relativeError: 0,
    },
    steps: 10,
    cellUpdates: 2000,
    seconds: 0.1,
    warnings: [{ code: 'supercritical', message: 'Fast water.', chainage: 1200, time: 60 }],
  };
}

/** The blocks of such a run, as the worker makes them, and a reader over them. */
export function sampleBlocks(cellCount = 100, interval = 60) {
  const caseFile = sampleCase();
  const result = sampleResult(caseFile, cellCount, interval);
  const { chainage } = result.cells;
  const wave = recordWave(result.times.length);
  result.times.forEach((time, index) =>
    wave.add({
      index,
      time,
      stage: Float64Array.from(chainage, (x) => bedAt(x) + depthAt(x, time)),
      flow: Float64Array.from(chainage, (x) => flowAt(x, time)),
      velocity: new Float64Array(chainage.length).fill(2),
    }),
  );
  const encoded = encodeRun(caseFile, result, wave.finish());
  const reads: string[] = [];
  const queries: string[] = [];
  const blocks = runBlocks(async (kind, parts) => {
    queries.push(`${kind}/${parts.join(',')}`);
    return parts.map((part) => {
      reads.push(`${kind}/${part}`);
      return encoded.find((b) => b.kind === kind && b.part === part)!.bytes;
    });
  });
  return { caseFile, result, encoded, blocks, reads, queries };
}
