/** [offset, level] pairs of a crest, one after the other (m). */
export type Crest = Float64Array;

export function crestOf(points: readonly (readonly [number, number])[]): Crest {
  return Float64Array.from(points.flat());
}

/** h^1.5, many times faster than a power */
export function power15(h: number): number {
  return h * Math.sqrt(h);
}

/**
 * ∫ (z - crest)^1.5 ds (m^2.5) of water that stands at z over a straight piece of crest of length `length`, from level
 * `a` to level `b`: exact, 0.4 L (h_a^2.5 - h_b^2.5)/(h_a - h_b).
 */
export function pieceHead(z: number, length: number, a: number, b: number): number {
  const high = z - Math.min(a, b);
  if (!(high > 0) || !(length > 0)) return 0;
  const low = z - Math.max(a, b);
  const rise = high - low;
  if (low > 0 && rise < 0.02 * high) {
    const middle = 0.5 * (high + low);
    return (length * (power15(high) + 4 * power15(middle) + power15(low))) / 6;
  }
  const rest = low > 0 ? low * power15(low) : 0;
  return (0.4 * length * (high * power15(high) - rest)) / rise;
}

/** ∫ (z - crest)^1.5 ds over the whole crest (m^2.5). */
export function crestHead(crest: Crest, z: number): number {
  let sum = 0;
  for (let k = 2; k < crest.length; k += 2) {
    sum += pieceHead(z, crest[k] - crest[k - 2], crest[k - 1], crest[k + 1]);
  }
  return sum;
}

/** Lowest level of a crest (m). */
export function crestLow(crest: Crest): number {
  let low = Infinity;
  for (let k = 1; k < crest.length; k += 2) low = Math.min(low, crest[k]);
  return low;
}

/**
 * What tailwater leaves of a free flow, (1 - Q2/Q1)^0.385, with the flows that the stages below and above would make on
 * their own: (h2/h1)^1.5 for a level crest, ^2.5 for a notch. J. R. Villemonte (1947), Submerged-weir discharge studies,
 * Engineering News-Record, 25 December 1947, p. 866.
 */
export function drowning(below: number, above: number): number {
  if (below <= 0) return 1;
  return below < above ? (1 - below / above) ** 0.385 : 0;
}

/** (2/3)^1.5 sqrt(g), m^0.5/s: critical depth over a broad crest, Q = C_d of it b H^1.5 (H energy head; Bos 1989). */
export function broadCoefficient(gravity: number): number {
  return (2 / 3) ** 1.5 * Math.sqrt(gravity);
}

/** (2/3) sqrt(2g), m^0.5/s: Q = C_d of it b h^1.5 over a sharp crest. */
export function sharpCoefficient(gravity: number): number {
  return (2 / 3) * Math.sqrt(2 * gravity);
}

/** 0.611 + 0.08 h/P: Rehbock's coefficient in its short form (Henderson 1966), held where h/P leaves its range. */
export function rehbock(head: number, height: number): number {
  return 0.611 + 0.08 * Math.min(5, head / Math.max(height, 1e-6));
}
