/** Errors on one grid: of the surface (m) or area (m²), and of the flow (m³/s). */
export interface GridRow {
  cells: number;
  errors: [water: number, flow: number];
}

/** Observed order log(e1/e2)/log(n2/n1) between two grids; null where what is left is rounding, or the
 *  last of a flow that settles. */
export function orderBetween(coarse: GridRow, fine: GridRow, which: 0 | 1): number | null {
  const [e1, e2] = [coarse.errors[which], fine.errors[which]];
  if (!(e1 > SETTLED) || !(e2 > SETTLED)) return null;
  return Math.log(e1 / e2) / Math.log(fine.cells / coarse.cells);
}

const SETTLED = 1e-6;
