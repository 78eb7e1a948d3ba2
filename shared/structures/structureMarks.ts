import type { StructureInput } from '../case/structures';
import type { StructureBody } from '../scenarios/structures/schemas';
import { crestPoints, lowestOf } from './crests';
import type { StandingKind } from './structureWords';

/** A structure as a drawing from the side has it, m. */
export interface StructureMark {
  id: string;
  kind: StandingKind;
  chainage: number;
  /** Where water passes last and first: sill, invert or bottom of the breach; null where the bed is it. */
  foot: number | null;
  /** The lowest it can be overflowed at, or the soffit of a bridge without a deck; null where nothing of it is known. */
  top: number | null;
}

/** Of the structures of a form or of a case, those whose place is known. */
export const structureMarks = (
  structures: readonly (StructureBody | StructureInput)[],
): StructureMark[] =>
  structures.flatMap((structure) => {
    const { id, kind, chainage } = structure;
    if (chainage === null || !Number.isFinite(chainage)) return [];
    return [{ id, kind, chainage, ...levelsOf(structure) }];
  });

function levelsOf(structure: StructureBody | StructureInput): Pick<StructureMark, 'foot' | 'top'> {
  switch (structure.kind) {
    case 'weir':
      return { foot: null, top: crestOf(structure) };
    case 'sluice': {
      const opening = Math.max(0, ...structure.openings);
      const { sill } = structure;
      return { foot: sill, top: sill === null ? null : sill + opening };
    }
    case 'culvert': {
      const height = structure.shape === 'circular' ? structure.diameter : structure.height;
      const { invertUp } = structure;
      const roof = invertUp === null || height === null ? null : invertUp + height;
      return { foot: invertUp, top: crestOf(structure) ?? roof };
    }
    case 'bridge':
      return { foot: structure.soffit, top: crestOf(structure) ?? structure.soffit };
    case 'breach':
      return { foot: structure.bottomLevel, top: crestOf(structure) };
  }
}

type Crested =
  | { offsets: number[]; levels: number[] }
  | { crest?: [number, number][] }
  | { deck?: [number, number][] };

function crestOf(structure: Crested): number | null {
  const points =
    'offsets' in structure
      ? crestPoints(structure)
      : (('crest' in structure ? structure.crest : 'deck' in structure ? structure.deck : []) ??
        []);
  const low = lowestOf(points);
  return Number.isFinite(low) ? low : null;
}
