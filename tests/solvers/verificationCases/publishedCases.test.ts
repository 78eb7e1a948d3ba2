import { RunCancelled } from '@/server/solvers';
import { PUBLISHED_CASES, publishedCase, runPublishedCase } from '@/server/verificationCases';
import type { PublishedCase } from '@/server/verificationCases';
import { validateCase } from '@/shared/case/validateCase';

/** Every case with all its grids is run by the browser test of the screen; the orders and errors behind the bounds are
 *  held by tests/solvers/convergence. Here: that the verdict means something. */
const quick = publishedCase('dam-stoker-1')!;

describe('the list of published cases', () => {
  it.each(PUBLISHED_CASES.map((published) => [published.id, published] as const))(
    '%s: sound case files, coarse to fine, with bounds',
    (_id, { grids, bounds, problem, source, shows, doesNotShow }) => {
      expect(grids.length).toBeGreaterThanOrEqual(3);
      expect([...grids].sort((a, b) => a - b)).toEqual(grids);
      expect(validateCase(problem(grids[0]).caseFile).faults).toEqual([]);
      expect(bounds.volume).toBeLessThanOrEqual(1e-12);
      expect(Object.keys(bounds).length).toBeGreaterThanOrEqual(3);
      // A year stands in every source.
      expect(source).toMatch(/\b1[89]\d\d|20\d\d/);
      expect(shows && doesNotShow).toBeTruthy();
    },
  );

  it('names each once', () => {
    const ids = PUBLISHED_CASES.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    expect(ids.length).toBeGreaterThanOrEqual(25);
    expect(publishedCase('no such case')).toBeUndefined();
  });
});

describe('a published case', () => {
  it('is within its bounds, with errors and orders on every grid', () => {
    const seen: number[] = [];
    const result = runPublishedCase(quick, { onProgress: (fraction) => seen.push(fraction) });
    expect(result.criteria.filter(({ within }) => !within)).toEqual([]);
    expect(result.within).toBe(true);
    expect(result.grids.map(({ cells }) => cells)).toEqual([100, 200, 400, 800]);
    expect(result.grids[0].stageOrder).toBeNull();
    const [, , coarse, fine] = result.grids;
    expect(fine.stageOrder).toBeCloseTo(Math.log2(coarse.stage.l1 / fine.stage.l1), 12);
    for (const { stage, flow } of result.grids)
      for (const { l1, l2, max } of [stage, flow]) {
        expect(l1).toBeLessThanOrEqual(l2);
        expect(l2).toBeLessThanOrEqual(max);
      }
    // Stage at the dam by Ritter's constant, 4/9 of 10 m (exact for so low a tailwater), in both columns.
    const { at, stage, bed } = result.curves;
    const dam = at.findIndex((x) => x > 500);
    expect(stage.exact[dam]).toBeCloseTo(40 / 9, 1);
    expect(Math.abs(stage.computed[dam] - stage.exact[dam])).toBeLessThan(0.02);
    expect(bed).toHaveLength(at.length);
    expect(seen.at(-1)).toBe(1);
    expect([...seen].sort((a, b) => a - b)).toEqual(seen);
  });

  it('fails where the exact answer is another: 2 cm too high, or a bore a tenth too fast', () => {
    const coarse = { ...quick, grids: [400, 800] };
    const shifted: PublishedCase = {
      ...coarse,
      problem: (cells) => {
        const { exact, ...rest } = quick.problem(cells);
        return { ...rest, exact: (x) => ({ ...exact(x), stage: exact(x).stage + 0.02 }) };
      },
    };
    const faster: PublishedCase = {
      ...coarse,
      problem: (cells) => {
        const { exact, ...rest } = quick.problem(cells);
        return { ...rest, exact: (x) => exact(500 + (x - 500) / 1.1) };
      },
    };
    for (const wrong of [shifted, faster]) {
      const result = runPublishedCase(wrong);
      expect(result.within).toBe(false);
      expect(result.criteria.find(({ measure }) => measure === 'stageL1')!.within).toBe(false);
      expect(result.criteria.find(({ measure }) => measure === 'stageOrder')!.within).toBe(false);
    }
  });

  it('leaves a standing jump out of the norms and says how many cells it is out of place', () => {
    const { criteria, curves, within } = runPublishedCase(publishedCase('prescribed-c')!);
    expect(within).toBe(true);
    expect(criteria.find(({ measure }) => measure === 'jumpShift')!.value).toBeLessThan(1);
    expect(curves.leftOut).toEqual([[650, 750]]);
    // The approach of 200 m is not compared.
    expect(curves.at[0]).toBeGreaterThan(200);
  });

  it('has no order where rounding is all that is left, and none is asked for', () => {
    const still = publishedCase('still-bump')!;
    const result = runPublishedCase({ ...still, grids: [25, 50] });
    expect(result.grids[1].stageOrder).toBeNull();
    expect(result.within).toBe(true);
  });

  it('compares along time where it is a hydrograph', () => {
    const { curves, within } = runPublishedCase(publishedCase('pool-breach')!);
    expect(within).toBe(true);
    expect(curves.along).toBe('time');
    // Peak at the end of the growth, 1908.3232 m³/s (closed form, computed apart from this program).
    const end = curves.at.indexOf(1800);
    expect(curves.flow.exact[end]).toBeCloseTo(1908.3232, 3);
    expect(Math.abs(curves.flow.computed[end] / 1908.3232 - 1)).toBeLessThan(1e-5);
  });

  it('stops when it is told to', () => {
    expect(() => runPublishedCase(quick, { shouldStop: () => true })).toThrow(RunCancelled);
  });
});
