/** Repeatable uniform numbers in [0, 1): a 32-bit state stepped by a constant and scrambled (splitmix type,
 *  G. L. Steele, D. Lea & C. H. Flood, 2014, OOPSLA). */
export function seededRandom(seed: number): () => number {
  let state = seed | 0;
  return () => {
    state = (state + 0x9e3779b9) | 0;
    let z = state ^ (state >>> 16);
    z = Math.imul(z, 0x21f0aaad);
    z ^= z >>> 15;
    z = Math.imul(z, 0x735a2d97);
    z ^= z >>> 15;
    return (z >>> 0) / 4294967296;
  };
}
