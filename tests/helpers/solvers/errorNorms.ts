/** Differences between computed values and exact ones at the same places. */
export interface ErrorNorms {
  /** Mean of the magnitudes: the L1 norm over the reach divided by its length, on equal cells. */
  mean: number;
  largest: number;
}

export function errorNorms(
  places: readonly number[],
  computed: readonly number[],
  exact: (place: number) => number,
  within: (place: number) => boolean = () => true,
): ErrorNorms {
  let sum = 0;
  let largest = 0;
  let count = 0;
  places.forEach((place, i) => {
    if (!within(place)) return;
    const error = Math.abs(computed[i] - exact(place));
    sum += error;
    largest = Math.max(largest, error);
    count++;
  });
  return { mean: sum / count, largest };
}
