import type { CaseFile, RoughnessFactor } from '../../case/caseFile';
import type { SearchStretch } from './types';

/** A constant multiplier of n for each stretch, as the case file writes it. */
export const roughnessFactors = (
  stretches: readonly Pick<SearchStretch, 'from' | 'to' | 'part'>[],
  factors: readonly number[],
): RoughnessFactor[] =>
  stretches.map(({ from, to, part }, i) => ({
    from,
    to,
    part,
    depths: [0],
    factors: [factors[i]],
  }));

/** The case with these multipliers beside those that it has already: they multiply. `cellSize` in m. */
export function withFactors(
  caseFile: CaseFile,
  stretches: readonly SearchStretch[],
  factors: readonly number[],
  cellSize: number,
): CaseFile {
  return {
    ...caseFile,
    roughnessFactors: [
      ...(caseFile.roughnessFactors ?? []),
      ...roughnessFactors(stretches, factors),
    ],
    numerics: { ...caseFile.numerics, cellSize },
  };
}
