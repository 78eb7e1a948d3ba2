import type { Section } from '../../shared/surveys/types';
import { alongMeander, type Meander, type PlaceOnLine } from '../tools/meander';
import { round, seededRandom } from '../tools/seededRandom';
import { surveyedSection, type Ground } from './surveyedSection';

/**
 * The Lower Veshall at Tornick, an invented lowland river: 44 sections over 21.4 km, pools and riffles, bends with a steep
 * outer bank, floodplains of 60 to 400 m, and a bridge whose approaches close the floodplain at 10.6 km. Always the same.
 */
const SEED = 4417;
const COUNT = 44;
const LENGTH = 21_400;
/** Sections that stand where something is: the bridge with one on each side of it, a mill, a gauge. */
const BRIDGE = 10_600;
const FIXED = [BRIDGE - 60, BRIDGE, BRIDGE + 60, 13_100, 17_400];
const LINE: Meander = {
  easting: 412_300,
  northing: 287_900,
  heading: 0.35,
  swing: 0.75,
  wavelength: 2600,
};
const HEAD_BED = 48.3;
const BANK_HEIGHT = 4.1;
/** Fall of the valley, m/m, at its head and at its outlet. */
const SLOPE = { head: 0.00122, outlet: 0.00086 };
/** Share of the half width across, and of the depth: the shape of a channel in a straight. */
const CHANNEL_POINTS = [-1, -0.9, -0.77, -0.6, -0.42, -0.22, 0, 0.22, 0.42, 0.6, 0.77, 0.9, 1];
const PLAIN_POINTS = 12;
const SIDE_POINTS = 2;

export function lowerVeshall(): Section[] {
  const random = seededRandom(SEED);
  const chainages = placeSections(random);
  const places = alongMeander(LINE, chainages);
  return chainages.map((chainage, i) => {
    const id = `XS-${String(i + 1).padStart(2, '0')}`;
    const ground =
      chainage === BRIDGE ? bridge(id, random) : natural(id, chainage, places[i], random);
    return surveyedSection(ground, places[i]);
  });
}

/** About every 500 m, where a surveyor could get to the bank. */
function placeSections(random: () => number): number[] {
  const free = COUNT - FIXED.length;
  const chainages = [...FIXED];
  for (let i = 0; i < free; i++) {
    const even = (LENGTH * i) / (free - 1);
    const isEnd = i === 0 || i === free - 1;
    let at = isEnd ? even : round(even + 110 * (random() - 0.5), -1);
    // Not beside one that is there already.
    const near = FIXED.find((fixed) => Math.abs(fixed - at) < 170);
    if (near !== undefined && !isEnd) at = near < at ? near + 190 : near - 190;
    chainages.push(at);
  }
  return chainages.sort((a, b) => a - b);
}

/** Valley line, with pools and riffles every few channel widths. */
function bedAt(chainage: number): number {
  const pools = 0.22 * Math.sin(chainage / 290 + 1.3) + 0.16 * Math.sin(chainage / 830);
  return HEAD_BED - fallTo(chainage) + pools;
}

/** The banks follow the valley, not the pools. */
const bankAbove = (chainage: number) => HEAD_BED - fallTo(chainage) + BANK_HEIGHT;

function fallTo(chainage: number): number {
  const share = chainage / LENGTH;
  return chainage * (SLOPE.head + 0.5 * share * (SLOPE.outlet - SLOPE.head));
}

