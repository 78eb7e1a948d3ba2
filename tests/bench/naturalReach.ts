import type { CaseFile, SectionInput } from '../../shared/case/caseFile';

/** Numbers in 0..1, the same for the same seed: a linear congruential generator (Numerical Recipes constants). */
export function seededRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1664525 + 1013904223) % 4294967296;
    return state / 4294967296;
  };
}

/** A river of `length` m with banks and flood plains, surveyed every 500 m, falling by 1 in 1000. */
export function naturalReach(length: number, cellSize: number): CaseFile {
  const random = seededRandom(7);
  const sections: SectionInput[] = [];
  for (let k = 0; k * 500 <= length; k++) {
    const bed = 100 + (length - k * 500) * 0.001 + 0.3 * random();
    const width = 25 + 10 * random();
    sections.push({
      id: `R${k + 1}`,
      chainage: k * 500,
      points: [
        [0, bed + 8],
        [5 + 10 * random(), bed + 4 + random()],
        [80, bed + 3.2],
        [83, bed + 0.5 + random()],
        [83 + 0.4 * width, bed],
        [83 + 0.7 * width, bed + 0.2],
        [83 + width, bed + 2],
        [86 + width, bed + 3.3],
        [150 + width, bed + 3.8 + random()],
        [170 + width + 20 * random(), bed + 8],
      ],
      roughness: [
        [0, 0.06],
        [80, 0.035],
        [86 + width, 0.06],
      ],
      banks: [80, 86 + width],
    });
  }
  return {
    format: 'spate-case/1',
    title: 'Benchmark reach',
    sections,
    upstream: { kind: 'inflow', times: [0, 7200, 14400, 36000], flows: [60, 400, 700, 60] },
    downstream: { kind: 'normalDepth', slope: 0.001 },
    laterals: [],
    structures: [],
    initial: { kind: 'steady' },
    numerics: { cellSize, duration: 43200, outputInterval: 1800 },
  };
}
