/** Failing dam on a level dry bed with a little Chezy friction, S_f = u|u|/(C² h): the first correction of Ritter's fan.
 *  With c0 = √(g h0), ξ = x/(c0 t), R = g²/C² (R t is a speed), x = 0 at the dam
 *
 *    √(g h) = c0 (2 - ξ)/3 + R t α1,   u = 2 c0 (1 + ξ)/3 + R t α2
 *    α1 = 6/(5 (2 - ξ)) - 2/3 + (4√3/135)(2 - ξ)^1.5
 *    α2 = 12/(2 - ξ) - 8/3 + (8√3/189)(2 - ξ)^1.5 - 108/(7 (2 - ξ)²)
 *
 *  for -1 < ξ, up to the tip, which begins where u is largest. Good while R t is small beside c0.
 *
 *  Source: R. F. Dressler (1952), J. Res. Natl. Bur. Stand. 49(3), 217-225 (from memory; both equations of motion are
 *  met to first order, see its test). */
export interface DresslerWave {
  /** m; x m below the dam (negative above), t in s. */
  depth(x: number, time: number): number;
  /** m/s */
  velocity(x: number, time: number): number;
  /** Where the tip begins, ξ and x (m). */
  tip(time: number): { xi: number; x: number };
}

export function dresslerWave(gravity: number, stillDepth: number, chezy: number): DresslerWave {
  const c0 = Math.sqrt(gravity * stillDepth);
  const rate = (gravity / chezy) ** 2;
  const inside = (xi: number) => Math.min(2, Math.max(-1, xi));
  const depth = (x: number, time: number) => {
    const xi = inside(x / (c0 * time));
    return ((c0 * (2 - xi)) / 3 + rate * time * alpha1(xi)) ** 2 / gravity;
  };
  const velocityAt = (xi: number, time: number) =>
    (2 * c0 * (1 + xi)) / 3 + rate * time * alpha2(xi);
  return {
    depth,
    velocity: (x, time) => velocityAt(inside(x / (c0 * time)), time),
    tip(time) {
      // u rises to its only maximum in -1 < ξ < 2: golden section would do, a bisection of its slope is plainer.
      let low = -1;
      let high = 2 - 1e-9;
      for (let i = 0; i < 100; i++) {
        const xi = (low + high) / 2;
        const rises = (2 * c0) / 3 + rate * time * alpha2Slope(xi) > 0;
        if (rises) low = xi;
        else high = xi;
      }
      return { xi: low, x: low * c0 * time };
    },
  };
}

export function alpha1(xi: number): number {
  const s = 2 - xi;
  return 6 / (5 * s) - 2 / 3 + ((4 * Math.sqrt(3)) / 135) * s ** 1.5;
}

export function alpha2(xi: number): number {
  const s = 2 - xi;
  return 12 / s - 8 / 3 + ((8 * Math.sqrt(3)) / 189) * s ** 1.5 - 108 / (7 * s * s);
}

function alpha2Slope(xi: number): number {
  const s = 2 - xi;
  return 12 / (s * s) - ((12 * Math.sqrt(3)) / 189) * Math.sqrt(s) - 216 / (7 * s * s * s);
}
