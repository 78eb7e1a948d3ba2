import type { PrismaticSection } from './prismaticSection';
import { manningConveyance, normalDepth } from './uniformFlow';

/** Small waves on uniform flow in a prismatic channel with Manning friction, by the full equations. With A = A0 + a and
 *  Q = Q0 + q, both proportional to exp(i ω t + λ x):
 *
 *    a_t + q_x = 0,   q_t + 2 V q_x + (c² - V²) a_x + r (q - c_k a) = 0,   r = 2 g S0/V,   c_k = (dQ/dA) at constant slope
 *    (c² - V²) λ² - (r c_k + 2 i V ω) λ + ω² - i r ω = 0
 *
 *  Of its roots the one that tends to -i ω/c_k for slow waves runs downstream; its first terms are those of the diffusion
 *  wave, λ = -i ω/c_k - D ω²/c_k³, with D = Q/(2 B S0) [1 - (c_k/V - 1)² Fr²].
 *
 *  Source: V. M. Ponce and D. B. Simons (1977), Shallow wave propagation in open channel flow, J. Hydraul. Div. ASCE 103,
 *  1461-1476 (from memory; derived anew). Subcritical flow of Vedernikov number (c_k/V - 1) Fr below 1. */
export interface LinearWave {
  /** Uniform flow: depth (m), velocity (m/s), Froude number. */
  depth: number;
  velocity: number;
  froude: number;
  /** dQ/dA at constant slope, m/s. */
  kinematicCelerity: number;
  /** Of the equivalent diffusion wave, m²/s. */
  diffusivity: number;
  /** Decay (1/m) and wave number (1/m) of a small sinusoidal change of inflow of the given period (s). */
  sinusoid(period: number): { decay: number; waveNumber: number };
}

export function linearWave(
  section: PrismaticSection,
  gravity: number,
  manning: number,
  slope: number,
  flow: number,
): LinearWave {
  const depth = normalDepth(section, manning, slope, flow);
  const area = section.area(depth);
  const topWidth = section.topWidth(depth);
  const velocity = flow / area;
  const celerity = Math.sqrt((gravity * area) / topWidth);
  const froude = velocity / celerity;
  const step = 1e-5 * depth;
  const carried = (h: number) => manningConveyance(section, manning, h) * Math.sqrt(slope);
  const kinematicCelerity = (carried(depth + step) - carried(depth - step)) / (2 * step * topWidth);
  const vedernikov = (kinematicCelerity / velocity - 1) * froude;
  return {
    depth,
    velocity,
    froude,
    kinematicCelerity,
    diffusivity: (flow / (2 * topWidth * slope)) * (1 - vedernikov * vedernikov),
    sinusoid(period) {
      const omega = (2 * Math.PI) / period;
      const rate = (2 * gravity * slope) / velocity;
      const a = celerity * celerity - velocity * velocity;
      const [p, q] = [rate * kinematicCelerity, 2 * velocity * omega];
      // Root of (p + i q)² - 4 a (ω² - i r ω) with positive real part.
      const real = p * p - q * q - 4 * a * omega * omega;
      const imaginary = 2 * p * q + 4 * a * rate * omega;
      const modulus = Math.hypot(real, imaginary);
      const rootReal = Math.sqrt((modulus + real) / 2);
      const rootImaginary = Math.sign(imaginary) * Math.sqrt((modulus - real) / 2);
      return { decay: (rootReal - p) / (2 * a), waveNumber: (rootImaginary - q) / (2 * a) };
    },
  };
}
