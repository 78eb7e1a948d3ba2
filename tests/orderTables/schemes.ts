import type { Numerics } from '@/shared/case/caseFile';

/** What a case file can choose of the scheme: every combination has its columns in the order tables. */
export interface Scheme {
  name: string;
  numerics: Partial<Numerics>;
}

export const SCHEMES: readonly Scheme[] = [
  { name: 'first order', numerics: { order: 1 } },
  { name: 'second order', numerics: { order: 2 } },
];
