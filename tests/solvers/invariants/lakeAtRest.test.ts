import type { CaseFile } from '@/shared/case/caseFile';
import { buildCase, steadyFlow, steadyStage } from '../../helpers/solvers/caseBuilders';
import { wildReach } from '../../helpers/solvers/naturalReach';
import { routeChecked } from '../../helpers/solvers/routeChecked';

/** Still water must stay still over any bed: bed slope and thrust on varying sections cancel exactly, or every
 *  river invents a current. Rounding alone may remain: 1e-12 m on stages of order 10 m. */
const STAGE_ROUNDING = 1e-12;
/** m³/s; sections here carry up to some 1e3 m³/s at a metre a second. */
const FLOW_ROUNDING = 1e-9;

const LEVEL = 5;

function rest(seed: number, ends: Pick<CaseFile, 'upstream' | 'downstream'>) {
  const sections = wildReach(seed, 200, 50);
  const result = routeChecked(
    buildCase({
      sections,
      ...ends,
      initial: { kind: 'still', stage: LEVEL },
      numerics: { cellSize: 25, duration: 1800, outputInterval: 600 },
    }),
  );
  const { cells } = result;
  const drift = cells.finalStage.map((stage, i) => Math.abs(stage - cells.initialStage[i]));
  expect(Math.max(...drift)).toBeLessThanOrEqual(STAGE_ROUNDING);
  expect(Math.max(...cells.peakFlow.map(Math.abs))).toBeLessThanOrEqual(FLOW_ROUNDING);
  return result;
}

describe('still water over wild sections with dry islands', () => {
  it.each([1, 2, 3])('rests between walls, reach %d', (seed) => {
    const { cells } = rest(seed, { upstream: { kind: 'wall' }, downstream: { kind: 'wall' } });
    const dry = cells.bed.filter((bed) => bed >= LEVEL).length;
    expect(dry).toBeGreaterThan(20);
    expect(dry).toBeLessThan(cells.bed.length / 2);
    // A film thinner than the dry depth of a millimetre counts as dry.
    cells.bed.forEach((bed, i) =>
      expect(cells.initialStage[i]).toBeCloseTo(LEVEL - bed > 1e-3 ? LEVEL : bed, 9),
    );
  });

  it('rests against a held stage at both ends', () => {
    rest(4, {
      upstream: { kind: 'stage', ...steadyStage(LEVEL) },
      downstream: { kind: 'stage', ...steadyStage(LEVEL) },
    });
  });

  it('rests under no inflow and against a rating that lets nothing out', () => {
    rest(5, {
      upstream: { kind: 'inflow', ...steadyFlow(0) },
      downstream: { kind: 'rating', stages: [LEVEL, LEVEL + 5], flows: [0, 100] },
    });
  });
});
