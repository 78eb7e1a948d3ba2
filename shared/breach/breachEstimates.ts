import { BREACH_REGRESSIONS, erodedVolume, type BreachInputs } from './regressions';

/**
 * What each set of published regressions makes of one dam: a whole breach (average width, side slope, formation time),
 * with the band that holds the true value in 95 of 100 past failures (Wahl 2001, table 1).
 *
 * Side slopes, horizontal to vertical: Froehlich 1995 for piping as compiled by Wahl (2001); the others are from memory of
 * the originals. MacDonald & Langridge-Monopolis give the eroded volume; width is that over the cross-section of the dam,
 * h_b (crest width + h_b × face slopes / 2), with its band.
 */
export interface DamInputs extends BreachInputs {
  /** m; null where it is not known. */
  crestWidth: number | null;
  /** Of both faces together, horizontal to vertical; null where not known. */
  faceSlopes: number | null;
}

export interface Estimated {
  value: number;
  /** [least, most] in SI; null where no band is published. */
  band: readonly [number, number] | null;
}

export interface BreachEstimate {
  id: string;
  name: string;
  source: string;
  /** Average width, m; null where an input is missing. */
  width: Estimated | null;
  /** null: the authors give none. */
  sideSlope: number | null;
  /** s */
  formationTime: Estimated | null;
}

interface Set {
  id: string;
  name: string;
  width: string | ((inputs: DamInputs) => Estimated | null);
  time: string;
  sideSlope: (inputs: DamInputs) => number | null;
}

/** Of the eroded volume, and so of the width at a given dam. */
const MACDONALD_BAND = [0.15, 6.8] as const;

const SETS: readonly Set[] = [
  {
    id: 'froehlich2008',
    name: 'Froehlich 2008',
    width: 'width.froehlich2008',
    time: 'time.froehlich2008',
    sideSlope: ({ failure }) => (failure === 'overtopping' ? 1 : 0.7),
  },
  {
    id: 'froehlich1995',
    name: 'Froehlich 1995',
    width: 'width.froehlich1995',
    time: 'time.froehlich1995',
    sideSlope: ({ failure }) => (failure === 'overtopping' ? 1.4 : 0.9),
  },
  {
    id: 'macDonald1984',
    name: 'MacDonald & Langridge-Monopolis 1984',
    width: widthMacDonald,
    time: 'time.macDonald1984',
    sideSlope: () => 0.5,
  },
  {
    id: 'vonThunGillette1990.depth',
    name: 'Von Thun & Gillette 1990, time by depth',
    width: 'width.vonThunGillette1990',
    time: 'time.vonThunGillette1990.depth',
    sideSlope: () => 1,
  },
  {
    id: 'vonThunGillette1990.width',
    name: 'Von Thun & Gillette 1990, time by width',
    width: 'width.vonThunGillette1990',
    time: 'time.vonThunGillette1990.width',
    sideSlope: () => 1,
  },
  {
    id: 'usbr1988',
    name: 'USBR 1988',
    width: 'width.usbr1988',
    time: 'time.usbr1988',
    sideSlope: () => null,
  },
];

export function breachEstimates(inputs: DamInputs): BreachEstimate[] {
  return SETS.map(({ id, name, width, time, sideSlope }) => ({
    id,
    name,
    source: regression(time).source,
    width: typeof width === 'string' ? estimated(width, inputs) : width(inputs),
    sideSlope: sideSlope(inputs),
    formationTime: estimated(time, inputs),
  }));
}

export interface PeakEstimate extends Estimated {
  id: string;
  name: string;
  source: string;
}

/** Peak flow at the dam by every published regression whose inputs are known: to hold the computed peak against. */
export function peakEstimates(inputs: BreachInputs): PeakEstimate[] {
  return BREACH_REGRESSIONS.filter(({ quantity }) => quantity === 'peakFlow').flatMap(
    ({ id, name, source }) => {
      const found = estimated(id, inputs);
      return found ? [{ id, name, source, ...found }] : [];
    },
  );
}

/** Width of the bottom of a breach that is as wide on average, m. Not above 0: its sides would meet above the bottom. */
export const bottomWidthOf = (average: number, sideSlope: number, breachHeight: number): number =>
  average - sideSlope * breachHeight;

/** `Width and formation time by Froehlich 2008 (…).`; empty for own values. */
export function estimateSentence(id: string): string {
  const set = SETS.find((one) => one.id === id);
  return set ? `Width and formation time by ${set.name} (${regression(set.time).source}).` : '';
}

function regression(id: string) {
  const found = BREACH_REGRESSIONS.find((one) => one.id === id);
  if (!found) throw new Error(`No regression ${id}`);
  return found;
}

function estimated(id: string, inputs: BreachInputs): Estimated | null {
  const { predict, band } = regression(id);
  return withBand(predict(inputs), band);
}

function withBand(value: number, band: readonly [number, number] | null): Estimated | null {
  if (!Number.isFinite(value) || value <= 0) return null;
  return { value, band: band && [value * band[0], value * band[1]] };
}

function widthMacDonald(inputs: DamInputs): Estimated | null {
  const { breachHeight, crestWidth, faceSlopes } = inputs;
  if (crestWidth === null || faceSlopes === null) return null;
  const across = breachHeight * (crestWidth + 0.5 * breachHeight * faceSlopes);
  return withBand(erodedVolume(inputs) / across, MACDONALD_BAND);
}
