import { risingRoot } from '../boundaries/rootNear';

/** One barrel of a culvert. Depths in m above its invert. */
export interface Barrel {
  /** Inner height (m) */
  rise: number;
  fullArea: number;
  fullPerimeter: number;
  area(depth: number): number;
  width(depth: number): number;
  perimeter(depth: number): number;
}

export function circularBarrel(diameter: number): Barrel {
  const angle = (depth: number): number =>
    2 * Math.acos(Math.max(-1, Math.min(1, 1 - (2 * depth) / diameter)));
  return {
    rise: diameter,
    fullArea: (Math.PI * diameter ** 2) / 4,
    fullPerimeter: Math.PI * diameter,
    area: (depth) => ((angle(depth) - Math.sin(angle(depth))) * diameter ** 2) / 8,
    width: (depth) => diameter * Math.sin(0.5 * angle(depth)),
    perimeter: (depth) => 0.5 * angle(depth) * diameter,
  };
}

export function boxBarrel(width: number, height: number): Barrel {
  return {
    rise: height,
    fullArea: width * height,
    fullPerimeter: 2 * (width + height),
    area: (depth) => width * Math.min(depth, height),
    width: () => width,
    perimeter: (depth) => width + 2 * Math.min(depth, height),
  };
}

/** Critical depth (m) of a flow (m³/s); the rise where it would fill the barrel. */
export function criticalDepthIn(barrel: Barrel, flow: number, gravity: number): number {
  const { rise } = barrel;
  // A circle narrows to nothing at its top: it is searched up to just below.
  const top = rise * (1 - 1e-9);
  const flowAt = (depth: number): number => {
    const a = barrel.area(Math.min(depth, top));
    const width = barrel.width(Math.min(depth, top));
    return a * Math.sqrt((gravity * a) / Math.max(width, 1e-12));
  };
  if (!(flow > 0)) return 0;
  if (flowAt(top) <= flow) return rise;
  return Math.min(
    top,
    risingRoot((depth) => flowAt(depth) - flow, 0, 0.25 * rise),
  );
}
