import type { PlacedPoint } from '@/components/charts/LongSection';
import type { TimedPoint } from '@/components/charts/Hydrograph';
import type { ReviewPoint } from '@/shared/review/types';
import type { UnitSystem } from '@/shared/units/units';
import { POINT_STATES, pointPlace } from './reviewWords';

/** Points of a run as its drawings show them. */
export interface RaisedPoints {
  /** Along the reach. */
  placed: PlacedPoint[];
  /** Against time at a place, by its chainage. */
  timed: (TimedPoint & { chainage: number })[];
}

/** Each point has the number of the order in which it was raised, on every screen and in the report. */
export function pointNumbers(points: readonly ReviewPoint[]): Map<number, number> {
  const ids = points.map(({ id }) => id).sort((a, b) => a - b);
  return new Map(ids.map((id, k) => [id, k + 1]));
}

export function raisedPoints(
  points: readonly ReviewPoint[],
  stations: readonly { name: string; chainage: number }[],
  span: number,
  system: UnitSystem,
): RaisedPoints {
  const numbers = pointNumbers(points);
  const placed = points.flatMap((point) => {
    const { id, chainage, time, state, text } = point;
    if (chainage === null) return [];
    const number = numbers.get(id)!;
    const place = pointPlace(point, stations, span, system);
    const words = `Point ${number}, ${POINT_STATES[state].label.toLowerCase()}, ${place}: ${text}`;
    return [{ id, number, isClosed: state === 'closed', words, chainage, time }];
  });
  return {
    placed,
    timed: placed.flatMap((point) => (point.time === null ? [] : [{ ...point, time: point.time }])),
  };
}

/** Chainages of an address are to the centimetre. */
export const pointsAt = ({ timed }: RaisedPoints, at: number): RaisedPoints['timed'] =>
  timed.filter(({ chainage }) => Math.abs(chainage - at) < 0.01);
