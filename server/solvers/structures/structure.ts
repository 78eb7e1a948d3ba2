import type { StructureRegime } from '../../../shared/case/resultFile';

export type Regime = StructureRegime;

/** The water on both sides of a structure, seen in the direction in which it would flow. One object, overwritten. */
export interface Water {
  /** m, of the higher water */
  stageUp: number;
  /** Its energy level (m): with the velocity head of what approaches */
  energyUp: number;
  /** m, of the lower water */
  stageDown: number;
  /** Cell on the higher and on the lower side: index into the workspace; 0 is a reservoir */
  cellUp: number;
  cellDown: number;
  /** Downstream */
  isForward: boolean;
  /** s */
  time: number;
}

/** How much water a structure lets through. */
export interface Structure {
  readonly id: string;
  readonly kind: string;
  /** m: the boundary between cells at which it stands */
  readonly chainage: number;
  /** Flow (m³/s, never negative) from the higher water to the lower; 0 where both stand level. */
  flow(water: Water): number;
  /** Of the last flow. */
  regime(): Regime;
  /** Lowest level (m) at which water passes now */
  lowest(): number;
  /** The state at the start of a step: stage (m) of the water above it at a time (s). */
  follow?(stageAbove: number, time: number): void;
  /** What has opened by now (m). */
  opening?(): { width: number; bottom: number };
}
