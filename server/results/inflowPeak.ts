import type { CaseFile } from '../../shared/case/caseFile';
import type { ResultFile } from '../../shared/case/resultFile';

/** Largest inflow at the upstream end within the run, m³/s, and when, s; null where that end is not an inflow. */
export function inflowPeak(caseFile: CaseFile): { flow: number; time: number } | null {
  const { upstream, numerics } = caseFile;
  if (upstream.kind !== 'inflow') return null;
  const { times, flows } = upstream;
  let peak = { flow: flowAt(times, flows, 0), time: 0 };
  const consider = (flow: number, time: number) => {
    if (flow > peak.flow) peak = { flow, time };
  };
  times.forEach((time, k) => {
    if (time > 0 && time < numerics.duration) consider(flows[k], time);
  });
  consider(flowAt(times, flows, numerics.duration), numerics.duration);
  return peak;
}

/** Largest release of a reservoir into the reach at the output times; null where there is none. */
export function releasePeak({ reservoir, times }: ResultFile) {
  if (!reservoir) return null;
  const flow = Math.max(...reservoir.release);
  return { flow, time: times[reservoir.release.indexOf(flow)] };
}

/** Linear between the given values, held outside. */
export function flowAt(times: number[], flows: number[], t: number): number {
  const last = times.length - 1;
  if (t <= times[0]) return flows[0];
  if (t >= times[last]) return flows[last];
  const k = times.findIndex((time) => time > t);
  const share = (t - times[k - 1]) / (times[k] - times[k - 1]);
  return flows[k - 1] + share * (flows[k] - flows[k - 1]);
}
