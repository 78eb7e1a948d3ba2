/** Times of output (s): every `interval` from 0, and the end. */
export function outputTimes(duration: number, interval: number): number[] {
  const times: number[] = [];
  // An interval that divides the duration up to rounding makes no sliver at the end.
  const whole = Math.ceil(duration / interval - 1e-9);
  for (let k = 0; k < whole; k++) times.push(k * interval);
  times.push(duration);
  return times;
}

/** The step (s) to take towards `target`: lands on it exactly, and leaves no sliver of a step for the last. */
export function stepTowards(time: number, target: number, largest: number): number {
  const rest = target - time;
  if (rest <= largest) return rest;
  return rest < 2 * largest ? 0.5 * rest : largest;
}
