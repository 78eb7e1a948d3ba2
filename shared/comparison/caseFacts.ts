import { CASE_DEFAULTS, type CaseFile, type FlowSeries } from '../case/caseFile';
import { formatDuration, formatNumber, formatSetting, formatWithUnit } from '../units/format';
import type { Quantity, UnitSystem } from '../units/units';
import { factsOfSection } from './sectionFacts';
import { factsOfStructure } from './structureFacts';

/** One thing that goes into a run, as it is said, and what is behind the words, to tell whether two are the same. */
export interface CaseFact {
  part: string;
  what: string;
  text: string;
  exact: unknown;
}

export type Say = (value: number, quantity: Quantity) => string;

/** Everything that a run depends on but its title, in the order in which a modeller thinks of it; in the study's units. */
export function caseFacts(caseFile: CaseFile, system: UnitSystem): CaseFact[] {
  const say: Say = (value, quantity) => formatWithUnit(value, quantity, system);
  return [
    ...upstreamFacts(caseFile, say),
    ...lateralFacts(caseFile, say),
    ...downstreamFacts(caseFile, say),
    ...initialFacts(caseFile, say),
    ...roughnessFacts(caseFile, say),
    ...lossFacts(caseFile, say),
    ...caseFile.structures.flatMap((structure) => factsOfStructure(structure, say)),
    ...numericsFacts(caseFile, say, system),
    ...caseFile.sections.flatMap((section) => factsOfSection(section, say)),
  ];
}

const fact = (part: string, what: string, text: string, exact: unknown = text): CaseFact => ({
  part,
  what,
  text,
  exact,
});

/** `peak 490 m³/s at 14 h 00, 76 values`. */
function seriesFacts(part: string, { times, flows }: FlowSeries, say: Say): CaseFact[] {
  const top = flows.reduce((best, flow, i) => (flow > flows[best] ? i : best), 0);
  return [
    fact(part, 'peak', say(flows[top], 'flow'), flows[top]),
    fact(part, 'time of the peak', formatDuration(times[top]), times[top]),
    fact(part, 'first value', say(flows[0], 'flow'), flows[0]),
    fact(
      part,
      'table',
      `${flows.length} values over ${formatDuration(times[times.length - 1] - times[0])}`,
      [times, flows],
    ),
  ];
}

function levelFacts(part: string, times: number[], stages: number[], say: Say): CaseFact[] {
  const [low, high] = [Math.min(...stages), Math.max(...stages)];
  return [
    fact(part, 'lowest stage', say(low, 'elevation'), low),
    fact(part, 'highest stage', say(high, 'elevation'), high),
    fact(part, 'table', `${stages.length} values`, [times, stages]),
  ];
}

const UPSTREAM = {
  inflow: 'inflow hydrograph',
  stage: 'stage against time',
  reservoir: 'reservoir',
  wall: 'closed',
};

function upstreamFacts({ upstream }: CaseFile, say: Say): CaseFact[] {
  const kind = fact('Upstream end', 'kind', UPSTREAM[upstream.kind]);
  switch (upstream.kind) {
    case 'inflow':
      return [kind, ...seriesFacts('Inflow', upstream, say)];
    case 'stage':
      return [kind, ...levelFacts('Upstream stage', upstream.times, upstream.stages, say)];
    case 'reservoir': {
      const { inflow, ...pool } = upstream;
      return [
        kind,
        fact('Reservoir', 'first stage', say(pool.initialStage, 'elevation'), pool.initialStage),
        fact('Reservoir', 'storage and spillway', `${pool.stages.length} levels`, pool),
        ...(inflow ? seriesFacts('Inflow of the reservoir', inflow, say) : []),
      ];
    }
    case 'wall':
      return [kind];
  }
}

function lateralFacts({ laterals }: CaseFile, say: Say): CaseFact[] {
  return laterals.flatMap((lateral, i) => {
    const part = `Lateral inflow ${i + 1}`;
    const place = `${say(lateral.from, 'chainage')} to ${say(lateral.to, 'chainage')}`;
    return [
      fact(part, 'place', place, [lateral.from, lateral.to]),
      ...seriesFacts(part, lateral, say),
    ];
  });
}

