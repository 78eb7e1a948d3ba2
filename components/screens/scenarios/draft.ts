import { SCS_RECESSION_RATIO, USUAL_GAMMA_EXPONENT } from '@/shared/scenarios/hydrographs';
import type {
  Downstream,
  InitialState,
  LateralInflow,
  LocalLossBody,
  NumericsSettings,
  ReservoirEnd,
  RoughnessFactorBody,
  ScenarioBody,
  Upstream,
} from '@/shared/scenarios/schemas';
import type { StructureBody } from '@/shared/scenarios/structures/schemas';
import { clockFromText, clockToText } from './startClock';

type ByKind<T extends { kind: string }> = { [K in T['kind']]: Extract<T, { kind: K }> };

/**
 * A scenario while it is edited. It holds an entry for every kind of boundary and initial state, not only for the one
 * chosen, so that looking at another kind loses nothing that was typed. Numbers are SI; the clock stays as typed.
 */
export interface Draft {
  name: string;
  reachId: number;
  startsAt: string;
  note: string;
  upstream: { kind: Upstream['kind']; byKind: ByKind<Upstream> };
  laterals: LateralInflow[];
  structures: StructureBody[];
  roughnessFactors: RoughnessFactorBody[];
  localLosses: LocalLossBody[];
  downstream: { kind: Downstream['kind']; byKind: ByKind<Downstream> };
  initial: { kind: InitialState['kind']; byKind: ByKind<InitialState> };
  numerics: NumericsSettings;
}

export const emptyLateral = (): LateralInflow => ({
  name: '',
  from: null,
  to: null,
  times: [],
  flows: [],
});

/** n as it is in a stretch that is still to be named. */
export const emptyRoughnessFactor = (): RoughnessFactorBody => ({
  from: null,
  to: null,
  part: 'all',
  depths: [0],
  factors: [1],
});

/** Gradual transitions: common practice. */
export const emptyLocalLoss = (): LocalLossBody => ({
  from: null,
  to: null,
  contraction: 0.1,
  expansion: 0.3,
});

export const emptyReservoir = (): ReservoirEnd => ({
  kind: 'reservoir',
  storage: { stages: [], volumes: [] },
  initialStage: null,
  inflow: { kind: 'table', times: [], flows: [] },
  spillway: { stages: [], flows: [] },
});

export function toDraft(body: ScenarioBody): Draft {
  const { upstream, downstream, initial } = body;
  return {
    name: body.name,
    reachId: body.reachId,
    startsAt: clockToText(body.startsAt),
    note: body.note,
    upstream: {
      kind: upstream.kind,
      byKind: {
        generated: {
          kind: 'generated',
          shape: 'nrcs',
          baseFlow: null,
          peakFlow: null,
          timeToPeak: null,
          recessionRatio: SCS_RECESSION_RATIO,
          gammaExponent: USUAL_GAMMA_EXPONENT,
        },
        table: { kind: 'table', times: [], flows: [] },
        stage: { kind: 'stage', times: [], stages: [] },
        reservoir: emptyReservoir(),
        wall: { kind: 'wall' },
        [upstream.kind]: upstream,
      },
    },
    laterals: body.laterals,
    structures: body.structures ?? [],
    roughnessFactors: body.roughnessFactors ?? [],
    localLosses: body.localLosses ?? [],
    downstream: {
      kind: downstream.kind,
      byKind: {
        normalDepth: { kind: 'normalDepth', slope: null },
        stage: { kind: 'stage', times: [], stages: [] },
        rating: { kind: 'rating', stages: [], flows: [] },
        criticalDepth: { kind: 'criticalDepth' },
        open: { kind: 'open' },
        wall: { kind: 'wall' },
        [downstream.kind]: downstream,
      },
    },
    initial: {
      kind: initial.kind,
      byKind: {
        steady: { kind: 'steady' },
        still: { kind: 'still', stage: null },
        profile: { kind: 'profile', chainages: [], stages: [], flows: [] },
        dam: { kind: 'dam', chainage: null, stageAbove: null, stageBelow: null },
        [initial.kind]: initial,
      },
    },
    numerics: body.numerics,
  };
}

/** What is stored and routed: of each choice only the kind that stands. */
export function toBody(draft: Draft): ScenarioBody {
  return {
    name: draft.name.trim(),
    reachId: draft.reachId,
    startsAt: clockFromText(draft.startsAt).iso,
    note: draft.note.trim(),
    upstream: draft.upstream.byKind[draft.upstream.kind],
    laterals: draft.laterals,
    structures: draft.structures,
    roughnessFactors: draft.roughnessFactors,
    localLosses: draft.localLosses,
    downstream: draft.downstream.byKind[draft.downstream.kind],
    initial: draft.initial.byKind[draft.initial.kind],
    numerics: draft.numerics,
  };
}

/** Whether a number stands in it that could not be read: it shows as NaN where it was typed. */
export function hasUnreadable(value: unknown): boolean {
  if (typeof value === 'number') return Number.isNaN(value);
  if (typeof value !== 'object' || value === null) return false;
  return Object.values(value).some(hasUnreadable);
}
