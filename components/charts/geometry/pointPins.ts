import type { Frame } from './frame';
import { overlap, type Box } from './placeLabel';

/** A raised point and where it points to, px. */
export interface Pinned {
  id: number;
  x: number;
  y: number;
}

export interface Pin {
  id: number;
  /** Middle of its box. */
  x: number;
  y: number;
  footX: number;
  footY: number;
}

/** Side of the box, px. */
export const PIN = 18;
/** From box to box and from a box to its foot: what a finger presses must not lie on another. */
const STEP = 24;

/** What a label keeps clear of. */
export const pinBox = ({ x, y }: Pin): Box => boxAt(x, y);

const boxAt = (x: number, y: number): Box => ({
  x: x - PIN / 2,
  y: y - PIN / 2,
  width: PIN,
  height: PIN,
});

/**
 * Boxes above the places that they point to, within the plot. Where two would lie on each other the later one stands
 * higher; at the top of the plot it moves to the side, away from the nearer edge. The same where a name stands.
 */
export function pointPins(
  points: readonly Pinned[],
  frame: Frame,
  names: readonly Box[] = [],
): Pin[] {
  const { left, right, top, bottom } = frame;
  const placed: Pin[] = [];
  for (const { id, x: footX, y: footY } of points) {
    const away = footX > (left + right) / 2 ? -STEP : STEP;
    const highest = top + PIN / 2;
    let x = Math.min(Math.max(footX, left + STEP / 2), right - STEP / 2);
    let y = Math.min(Math.max(footY - STEP, highest), bottom - STEP / 2);
    const isTaken = () =>
      placed.some((pin) => Math.abs(pin.x - x) < STEP && Math.abs(pin.y - y) < STEP) ||
      names.some((box) => overlap(boxAt(x, y), box));
    while (isTaken() && y - STEP >= highest) y -= STEP;
    while (isTaken() && x + away >= left && x + away <= right) x += away;
    placed.push({ id, x, y, footX, footY });
  }
  return placed;
}
