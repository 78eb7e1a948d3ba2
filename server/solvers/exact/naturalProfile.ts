import { surfaceProfile, type SteadyReach } from './graduallyVariedFlow';
import type { SectionInput } from '../../../shared/case/caseFile';
import { hydraulicsAt, stripsBetween } from './polygonHydraulics';

/** Half-width of the difference in ∂A/∂x, as a share of the distance between two sections. */
const SHARE = 1e-4;

/** Steady subcritical water surface of a surveyed reach at the given chainages (falling), from the stage at the
 *  last section upstream, by an adaptive integration over the exact geometry. */
export function naturalProfile(
  sections: readonly SectionInput[],
  gravity: number,
  flow: number,
  stageAtEnd: number,
  chainages: readonly number[],
): number[] {
  const stages: number[] = [];
  let stage = stageAtEnd;
  for (let i = sections.length - 1; i > 0; i--) {
    const [above, below] = [sections[i - 1], sections[i]];
    const inside = chainages.filter((x) => x < below.chainage && x >= above.chainage);
    const places = [below.chainage, ...inside, above.chainage];
    const found = surfaceProfile(between(above, below, flow), gravity, places, stage, 1e-8);
    stages.push(...found.slice(1, 1 + inside.length));
    stage = found[found.length - 1];
  }
  return stages;
}

function between(above: SectionInput, below: SectionInput, flow: number): SteadyReach {
  const length = below.chainage - above.chainage;
  const at = (share: number, stage: number) =>
    hydraulicsAt(stripsBetween(above, below, share), stage);
  const share = (x: number) => (x - above.chainage) / length;
  // The slope of the surface asks three things of the same place one after the other.
  let last = { x: NaN, stage: NaN, found: at(0, -Infinity) };
  const here = (x: number, stage: number) => {
    if (x !== last.x || stage !== last.stage) last = { x, stage, found: at(share(x), stage) };
    return last.found;
  };
  return {
    area: (x, stage) => here(x, stage).area,
    topWidth: (x, stage) => here(x, stage).topWidth,
    conveyance: (x, stage) => here(x, stage).conveyance,
    areaGradient: (x, stage) =>
      (at(share(x) + SHARE, stage).area - at(share(x) - SHARE, stage).area) / (2 * SHARE * length),
    flow: () => flow,
    lateralInflow: () => 0,
  };
}
