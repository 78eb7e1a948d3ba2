import type { Mutation } from '../mutation';

const WEIR = ['structures/weirFlow', 'structures/weirReach'];
const BREACH = ['structures/breachReach'];

export const STRUCTURES: Mutation[] = [
  {
    what: 'weir: sharp without the growth of its coefficient',
    file: 'structures/crestFlow.ts',
    find: 'return 0.611 + 0.08',
    put: 'return 0.611 + 0',
    tests: WEIR,
  },
  {
    what: 'weir: sloping crest counts its lower end only',
    file: 'structures/crestFlow.ts',
    find: '(high * power15(high) - rest)',
    put: 'high * power15(high)',
    tests: WEIR,
  },
  {
    what: 'weir: never drowned',
    file: 'structures/crestFlow.ts',
    find: '(1 - below / above) ** 0.385 : 0',
    put: '1 : 0',
    tests: WEIR,
  },
  {
    what: 'sluice: free without the fall to the jet',
    file: 'structures/sluiceFlow.ts',
    find: '(1 + j / up)',
    put: '(1 - j / up)',
    tests: ['structures/sluice'],
  },
  {
    what: 'sluice: drowned without the momentum of the jet',
    file: 'structures/sluiceFlow.ts',
    find: '(1 / j - 1 / tail) * m',
    put: '(1 / j + 1 / tail) * m',
    tests: ['structures/sluice'],
  },
  {
    what: 'culvert: inlet control without the slope of the barrel',
    file: 'structures/culvertFlow.ts',
    find: 'inlet.c * x * x + inlet.Y + correction',
    put: 'inlet.c * x * x + inlet.Y',
    tests: ['structures/culvert'],
  },
  {
    what: 'culvert: outlet control without the loss at the entrance',
    file: 'structures/culvertFlow.ts',
    find: 'return 1 + inlet.loss + ',
    put: 'return 1 + ',
    tests: ['structures/culvert'],
  },
  {
    what: 'culvert: sign of its fall',
    file: 'structures/culvertFlow.ts',
    find: 'Math.max(tailwater, outlet) - fall',
    put: 'Math.max(tailwater, outlet) + fall',
    tests: ['structures/culvert'],
  },
  {
    what: 'bridge: the velocity of a rise without its second root',
    file: 'structures/bridgeFlow.ts',
    find: 'b * b + (4 * a * rise) / m',
    put: 'b * b - (4 * a * rise) / m',
    tests: ['structures/bridge'],
  },
  {
    what: 'bridge: no fourth power of the obstruction',
    file: 'structures/bridgeFlow.ts',
    find: 'return 2 * coefficient * (coefficient + 10 * w - 0.6) * (alpha + 15 * alpha ** 4)',
    put: 'return 2 * coefficient * (coefficient + 10 * w - 0.6) * alpha',
    tests: ['structures/bridge'],
  },
  {
    what: 'breach: shrinks where it should grow',
    file: 'structures/breach.ts',
    find: 'startLevel + p * (input.bottomLevel - startLevel)',
    put: 'startLevel - p * (input.bottomLevel - startLevel)',
    tests: BREACH,
  },
  {
    what: 'breach: a pipe that does not feel its tailwater',
    file: 'structures/breach.ts',
    find: 'stageUp - Math.max(stageDown, middle)',
    put: 'stageUp - middle',
    tests: ['structures/breachPipe'],
  },
  {
    what: 'reservoir: sign of its release',
    file: 'structures/levelPool.ts',
    find: 'old + dt * (into - out)',
    put: 'old + dt * (into + out)',
    tests: ['convergence/levelPoolRouting', ...BREACH],
  },
  {
    what: 'structures: sign of the characteristic',
    file: 'structures/waterSide.ts',
    find: 'let a = faceArea - change / speed',
    put: 'let a = faceArea + change / speed',
    tests: ['structures/weirReach', 'structures/structuresTogether'],
  },
  {
    what: 'structures: sign of the pressure of their own water',
    file: 'structures/waterSide.ts',
    find: 'carried + 0.5 * gravity',
    put: 'carried - 0.5 * gravity',
    tests: ['structures/weirReach', 'structures/structuresTogether'],
  },
  {
    what: 'structures: no limit by what the river carries to them',
    file: 'structures/release.ts',
    find: 'if (Math.abs(sum) <= most) return sum;',
    put: 'if (most > -1) return sum;',
    tests: ['structures/structuresTogether', 'structures/weirReach', ...BREACH],
  },
];
