/** Thinner water than this is drawn as dry ground, m. */
export const THIN = 0.002;

interface Ground {
  /** px. */
  x: ArrayLike<number>;
  /** m. */
  bed: ArrayLike<number>;
  /** Where the water ends below, px: the ground is drawn over it. */
  foot: number;
}

/**
 * A maker of the two paths of a water surface given in m at the same places: its line, and the water below it. Made for play:
 * what stays is written once, and a frame is one walk along the places.
 */
export function waterPaths({ x, bed, foot }: Ground, y: { at0: number; perMetre: number }) {
  const xs = Array.from(x, tenths);
  const base = tenths(foot);
  return (stage: ArrayLike<number>): { line: string; water: string } => {
    let line = '';
    let water = '';
    let run = '';
    let from = 0;
    for (let i = 0; i <= xs.length; i++) {
      if (i < xs.length && stage[i] - bed[i] > THIN) {
        if (run === '') from = i;
        run += `${run === '' ? 'M' : 'L'}${xs[i]},${tenths(y.at0 + y.perMetre * stage[i])}`;
      } else if (run !== '') {
        line += run;
        water += `${run}L${xs[i - 1]},${base}L${xs[from]},${base}Z`;
        run = '';
      }
    }
    return { line, water };
  };
}

/** A tenth of a pixel is finer than any screen and keeps the path short. */
const tenths = (px: number): string => String(Math.round(px * 10) / 10);
