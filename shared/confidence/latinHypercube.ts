import { seededRandom } from '../numbers/seededRandom';

/**
 * Latin hypercube sample: `members` points in the unit cube of `dimensions`, [member][dimension]. In each dimension every one of
 * the `members` equal strata holds exactly one point, at a random place in it; the strata of the dimensions are paired at
 * random. The same seed gives the same points.
 * Source: M. D. McKay, R. J. Beckman, W. J. Conover (1979), Technometrics 21(2), 239-245.
 */
export function latinHypercube(members: number, dimensions: number, seed: number): number[][] {
  const random = seededRandom(seed);
  const points = Array.from({ length: members }, () => new Array<number>(dimensions));
  for (let d = 0; d < dimensions; d++) {
    const strata = shuffled(members, random);
    for (let m = 0; m < members; m++) points[m][d] = (strata[m] + random()) / members;
  }
  return points;
}

/** 0..count-1 in random order (R. Durstenfeld 1964, Commun. ACM 7(7), 420). */
function shuffled(count: number, random: () => number): number[] {
  const order = Array.from({ length: count }, (_, k) => k);
  for (let k = count - 1; k > 0; k--) {
    const other = Math.floor(random() * (k + 1));
    [order[k], order[other]] = [order[other], order[k]];
  }
  return order;
}
