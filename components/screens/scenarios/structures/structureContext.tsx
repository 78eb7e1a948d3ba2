import { createContext, useContext } from 'react';
import type { StructureBody } from '@/shared/scenarios/structures/schemas';
import { useEditing } from '../editorContext';

/** Which structure of the draft the fields below are of. */
const IndexContext = createContext<number | null>(null);
export const StructureProvider = IndexContext.Provider;

type Kind = StructureBody['kind'];
type Of<K extends Kind> = Extract<StructureBody, { kind: K }>;

/** The structure that the fields stand in, by its kind. */
export function useStructure<K extends Kind>(kind: K) {
  const { draft, dispatch, isLocked, reach } = useEditing();
  const index = useContext(IndexContext);
  const structure = index === null ? undefined : draft.structures[index];
  if (index === null || structure?.kind !== kind)
    throw new Error(`useStructure stands outside a ${kind}`);
  return {
    structure: structure as Of<K>,
    path: `structures[${index}]`,
    change: (to: Partial<Omit<Of<K>, 'kind'>>) =>
      dispatch({ type: 'structureChanged', index, change: to }),
    upstream: draft.upstream.byKind[draft.upstream.kind],
    reach,
    disabled: isLocked,
  };
}
