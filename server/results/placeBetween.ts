/** Two neighbours of a chainage among places, and the share of the second: 0 is wholly the first. */
export interface Between {
  lower: number;
  upper: number;
  share: number;
}

/** A place this near is meant exactly, m: far below what a survey resolves, far above rounding of an address. */
export const SAME_CHAINAGE = 1e-3;

/** `chainages` grow. Outside them, null; at a place itself, that place alone. */
export function placeBetween(chainages: ArrayLike<number>, chainage: number): Between | null {
  const last = chainages.length - 1;
  if (last < 0) return null;
  if (chainage < chainages[0] - SAME_CHAINAGE || chainage > chainages[last] + SAME_CHAINAGE) {
    return null;
  }
  let lower = 0;
  let upper = last;
  while (upper - lower > 1) {
    const middle = (lower + upper) >> 1;
    if (chainages[middle] <= chainage) lower = middle;
    else upper = middle;
  }
  if (Math.abs(chainage - chainages[lower]) <= SAME_CHAINAGE) {
    return { lower, upper: lower, share: 0 };
  }
  if (Math.abs(chainage - chainages[upper]) <= SAME_CHAINAGE) {
    return { lower: upper, upper, share: 0 };
  }
  const share = (chainage - chainages[lower]) / (chainages[upper] - chainages[lower]);
  return { lower, upper, share };
}

/** Linear between two values; exact where they are equal or the share is 0. */
export const mix = (a: number, b: number, share: number): number =>
  share === 0 ? a : a + share * (b - a);
