import type { Mutation } from '../mutation';

const SLOPES = 'reconstruction/limitedSlopes.ts';
const LOOPS = 'time/stepLoops.ts';
const BRAKED = ['unit/steepReach', 'convergence/steadyFlow', 'convergence/manufacturedFlow'];
const MOVED = ['unit/routeCase', 'convergence/movingJumps'];
const SIDE = ['convergence/laterals', 'convergence/manufacturedFlow'];

/** Reconstruction, steps with friction and laterals, states of cells. */
export const CELLS: Mutation[] = [
  {
    what: 'reconstruction: sign of the slope of the stage',
    file: SLOPES,
    find: 'sEta = (2 * productEta)',
    put: 'sEta = (-2 * productEta)',
    tests: ['unit/limitedSlopes', 'convergence/bumpFlow'],
  },
  {
    what: 'reconstruction: no slope of the flow',
    file: SLOPES,
    find: 'if (productQ > 0) sQ',
    put: 'if (productQ > Infinity) sQ',
    tests: ['unit/limitedSlopes', 'convergence/manufacturedFlow'],
  },
  {
    what: 'reconstruction: slopes beside dry ground',
    file: SLOPES,
    find: 'if (etaI > floor && etaJ > floor && etaK > floor)',
    put: 'if (etaJ > floor)',
    tests: ['unit/limitedSlopes', 'invariants/lakeAtRest'],
  },
  {
    what: 'reconstruction: slope of the stage at a face turned',
    file: 'riemann/interiorFluxes.ts',
    find: 'etaI + 0.5 * slopeStage[i]',
    put: 'etaI - 0.5 * slopeStage[i]',
    tests: ['unit/interiorFluxes', 'convergence/bumpFlow'],
  },
  {
    what: 'step: sign of the change of volume in the predictor',
    file: LOOPS,
    find: 'let a = old - ratio',
    put: 'let a = old + ratio',
    tests: MOVED,
  },
  {
    what: 'step: sign of the change of momentum in the predictor',
    file: LOOPS,
    find: 'let q = q0 - ratio',
    put: 'let q = q0 + ratio',
    tests: MOVED,
  },
  {
    what: 'step: sign of the change of volume in the corrector',
    file: LOOPS,
    find: 'let a = area[i] - ratio',
    put: 'let a = area[i] + ratio',
    tests: MOVED,
  },
  {
    what: 'step: sign of the change of momentum in the corrector',
    file: LOOPS,
    find: 'halfFlow[i] - 0.5 * ratio',
    put: 'halfFlow[i] + 0.5 * ratio',
    tests: MOVED,
  },
  {
    what: 'friction: none in the predictor',
    file: LOOPS,
    find: 'sqrt(1 + fourDt * friction[i] * abs(q))',
    put: 'sqrt(1)',
    tests: ['convergence/manufacturedFlow', 'unit/steepReach', 'convergence/monoclinalWave'],
  },
  {
    what: 'friction: none in the corrector',
    file: LOOPS,
    find: 'sqrt(1 + m * abs(q))',
    put: 'sqrt(1)',
    tests: BRAKED,
  },
  {
    what: 'friction: sign of its explicit part',
    file: LOOPS,
    find: '- e * q0',
    put: '+ e * q0',
    tests: BRAKED,
  },
  {
    what: 'friction: by the velocity instead of its square',
    file: 'geometry/cellState.ts',
    find: 'gravity / (a * v * v + TINY)',
    put: 'gravity / (a * v + TINY)',
    tests: BRAKED,
  },
  {
    what: 'celerity: of half the depth',
    file: 'geometry/cellState.ts',
    find: 'sqrt(fourG * quarter)',
    put: 'sqrt(0.5 * fourG * quarter)',
    tests: ['unit/interiorFluxes', 'convergence/bumpFlow', 'convergence/boundaries'],
  },
  {
    what: 'time step: without the celerity',
    file: 'time/fastestWave.ts',
    find: 'let speed = u + c;',
    put: 'let speed = u;',
    tests: ['unit/routeCase', 'convergence/movingJumps'],
  },
  {
    what: 'limit of outflow: volume made where a cell runs dry',
    file: 'time/limitOutflow.ts',
    find: 'fluxArea[i] = right * share',
    put: 'fluxArea[i] = right',
    tests: ['unit/timeParts', 'invariants/volume'],
  },
  {
    what: 'laterals: sign of the volume',
    file: LOOPS,
    find: 'return a + taken;',
    put: 'return a - taken;',
    tests: SIDE,
  },
  {
    what: 'laterals: not in the books',
    file: LOOPS,
    find: 'lateralSums[0] += (taken * dx) / dt;',
    put: '',
    tests: SIDE,
  },
  {
    what: 'laterals: a withdrawal leaves its momentum in the predictor',
    file: LOOPS,
    find: 'q += ((a - before) * q0) / old;',
    put: 'q += 0;',
    tests: ['convergence/manufacturedFlow', 'convergence/laterals'],
  },
  {
    what: 'laterals: a withdrawal leaves its momentum in the corrector',
    file: LOOPS,
    find: 'q += (0.5 * (a - before) * flow[i]) / area[i];',
    put: 'q += 0;',
    tests: ['convergence/manufacturedFlow', 'convergence/laterals'],
  },
  {
    what: 'reported flow: the flux of one stage',
    file: 'diagnostics/faceFlow.ts',
    find: 'faceFlow[f] = 0.5 * (lateFlux[f] + fluxArea[f])',
    put: 'faceFlow[f] = fluxArea[f]',
    tests: ['unit/faceFlow'],
  },
  {
    what: 'local losses: sign',
    file: 'sources/localLosses.ts',
    find: 'contraction[f] * gain',
    put: '-contraction[f] * gain',
    tests: ['valley/localLosses'],
  },
];
