/** The linear diffusion wave, Q_t + c Q_x = D Q_xx on x > 0, for what a steady flow does when its inflow changes a little.
 *
 *    step of height 1 at x = 0, t = 0    Q = ½ [erfc((x - c t)/√(4 D t)) + exp(c x/D) erfc((x + c t)/√(4 D t))]
 *    inflow sin ωt                       Q = exp(-m x) sin(ω t - k x),   m + i k = [√(c² + 4 i ω D) - c]/(2 D)
 *
 *  c celerity dQ/dA, m/s; D hydraulic diffusivity, m²/s. In a river of mean slope S0, width B and uniform flow Q,
 *  D = Q/(2 B S0), and with the inertia of the water D = Q/(2 B S0) [1 - (c/V - 1)² Fr²].
 *
 *  Sources: S. Hayami (1951), On the propagation of flood waves, Disaster Prev. Res. Inst. Kyoto, Bull. 1; J. C. I. Dooge
 *  (1973), Linear Theory of Hydrologic Systems, USDA Tech. Bull. 1468; V. M. Ponce (1991), J. Hydraul. Eng. 117, 511-525. */
export interface DiffusionWave {
  /** Share of a step of the inflow that has come to x (m) at t (s). */
  step(x: number, time: number): number;
  /** Decay (1/m) and wave number (1/m) of a sinusoidal inflow of the given period (s). */
  sinusoid(period: number): { decay: number; waveNumber: number };
}

export function diffusionWave(celerity: number, diffusivity: number): DiffusionWave {
  return {
    step(x, time) {
      if (time <= 0) return x > 0 ? 0 : 1;
      const spread = Math.sqrt(4 * diffusivity * time);
      const behind = (x - celerity * time) / spread;
      const ahead = (x + celerity * time) / spread;
      // exp(c x/D) erfc(ahead) = exp(-behind²) erfcx(ahead): neither factor overflows.
      return 0.5 * (erfc(behind) + Math.exp(-behind * behind) * scaledErfc(ahead));
    },
    sinusoid(period) {
      const omega = (2 * Math.PI) / period;
      const c2 = celerity * celerity;
      const modulus = Math.hypot(c2, 4 * omega * diffusivity);
      const real = Math.sqrt((modulus + c2) / 2);
      const imaginary = Math.sqrt((modulus - c2) / 2);
      return {
        decay: (real - celerity) / (2 * diffusivity),
        waveNumber: imaginary / (2 * diffusivity),
      };
    },
  };
}

/** Complementary error function. */
export function erfc(x: number): number {
  return x < 0 ? 2 - erfc(-x) : Math.exp(-x * x) * scaledErfc(x);
}

/** exp(x²) erfc(x), x ≥ 0: the series of erf for small x, the continued fraction beyond (M. Abramowitz and I. A.
 *  Stegun, 1964, 7.1.6 and 7.1.14). */
function scaledErfc(x: number): number {
  if (x < 2) {
    let term = x;
    let sum = x;
    for (let n = 1; Math.abs(term) > 1e-18 * sum; n++) {
      term *= (2 * x * x) / (2 * n + 1);
      sum += term;
    }
    return Math.exp(x * x) - (2 / Math.sqrt(Math.PI)) * sum;
  }
  let fraction = 0;
  for (let k = 200; k >= 1; k--) fraction = k / 2 / (x + fraction);
  return 1 / (Math.sqrt(Math.PI) * (x + fraction));
}
