/**
 * Published regressions for the breach of an embankment dam: average width, formation time and peak outflow from
 * dam and reservoir data. They spread by up to an order of magnitude; each carries the 95 % band that Wahl gives.
 *
 * SI throughout: heights and widths in m, volumes in m³, times in s, flows in m³/s.
 *
 *   hw  depth of water above the breach invert at failure
 *   hb  height of the breach          hd  height of the dam
 *   Vw  volume of water above the breach invert at failure
 *   S   storage of the reservoir
 *
 * Formulas and bands: T. L. Wahl (2001), "The uncertainty of embankment dam breach parameter predictions based on
 * dam failure case studies", FEMA/USDA workshop, Oklahoma City; later J. Hydraul. Eng. 130(5), 389-397 (2004).
 * Froehlich 2008 and Pierce, Thornton & Abt 2010 are not in that paper and carry no band here.
 */
export interface BreachInputs {
  waterDepth: number;
  breachHeight: number;
  damHeight: number;
  waterVolume: number;
  storage: number;
  failure: 'overtopping' | 'piping';
  embankment: 'earthfill' | 'nonEarthfill';
  erodibility: 'high' | 'low';
}

export type BreachQuantity = 'width' | 'formationTime' | 'peakFlow';

export interface BreachRegression {
  id: string;
  quantity: BreachQuantity;
  name: string;
  source: string;
  /** Value in SI, for positive inputs; NaN where an input that it needs is not positive. */
  predict: (inputs: BreachInputs) => number;
  /** Multipliers of the prediction that hold the true value in 95 of 100 cases; null where none is published. */
  band: readonly [number, number] | null;
}

const HOUR = 3600;
const GRAVITY = 9.80665;

/** Eroded volume, m³: MacDonald & Langridge-Monopolis 1984. */
export function erodedVolume({ waterVolume, waterDepth, embankment }: BreachInputs): number {
  const formed = waterVolume * waterDepth;
  return embankment === 'earthfill' ? 0.0261 * formed ** 0.769 : 0.00348 * formed ** 0.852;
}

/**
 * Offset C_b of Von Thun & Gillette by storage, m. The end values and the uppermost limit stand in Wahl (2001);
 * the two middle ones are from memory of the original.
 */
export function vonThunGilletteOffset(storage: number): number {
  if (storage < 1.23e6) return 6.1;
  if (storage < 6.17e6) return 18.3;
  if (storage < 12.3e6) return 42.7;
  return 54.9;
}

const MACDONALD = 'MacDonald & Langridge-Monopolis (1984), J. Hydraul. Eng. 110(5), 567-586';
const FROEHLICH_1995A = 'Froehlich (1995), J. Water Resour. Plann. Manage. 121(1), 90-97';
const FROEHLICH_1995B = 'Froehlich (1995), Water Resources Engineering, Proc. 1995 ASCE Conference';
const FROEHLICH_2008 = 'Froehlich (2008), J. Hydraul. Eng. 134(12), 1708-1721';
const VON_THUN = 'Von Thun & Gillette (1990), U.S. Bureau of Reclamation, internal document';
const USBR = 'U.S. Bureau of Reclamation (1988), ACER Technical Memorandum 11';
const IN_WAHL = 'as compiled by Wahl (2001)';

const widthVonThun = (i: BreachInputs) => 2.5 * i.waterDepth + vonThunGilletteOffset(i.storage);
const widthUsbr = (i: BreachInputs) => 3 * i.waterDepth;

