import type { CulvertInlet, BridgeInput, StructureKind } from '../case/structures';
import type { StructureRegime } from '../case/resultFile';

/** What stands in the river of a run: its structures, and the spillway of a reservoir beside them. */
export type StandingKind = StructureKind | 'spillway';

/** Names of it, as every screen, file and report tells them. */
export const STRUCTURE_NAMES: Record<StandingKind, string> = {
  weir: 'Weir',
  sluice: 'Sluice',
  culvert: 'Culvert',
  bridge: 'Bridge',
  breach: 'Failing dam',
  spillway: 'Spillway',
};

export const CULVERT_INLET_WORDS: Record<CulvertInlet, string> = {
  concretePipeSquareEdge: 'Concrete pipe, square edge in a headwall',
  concretePipeGrooveHeadwall: 'Concrete pipe, groove end in a headwall',
  concretePipeGrooveProjecting: 'Concrete pipe, groove end projecting',
  metalPipeHeadwall: 'Corrugated metal pipe in a headwall',
  metalPipeMitered: 'Corrugated metal pipe, mitred to the slope',
  metalPipeProjecting: 'Corrugated metal pipe, projecting',
  pipeBeveledRing: 'Pipe with a bevelled ring, 45°',
  boxWingwalls30to75: 'Box, wingwalls flared 30° to 75°',
  boxWingwalls90or15: 'Box, wingwalls flared 90° or 15°',
  boxWingwallsParallel: 'Box, wingwalls parallel to it',
  boxFlared45Beveled: 'Box, wingwalls 45°, top edge bevelled',
  boxFlared18to34Beveled: 'Box, wingwalls 18° to 34°, top edge bevelled',
};

export const PIER_WORDS: Record<BridgeInput['piers'], string> = {
  semicircular: 'Semicircular nose and tail',
  twinCylindersWithDiaphragm: 'Twin cylinders with a diaphragm',
  twinCylinders: 'Twin cylinders without a diaphragm',
  triangular: 'Triangular nose and tail, 90°',
  square: 'Square nose and tail',
  tenPileTrestle: 'Trestle of ten piles',
};

/** How the water passes, in words that end a sentence: `from 2 h 10 drowned`. */
export const REGIME_WORDS: Record<StructureRegime, string> = {
  dry: 'no water passes',
  closed: 'closed',
  free: 'free flow over the crest',
  drowned: 'drowned from below',
  pipe: 'flow through a pipe in the dam',
  drownedPipe: 'flow through a drowned pipe in the dam',
  gate: 'free jet under the gate',
  drownedGate: 'drowned jet under the gate',
  rating: 'flow by its rating',
  inletControl: 'held by its inlet',
  outletControl: 'held by its barrel and outlet',
  overtopped: 'overtopped',
};

/** The same in a word or two, for drawings. */
export const REGIME_LABELS: Record<StructureRegime, string> = {
  dry: 'no flow',
  closed: 'closed',
  free: 'free',
  drowned: 'drowned',
  pipe: 'pipe',
  drownedPipe: 'drowned pipe',
  gate: 'free jet',
  drownedGate: 'drowned jet',
  rating: 'spilling',
  inletControl: 'inlet control',
  outletControl: 'outlet control',
  overtopped: 'overtopped',
};

export const REGIMES = Object.keys(REGIME_WORDS) as StructureRegime[];
