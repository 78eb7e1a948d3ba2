import type { Mutation } from '../mutation';

const REGULAR = 'riemann/interiorFluxes.ts';
const IRREGULAR = 'riemann/irregularFlux.ts';
const STEADY = ['unit/nearlyEqualStates', 'convergence/bumpFlow', 'convergence/manufacturedFlow'];
const WAVES = ['unit/nearlyEqualStates', 'convergence/movingJumps', 'convergence/damBreak'];
const SHORES = [
  'unit/interiorFluxes',
  'invariants/lakeAtRest',
  'convergence/damBreak',
  'convergence/movingShore',
];

export const FLUXES: Mutation[] = [
  {
    what: 'flux of volume: no diffusion',
    file: REGULAR,
    find: 'sL * qR + product * dA) * inverse',
    put: 'sL * qR) * inverse',
    tests: ['convergence/movingJumps', 'invariants/totalVariation', ...WAVES],
  },
  {
    what: 'flux of volume: sign of what comes from the right',
    file: REGULAR,
    find: 'const volume = (sR * qL - sL * qR',
    put: 'const volume = (sR * qL + sL * qR',
    tests: STEADY,
  },
  {
    what: 'flux of momentum: no Q²/A from the left',
    file: REGULAR,
    find: '(sR * qL * uL - sL',
    put: '(-sL',
    tests: STEADY,
  },
  {
    what: 'flux of momentum: sign of the pressure',
    file: REGULAR,
    find: '(qR * uR + dP)',
    put: '(qR * uR - dP)',
    tests: ['unit/nearlyEqualStates', 'convergence/movingJumps', 'convergence/damBreak'],
  },
  {
    what: 'flux of momentum: sign in the diffusion',
    file: REGULAR,
    find: 'product * (qR - qL)',
    put: 'product * (qR + qL)',
    tests: STEADY,
  },
  {
    what: 'wave speed to the left: sign of the celerity',
    file: REGULAR,
    find: 'uL - cI, uR - cJ',
    put: 'uL + cI, uR + cJ',
    tests: WAVES,
  },
  {
    what: 'wave speed to the right: sign of the celerity',
    file: REGULAR,
    find: 'uL + cI, uR + cJ',
    put: 'uL - cI, uR - cJ',
    tests: WAVES,
  },
  {
    what: 'diffusion by the greater difference of areas',
    file: REGULAR,
    find: 'abs(dAi) < abs(dAj) ? dAi',
    put: 'abs(dAi) > abs(dAj) ? dAi',
    tests: ['unit/interiorFluxes'],
  },
  {
    what: 'pressure: the right cell with the wrong sign',
    file: REGULAR,
    find: 'halfG * (dPi + dPj)',
    put: 'halfG * (dPi - dPj)',
    tests: STEADY,
  },
  {
    what: 'source: sign of the pressure within the left cell',
    file: REGULAR,
    find: 'momentum + halfG * iL',
    put: 'momentum - halfG * iL',
    tests: STEADY,
  },
  {
    what: 'source: sign of the pressure within the right cell',
    file: REGULAR,
    find: 'momentum - dP + halfG * jR',
    put: 'momentum - dP - halfG * jR',
    tests: STEADY,
  },
  {
    what: 'source: the right cell does not feel the pressure of the face',
    file: REGULAR,
    find: 'momentum - dP + halfG * jR',
    put: 'momentum + halfG * jR',
    tests: STEADY,
  },
  {
    what: 'beside dry ground: sign of the pressure',
    file: IRREGULAR,
    find: '(qR * uJ + dP)',
    put: '(qR * uJ - dP)',
    tests: SHORES,
  },
  {
    what: 'beside dry ground: the right cell does not feel the pressure',
    file: IRREGULAR,
    find: 'fluxRight[f] = momentum - dP',
    put: 'fluxRight[f] = momentum',
    tests: SHORES,
  },
  {
    what: 'beside dry ground: sign of the diffusion of volume',
    file: IRREGULAR,
    find: 'sL * sR * (aR - aL)',
    put: 'sL * sR * (aL - aR)',
    tests: SHORES,
  },
  {
    what: 'beside dry ground: no Q²/A',
    file: IRREGULAR,
    find: 'sR * qL * uI - sL',
    put: '-sL',
    tests: [...SHORES, 'unit/steepReach'],
  },
  {
    what: 'beside dry ground: a front no faster than a wave',
    file: IRREGULAR,
    find: 'uI + tables.frontSpeedAt(i, etaI)',
    put: 'uI',
    tests: [...SHORES, 'convergence/riemannTests', 'convergence/parabolicBowl'],
  },
  {
    what: 'the fast kernel: sign of the pressure within the left cell',
    file: 'fast/assembly/fluxes.ts',
    find: 'add(momentum, mul(mul(halfG, iL)',
    put: 'sub(momentum, mul(mul(halfG, iL)',
    tests: ['kernels/sameBits'],
    isFast: true,
  },
];
