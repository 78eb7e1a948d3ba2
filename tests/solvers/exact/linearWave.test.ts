import { diffusionWave } from '@/server/solvers/exact/diffusionWave';
import { linearWave } from '@/server/solvers/exact/linearWave';
import { parabola, trapezoid, wideRectangle } from '@/server/solvers/exact/prismaticSection';

const G = 9.81;

describe('small waves on uniform flow', () => {
  // Celerities of Manning's formula in wide sections, 5/3, 4/3 and 13/9 of the velocity (V. M. Ponce, 1991, from memory).
  it.each([
    ['rectangle', wideRectangle(1), 5 / 3],
    ['triangle', trapezoid(0, 200), 4 / 3],
    ['parabola', parabola(1000), 13 / 9],
  ])('travel in a wide %s at %s of the water', (_name, section, ratio) => {
    const { kinematicCelerity, velocity } = linearWave(section, G, 0.03, 0.001, 50);
    expect(kinematicCelerity / velocity).toBeCloseTo(ratio, 3);
  });

  // q, n, S0: depth, velocity, celerity, Froude number, diffusivity with inertia; computed apart from this program.
  it.each([
    [5, 0.035, 0.0005, 3.436622, 1.454917, 2.424861, 0.25058, 4860.471],
    [2, 0.03, 0.001, 1.468557, 1.361881, 2.269802, 0.35881, 942.782],
    [10, 0.03, 0.0002, 6.251205, 1.599692, 2.666153, 0.20428, 24536.343],
  ])(
    'on %f m²/s, n %f, slope %f',
    (q, n, slope, depth, velocity, celerity, froude, diffusivity) => {
      const wave = linearWave(wideRectangle(1), G, n, slope, q);
      expect(wave.depth).toBeCloseTo(depth, 6);
      expect(wave.velocity).toBeCloseTo(velocity, 6);
      expect(wave.kinematicCelerity).toBeCloseTo(celerity, 5);
      expect(wave.froude).toBeCloseTo(froude, 5);
      expect(wave.diffusivity / diffusivity).toBeCloseTo(1, 6);
    },
  );

  it('are diffusion waves when slow and gravity waves when fast', () => {
    const wave = linearWave(wideRectangle(1), G, 0.03, 0.001, 2);
    const slow = wave.sinusoid(10 * 86_400);
    const like = diffusionWave(wave.kinematicCelerity, wave.diffusivity).sinusoid(10 * 86_400);
    expect(slow.decay / like.decay).toBeCloseTo(1, 3);
    expect(slow.waveNumber / like.waveNumber).toBeCloseTo(1, 5);
    const fast = (2 * Math.PI) / wave.sinusoid(1).waveNumber;
    expect(fast).toBeCloseTo(wave.velocity + Math.sqrt(G * wave.depth), 3);
  });

  it('meet the equations of a small wave', () => {
    const { depth, velocity, kinematicCelerity, sinusoid } = linearWave(
      wideRectangle(1),
      G,
      0.03,
      0.001,
      2,
    );
    const omega = (2 * Math.PI) / 5000;
    const { decay, waveNumber } = sinusoid(5000);
    // λ = -decay - i waveNumber in (c² - V²) λ² - (r c_k + 2 i V ω) λ + ω² - i r ω = 0, real and imaginary part.
    const r = (2 * G * 0.001) / velocity;
    const a = G * depth - velocity * velocity;
    const real =
      a * (decay * decay - waveNumber * waveNumber) +
      r * kinematicCelerity * decay -
      2 * velocity * omega * waveNumber +
      omega * omega;
    const imaginary =
      2 * a * decay * waveNumber +
      r * kinematicCelerity * waveNumber +
      2 * velocity * omega * decay -
      r * omega;
    expect(Math.abs(real)).toBeLessThan(1e-12 * r);
    expect(Math.abs(imaginary)).toBeLessThan(1e-12 * r);
  });
});
