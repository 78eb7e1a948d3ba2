/**
 * Minimum of f over a box by the simplex method of Nelder & Mead (1965), Computer Journal 7(4), 308-313, with its
 * coefficients 1 (reflection), 2 (expansion), 1/2 (contraction, shrinkage). Points outside the box are moved onto it, and a
 * simplex that has settled is spread out once more around the best point to find out whether it only got stuck, as
 * Luersen & Le Riche (2004), Computers & Structures 82, 2251-2260, do. Needs no derivatives; every point is a whole run, so
 * the number of evaluations is the budget. Where f cannot be evaluated it answers Infinity.
 */
export interface SimplexOptions {
  low: readonly number[];
  high: readonly number[];
  /** First step along each axis, of one length with the box. */
  step: readonly number[];
  /** Settled when all corners lie this near to the best along each axis. */
  near: number;
  budget: number;
}

export interface SimplexEnd {
  x: number[];
  value: number;
  evaluations: number;
  why: 'settled' | 'budget';
}

interface Corner {
  x: number[];
  value: number;
}

class BudgetSpent extends Error {}

/** A restart that gains less than this share was not worth more. */
const WORTH = 0.005;
/** The second simplex is this part of the first. */
const SPREAD = 0.4;

export async function nelderMead(
  f: (x: number[]) => Promise<number>,
  start: readonly number[],
  { low, high, step, near, budget }: SimplexOptions,
): Promise<SimplexEnd> {
  let evaluations = 0;
  let best: Corner = { x: [...start], value: Infinity };
  const inBox = (x: readonly number[]) =>
    x.map((value, i) => Math.min(high[i], Math.max(low[i], value)));
  const at = async (wanted: readonly number[]): Promise<Corner> => {
    if (evaluations >= budget) throw new BudgetSpent();
    const x = inBox(wanted);
    const value = await f(x);
    evaluations++;
    if (value < best.value) best = { x, value };
    return { x, value };
  };

  const simplexAround = async (centre: Corner | null, share: number): Promise<Corner[]> => {
    const origin = centre ?? (await at(start));
    const corners = [origin];
    for (let i = 0; i < origin.x.length; i++) {
      const x = [...origin.x];
      // Into the box where the step would leave it.
      x[i] += x[i] + share * step[i] > high[i] ? -share * step[i] : share * step[i];
      corners.push(await at(x));
    }
    return corners;
  };

  try {
    let corners = await simplexAround(null, 1);
    for (;;) {
      await settle(corners, at, near);
      const settled = best;
      corners = await simplexAround(best, SPREAD);
      await settle(corners, at, near);
      if (!(best.value < (1 - WORTH) * settled.value)) break;
    }
    return { ...best, evaluations, why: 'settled' };
  } catch (error) {
    if (!(error instanceof BudgetSpent)) throw error;
    return { ...best, evaluations, why: 'budget' };
  }
}

/** Moves the corners until they lie near one another. */
async function settle(
  corners: Corner[],
  at: (x: readonly number[]) => Promise<Corner>,
  near: number,
): Promise<void> {
  const n = corners.length - 1;
  for (;;) {
    corners.sort((a, b) => a.value - b.value);
    if (isSmall(corners, near)) return;
    const worst = corners[n];
    const centre = worst.x.map(
      (_, i) => corners.slice(0, n).reduce((sum, corner) => sum + corner.x[i], 0) / n,
    );
    const along = (factor: number) => centre.map((c, i) => c + factor * (worst.x[i] - c));
    const reflected = await at(along(-1));
    if (reflected.value < corners[0].value) {
      const expanded = await at(along(-2));
      corners[n] = expanded.value < reflected.value ? expanded : reflected;
      continue;
    }
    if (reflected.value < corners[n - 1].value) {
      corners[n] = reflected;
      continue;
    }
    const contracted = await at(along(reflected.value < worst.value ? -0.5 : 0.5));
    if (contracted.value < Math.min(reflected.value, worst.value)) {
      corners[n] = contracted;
      continue;
    }
    for (let k = 1; k <= n; k++)
      corners[k] = await at(corners[k].x.map((value, i) => (value + corners[0].x[i]) / 2));
  }
}

const isSmall = ([best, ...others]: Corner[], near: number) =>
  others.every(({ x }) => x.every((value, i) => Math.abs(value - best.x[i]) <= near));
