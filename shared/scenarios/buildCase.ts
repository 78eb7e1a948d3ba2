import {
  CASE_DEFAULTS,
  CASE_FORMAT,
  type CaseFile,
  type LocalLoss,
  type RoughnessFactor,
} from '../case/caseFile';
import type { Section } from '../surveys/types';
import { inflowOf } from './hydrographs';
import type { LocalLossBody, RoughnessFactorBody, ScenarioBody } from './schemas';
import { buildStructure } from './structures/buildStructure';

/**
 * The case file of a scenario: everything that its run depends on. The scenario must be free of faults
 * (`checkScenario`); throws an Error that names the first number that is missing where it is not.
 */
export function buildCase(
  body: ScenarioBody,
  sections: readonly Section[],
  title: string,
): CaseFile {
  const { numerics } = body;
  return {
    format: CASE_FORMAT,
    title,
    gravity: CASE_DEFAULTS.gravity,
    sections: sections.map(({ id, chainage, points, roughness, banks, storage, embankments }) => ({
      id,
      chainage,
      points,
      roughness,
      ...(banks && { banks }),
      ...(storage?.length && { storage }),
      ...((embankments?.left || embankments?.right) && { embankments }),
    })),
    upstream: upstreamOf(body),
    downstream: downstreamOf(body),
    laterals: body.laterals.map(({ from, to, times, flows }, i) => ({
      from: given(from, `laterals[${i}].from`),
      to: given(to, `laterals[${i}].to`),
      times,
      flows,
    })),
    structures: (body.structures ?? []).map((structure, i) =>
      buildStructure(structure, `structures[${i}]`),
    ),
    ...(body.roughnessFactors?.length && { roughnessFactors: factorsOf(body.roughnessFactors) }),
    ...(body.localLosses?.length && { localLosses: lossesOf(body.localLosses) }),
    initial: initialOf(body),
    numerics: {
      cellSize: given(numerics.cellSize, 'numerics.cellSize'),
      duration: given(numerics.duration, 'numerics.duration'),
      outputInterval: given(numerics.outputInterval, 'numerics.outputInterval'),
      order: numerics.order as 1 | 2,
      courant: numerics.courant ?? CASE_DEFAULTS.courant,
      dryDepth: numerics.dryDepth ?? CASE_DEFAULTS.dryDepth,
      ...(numerics.momentum === 'compound' && { momentum: 'compound' as const }),
    },
  };
}

const factorsOf = (factors: RoughnessFactorBody[]): RoughnessFactor[] =>
  factors.map(({ from, to, part, depths, factors: values }, i) => ({
    from: given(from, `roughnessFactors[${i}].from`),
    to: given(to, `roughnessFactors[${i}].to`),
    part,
    depths,
    factors: values,
  }));

const lossesOf = (losses: LocalLossBody[]): LocalLoss[] =>
  losses.map(({ from, to, contraction, expansion }, i) => ({
    from: given(from, `localLosses[${i}].from`),
    to: given(to, `localLosses[${i}].to`),
    contraction: given(contraction, `localLosses[${i}].contraction`),
    expansion: given(expansion, `localLosses[${i}].expansion`),
  }));

function upstreamOf({ upstream }: ScenarioBody): CaseFile['upstream'] {
  if (upstream.kind === 'wall') return { kind: 'wall' };
  if (upstream.kind === 'stage')
    return { kind: 'stage', times: upstream.times, stages: upstream.stages };
  const inflow = inflowOf(upstream);
  if (!inflow) throw new Error('The scenario is incomplete: upstream');
  if (upstream.kind === 'reservoir') {
    const { storage, initialStage, spillway } = upstream;
    return {
      kind: 'reservoir',
      ...storage,
      initialStage: given(initialStage, 'upstream.initialStage'),
      inflow,
      ...(spillway.stages.length > 0 && { spillway }),
    };
  }
  return { kind: 'inflow', ...inflow };
}

function downstreamOf({ downstream }: ScenarioBody): CaseFile['downstream'] {
  switch (downstream.kind) {
    case 'normalDepth':
      return { kind: 'normalDepth', slope: given(downstream.slope, 'downstream.slope') };
    case 'stage':
      return { kind: 'stage', times: downstream.times, stages: downstream.stages };
    case 'rating':
      return { kind: 'rating', stages: downstream.stages, flows: downstream.flows };
    default:
      return { kind: downstream.kind };
  }
}

function initialOf({ initial }: ScenarioBody): CaseFile['initial'] {
  switch (initial.kind) {
    case 'steady':
      return { kind: 'steady' };
    case 'still':
      return { kind: 'still', stage: given(initial.stage, 'initial.stage') };
    case 'profile': {
      const { chainages, stages, flows } = initial;
      return { kind: 'profile', chainages, stages, flows };
    }
    case 'dam':
      return {
        kind: 'dam',
        chainage: given(initial.chainage, 'initial.chainage'),
        stageAbove: given(initial.stageAbove, 'initial.stageAbove'),
        stageBelow: initial.stageBelow,
      };
  }
}

function given(value: number | null, path: string): number {
  if (value === null) throw new Error(`The scenario is incomplete: ${path}`);
  return value;
}
