import { linearWave } from '../../solvers/exact/linearWave';
import { wideRectangle } from '../../solvers/exact/prismaticSection';
import { caseOf, GRAVITY, sectionsAt, wideChannel } from '../channels';
import type { PublishedCase } from '../publishedCase';

const [LENGTH, SLOPE, MANNING, FLOW] = [8000, 0.001, 0.03, 2];
/** Share of the flow, and s. */
const [CHANGE, PERIOD] = [0.004, 3600];

export const smallWave: PublishedCase = {
  id: 'small-wave',
  group: 'waves',
  title: 'A small wave on uniform flow',
  setup:
    `Uniform flow of ${FLOW} m³/s per metre of a wide channel, slope ${SLOPE}, Manning's n ${MANNING}; the inflow sways by ${CHANGE * 100} % ` +
    'with a period of an hour. Compared after one period, over 8 km, with the exact solution of the linear equations.',
  source:
    'V. M. Ponce and D. B. Simons (1977), Shallow wave propagation in open channel flow, ASCE Journal of the Hydraulics Division ' +
    '103, 1461-1476 [from memory; derived anew]. For slow waves it gives the celerity dQ/dA and the diffusivity of S. Hayami (1951).',
  shows:
    'That a flood wave travels, lags and flattens as it should: the speed and the decay that decide when and how high a peak arrives.',
  doesNotShow: 'What a high wave does beyond the linear equations.',
  boundReason:
    'A quarter above what was left when the bounds were set. The wave is some 4 mm high and 8 l/s strong. What the full equations add to the linear ' +
    'ones, and the table of the section, is all that is left on these grids, so that there is no order to ask for.',
  grids: [40, 80, 160],
  bounds: { stageL1: 8e-5, flowL1: 2.3e-5, volume: 1e-12 },
  problem: (cells) => {
    const uniform = linearWave(wideRectangle(1), GRAVITY, MANNING, SLOPE, FLOW);
    const { decay, waveNumber } = uniform.sinusoid(PERIOD);
    const omega = (2 * Math.PI) / PERIOD;
    const bed = (x: number) => SLOPE * (LENGTH - x);
    const wave = (x: number, time: number) => {
      const height = CHANGE * FLOW * Math.exp(-decay * x);
      const angle = omega * time - waveNumber * x;
      const sine = Math.sin(angle);
      // Volume, a_t + q_x = 0.
      const area = (waveNumber * sine - decay * Math.cos(angle)) / omega;
      return {
        stage: bed(x) + uniform.depth + height * area,
        flow: FLOW + height * sine,
      };
    };
    const times = Array.from({ length: cells + 1 }, (_, i) => (i * PERIOD) / cells);
    const middles = Array.from({ length: cells }, (_, i) => ((i + 0.5) * LENGTH) / cells);
    const chainages = [0, ...middles, LENGTH];
    return {
      caseFile: caseOf('A small wave on uniform flow', {
        sections: sectionsAt([0, LENGTH], MANNING, (x) => wideChannel(1, bed(x))),
        upstream: { kind: 'inflow', times, flows: times.map((time) => wave(0, time).flow) },
        downstream: {
          kind: 'stage',
          times,
          stages: times.map((time) => wave(LENGTH, time).stage),
        },
        initial: {
          kind: 'profile',
          chainages,
          stages: chainages.map((x) => wave(x, 0).stage),
          flows: chainages.map((x) => wave(x, 0).flow),
        },
        numerics: { cellSize: LENGTH / cells, duration: PERIOD, outputInterval: PERIOD },
      }),
      exact: (x) => wave(x, PERIOD),
    };
  },
};
