import { macDonald } from '@/server/solvers/exact/macDonald';
import { trapezoid } from '@/server/solvers/exact/prismaticSection';
import { sequentDepth } from '@/server/solvers/exact/uniformFlow';

/** I. MacDonald et al. (1997), ASCE J. Hydraul. Eng. 123(11), 1041-1045: constants from memory, bed and depth
 *  computed apart from this program (bed by integrating the slope formula, not the energy). */
const G = 9.81;

describe('flows of prescribed depth', () => {
  it.each([
    ['A', 0, 0.74832356, 7.086801],
    ['A', 500, 1.1122991, 3.378708],
    ['A', 900, 0.77019473, 1.097348],
    ['B', 0, 0.96526509, 5.632288],
    ['B', 500, 0.74153274, 4.135646],
    ['B', 800, 0.62451813, 1.840062],
    ['C', 0, 0.54379067, 5.673801],
    ['C', 400, 0.64242732, 1.746704],
    ['C', 600, 1.110697, 0.6143833],
    ['C', 1000, 1.3347472, 0],
    ['D', 0, 0.98871031, 2.597069],
    ['D', 60, 0.57979067, 2.045816],
    ['D', 80, 2.2087301, 0.6579079],
  ] as const)('%s at %f m: depth %f m, bed %f m', (name, x, depth, bed) => {
    const flow = macDonald(name, G);
    expect(flow.depth(x)).toBeCloseTo(depth, 7);
    expect(flow.bed(x)).toBeCloseTo(bed, 5);
  });

  it.each(['C', 'D'] as const)('%s jumps between sequent depths on a continuous bed', (name) => {
    const { jumpAt, depth, bed, flow } = macDonald(name, G);
    const before = depth(jumpAt!);
    const after = depth(jumpAt! + 1e-9);
    expect(sequentDepth(trapezoid(10, 0), G, flow, before)).toBeCloseTo(after, 5);
    expect(bed(jumpAt! + 1e-9)).toBeCloseTo(bed(jumpAt!), 8);
  });

  it('leads to C without a kink in the bed slope', () => {
    const { bed } = macDonald('C', G);
    const slope = (x: number) => (bed(x - 0.01) - bed(x + 0.01)) / 0.02;
    // S0 of C at its inlet, 0.0132301; a kink would show at either side.
    expect(slope(-0.02)).toBeCloseTo(0.0132301, 5);
    expect(slope(0.02)).toBeCloseTo(0.0132301, 5);
  });
});
