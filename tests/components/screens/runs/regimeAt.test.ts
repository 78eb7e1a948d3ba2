import { regimeAt } from '@/components/screens/runs/results/regimeAt';

const regimes = [
  { time: 0, regime: 'dry' },
  { time: 600, regime: 'free' },
  { time: 1500, regime: 'drowned' },
] as const;

describe('how the water passes a structure at a moment', () => {
  it.each([
    [-1, 'dry'],
    [0, 'dry'],
    [599, 'dry'],
    [600, 'free'],
    [1499, 'free'],
    [9999, 'drowned'],
  ])('at %d s', (t, regime) => {
    expect(regimeAt([...regimes], t).regime).toBe(regime);
  });
});
