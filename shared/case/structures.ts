/** Structures of the case file. SI units; levels are above the datum of the study, offsets run across the river. */

/** [offset, level] in m, offsets never decreasing. */
export type CrestPoint = [number, number];

interface StructureBase {
  id: string;
  /** Where it stands (m): the boundary between two cells nearest to it */
  chainage: number;
  /** Where its numbers come from, for the reader of a report; the solver does not look at it */
  note?: string;
}

/** Water that flows over a crest, either way. */
export interface WeirInput extends StructureBase {
  kind: 'weir';
  crest: CrestPoint[];
  form: 'broad' | 'sharp';
  /** Discharge coefficient C_d; by default 1 for a broad crest, 0.611 + 0.08 h/P for a sharp one */
  coefficient?: number;
}

/** A gate over a level sill, raised and lowered in time. */
export interface SluiceInput extends StructureBase {
  kind: 'sluice';
  /** Clear width of all gates (m) */
  width: number;
  /** Level (m) */
  sill: number;
  /** Opening above the sill (m) at times (s); 0 is closed */
  times: number[];
  openings: number[];
  /** Coefficient of contraction; by default 0.611 */
  contraction?: number;
}

export const CULVERT_INLET_NAMES = [
  'concretePipeSquareEdge',
  'concretePipeGrooveHeadwall',
  'concretePipeGrooveProjecting',
  'metalPipeHeadwall',
  'metalPipeMitered',
  'metalPipeProjecting',
  'pipeBeveledRing',
  'boxWingwalls30to75',
  'boxWingwalls90or15',
  'boxWingwallsParallel',
  'boxFlared45Beveled',
  'boxFlared18to34Beveled',
] as const;

export type CulvertInlet = (typeof CULVERT_INLET_NAMES)[number];

interface CulvertBase extends StructureBase {
  kind: 'culvert';
  /** Number of equal barrels */
  barrels: number;
  /** Manning's n of a barrel */
  n: number;
  length: number;
  /** Levels (m) of the inverts at both ends */
  invertUp: number;
  invertDown: number;
  /** Of the end at which water enters, whichever it is */
  inlet: CulvertInlet;
  /** What water flows over when the culvert cannot pass it: none where left out */
  crest?: CrestPoint[];
  /** C_d of the crest as a broad one; by default 1 */
  crestCoefficient?: number;
}

/** Barrels under a road. Sizes are inner ones in m. */
export type CulvertInput =
  | (CulvertBase & { shape: 'circular'; diameter: number })
  | (CulvertBase & { shape: 'box'; width: number; height: number });

export const PIER_SHAPE_NAMES = [
  'semicircular',
  'twinCylindersWithDiaphragm',
  'twinCylinders',
  'triangular',
  'square',
  'tenPileTrestle',
] as const;

/** A bridge over the river: its piers, its soffit and its deck. */
export interface BridgeInput extends StructureBase {
  kind: 'bridge';
  /** Nose and tail of the piers */
  piers: (typeof PIER_SHAPE_NAMES)[number];
  /** Share of the flow area that the piers take, 0 to 0.5 */
  obstructed: number;
  /** Level (m) of the underside of the deck */
  soffit: number;
  /** Coefficient of contraction under the soffit; by default 0.611 */
  contraction?: number;
  /** What water flows over above the deck: none where left out */
  deck?: CrestPoint[];
  /** C_d of the deck as a broad crest; by default 1 */
  deckCoefficient?: number;
}

/** What makes a dam begin to fail: a time (s), or the stage (m) of the water above it. */
export type BreachTrigger = { kind: 'time'; time: number } | { kind: 'stage'; stage: number };

/** A dam that fails: a crest in which a trapezoid grows. */
export interface BreachInput extends StructureBase {
  kind: 'breach';
  /** The top of the dam, over which water flows as over a broad crest */
  crest: CrestPoint[];
  trigger: BreachTrigger;
  mode: 'overtopping' | 'piping';
  growth: 'linear' | 'sine';
  /** s; 0: at once */
  formationTime: number;
  /** Offset (m) of the middle of the breach; by default of the middle of the crest */
  centre?: number;
  /** Of the full breach (m) */
  bottomWidth: number;
  /** Of the full breach (m) */
  bottomLevel: number;
  /** Horizontal to vertical */
  sideSlope: number;
  /** Where it begins (m): by default the crest at its middle; needed for piping */
  startLevel?: number;
  /** C of Q = C b h^1.5, m^0.5/s; by default 1.7 */
  weirCoefficient?: number;
  /** By default 0.6 */
  orificeCoefficient?: number;
}

export type StructureInput = WeirInput | SluiceInput | CulvertInput | BridgeInput | BreachInput;

export type StructureKind = StructureInput['kind'];

/** A level pool at the head of the reach. The structures at the first chainage stand in its dam. */
export interface ReservoirInput {
  /** Storage (m³) by stage (m), both rising; linear in between and beyond */
  stages: number[];
  volumes: number[];
  initialStage: number;
  inflow: { times: number[]; flows: number[] };
  /** Flow (m³/s) into the reach by stage of the pool (m), beside the structures */
  spillway?: { stages: number[]; flows: number[] };
}
