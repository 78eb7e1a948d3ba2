import type { Workspace } from '../workspace';

/** Van Leer's limited difference of one-sided differences a and b: their harmonic mean, 0 at an extremum. */
export function vanLeer(a: number, b: number): number {
  const product = a * b;
  return product > 0 ? (2 * product) / (a + b) : 0;
}

/** End cells know one side only: its difference, at most twice their neighbour's slope and of the same sign. */
export function oneSided(difference: number, neighbour: number): number {
  if (difference * neighbour <= 0) return 0;
  const most = 2 * Math.abs(neighbour);
  return Math.max(-most, Math.min(most, difference));
}

/**
 * Second-order reconstruction: limited differences over each cell of stage (m) and flow (m³/s), into `slopeStage` and
 * `slopeFlow`. No slope where a bed of the three cells reaches the water surface; the slope of the stage is at most
 * A/B, so that it empties no cell. Van Leer (1974), J. Comput. Phys. 14, 361-370.
 */
export function createLimitedSlopes(workspace: Workspace): () => void {
  const { n, stage, flow, reach, slopeStage, slopeFlow, slopeFloor } = workspace;
  const limitedEnds = createLimitedEnds(workspace);

  return function limitedSlopes(): void {
    if (n < 2) return;
    let etaI = stage[1];
    let etaJ = stage[2];
    let lowEta = etaJ - etaI;
    let lowQ = flow[2] - flow[1];
    for (let i = 2; i < n; i++) {
      const etaK = stage[i + 1];
      const highEta = etaK - etaJ;
      const highQ = flow[i + 1] - flow[i];
      const floor = slopeFloor[i];
      let sEta = 0;
      let sQ = 0;
      if (etaI > floor && etaJ > floor && etaK > floor) {
        const productEta = lowEta * highEta;
        if (productEta > 0) {
          sEta = (2 * productEta) / (lowEta + highEta);
          const most = 4 * reach[i];
          if (sEta > most) sEta = most;
          else if (sEta < -most) sEta = -most;
        }
        const productQ = lowQ * highQ;
        if (productQ > 0) sQ = (2 * productQ) / (lowQ + highQ);
      }
      slopeStage[i] = sEta;
      slopeFlow[i] = sQ;
      etaI = etaJ;
      etaJ = etaK;
      lowEta = highEta;
      lowQ = highQ;
    }
    limitedEnds();
  };
}

/** … of the first and the last cell, after those between them. */
export function createLimitedEnds(workspace: Workspace): () => void {
  const { n, stage, flow, reach, slopeStage, slopeFlow, slopeFloor } = workspace;

  function limitEnd(i: number, inner: number): void {
    const lo = i < inner ? i : inner;
    const hi = i < inner ? inner : i;
    const neighbourStage = n > 2 ? slopeStage[inner] : stage[hi] - stage[lo];
    const neighbourFlow = n > 2 ? slopeFlow[inner] : flow[hi] - flow[lo];
    slopeStage[i] = 0;
    slopeFlow[i] = 0;
    if (Math.min(stage[i], stage[inner]) <= Math.max(slopeFloor[i], slopeFloor[inner])) return;
    const most = 4 * reach[i];
    const s = oneSided(stage[hi] - stage[lo], neighbourStage);
    slopeStage[i] = Math.max(-most, Math.min(most, s));
    slopeFlow[i] = oneSided(flow[hi] - flow[lo], neighbourFlow);
  }

  return function limitedEnds() {
    if (n < 2) return;
    limitEnd(1, 2);
    limitEnd(n, n - 1);
  };
}
