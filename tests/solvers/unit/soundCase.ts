import type { CaseFile } from '../../../shared/case/caseFile';

/** A small case without fault: 1 km of natural-looking river. */
export function soundCase(): CaseFile {
  return {
    format: 'spate-case/1',
    title: 'Sound',
    gravity: 9.81,
    sections: [0, 500, 1000].map((chainage, k) => ({
      id: `S${k + 1}`,
      chainage,
      points: [
        [0, 14 - k],
        [10, 11 - k],
        [14, 10 - k],
        [20, 11.2 - k],
        [30, 14 - k],
      ],
      roughness: [
        [0, 0.06],
        [10, 0.035],
        [20, 0.06],
      ],
      banks: [10, 20],
    })),
    upstream: { kind: 'inflow', times: [0, 600], flows: [5, 20] },
    downstream: { kind: 'normalDepth', slope: 0.002 },
    laterals: [],
    structures: [],
    initial: { kind: 'steady' },
    numerics: { cellSize: 50, duration: 1800, outputInterval: 300 },
  };
}