function natural(id: string, chainage: number, place: PlaceOnLine, random: () => number): Ground {
  const jitter = (size: number) => size * (2 * random() - 1);
  const width = 45 + 5 * Math.sin(chainage / 2100) + jitter(2.5);
  const bank = bankAbove(chainage);
  const left = bank + jitter(0.15);
  const right = bank + jitter(0.15);
  const bed = bedAt(chainage) + jitter(0.07);
  const channel = channelPoints(width, bed, left, right, 0.36 * place.bend, jitter);
  // The inner side of a bend has the wide plain.
  const plain = 112 + 70 * Math.sin(chainage / 1900 + 0.4) + jitter(14);
  const leftWidth = Math.max(28, plain * (1 - 0.55 * place.bend));
  const rightWidth = Math.max(28, plain * (1 + 0.55 * place.bend));
  const outwards = (side: 'left' | 'right') =>
    plainPoints(side === 'left' ? leftWidth : rightWidth, side === 'left' ? left : right, jitter);
  const half = 0.5 * width;
  const leftPlain = outwards('left').map(([y, z]): [number, number] => [-half - y, z]);
  const rightPlain = outwards('right').map(([y, z]): [number, number] => [half + y, z]);
  const bank0 = channel[0][0];
  const bank1 = channel[channel.length - 1][0];
  const wooded = Math.sin(chainage / 2700) > 0.35;
  return {
    id,
    chainage,
    points: [...leftPlain.reverse(), ...channel, ...rightPlain],
    zones: [
      [-half - leftWidth, wooded ? 0.08 : 0.055],
      [bank0, round(0.034 + 0.003 * Math.sin(chainage / 3100), 3)],
      [bank1, Math.sin(chainage / 3300 + 2) > 0.2 ? 0.07 : 0.05],
    ],
    banks: [bank0, bank1],
  };
}

/** Steep at the outer bank, a flat bar at the inner one; `skew` moves the thalweg towards the outer side. */
function channelPoints(
  width: number,
  bed: number,
  left: number,
  right: number,
  skew: number,
  jitter: (size: number) => number,
): [number, number][] {
  return CHANNEL_POINTS.map((u): [number, number] => {
    // The thalweg of the straight lies at 0; in a bend it is pushed aside, and the shape stretched with it.
    const across = u <= 0 ? u * (1 + skew) + skew : u * (1 - skew) + skew;
    const bank = u <= 0 ? left : right;
    const share = Math.abs(u) ** 2.7;
    const rough = Math.abs(u) === 1 || u === 0 ? 0 : jitter(0.12);
    return [0.5 * width * across, bed + (bank - bed) * share + rough];
  });
}

/** From the bank outwards: a slight levee, lower ground behind it, a rise to the valley side. */
function plainPoints(
  width: number,
  bank: number,
  jitter: (size: number) => number,
): [number, number][] {
  const points: [number, number][] = [];
  for (let i = 1; i <= PLAIN_POINTS; i++) {
    const share = i / PLAIN_POINTS;
    const hollow = -0.5 * Math.sin(Math.PI * Math.min(1, share * 1.4));
    points.push([width * share + jitter(1), bank + hollow + 0.9 * share ** 1.5 + jitter(0.08)]);
  }
  const [, foot] = points[points.length - 1];
  for (let i = 1; i <= SIDE_POINTS; i++)
    points.push([width + 9 * i + jitter(1), foot + 2.4 * i + jitter(0.2)]);
  return points;
}

/** Tornick bridge: abutments beside the channel, and road banks over the plain on both sides. */
function bridge(id: string, random: () => number): Ground {
  const jitter = (size: number) => size * (2 * random() - 1);
  const bank = bankAbove(BRIDGE);
  const bed = bedAt(BRIDGE);
  const half = 14.5;
  const road = bank + 3.4;
  const rise: [number, number][] = [
    [half + 0.8, bank + 0.4],
    [half + 5, bank + 0.5],
    [half + 9, road - 0.3],
    [half + 24, road],
    [half + 45, road + 0.1],
    [half + 70, road + 0.2],
    [half + 95, road + 0.4],
    [half + 110, road + 1.2],
  ];
  const channel = channelPoints(2 * half, bed - 0.15, bank, bank, 0, jitter);
  return {
    id,
    chainage: BRIDGE,
    points: [...rise.map(([y, z]): [number, number] => [-y, z]).reverse(), ...channel, ...rise],
    zones: [
      [-half - 110, 0.045],
      [-half, 0.032],
      [half, 0.045],
    ],
    banks: [-half, half],
  };
}
