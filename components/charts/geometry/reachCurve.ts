import { curveNatural, line } from 'd3-shape';

/** The river of the ribbon, px: x grows with chainage, y sways about the middle. */
export interface ReachCurve {
  path: string;
  /** Height of the line at an x. */
  yAt(x: number): number;
}

/**
 * The reach drawn as one winding line from upstream to downstream. The bends are a drawing, not a survey: they are the
 * same for the same width, so that the hand finds its place again.
 */
export function reachCurve(left: number, right: number, middle: number, sway: number): ReachCurve {
  const length = Math.max(1, right - left);
  const bends = Math.max(3, Math.round(length / 180));
  const yAt = (x: number) => {
    const s = (x - left) / length;
    return (
      middle +
      sway *
        (0.62 * Math.sin(Math.PI * 2 * bends * 0.72 * s + 0.6) +
          0.38 * Math.sin(Math.PI * 2 * bends * 0.41 * s + 2.1))
    );
  };
  const knots = Math.max(16, bends * 10);
  const points = Array.from({ length: knots + 1 }, (_, i): [number, number] => {
    const x = left + (length * i) / knots;
    return [x, yAt(x)];
  });
  return { path: line().digits(1).curve(curveNatural)(points) ?? '', yAt };
}