const OUTLET = {
  normalDepth: 'normal depth',
  stage: 'stage against time',
  rating: 'rating curve',
  criticalDepth: 'critical depth',
  open: 'open',
  wall: 'closed',
};

function downstreamFacts({ downstream }: CaseFile, say: Say): CaseFact[] {
  const kind = fact('Outlet', 'kind', OUTLET[downstream.kind]);
  switch (downstream.kind) {
    case 'normalDepth':
      return [kind, fact('Outlet', 'slope', say(downstream.slope, 'slope'), downstream.slope)];
    case 'stage':
      return [kind, ...levelFacts('Outlet stage', downstream.times, downstream.stages, say)];
    case 'rating':
      return [
        kind,
        fact('Outlet', 'rating curve', `${downstream.stages.length} points`, downstream),
      ];
    default:
      return [kind];
  }
}

const INITIAL = {
  steady: 'steady flow',
  still: 'still water',
  profile: 'given profile',
  dam: 'water behind a dam',
};

function initialFacts({ initial }: CaseFile, say: Say): CaseFact[] {
  const kind = fact('Initial state', 'kind', INITIAL[initial.kind]);
  const level = (z: number | null) => (z === null ? 'dry' : say(z, 'elevation'));
  switch (initial.kind) {
    case 'still':
      return [kind, fact('Initial state', 'stage', level(initial.stage), initial.stage)];
    case 'dam':
      return [
        kind,
        fact('Initial state', 'dam at', say(initial.chainage, 'chainage'), initial.chainage),
        fact('Initial state', 'stage above', level(initial.stageAbove), initial.stageAbove),
        fact('Initial state', 'stage below', level(initial.stageBelow), initial.stageBelow),
      ];
    case 'profile':
      return [
        kind,
        fact('Initial state', 'profile', `${initial.chainages.length} places`, initial),
      ];
    case 'steady':
      return [kind];
  }
}

const PARTS = { all: 'whole section', channel: 'channel', overbank: 'flood plain' };

const roughnessFacts = ({ roughnessFactors = [] }: CaseFile, say: Say): CaseFact[] =>
  roughnessFactors.map((factor, i) => {
    const { from, to, part, depths, factors } = factor;
    const by =
      factors.length === 1
        ? formatNumber(factors[0], 3)
        : factors.map((f, k) => `${formatNumber(f, 3)} at ${say(depths[k], 'depth')}`).join(', ');
    const text = `× ${by}, ${PARTS[part]}, ${say(from, 'chainage')} to ${say(to, 'chainage')}`;
    return fact(`Multiplier of n ${i + 1}`, 'value', text, factor);
  });

const lossFacts = ({ localLosses = [] }: CaseFile, say: Say): CaseFact[] =>
  localLosses.map((loss, i) => {
    const { from, to, contraction, expansion } = loss;
    const text = `${contraction} and ${expansion}, ${say(from, 'chainage')} to ${say(to, 'chainage')}`;
    return fact(`Local loss ${i + 1}`, 'contraction and expansion', text, loss);
  });

function numericsFacts({ numerics, gravity }: CaseFile, say: Say, system: UnitSystem): CaseFact[] {
  const filled = { ...CASE_DEFAULTS, ...numerics };
  return [
    fact('Settings', 'cell size', say(filled.cellSize, 'length'), filled.cellSize),
    fact('Settings', 'length of the run', formatDuration(filled.duration), filled.duration),
    fact('Settings', 'output interval', `${filled.outputInterval} s`),
    fact('Settings', 'order', String(filled.order)),
    fact('Settings', 'Courant number', String(filled.courant)),
    fact('Settings', 'dry depth', formatSetting(filled.dryDepth, 'depth', system)),
    fact('Settings', 'momentum coefficient', filled.momentum),
    fact(
      'Settings',
      'gravity',
      formatSetting(gravity ?? CASE_DEFAULTS.gravity, 'acceleration', system),
    ),
  ];
}
