import { surfaceProfile } from '../../solvers/exact/graduallyVariedFlow';
import { prismaticReach } from '../../solvers/exact/prismaticReach';
import { trapezoid } from '../../solvers/exact/prismaticSection';
import {
  caseOf,
  GRAVITY,
  sectionsAt,
  steadyFlow,
  steadyStage,
  trapezoidChannel,
} from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

interface Backwater {
  id: string;
  title: string;
  setup: string;
  source: string;
  shows: string;
  bottom: number;
  side: number;
  manning: number;
  slope: number;
  flow: number;
  /** Depth at the outlet, m. */
  held: number;
  length: number;
  bounds: Bounds;
}

function backwater(given: Backwater): PublishedCase {
  const { id, title, setup, source, shows, bottom, side, manning, slope, flow, held, length } =
    given;
  const bed = (x: number) => slope * (length - x);
  return {
    id,
    group: 'steady',
    title,
    setup,
    source,
    shows,
    doesNotShow: 'Sections that change along the reach; see the natural river.',
    boundReason:
      'A quarter above what was left when the bounds were set: far below what a mark can be levelled to.',
    grids: [30, 60, 120],
    bounds: { ...given.bounds, volume: 1e-12 },
    problem: (cells) => {
      // The integrator has its bed at 0 where its x is: the outlet.
      const reach = prismaticReach(trapezoid(bottom, side), manning, slope, () => flow);
      const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * length) / cells);
      const places = [0, ...middles.map((x) => x - length).reverse()];
      const stages = surfaceProfile(reach, GRAVITY, places, held).slice(1).reverse();
      return {
        caseFile: caseOf(title, {
          sections: sectionsAt([0, length], manning, (x) =>
            trapezoidChannel(bottom, side, bed(x), 8),
          ),
          upstream: { kind: 'inflow', ...steadyFlow(flow) },
          downstream: { kind: 'stage', ...steadyStage(held) },
          initial: { kind: 'steady' },
          numerics: { cellSize: length / cells, duration: 2400, outputInterval: 2400 },
        }),
        exact: (x) => ({
          stage: stages[Math.min(cells - 1, Math.floor((x / length) * cells))],
          flow,
        }),
      };
    },
  };
}

export const backwaters: readonly PublishedCase[] = [
  backwater({
    id: 'backwater-chow',
    title: 'Backwater of a dam (M1)',
    setup:
      'A dam raises 11.33 m³/s to 1.524 m (5 ft) in a trapezoid of 6.096 m and 1:2, slope 0.0016, n 0.025; the backwater over ' +
      '1.2 km upstream, from its gradually varied flow equation with α = 1.',
    source:
      'V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, example 10-1 [from memory], in SI and integrated exactly: the ' +
      'printed direct-step table drifts by 2 % of length near normal depth.',
    shows: 'The length of a backwater, and its fading into normal depth.',
    bottom: 6.096,
    side: 2,
    manning: 0.025,
    slope: 0.0016,
    flow: 11.3267,
    held: 1.524,
    length: 1200,
    bounds: { stageL1: 8.5e-6, stageMax: 1e-4, flowMax: 1e-7, stageOrder: 1.8 },
  }),
];
