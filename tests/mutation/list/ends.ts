import type { Mutation } from '../mutation';

const WAVES = ['convergence/boundaries'];
const CONTROL = 'boundaries/controlBoundary.ts';

export const ENDS: Mutation[] = [
  {
    what: 'inflow: sign of the characteristic',
    file: 'boundaries/inflowBoundary.ts',
    find: 'a = area + change / Math.max',
    put: 'a = area - change / Math.max',
    tests: WAVES,
  },
  {
    what: 'stage: sign of the celerity',
    file: 'boundaries/stageBoundary.ts',
    find: '(leaving - 0.5 * (inside.celerity + c))',
    put: '(leaving + 0.5 * (inside.celerity + c))',
    tests: WAVES,
  },
  {
    what: 'stage: no flow but that of the cell',
    file: 'boundaries/stageBoundary.ts',
    find: ' + (leaving - 0.5 * (inside.celerity + c)) * (a - inside.area)',
    put: '',
    tests: WAVES,
  },
  {
    what: 'normal depth: by the slope instead of its root',
    file: 'boundaries/downstreamBoundary.ts',
    find: 'Math.sqrt(downstream.slope)',
    put: 'downstream.slope',
    tests: ['unit/steepReach', 'invariants/initialStates'],
  },
  {
    what: 'rating: flow falls between its points',
    file: 'boundaries/ratingCurve.ts',
    find: 'return q[k] + ',
    put: 'return q[k] - ',
    tests: ['unit/timeParts', ...WAVES],
  },
  {
    what: 'critical depth: a tenth less flow',
    file: 'boundaries/downstreamBoundary.ts',
    find: 'return createEndSection(workspace, tables, section).criticalFlowAt;',
    put: 'return (z) => 0.9 * createEndSection(workspace, tables, section).criticalFlowAt(z);',
    tests: ['convergence/criticalOutlet'],
  },
  {
    what: 'outlets: sign of the characteristic',
    file: CONTROL,
    find: 'released(eta) - out - speed',
    put: 'released(eta) - out + speed',
    tests: WAVES,
  },
  {
    what: 'outlets: no limit by critical flow',
    file: CONTROL,
    find: 'min(control(eta), criticalFlowAt(eta))',
    put: 'control(eta)',
    tests: ['convergence/criticalOutlet'],
  },
  {
    what: 'open: sign of ω in the invariant',
    file: 'boundaries/openBoundary.ts',
    find: 'invariant + tables.frontSpeedAt',
    put: 'invariant - tables.frontSpeedAt',
    tests: WAVES,
  },
  {
    what: 'wall: sign of the celerity',
    file: 'boundaries/wallBoundary.ts',
    find: '2 * towards + inside.celerity : inside',
    put: '2 * towards - inside.celerity : inside',
    tests: WAVES,
  },
  {
    what: 'wall: sign of the pressure in the half cell',
    file: 'boundaries/wallBoundary.ts',
    find: '? 0.5 * gravity',
    put: '? -0.5 * gravity',
    tests: ['unit/wallBoundary'],
  },
  {
    what: 'ends: sign of the pressure in the half cell',
    file: 'boundaries/endFlux.ts',
    find: 'carried + 0.5 * path * gravity',
    put: 'carried - 0.5 * path * gravity',
    tests: ['convergence/bumpFlow', ...WAVES],
  },
  {
    what: 'ends: no Q²/A',
    file: 'boundaries/endFlux.ts',
    find: 'carried + 0.5 * path * gravity',
    put: '0.5 * path * gravity',
    tests: ['convergence/bumpFlow', ...WAVES],
  },
];
