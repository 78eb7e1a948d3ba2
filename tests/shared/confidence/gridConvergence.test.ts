import { gridConvergence } from '@/shared/confidence/gridConvergence';

it('gives the worked example of the NASA tutorial on spatial convergence', () => {
  // f = 0.97050, 0.96854, 0.96178 on grids halved twice: p = 1.786, f = 0.97130, GCI 0.1031 % and 0.3562 % as published.
  const found = gridConvergence([0.9705, 0.96854, 0.96178], [1, 2, 4]);
  expect(found.order).toBeCloseTo(1.78617, 6);
  expect(found.extrapolated).toBeCloseTo(0.9713003, 7);
  expect(found.gciFine).toBeCloseTo(0.001030826, 8);
  expect(found.gciCoarse).toBeCloseTo(0.003562493, 8);
  expect(found.kind).toBe('monotone');
});

/** I. B. Celik et al. (2008), J. Fluids Eng. 130, 078001, table 1; from memory, recomputed. Two-dimensional cell counts. */
const CELIK = [
  {
    cells: [18000, 8000, 4500],
    values: [6.063, 5.972, 5.863],
    p: 1.534,
    extrapolated: 6.1685,
    gci: 0.0217,
    kind: 'monotone',
  },
  {
    cells: [18000, 4500, 980],
    values: [10.788, 10.725, 10.605],
    p: 0.7519,
    extrapolated: 10.8801,
    gci: 0.0107,
    kind: 'monotone',
  },
  {
    cells: [18000, 4500, 980],
    values: [6.0042, 5.9624, 6.0909],
    p: 1.5077,
    extrapolated: 6.0269,
    gci: 0.00472,
    kind: 'oscillating',
  },
] as const;

it.each(CELIK)('gives the published order and index of $values', (row) => {
  const sizes = row.cells.map((n) => 1 / Math.sqrt(n)) as [number, number, number];
  const found = gridConvergence([...row.values], sizes);
  expect(found.order).toBeCloseTo(row.p, 3);
  expect(found.extrapolated).toBeCloseTo(row.extrapolated, 3);
  expect(found.gciFine).toBeCloseTo(row.gci, 4);
  expect(found.kind).toBe(row.kind);
});

it('says so where nothing changes or nothing converges', () => {
  expect(gridConvergence([1, 1, 2], [1, 2, 4]).kind).toBe('unchanged');
  expect(gridConvergence([4, 2, 1], [1, 2, 4]).kind).toBe('diverging');
  expect(() => gridConvergence([1, 2, 3], [4, 2, 1])).toThrow(RangeError);
});
