import { area, line } from 'd3-shape';

/** A tenth of a pixel is finer than any screen and keeps the path short. */
const DIGITS = 1;

/** Open line through points given in px; NaN lifts the pen. */
export function linePath(x: ArrayLike<number>, y: ArrayLike<number>): string {
  return (
    line<number>()
      .digits(DIGITS)
      .defined((_, i) => Number.isFinite(y[i]))
      .x((_, i) => x[i])
      .y((_, i) => y[i])(indices(x.length)) ?? ''
  );
}

/** Band between two lines over the same x, in px; NaN in either leaves a gap. */
export function bandPath(
  x: ArrayLike<number>,
  upper: ArrayLike<number>,
  lower: ArrayLike<number> | number,
): string {
  const low = typeof lower === 'number' ? () => lower : (i: number) => lower[i];
  return (
    area<number>()
      .digits(DIGITS)
      .defined((_, i) => Number.isFinite(upper[i]) && Number.isFinite(low(i)))
      .x((_, i) => x[i])
      .y0((_, i) => low(i))
      .y1((_, i) => upper[i])(indices(x.length)) ?? ''
  );
}

/** d3-shape walks over data; ours lie in typed rows, so it is given the indices, made once a length. */
const made = new Map<number, number[]>();
function indices(length: number): number[] {
  let list = made.get(length);
  if (!list) {
    if (made.size > 32) made.clear();
    list = Array.from({ length }, (_, i) => i);
    made.set(length, list);
  }
  return list;
}

/** A row of data through a scale to px. */
export function project(row: ArrayLike<number>, scale: (value: number) => number): Float64Array {
  const out = new Float64Array(row.length);
  for (let i = 0; i < row.length; i++) out[i] = scale(row[i]);
  return out;
}
