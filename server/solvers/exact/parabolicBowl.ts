/** Water swaying without friction in a trough of parabolic bed, its surface plane and its two shores moving:
 *
 *    z = h0 (X/a)²,   h = max(0, h0 [1 - (X/a + δ cos ωt)²]),   u = V sin ωt
 *    ω = √(2 g h0)/a,   δ = V/√(2 g h0)
 *
 *  X distance from the lowest point, m; h0 still-water depth there, m; a half the still-water length, m;
 *  V largest velocity, m/s. Rectangular section.
 *  Source: W. C. Thacker (1981), J. Fluid Mech. 107, 499-508 (plane surface, one dimension). */
export interface ParabolicBowl {
  period: number;
  bed(x: number): number;
  depth(x: number, time: number): number;
  stage(x: number, time: number): number;
  velocity(time: number): number;
}

export function parabolicBowl(
  gravity: number,
  stillDepth: number,
  halfLength: number,
  peakVelocity: number,
): ParabolicBowl {
  const speed = Math.sqrt(2 * gravity * stillDepth);
  const omega = speed / halfLength;
  const bed = (x: number) => stillDepth * (x / halfLength) ** 2;
  const shift = (time: number) => (peakVelocity / speed) * Math.cos(omega * time);
  /** The plane of the surface, carried on beyond the shores. */
  const stage = (x: number, time: number) =>
    stillDepth * (1 - shift(time) ** 2 - (2 * shift(time) * x) / halfLength);
  return {
    period: (2 * Math.PI) / omega,
    bed,
    stage,
    depth: (x, time) => Math.max(0, stage(x, time) - bed(x)),
    velocity: (time) => peakVelocity * Math.sin(omega * time),
  };
}
