import type { Section } from '../../shared/surveys/types';
import { alongMeander, type Meander } from '../tools/meander';
import { round, seededRandom } from '../tools/seededRandom';
import { surveyedSection, type Ground } from './surveyedSection';

/**
 * The Quenlow valley, invented: 22 sections over 5.2 km of a steep upland valley with a dam at 1.2 km, reservoir above it and a
 * stony stream below. Always the same.
 */
const SEED = 2203;
const COUNT = 22;
const LENGTH = 5200;
const HEAD_BED = 312;
/** Fall above the dam and below it, flattening to the outlet, m/m. */
const SLOPE = { above: 0.011, below: 0.013, outlet: 0.007 };
const LINE: Meander = {
  easting: 398_600,
  northing: 301_200,
  heading: -0.5,
  swing: 0.35,
  wavelength: 1500,
};
export const QUENLOW_DAM = { chainage: 1200, depth: 13 };
const DAM_SECTION = 5;

const bedAt = (chainage: number): number => {
  const dam = QUENLOW_DAM.chainage;
  if (chainage <= dam) return HEAD_BED - SLOPE.above * chainage;
  const run = chainage - dam;
  const share = run / (LENGTH - dam);
  return (
    HEAD_BED - SLOPE.above * dam - run * (SLOPE.below + 0.5 * share * (SLOPE.outlet - SLOPE.below))
  );
};

/** Stage of the full reservoir, m. */
export const quenlowReservoir = (): number =>
  round(bedAt(QUENLOW_DAM.chainage) + QUENLOW_DAM.depth, 2);

export function quenlowValley(): Section[] {
  const random = seededRandom(SEED);
  const jitter = (size: number) => size * (2 * random() - 1);
  const chainages = Array.from({ length: COUNT }, (_, i) => {
    const even = (LENGTH * i) / (COUNT - 1);
    if (i === DAM_SECTION) return QUENLOW_DAM.chainage;
    return i === 0 || i === COUNT - 1 ? even : round(even + jitter(40), -1);
  });
  const places = alongMeander(LINE, chainages);
  return chainages.map((chainage, i) => {
    const id = `QV-${String(i + 1).padStart(2, '0')}`;
    return surveyedSection(valley(id, chainage, places[i].bend, jitter), places[i]);
  });
}

/** A stream in a narrow floor that widens downstream, between slopes of one in three. */
function valley(
  id: string,
  chainage: number,
  bend: number,
  jitter: (size: number) => number,
): Ground {
  const bed = bedAt(chainage) + jitter(0.1);
  const stream = 5 + 3 * (chainage / LENGTH) + jitter(0.4);
  const floor = 14 + 22 * (chainage / LENGTH) + jitter(3);
  const bank = bed + 1.5 + jitter(0.15);
  const side = (share: number): [number, number][] => {
    const width = floor * share;
    return [
      [stream + 0.35 * width, bank + 0.15 + jitter(0.1)],
      [stream + 0.7 * width, bank + 0.4 + jitter(0.1)],
      [stream + width, bank + 0.8 + jitter(0.1)],
      [stream + width + 9, bank + 3.6 + jitter(0.4)],
      [stream + width + 20, bank + 7.2 + jitter(0.5)],
      [stream + width + 34, bank + 11.8 + jitter(0.5)],
      [stream + width + 50, bank + 17 + jitter(0.6)],
    ];
  };
  const left = side(1 - 0.4 * bend).map(([y, z]): [number, number] => [-y, z]);
  const channel: [number, number][] = [
    [-stream, bank],
    [-0.75 * stream, bed + 0.7 + jitter(0.1)],
    [-0.45 * stream, bed + 0.15],
    [0.1 * bend * stream, bed],
    [0.4 * stream, bed + 0.1],
    [0.8 * stream, bed + 0.8 + jitter(0.1)],
    [stream, bank],
  ];
  return {
    id,
    chainage,
    points: [...left.reverse(), ...channel, ...side(1 + 0.4 * bend)],
    zones: [
      [-1e3, 0.08],
      [-stream, 0.06],
      [stream, 0.08],
    ],
    banks: [-stream, stream],
  };
}
