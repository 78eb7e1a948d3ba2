import type { PrismaticSection } from './prismaticSection';
import { integrate } from './tools/integrate';

/** Speed of a small gravity wave, c = √(g A/B), m/s; zero on a dry bed. */
export function waveSpeed(section: PrismaticSection, gravity: number, depth: number): number {
  return depth > 0 ? Math.sqrt((gravity * section.area(depth)) / section.topWidth(depth)) : 0;
}

/** Riemann variable ω(h) = ∫₀ᴬ (c/A) dA = ∫₀ʰ √(g B/A) dh, m/s, so that u ± ω is constant along the
 *  characteristics dx/dt = u ± c of a frictionless level channel. In a rectangle ω = 2c, in a triangle 4c.
 *
 *  The substitution h = s² removes the singularity at the bed, where A/B is proportional to h.
 *  Source: J. J. Stoker (1957), Water Waves, sec. 10.2, in the form for a general section. */
export function riemannVariable(section: PrismaticSection, gravity: number, depth: number): number {
  const integrand = (s: number) => {
    const h = s * s;
    return 2 * s * Math.sqrt((gravity * section.topWidth(h)) / section.area(h));
  };
  return depth > 0 ? integrate(integrand, 0, Math.sqrt(depth)) : 0;
}
