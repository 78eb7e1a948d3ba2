/** One sign turned or one term dropped in the solver, and the tests that must see it. */
export interface Mutation {
  what: string;
  /** Under server/solvers */
  file: string;
  /** Stands once in the file */
  find: string;
  put: string;
  /** Under tests/solvers, without `.test.ts`; the cheapest first */
  tests: readonly string[];
  /** Of the fast kernel: it is compiled anew, and runs. All others are tried with the readable one. */
  isFast?: boolean;
}
