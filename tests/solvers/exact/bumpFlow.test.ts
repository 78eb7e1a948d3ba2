import { bumpFlow } from '@/server/solvers/exact/bumpFlow';

/** Three flows of N. Goutal & F. Maurel (eds., 1997), 2nd Workshop on Dam-Break Wave Simulation, EDF report
 *  HE-43/97/016/B: parameters from memory, depths computed apart from this program. */
const G = 9.81;

describe('steady flow over a bump', () => {
  it.each([
    ['subcritical', 0, 2],
    ['subcritical', 8.5, 1.8795814],
    ['subcritical', 10, 1.7073475],
    ['subcritical', 11, 1.7871846],
    ['transcritical', 0, 1.0144468],
    ['transcritical', 9.5, 0.69797841],
    ['transcritical', 10, 0.62025644],
    ['transcritical', 11.5, 0.44774787],
    ['transcritical', 25, 0.40578095],
    ['jump', 0, 0.41373573],
    ['jump', 9, 0.2461216],
    ['jump', 11.5, 0.080396932],
    ['jump', 12, 0.33],
  ] as const)('%s at x = %f m: depth %f m', (regime, x, depth) => {
    expect(bumpFlow(regime, G).depth(x)).toBeCloseTo(depth, 7);
  });

  it('puts the jump at 11.6656 m, between sequent depths', () => {
    const { jumpAt, depth } = bumpFlow('jump', G);
    expect(jumpAt).toBeCloseTo(11.66561838, 7); // published: 11.665 m
    expect(depth(jumpAt! - 1e-9)).toBeCloseTo(0.07597027, 7);
    expect(depth(jumpAt! + 1e-9)).toBeCloseTo(0.2593218, 7);
  });
});
