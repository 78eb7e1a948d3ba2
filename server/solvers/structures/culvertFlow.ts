import { risingRoot } from '../boundaries/rootNear';
import { criticalDepthIn, type Barrel } from './barrel';
import type { InletConstants } from './culvertInlets';

/** Factor of the SI form of the inlet curves, with Q in m³/s, A in m² and D in m. */
const KU = 1.811;
/** Unsubmerged up to this KU Q/(A D^0.5) … */
const UNSUBMERGED = 3.5;
/** … submerged from here on; between them the curves are joined smoothly. */
const SUBMERGED = 4;

/**
 * Headwater (m above the invert at the inlet) that a flow (m³/s) needs in one barrel under inlet control, by the forms
 * of HDS-5 (culvertInlets.ts). Between 3.5 and 4 a cubic meets both curves with their values and slopes.
 */
export function inletHeadwater(
  barrel: Barrel,
  inlet: InletConstants,
  slope: number,
  flow: number,
  gravity: number,
): number {
  const { rise, fullArea } = barrel;
  const perX = (fullArea * Math.sqrt(rise)) / KU;
  const correction = (inlet.isMitered ? 0.7 : -0.5) * slope;

  function unsubmerged(x: number): number {
    const curve = inlet.K * x ** inlet.M;
    if (inlet.form === 2) return curve;
    const q = x * perX;
    const depth = criticalDepthIn(barrel, q, gravity);
    const a = barrel.area(depth);
    const energy = a > 0 ? depth + (q / a) ** 2 / (2 * gravity) : 0;
    return energy / rise + curve + correction;
  }
  const submerged = (x: number): number => inlet.c * x * x + inlet.Y + correction;

  const x = flow / perX;
  if (x <= UNSUBMERGED) return Math.max(0, rise * unsubmerged(x));
  if (x >= SUBMERGED) return rise * submerged(x);
  const span = SUBMERGED - UNSUBMERGED;
  const t = (x - UNSUBMERGED) / span;
  const low = unsubmerged(UNSUBMERGED);
  const high = submerged(SUBMERGED);
  const step = 1e-4;
  const lowSlope = ((unsubmerged(UNSUBMERGED) - unsubmerged(UNSUBMERGED - step)) / step) * span;
  const highSlope = 2 * inlet.c * SUBMERGED * span;
  return (
    rise *
    ((2 * t ** 3 - 3 * t * t + 1) * low +
      (t ** 3 - 2 * t * t + t) * lowSlope +
      (3 * t * t - 2 * t ** 3) * high +
      (t ** 3 - t * t) * highSlope)
  );
}

/** Losses of full flow in velocity heads: exit, entrance and friction 2 g n² L/R^(4/3). */
export function fullLosses(
  barrel: Barrel,
  inlet: InletConstants,
  n: number,
  length: number,
  gravity: number,
): number {
  const radius = barrel.fullArea / barrel.fullPerimeter;
  return 1 + inlet.loss + (2 * gravity * n * n * length) / radius ** (4 / 3);
}

/**
 * Headwater (m above the invert at the inlet) under outlet control, H + h_o - L S with h_o = max(tailwater,
 * (y_c + D)/2), tailwater in m above the invert at the outlet. HDS-5 holds it good for headwater above 0.75 D.
 */
export function outletHeadwater(
  barrel: Barrel,
  losses: number,
  fall: number,
  flow: number,
  tailwater: number,
  gravity: number,
): number {
  const head = (losses * (flow / barrel.fullArea) ** 2) / (2 * gravity);
  const outlet = 0.5 * (criticalDepthIn(barrel, flow, gravity) + barrel.rise);
  return head + Math.max(tailwater, outlet) - fall;
}

/**
 * Headwater (m above the invert at the inlet) for a free outfall from a barrel that does not run full: critical depth at
 * the outlet, the profile up the barrel by the standard step, and the entrance loss. Where the
 * barrel fills: Infinity; 0 where the barrel is so steep that it flows supercritical and its inlet rules.
 */
export function freeSurfaceHeadwater(
  barrel: Barrel,
  entrance: number,
  n: number,
  length: number,
  fall: number,
  flow: number,
  gravity: number,
): number {
  if (!(flow > 0)) return 0;
  const critical = criticalDepthIn(barrel, flow, gravity);
  const top = barrel.rise * (1 - 1e-6);
  if (critical >= top) return Infinity;
  const steps = 25;
  const step = 0.01 * barrel.rise;
  const dx = length / steps;
  const velocityHead = (depth: number): number => (flow / barrel.area(depth)) ** 2 / (2 * gravity);
  const friction = (depth: number): number => {
    const a = barrel.area(depth);
    return ((n * flow) / a) ** 2 / (a / barrel.perimeter(depth)) ** (4 / 3);
  };
  let depth = critical;
  for (let k = 0; k < steps; k++) {
    const known = depth + velocityHead(depth) + 0.5 * dx * friction(depth) - (fall / length) * dx;
    const excess = (y: number): number => y + velocityHead(y) - 0.5 * dx * friction(y) - known;
    if (excess(top) < 0) return Infinity;
    // Above critical depth the energy rises with the depth; on a steep barrel depth stays critical.
    if (excess(critical) >= 0) {
      depth = critical;
      continue;
    }
    depth = Math.min(top, risingRoot(excess, critical, step));
  }
  if (depth === critical) return 0;
  return depth + (1 + entrance) * velocityHead(depth);
}
