import type { SteadyReach } from './graduallyVariedFlow';
import type { PrismaticSection } from './prismaticSection';
import { manningConveyance } from './uniformFlow';

/** A channel of one section on an even slope, as the steady-flow integrator wants it. The bed stands at
 *  elevation 0 where x = 0 and falls downstream; manning 0 means no friction. */
export function prismaticReach(
  section: PrismaticSection,
  manning: number,
  slope: number,
  flow: (x: number) => number,
  lateralInflow: (x: number) => number = () => 0,
): SteadyReach {
  const depth = (x: number, stage: number) => stage + slope * x;
  return {
    area: (x, stage) => section.area(depth(x, stage)),
    topWidth: (x, stage) => section.topWidth(depth(x, stage)),
    conveyance: (x, stage) =>
      manning > 0 ? manningConveyance(section, manning, depth(x, stage)) : Infinity,
    areaGradient: (x, stage) => slope * section.topWidth(depth(x, stage)),
    flow,
    lateralInflow,
  };
}
