import { findRoot } from './tools/findRoot';

/** The front of a dam-break wave on a level dry bed with constant Darcy friction f: the water of the tip moves as a body
 *  with the speed U of the front, and its surface h² = f U² (x_s - x)/(4 g) balances friction; behind it stands Ritter's
 *  fan. Volume makes
 *
 *    T = (8/(3 f)) (1 - U/2)³/U²,   x_s = (3 U/2 - 1) T + (4/f)(1 - U/2)⁴/U²,   tip from x_1 = (3 U/2 - 1) T,
 *    depth there (1 - U/2)²         lengths in h0, speeds in √(g h0), T = t √(g/h0)
 *
 *  Approximate: the tip is not quite a body, and x_s by this volume moves faster than U (by a fifth where f T = 1).
 *  Friction slope f u²/(8 g h), that is, f = 8 g/C².
 *  Sources: G. B. Whitham (1955), Proc. R. Soc. A 227, 399-407; H. Chanson (2006), River Flow 2006 (closed form). */
export interface RoughFront {
  /** Speed of the front over √(g h0). */
  celerity: number;
  /** Places of the front and of the start of the tip over h0, from the dam. */
  front: number;
  tipStart: number;
  /** Depth at the start of the tip over h0. */
  tipDepth: number;
}

export function roughFront(darcy: number, scaledTime: number): RoughFront {
  const time = (u: number) => ((8 / (3 * darcy)) * (1 - u / 2) ** 3) / (u * u);
  const celerity = findRoot((u) => time(u) - scaledTime, 1e-6, 2);
  const depthRoot = 1 - celerity / 2;
  const tipStart = (1.5 * celerity - 1) * scaledTime;
  return {
    celerity,
    tipStart,
    front: tipStart + ((4 / darcy) * depthRoot ** 4) / (celerity * celerity),
    tipDepth: depthRoot * depthRoot,
  };
}
