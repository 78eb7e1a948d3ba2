import { runPublishedCase, type PublishedCase } from '@/server/verificationCases';
import type { Scheme } from './schemes';
import type { GridRow } from './gridRow';

/** Mean errors of a published case on its grids (or some of them), by the given scheme. */
export function publishedErrors(
  published: PublishedCase,
  scheme: Scheme,
  grids = published.grids,
): GridRow[] {
  const result = runPublishedCase({
    ...published,
    grids,
    problem: (cells) => {
      const problem = published.problem(cells);
      const numerics = { ...problem.caseFile.numerics, ...scheme.numerics };
      return { ...problem, caseFile: { ...problem.caseFile, numerics } };
    },
  });
  return result.grids.map(({ cells, stage, flow }) => ({ cells, errors: [stage.l1, flow.l1] }));
}
