import { parabolicBowl } from '@/server/solvers/exact/parabolicBowl';

describe('water swaying in a parabolic trough', () => {
  const G = 9.81;
  const bowl = parabolicBowl(G, 0.5, 1, 0.5 * Math.sqrt(G));

  it('meets the equations of motion', () => {
    // Centred differences of step 1e-4 leave about 1e-7 of derivatives of order 10.
    const d = 1e-4;
    for (const time of [0.3, 0.9, 1.7]) {
      for (const x of [-0.4, 0.1, 0.3]) {
        const rate = (bowl.depth(x, time + d) - bowl.depth(x, time - d)) / (2 * d);
        const spread = (bowl.depth(x + d, time) - bowl.depth(x - d, time)) / (2 * d);
        expect(rate + bowl.velocity(time) * spread).toBeCloseTo(0, 6);
        const acceleration = (bowl.velocity(time + d) - bowl.velocity(time - d)) / (2 * d);
        const slope = (bowl.stage(x + d, time) - bowl.stage(x - d, time)) / (2 * d);
        expect(acceleration + G * slope).toBeCloseTo(0, 6);
      }
    }
  });

  it('returns after a period with the same water', () => {
    const volume = (time: number) => {
      let sum = 0;
      for (let i = 0; i < 4000; i++) sum += bowl.depth(-2 + (i + 0.5) / 1000, time) / 1000;
      return sum;
    };
    expect(bowl.depth(0.3, bowl.period)).toBeCloseTo(bowl.depth(0.3, 0), 12);
    // 4/3 h0 a; the shores cut cells, which costs about 1e-6.
    for (const time of [0, 0.4, 1.1]) expect(volume(time)).toBeCloseTo(2 / 3, 5);
  });
});
