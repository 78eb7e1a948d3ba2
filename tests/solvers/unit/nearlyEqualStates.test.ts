import type { SectionInput } from '../../../shared/case/caseFile';
import { fluxesBetween } from './fluxesBetween';
import { natural, rectangle, trapezoid } from './sections';

const G = 9.81;

/** Two states that hardly differ must give a flux that hardly differs from their own: the classic trap is a difference
 *  of nearly nothing divided by a difference of nearly nothing. HLL adds to the mean of both physical fluxes at most
 *  (|u| + c)/2 of the difference of the states (Harten, Lax and van Leer 1983, SIAM Rev. 25, 35-61, eq. 3.1 ff.). */
const SECTIONS: [string, SectionInput][] = [
  ['rectangle', rectangle(5)],
  ['triangle', trapezoid(0, 2)],
  ['natural', natural('a', 0, 0)],
];
/** m; the second and the third stand about the dry depth of 1 mm. */
const DEPTHS = [3.4, 0.0012, 0.001, 1e-5];
const DIFFERENCES = [1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12, 1e-14, 1e-300, 0];

describe.each(SECTIONS)('nearly equal states in a %s', (_name, section) => {
  it.each(DEPTHS)('%f m deep give nearly their own flux', (depth) => {
    for (const velocity of [0, 0.7, -2.2, 9]) {
      for (const difference of DIFFERENCES) {
        for (const sign of [1, -1]) {
          const change = (sign * difference * Math.min(1, depth)) / 2;
          const l: [number, number] = [depth + change, velocity - change];
          const r: [number, number] = [depth - change, velocity + change];
          const { volume, left, right, area, celerity } = fluxesBetween(section, l, r);
          const state = [1, 2].map((k, i) => {
            const u = (i === 0 ? l : r)[1];
            return { flow: area[k] * u, momentum: area[k] * u * u };
          });
          const speed = Math.abs(velocity) + 2 * Math.max(celerity[1], celerity[2]) + difference;
          const dArea = Math.abs(area[2] - area[1]);
          const dFlow = Math.abs(state[1].flow - state[0].flow);
          const rounding = 1e-13 * Math.max(area[1], area[2]);
          const volumeBound = speed * dArea + dFlow + speed * rounding;
          expect(Math.abs(volume - (state[0].flow + state[1].flow) / 2)).toBeLessThanOrEqual(
            volumeBound,
          );
          const thrust = G * Math.max(area[1], area[2]) * 2 * Math.abs(change);
          const momentum = (state[0].momentum + state[1].momentum) / 2;
          const bound = speed * (speed * dArea + dFlow) + thrust + speed * speed * rounding;
          for (const felt of [left, right]) {
            expect(Math.abs(felt - momentum)).toBeLessThanOrEqual(bound);
          }
        }
      }
    }
  });

  it('tend to it in step with their difference', () => {
    const physical = fluxesBetween(section, [3.4, 0.7], [3.4, 0.7]).volume;
    const errors = [1e-2, 1e-3, 1e-4, 1e-5].map((difference) =>
      Math.abs(fluxesBetween(section, [3.4, 0.7], [3.4 - difference, 0.7]).volume - physical),
    );
    errors.slice(1).forEach((error, i) => expect(errors[i] / error).toBeCloseTo(10, 0));
  });
});
