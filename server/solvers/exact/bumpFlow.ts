import { findRoot } from './tools/findRoot';

/** Steady frictionless flow over a bump, z = 0.2 - 0.05 (x - 10)² for 8 < x < 12 and 0 elsewhere, in a channel of
 *  unit width and 25 m length. The energy h + z + q²/(2 g h²) is constant but across a jump, where
 *  q²/h + g h²/2 is. The flow passes critical depth at the crest, or nowhere.
 *
 *  q flow, m²/s; h depth, m; z bed, m.
 *  Source: N. Goutal & F. Maurel (eds., 1997), Proceedings of the 2nd Workshop on Dam-Break Wave Simulation,
 *  EDF report HE-43/97/016/B (parameters from memory). */
export interface BumpFlow {
  length: number;
  /** m²/s */
  flow: number;
  /** Stage that holds the flow at the outlet, m; null where it leaves supercritical. */
  outletStage: number | null;
  /** Chainage of the jump, m. */
  jumpAt: number | null;
  bed(x: number): number;
  depth(x: number): number;
}

export type BumpRegime = 'subcritical' | 'transcritical' | 'jump';

const LENGTH = 25;
const CREST = 10;
const END_OF_BUMP = 12;

export function bumpBed(x: number): number {
  return Math.max(0, 0.2 - 0.05 * (x - CREST) ** 2);
}

export function bumpFlow(regime: BumpRegime, gravity: number): BumpFlow {
  const flow = { subcritical: 4.42, transcritical: 1.53, jump: 0.18 }[regime];
  const outletStage = { subcritical: 2, transcritical: null, jump: 0.33 }[regime];
  const critical = Math.cbrt((flow * flow) / gravity);
  const velocityHead = (h: number) => (flow * flow) / (2 * gravity * h * h);
  const headBelow = outletStage === null ? 0 : outletStage + velocityHead(outletStage);
  const headAbove = regime === 'subcritical' ? headBelow : 1.5 * critical + bumpBed(CREST);

  const branch = (energy: number, low: number, high: number) =>
    energy <= 1.5 * critical ? critical : findRoot((h) => h + velocityHead(h) - energy, low, high);
  const slow = (energy: number) => branch(energy, critical, energy);
  const fast = (energy: number) => branch(energy, 1e-3 * critical, critical);

  const depthBefore = (x: number) =>
    regime === 'subcritical' || x <= CREST
      ? slow(headAbove - bumpBed(x))
      : fast(headAbove - bumpBed(x));
  const depthAfter = (x: number) => slow(headBelow - bumpBed(x));
  const force = (h: number) => (flow * flow) / h + (gravity * h * h) / 2;
  const jumpAt =
    regime === 'jump'
      ? findRoot((x) => force(depthBefore(x)) - force(depthAfter(x)), CREST + 1, END_OF_BUMP)
      : null;

  return {
    length: LENGTH,
    flow,
    outletStage,
    jumpAt,
    bed: bumpBed,
    depth: (x) => (jumpAt !== null && x > jumpAt ? depthAfter(x) : depthBefore(x)),
  };
}
