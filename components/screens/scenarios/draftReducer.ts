import type {
  Downstream,
  InitialState,
  LateralInflow,
  LocalLossBody,
  NumericsSettings,
  RoughnessFactorBody,
  Upstream,
} from '@/shared/scenarios/schemas';
import type { StructureBody } from '@/shared/scenarios/structures/schemas';
import { emptyLateral, emptyLocalLoss, emptyRoughnessFactor, type Draft } from './draft';

/** A change to the entry of the kind that stands. */
export type Change<T extends { kind: string }> = T extends unknown
  ? Partial<Omit<T, 'kind'>>
  : never;

export type DraftAction =
  | {
      type: 'detailsChanged';
      change: Partial<Pick<Draft, 'name' | 'note' | 'startsAt' | 'reachId'>>;
    }
  | { type: 'upstreamChosen'; kind: Upstream['kind'] }
  | { type: 'upstreamChanged'; change: Change<Upstream> }
  | { type: 'lateralAdded' }
  | { type: 'lateralChanged'; index: number; change: Partial<LateralInflow> }
  | { type: 'lateralRemoved'; index: number }
  | { type: 'structureAdded'; structure: StructureBody }
  | { type: 'structureChanged'; index: number; change: Change<StructureBody> }
  | { type: 'structureDuplicated'; index: number; id: string }
  | { type: 'structureRemoved'; index: number }
  | { type: 'roughnessFactorAdded' }
  | { type: 'roughnessFactorChanged'; index: number; change: Partial<RoughnessFactorBody> }
  | { type: 'roughnessFactorRemoved'; index: number }
  | { type: 'localLossAdded' }
  | { type: 'localLossChanged'; index: number; change: Partial<LocalLossBody> }
  | { type: 'localLossRemoved'; index: number }
  | { type: 'downstreamChosen'; kind: Downstream['kind'] }
  | { type: 'downstreamChanged'; change: Change<Downstream> }
  | { type: 'initialChosen'; kind: InitialState['kind'] }
  | { type: 'initialChanged'; change: Change<InitialState> }
  | { type: 'numericsChanged'; change: Partial<NumericsSettings> }
  | { type: 'restored'; draft: Draft };

export function draftReducer(draft: Draft, action: DraftAction): Draft {
  switch (action.type) {
    case 'detailsChanged':
      return { ...draft, ...action.change };
    case 'upstreamChosen':
      return { ...draft, upstream: { ...draft.upstream, kind: action.kind } };
    case 'upstreamChanged':
      return { ...draft, upstream: changed(draft.upstream, action.change) };
    case 'lateralAdded':
      return { ...draft, laterals: [...draft.laterals, emptyLateral()] };
    case 'lateralChanged':
      return {
        ...draft,
        laterals: draft.laterals.map((lateral, index) =>
          index === action.index ? { ...lateral, ...action.change } : lateral,
        ),
      };
    case 'lateralRemoved':
      return { ...draft, laterals: draft.laterals.filter((_, index) => index !== action.index) };
    case 'structureAdded':
      return { ...draft, structures: [...draft.structures, action.structure] };
    case 'structureChanged':
      return {
        ...draft,
        structures: draft.structures.map((structure, index) =>
          index === action.index
            ? ({ ...structure, ...action.change } as StructureBody)
            : structure,
        ),
      };
    case 'structureDuplicated': {
      const copy = { ...draft.structures[action.index], id: action.id };
      return { ...draft, structures: [...draft.structures, copy] };
    }
    case 'structureRemoved':
      return {
        ...draft,
        structures: draft.structures.filter((_, index) => index !== action.index),
      };
    case 'roughnessFactorAdded':
      return { ...draft, roughnessFactors: [...draft.roughnessFactors, emptyRoughnessFactor()] };
    case 'roughnessFactorChanged':
      return { ...draft, roughnessFactors: changedAt(draft.roughnessFactors, action) };
    case 'roughnessFactorRemoved':
      return { ...draft, roughnessFactors: without(draft.roughnessFactors, action.index) };
    case 'localLossAdded':
      return { ...draft, localLosses: [...draft.localLosses, emptyLocalLoss()] };
    case 'localLossChanged':
      return { ...draft, localLosses: changedAt(draft.localLosses, action) };
    case 'localLossRemoved':
      return { ...draft, localLosses: without(draft.localLosses, action.index) };
    case 'downstreamChosen':
      return { ...draft, downstream: { ...draft.downstream, kind: action.kind } };
    case 'downstreamChanged':
      return { ...draft, downstream: changed(draft.downstream, action.change) };
    case 'initialChosen':
      return { ...draft, initial: { ...draft.initial, kind: action.kind } };
    case 'initialChanged':
      return { ...draft, initial: changed(draft.initial, action.change) };
    case 'numericsChanged':
      return { ...draft, numerics: { ...draft.numerics, ...action.change } };
    case 'restored':
      return action.draft;
  }
}

const changedAt = <T extends object>(
  list: T[],
  { index, change }: { index: number; change: Partial<T> },
): T[] => list.map((one, k) => (k === index ? { ...one, ...change } : one));

const without = <T>(list: T[], index: number): T[] => list.filter((_, k) => k !== index);

const changed = <P extends { kind: string; byKind: Record<string, object> }>(
  part: P,
  change: object,
): P => ({
  ...part,
  byKind: { ...part.byKind, [part.kind]: { ...part.byKind[part.kind], ...change } },
});
