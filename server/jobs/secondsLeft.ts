/** Before this share is done a guess of the time left is worth nothing. */
const ENOUGH = 0.005;
/** How far back the pace is measured, ms of wall time. */
const WINDOW = 15_000;

/**
 * Seconds of wall time that a run still needs, by the pace of the last quarter of a minute: floods are slow to compute
 * at their peak and fast before. null while there is too little to go by.
 */
export function secondsLeft(startedAt: number) {
  const marks: { at: number; fraction: number }[] = [{ at: startedAt, fraction: 0 }];
  return (fraction: number, now: number): number | null => {
    marks.push({ at: now, fraction });
    while (marks.length > 2 && marks[1].at < now - WINDOW) marks.shift();
    const pace = (fraction - marks[0].fraction) / (now - marks[0].at);
    if (fraction < ENOUGH || !(pace > 0)) return null;
    return Math.ceil((1 - fraction) / pace / 1000);
  };
}
