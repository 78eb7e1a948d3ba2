import { newScenario, proposals } from '../shared/scenarios/proposals';
import type { ScenarioBody } from '../shared/scenarios/schemas';
import type { Section } from '../shared/surveys/types';
import { QUENLOW_DAM, quenlowReservoir } from './reaches/quenlowValley';
import { failingDam } from './failingDam';

const HOUR = 3600;

export const DESIGN_FLOOD = '1 in 100 year';
export const LARGER_FLOOD = '1 in 100 year, 20 % more';

/** The design flood of the Lower Veshall. */
export function designFlood(reachId: number, sections: Section[]): ScenarioBody {
  const body = newScenario(DESIGN_FLOOD, reachId, sections);
  return {
    ...body,
    startsAt: '2026-11-14T00:00:00.000Z',
    note: 'Peak and shape from the flood study of the catchment; base flow as gauged at Ebbick in November.',
    upstream: {
      kind: 'generated',
      shape: 'gamma',
      baseFlow: 55,
      peakFlow: 490,
      timeToPeak: 14 * HOUR,
      recessionRatio: null,
      gammaExponent: 5,
    },
    numerics: { ...body.numerics, duration: 48 * HOUR, outputInterval: 300 },
  };
}

/** The same with a fifth more water, to see what the reach makes of it. */
export function largerFlood(reachId: number, sections: Section[]): ScenarioBody {
  const body = designFlood(reachId, sections);
  if (body.upstream.kind !== 'generated') return body;
  return {
    ...body,
    name: LARGER_FLOOD,
    note: 'Allowance for a wetter climate.',
    upstream: { ...body.upstream, peakFlow: 1.2 * 490 },
  };
}

/** Sudden failure of the Quenlow dam on a dry day. */
export function damFailure(reachId: number, sections: Section[]): ScenarioBody {
  const body = newScenario('Sudden failure, dry day', reachId, sections);
  return {
    ...body,
    note: 'Whole dam gone at once: the safe side for arrival times. Bed below the dam taken as dry.',
    upstream: { kind: 'wall' },
    downstream: { kind: 'normalDepth', slope: proposals(sections).outletSlope },
    initial: {
      kind: 'dam',
      chainage: QUENLOW_DAM.chainage,
      stageAbove: quenlowReservoir(),
      stageBelow: null,
    },
    numerics: { ...body.numerics, cellSize: 10, duration: 1.5 * HOUR, outputInterval: 15 },
  };
}

export const GRADUAL_FAILURE = 'Failure by piping, dry day';

/** The same dam eroded from its crest down, its breach by a published regression. */
export function gradualFailure(reachId: number, sections: Section[]): ScenarioBody {
  const body = damFailure(reachId, sections);
  return {
    ...body,
    name: GRADUAL_FAILURE,
    note: 'What an eroding fill makes of it, beside the sudden failure as the upper bound.',
    structures: [failingDam(sections)],
    numerics: { ...body.numerics, duration: 2 * HOUR, outputInterval: 30 },
  };
}
