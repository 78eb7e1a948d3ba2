/** A meandering centre line: direction swings as a sine of the way along it (Langbein & Leopold 1966, USGS PP 422-H). */
export interface Meander {
  /** m, map coordinates of the beginning. */
  easting: number;
  northing: number;
  /** Mean direction and swing, radians; length of a full swing along the river, m. */
  heading: number;
  swing: number;
  wavelength: number;
}

export interface PlaceOnLine {
  easting: number;
  northing: number;
  direction: number;
  /** −1..1; positive where the river turns left, so that the outer bank is the right one. */
  bend: number;
}

const STEP = 5;

/** Follows the line to each chainage (m, growing). */
export function alongMeander(line: Meander, chainages: number[]): PlaceOnLine[] {
  let { easting, northing } = line;
  let at = 0;
  // The wavelength drifts, as no river repeats itself.
  const phase = (s: number) => (2 * Math.PI * s) / line.wavelength + 0.9 * Math.sin(s / 3700);
  const direction = (s: number) => line.heading + line.swing * Math.sin(phase(s));
  return chainages.map((chainage) => {
    while (at < chainage) {
      const step = Math.min(STEP, chainage - at);
      const theta = direction(at + 0.5 * step);
      easting += step * Math.cos(theta);
      northing += step * Math.sin(theta);
      at += step;
    }
    return { easting, northing, direction: direction(chainage), bend: Math.cos(phase(chainage)) };
  });
}
