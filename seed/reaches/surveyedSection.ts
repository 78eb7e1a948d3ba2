import type { Section } from '../../shared/surveys/types';
import type { PlaceOnLine } from '../tools/meander';
import { round } from '../tools/seededRandom';

/** Ground of a section before it is a survey: points from left to right, offset 0 at the middle of the channel. */
export interface Ground {
  id: string;
  chainage: number;
  points: [y: number, z: number][];
  /** Where roughness changes, and the bank marks, in the same offsets; each stands on a point. */
  zones: [from: number, n: number][];
  banks: [number, number];
}

/** As a surveyor writes it down: offsets from the left end to the decimetre, elevations to the centimetre, coordinates. */
export function surveyedSection(ground: Ground, place: PlaceOnLine): Section {
  const start = ground.points[0][0];
  const offset = (y: number) => round(y - start, 1);
  const points = ground.points.map(([y, z]): [number, number] => [offset(y), round(z, 2)]);
  return {
    id: ground.id,
    chainage: ground.chainage,
    points,
    roughness: ground.zones.map(([from, n], i) => [i === 0 ? 0 : offset(from), n]),
    banks: [offset(ground.banks[0]), offset(ground.banks[1])],
    // Left of the river is a quarter turn anticlockwise of its direction.
    coordinates: ground.points.map(([y]) => [
      round(place.easting + y * Math.sin(place.direction), 2),
      round(place.northing - y * Math.cos(place.direction), 2),
    ]),
  };
}
