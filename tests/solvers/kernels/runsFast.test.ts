import { runsFast } from '@/server/solvers/fast/runsFast';
import type { CaseFile } from '@/shared/case/caseFile';
import { soundCase } from '../unit/soundCase';

type FastModule = typeof import('@/server/solvers/fast/runsFast');
type SolverModule = typeof import('@/server/solvers');

describe('the fast kernel', () => {
  const plain = soundCase();

  it('runs by default, and not where the readable one is asked for', () => {
    expect(runsFast(plain, {})).toBe(true);
    expect(runsFast(plain, { kernel: 'fast' })).toBe(true);
    expect(runsFast(plain, { kernel: 'reference' })).toBe(false);
  });

  it('leaves to the readable one what it does not know', () => {
    const compound: CaseFile = { ...plain, numerics: { ...plain.numerics, momentum: 'compound' } };
    expect(runsFast(compound, {})).toBe(false);
    const [first, ...others] = plain.sections;
    const stored = { ...first, storage: [{ from: 0, to: 1 }] };
    expect(runsFast({ ...plain, sections: [stored, ...others] }, {})).toBe(false);
  });

  it('leaves everything to the readable one where WebAssembly has no SIMD', () => {
    jest.isolateModules(() => {
      const validate = jest.spyOn(WebAssembly, 'validate').mockReturnValue(false);
      const { runsFast: runs } = jest.requireActual<FastModule>('@/server/solvers/fast/runsFast');
      const { routeCase } = jest.requireActual<SolverModule>('@/server/solvers');
      expect(runs(plain, {})).toBe(false);
      expect(routeCase(plain).steps).toBeGreaterThan(0);
      validate.mockRestore();
    });
  });
});