export const BREACH_REGRESSIONS: readonly BreachRegression[] = [
  {
    id: 'width.usbr1988',
    quantity: 'width',
    name: 'USBR 1988',
    source: USBR,
    predict: widthUsbr,
    band: [0.45, 3.3],
  },
  {
    id: 'width.vonThunGillette1990',
    quantity: 'width',
    name: 'Von Thun & Gillette 1990',
    source: VON_THUN,
    predict: widthVonThun,
    band: [0.37, 1.8],
  },
  {
    id: 'width.froehlich1995',
    quantity: 'width',
    name: 'Froehlich 1995',
    source: FROEHLICH_1995B,
    predict: (i) =>
      0.1803 *
      (i.failure === 'overtopping' ? 1.4 : 1) *
      i.waterVolume ** 0.32 *
      i.breachHeight ** 0.19,
    band: [0.4, 2.4],
  },
  {
    id: 'width.froehlich2008',
    quantity: 'width',
    name: 'Froehlich 2008',
    source: FROEHLICH_2008,
    predict: (i) =>
      0.27 *
      (i.failure === 'overtopping' ? 1.3 : 1) *
      i.waterVolume ** 0.32 *
      i.breachHeight ** 0.04,
    band: null,
  },
  {
    id: 'time.macDonald1984',
    quantity: 'formationTime',
    name: 'MacDonald & Langridge-Monopolis 1984',
    source: MACDONALD,
    predict: (i) => 0.0179 * erodedVolume(i) ** 0.364 * HOUR,
    band: [0.24, 11],
  },
  {
    id: 'time.vonThunGillette1990.depth',
    quantity: 'formationTime',
    name: 'Von Thun & Gillette 1990, by depth',
    source: VON_THUN,
    predict: (i) =>
      (i.erodibility === 'high' ? 0.015 * i.waterDepth : 0.02 * i.waterDepth + 0.25) * HOUR,
    band: [0.49, 40],
  },
  {
    id: 'time.vonThunGillette1990.width',
    quantity: 'formationTime',
    name: 'Von Thun & Gillette 1990, by width and depth',
    source: VON_THUN,
    predict: (i) =>
      (widthVonThun(i) / (4 * i.waterDepth + (i.erodibility === 'high' ? 61 : 0))) * HOUR,
    band: [0.35, 17],
  },
  {
    id: 'time.froehlich1995',
    quantity: 'formationTime',
    name: 'Froehlich 1995',
    source: FROEHLICH_1995B,
    predict: (i) => 0.00254 * i.waterVolume ** 0.53 * i.breachHeight ** -0.9 * HOUR,
    band: [0.38, 7.3],
  },
  {
    id: 'time.froehlich2008',
    quantity: 'formationTime',
    name: 'Froehlich 2008',
    source: FROEHLICH_2008,
    predict: (i) => 63.2 * Math.sqrt(i.waterVolume / (GRAVITY * i.breachHeight ** 2)),
    band: null,
  },
  {
    id: 'time.usbr1988',
    quantity: 'formationTime',
    name: 'USBR 1988',
    source: USBR,
    predict: (i) => 0.011 * widthUsbr(i) * HOUR,
    band: [0.24, 27],
  },
  {
    id: 'peak.kirkpatrick1977',
    quantity: 'peakFlow',
    name: 'Kirkpatrick 1977',
    source: IN_WAHL,
    predict: (i) => 1.268 * (i.waterDepth + 0.3) ** 2.5,
    band: [0.28, 6.8],
  },
  {
    id: 'peak.scs1981',
    quantity: 'peakFlow',
    name: 'SCS 1981',
    source: IN_WAHL,
    predict: (i) => 16.6 * i.waterDepth ** 1.85,
    band: [0.23, 2.4],
  },
  {
    id: 'peak.reclamation1982',
    quantity: 'peakFlow',
    name: 'Reclamation 1982, envelope',
    source: IN_WAHL,
    predict: (i) => 19.1 * i.waterDepth ** 1.85,
    band: [0.2, 2.1],
  },
  {
    id: 'peak.macDonald1984',
    quantity: 'peakFlow',
    name: 'MacDonald & Langridge-Monopolis 1984',
    source: MACDONALD,
    predict: (i) => 1.154 * (i.waterVolume * i.waterDepth) ** 0.412,
    band: [0.15, 3.7],
  },
  {
    id: 'peak.macDonald1984.envelope',
    quantity: 'peakFlow',
    name: 'MacDonald & Langridge-Monopolis 1984, envelope',
    source: MACDONALD,
    predict: (i) => 3.85 * (i.waterVolume * i.waterDepth) ** 0.411,
    band: [0.05, 1.1],
  },
  {
    id: 'peak.evans1986',
    quantity: 'peakFlow',
    name: 'Evans 1986',
    source: IN_WAHL,
    predict: (i) => 0.72 * i.waterVolume ** 0.53,
    band: [0.06, 4.4],
  },
  {
    id: 'peak.froehlich1995',
    quantity: 'peakFlow',
    name: 'Froehlich 1995',
    source: FROEHLICH_1995A,
    predict: (i) => 0.607 * i.waterVolume ** 0.295 * i.waterDepth ** 1.24,
    band: [0.53, 2.3],
  },
  {
    id: 'peak.singhSnorrason1984.height',
    quantity: 'peakFlow',
    name: 'Singh & Snorrason 1984, by height',
    source: IN_WAHL,
    predict: (i) => 13.4 * i.damHeight ** 1.89,
    band: null,
  },
  {
    id: 'peak.singhSnorrason1984.storage',
    quantity: 'peakFlow',
    name: 'Singh & Snorrason 1984, by storage',
    source: IN_WAHL,
    predict: (i) => 1.776 * i.storage ** 0.47,
    band: null,
  },
  {
    id: 'peak.costa1985.storage',
    quantity: 'peakFlow',
    name: 'Costa 1985, by storage',
    source: IN_WAHL,
    predict: (i) => 1.122 * i.storage ** 0.57,
    band: null,
  },
  {
    id: 'peak.costa1985',
    quantity: 'peakFlow',
    name: 'Costa 1985, by storage and height',
    source: IN_WAHL,
    predict: (i) => 0.981 * (i.storage * i.damHeight) ** 0.42,
    band: null,
  },
  {
    id: 'peak.costa1985.envelope',
    quantity: 'peakFlow',
    name: 'Costa 1985, envelope',
    source: IN_WAHL,
    predict: (i) => 2.634 * (i.storage * i.damHeight) ** 0.44,
    band: null,
  },
  {
    id: 'peak.hagen1982',
    quantity: 'peakFlow',
    name: 'Hagen 1982',
    source: IN_WAHL,
    predict: (i) => 0.54 * (i.storage * i.damHeight) ** 0.5,
    band: null,
  },
  {
    id: 'peak.pierce2010',
    quantity: 'peakFlow',
    name: 'Pierce, Thornton & Abt 2010',
    // Coefficients from memory of the paper.
    source: 'Pierce, Thornton & Abt (2010), J. Hydrol. Eng. 15(5), 338-350',
    predict: (i) => 0.038 * i.waterVolume ** 0.475 * i.waterDepth ** 1.09,
    band: null,
  },
];
