/** Yarnell's coefficients by the shape of nose and tail of the piers; see bridgeRise. */
export const PIER_SHAPES = {
  semicircular: 0.9,
  twinCylindersWithDiaphragm: 0.95,
  twinCylinders: 1.05,
  triangular: 1.05,
  square: 1.25,
  tenPileTrestle: 2.5,
} as const;

/**
 * Rise of the water (m) above piers that obstruct the share `alpha` of the flow area, for the depth (m) and the velocity
 * (m/s) below them: Δy = 2 K (K + 10 w - 0.6)(α + 15 α⁴) V²/2g, w = (V²/2g)/y. D. L. Yarnell (1934), Bridge piers as
 * channel obstructions, USDA Technical Bulletin 442 (from memory). Later measurements found it to be on the high side.
 */
export function bridgeRise(
  coefficient: number,
  alpha: number,
  depth: number,
  velocity: number,
  gravity: number,
): number {
  const head = velocity ** 2 / (2 * gravity);
  const w = head / depth;
  return 2 * coefficient * (coefficient + 10 * w - 0.6) * (alpha + 15 * alpha ** 4) * head;
}

/** The velocity (m/s) below the piers that makes a rise (m): the root of the quadratic in V²/2g that the above is. */
export function velocityOfRise(
  coefficient: number,
  alpha: number,
  depth: number,
  rise: number,
  gravity: number,
): number {
  const m = 2 * coefficient * (alpha + 15 * alpha ** 4);
  const b = coefficient - 0.6;
  const a = 10 / depth;
  const head = (2 * rise) / (m * (b + Math.sqrt(b * b + (4 * a * rise) / m)));
  return Math.sqrt(2 * gravity * head);
}
