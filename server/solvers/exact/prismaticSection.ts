/** Sections whose geometry has a formula, for exact solutions in prismatic channels.
 *
 *  h   depth above the lowest point, m
 *  A   wetted area, m²                     B   top width dA/dh, m
 *  P   wetted perimeter, m                 I1  hydrostatic thrust over density and gravity, ∫A dh, m³
 *  Source: V. T. Chow (1959), Open-Channel Hydraulics, table 2-1. */
export interface PrismaticSection {
  area(depth: number): number;
  topWidth(depth: number): number;
  perimeter(depth: number): number;
  thrust(depth: number): number;
}

/** Trapezoid with sides of `sideSlope` horizontal to one vertical: a rectangle with sideSlope 0, a
 *  triangle with bottomWidth 0. */
export function trapezoid(bottomWidth: number, sideSlope: number): PrismaticSection {
  const b = bottomWidth;
  const z = sideSlope;
  return {
    area: (h) => h * (b + z * h),
    topWidth: (h) => b + 2 * z * h,
    perimeter: (h) => b + 2 * h * Math.sqrt(1 + z * z),
    thrust: (h) => h * h * (b / 2 + (z * h) / 3),
  };
}

/** Rectangle whose walls bear no friction (P is its width): the usual "unit width" channel. */
export function wideRectangle(width: number): PrismaticSection {
  return { ...trapezoid(width, 0), perimeter: () => width };
}

/** Parabola with top width B = widthAtOne √h (widthAtOne in m^½). */
export function parabola(widthAtOne: number): PrismaticSection {
  const k = widthAtOne;
  return {
    area: (h) => (2 / 3) * k * h ** 1.5,
    topWidth: (h) => k * Math.sqrt(h),
    // Arc length of y = 4 x²/k² between x = ±k√h/2.
    perimeter: (h) => {
      const q = (4 * Math.sqrt(h)) / k;
      return h === 0 ? 0 : (k * k * (q * Math.sqrt(1 + q * q) + Math.asinh(q))) / 16;
    },
    thrust: (h) => (4 / 15) * k * h ** 2.5,
  };
}
