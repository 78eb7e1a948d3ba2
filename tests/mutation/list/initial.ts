import type { Mutation } from '../mutation';

const STARTS = ['invariants/steadyStarts'];

export const INITIAL: readonly Mutation[] = [
  {
    what: 'steady start: sign of the momentum that a withdrawal takes',
    file: 'initial/steadyResidual.ts',
    find: 'abs(q) * q + taken',
    put: 'abs(q) * q - taken',
    tests: STARTS,
  },
  {
    what: 'steady start: no friction',
    file: 'initial/steadyResidual.ts',
    find: ' - friction[i] * abs(q) * q',
    put: '',
    tests: STARTS,
  },
  {
    what: 'steady start: a reservoir releases as over dry ground',
    file: 'initial/steadyState.ts',
    find: 'firstRelease(stateFor(q).stages[0])',
    put: 'firstRelease(bed[0])',
    tests: STARTS,
  },
  {
    what: 'banded elimination: no exchange of rows',
    file: 'initial/solveBanded.ts',
    find: 'if (pivot !== k)',
    put: 'if (pivot < k)',
    tests: ['unit/solveBanded'],
  },
];
