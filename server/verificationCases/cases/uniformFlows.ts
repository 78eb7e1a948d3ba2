import { trapezoid } from '../../solvers/exact/prismaticSection';
import { normalDepth } from '../../solvers/exact/uniformFlow';
import { caseOf, sectionsAt, steadyFlow, trapezoidChannel } from '../channels';
import type { Bounds, PublishedCase } from '../publishedCase';

const LENGTH = 1000;

interface Channel {
  id: string;
  title: string;
  where: string;
  bottom: number;
  side: number;
  manning: number;
  slope: number;
  flow: number;
  source: string;
  bounds: Bounds;
}

function uniform(channel: Channel): PublishedCase {
  const { id, title, where, bottom, side, manning, slope, flow, source, bounds } = channel;
  const depth = normalDepth(trapezoid(bottom, side), manning, slope, flow);
  const bed = (x: number) => slope * (LENGTH - x);
  return {
    id,
    group: 'steady',
    title,
    setup:
      `${flow} m³/s in ${where}, ${bottom} m wide at the bottom${side > 0 ? ` with sides of 1:${side}` : ''}, slope ${slope}, ` +
      `Manning's n ${manning}: the depth must be the normal depth, ${depth.toFixed(3)} m, everywhere.`,
    source,
    shows: "Manning's formula and the slope of the bed in balance, with no step between cells.",
    doesNotShow: 'Anything that changes along the reach.',
    boundReason:
      'A ten-thousandth of the depth: the section tables of the solver interpolate conveyance between levels. The grid plays no part.',
    grids: [25, 50, 100],
    bounds: { ...bounds, stageMax: 1e-4 * depth, volume: 1e-12 },
    problem: (cells) => ({
      caseFile: caseOf(title, {
        sections: sectionsAt([0, LENGTH], manning, (x) =>
          trapezoidChannel(bottom, side, bed(x), 8),
        ),
        upstream: { kind: 'inflow', ...steadyFlow(flow) },
        downstream: { kind: 'normalDepth', slope },
        initial: { kind: 'steady' },
        numerics: { cellSize: LENGTH / cells, duration: 1800, outputInterval: 1800 },
      }),
      exact: (x) => ({ stage: bed(x) + depth, flow }),
    }),
  };
}

export const uniformFlows: readonly PublishedCase[] = [
  uniform({
    id: 'uniform-mild',
    title: 'Uniform flow in a trapezoid',
    where: 'a channel',
    bottom: 6.096,
    side: 2,
    manning: 0.025,
    slope: 0.0016,
    flow: 11.3267,
    source:
      'V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, example 6-2 (20 ft, 400 cfs: 3.36 ft), in SI [from memory; ' +
      'recomputed].',
    bounds: { flowMax: 5e-7 },
  }),
  uniform({
    id: 'uniform-steep',
    title: 'Uniform flow on a steep slope',
    where: 'a rectangular chute',
    bottom: 4,
    side: 0,
    manning: 0.02,
    slope: 0.02,
    flow: 20,
    source:
      "Manning's formula, in V. T. Chow (1959), Open-Channel Hydraulics, McGraw-Hill, section 6-2; the flow is fast (Froude " +
      'number 1.73). Depth solved for to 12 digits.',
    bounds: { flowMax: 2e-7 },
  }),
];
