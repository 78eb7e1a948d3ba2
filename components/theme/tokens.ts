/** Every colour, space, radius and type size of the interface. Contrast is held by tests/components/theme. */
export interface Colours {
  /** Ground of the page and of what stands on it. */
  paper: string;
  card: string;
  /** Hairlines that divide; never the only sign of a control. */
  line: string;
  /** Outline of what can be filled in or pressed: 3:1 against paper and card. */
  edge: string;
  ink: string;
  soft: string;
  /** Water, and the place one is at; nothing else. */
  water: string;
  waterTint: string;
  /** Ground. */
  earth: string;
  earthTint: string;
  /** Attention, danger, done. */
  ochre: string;
  ochreTint: string;
  brick: string;
  brickTint: string;
  moss: string;
  mossTint: string;
}

export type Scheme = 'light' | 'dark';

export const COLOURS: Record<Scheme, Colours> = {
  light: {
    paper: '#F7F4ED',
    card: '#FFFDF8',
    line: '#E2DBCC',
    edge: '#7F847D',
    ink: '#1E2A2F',
    soft: '#5C686B',
    water: '#17768A',
    waterTint: '#BFE0E3',
    earth: '#6E5F4B',
    earthTint: '#E6DCCB',
    ochre: '#8F5808',
    ochreTint: '#F6E6C6',
    brick: '#A23B2A',
    brickTint: '#F5D9D2',
    moss: '#4E6B3A',
    mossTint: '#DDE6D2',
  },
  dark: {
    paper: '#141B1E',
    card: '#1B2428',
    line: '#2E3A3F',
    edge: '#6B7779',
    ink: '#EDE8DC',
    soft: '#9FAAAC',
    water: '#4DB6C6',
    waterTint: '#1F4A52',
    earth: '#A7947A',
    earthTint: '#2B2A26',
    ochre: '#E2A94A',
    ochreTint: '#3A2D16',
    brick: '#E08A77',
    brickTint: '#3F231D',
    moss: '#9DBB86',
    mossTint: '#26331F',
  },
};

/** Steps of the 8 px grid; `half` only inside a control. */
export const space = { half: 4, one: 8, two: 16, three: 24, four: 32, six: 48 } as const;
export const radius = { small: 6, control: 8, card: 10 } as const;
/** Least height of what is touched, and the hairline. */
export const touch = 44;
export const hairline = 1;

export const fonts = {
  regular: 'SourceSans3-Regular',
  semibold: 'SourceSans3-SemiBold',
  bold: 'SourceSans3-Bold',
} as const;

/** Type sizes and line heights, px. */
export const type = {
  caption: { fontSize: 12.5, lineHeight: 17 },
  small: { fontSize: 14, lineHeight: 20 },
  body: { fontSize: 15, lineHeight: 22 },
  lead: { fontSize: 17, lineHeight: 25 },
  title: { fontSize: 22, lineHeight: 28 },
  figure: { fontSize: 30, lineHeight: 34 },
  display: { fontSize: 56, lineHeight: 60 },
} as const;
export type TypeSize = keyof typeof type;

/** From this width on: rail, work, and a column beside it. */
export const WIDE = 1000;
/** Column widths, px. */
export const widths = { rail: 208, side: 352, prose: 640, form: 560 } as const;
