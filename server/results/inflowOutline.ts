import type { CaseFile } from '../../shared/case/caseFile';
import type { ResultFile } from '../../shared/case/resultFile';
import type { Run } from '../../shared/runs/types';
import { evenly } from './blocks/evenly';
import { flowAt } from './inflowPeak';

const POINTS = 400;

/** The release of a reservoir into the reach, as it was routed; null where there is none. */
export function releaseOutline({ reservoir, times }: ResultFile): Run['inflow'] | null {
  return reservoir ? thinned(times, reservoir.release) : null;
}

/** The inflow over the run for the time ribbon: both ends and the highest point are kept. Empty without an inflow. */
export function inflowOutline({ upstream, numerics }: CaseFile): Run['inflow'] {
  if (upstream.kind !== 'inflow') return { times: [], flows: [] };
  const { duration } = numerics;
  const inside = upstream.times.filter((time) => time > 0 && time < duration);
  const times = [0, ...inside, duration];
  const flows = times.map((time) => flowAt(upstream.times, upstream.flows, time));
  return thinned(times, flows);
}

function thinned(times: number[], flows: number[]): Run['inflow'] {
  const kept = new Set(evenly(times.length, POINTS - 1));
  kept.add(flows.indexOf(Math.max(...flows)));
  const order = [...kept].sort((a, b) => a - b);
  return { times: order.map((k) => times[k]), flows: order.map((k) => flows[k]) };
}
