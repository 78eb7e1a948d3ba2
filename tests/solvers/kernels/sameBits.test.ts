import { damBreakCase, demoCase } from '@/seed/demoCase';
import { routeCase } from '@/server/solvers';
import { hasFastKernel } from '@/server/solvers/fast/fastKernel';
import type { CaseFile } from '@/shared/case/caseFile';
import { naturalReach } from '../../helpers/solvers/naturalReach';
import { buildCase, steadyFlow } from '../../helpers/solvers/caseBuilders';
import { randomCase } from '../../helpers/solvers/randomCase';

/** The fast loops do the operations of the readable ones in their order, so whole results agree to the last bit. */
const RANDOM = Number(process.env.REACHES ?? 60);

const routed = (caseFile: CaseFile, kernel: 'fast' | 'reference'): string =>
  JSON.stringify({ ...routeCase(caseFile, { kernel }), seconds: 0 });

/** Not by `toBe` on the texts: a megabyte of difference helps nobody. */
function expectSameBits(caseFile: CaseFile): void {
  const fast = routed(caseFile, 'fast');
  const readable = routed(caseFile, 'reference');
  let at = 0;
  while (at < fast.length && fast[at] === readable[at]) at++;
  expect(fast.slice(at, at + 40)).toBe(readable.slice(at, at + 40));
}

const shortened = (caseFile: CaseFile, duration: number): CaseFile => ({
  ...caseFile,
  numerics: { ...caseFile.numerics, duration, outputInterval: duration / 4 },
});

describe('both kernels', () => {
  it('are there to be compared', () => expect(hasFastKernel()).toBe(true));

  it.each(Array.from({ length: RANDOM }, (_, seed) => seed))(
    'agree on the random reach of seed %d',
    (seed) => expectSameBits(shortened(randomCase(seed, { structures: seed % 3 === 2 }), 500)),
  );

  it('agree on a dam that breaks onto dry ground', () =>
    expectSameBits(shortened(damBreakCase(), 400)));

  it('agree on a flood that begins steady', () => {
    const demo = demoCase();
    const { numerics } = demo;
    expectSameBits(
      shortened({ ...demo, numerics: { ...numerics, cellSize: 8 * numerics.cellSize } }, 7200),
    );
  });

  it.each([1, 2, 3, 4, 5])('agree on %d cells', (cells) =>
    expectSameBits(
      buildCase({
        sections: naturalReach(3, { length: 400, spacing: 200, slope: 0.002 }),
        upstream: { kind: 'inflow', times: [0, 300], flows: [5, 80] },
        downstream: { kind: 'criticalDepth' },
        laterals: [{ from: 100, to: 300, ...steadyFlow(4) }],
        initial: { kind: 'steady' },
        numerics: { cellSize: 400 / cells, duration: 600, outputInterval: 60 },
      }),
    ),
  );
});
