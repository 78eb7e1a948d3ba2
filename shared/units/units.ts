/** SI inside, units at the edges: what a quantity is shown and typed in, by unit system. */
export const UNIT_SYSTEMS = ['metric', 'usCustomary'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];

/** International foot, exact (NIST SP 811, app. B.8). */
export const METRES_PER_FOOT = 0.3048;
/** US survey foot, 1200/3937 m, exact; retired at the end of 2022 but found in older surveys (NIST SP 811). */
export const METRES_PER_US_SURVEY_FOOT = 1200 / 3937;

export const QUANTITIES = [
  'chainage', // along the reach
  'length', // offsets, cell sizes, widths
  'elevation', // stage and bed above the study's datum
  'depth',
  'flow',
  'velocity',
  'area',
  'volume',
  'slope',
  'storage', // what a reservoir holds
  'weirCoefficient', // C of Q = C b h^1.5
  'multiplier', // of Manning's n
  'acceleration', // of gravity
] as const;
export type Quantity = (typeof QUANTITIES)[number];

export interface Unit {
  /** As written behind a number. */
  symbol: string;
  /** SI value of one of it. */
  si: number;
  /** Decimals that the quantity deserves. */
  decimals: number;
}

const FT = METRES_PER_FOOT;
export const UNITS: Record<UnitSystem, Record<Quantity, Unit>> = {
  metric: {
    chainage: { symbol: 'km', si: 1000, decimals: 2 },
    length: { symbol: 'm', si: 1, decimals: 1 },
    elevation: { symbol: 'm', si: 1, decimals: 2 },
    depth: { symbol: 'm', si: 1, decimals: 2 },
    flow: { symbol: 'm³/s', si: 1, decimals: 1 },
    velocity: { symbol: 'm/s', si: 1, decimals: 2 },
    area: { symbol: 'm²', si: 1, decimals: 1 },
    volume: { symbol: 'm³', si: 1, decimals: 0 },
    slope: { symbol: 'm/m', si: 1, decimals: 5 },
    storage: { symbol: '10⁶ m³', si: 1e6, decimals: 3 },
    weirCoefficient: { symbol: 'm½/s', si: 1, decimals: 2 },
    acceleration: { symbol: 'm/s²', si: 1, decimals: 2 },
    multiplier: { symbol: '× n', si: 1, decimals: 2 },
  },
  usCustomary: {
    chainage: { symbol: 'ft', si: FT, decimals: 0 },
    length: { symbol: 'ft', si: FT, decimals: 1 },
    elevation: { symbol: 'ft', si: FT, decimals: 2 },
    depth: { symbol: 'ft', si: FT, decimals: 2 },
    flow: { symbol: 'ft³/s', si: FT ** 3, decimals: 0 },
    velocity: { symbol: 'ft/s', si: FT, decimals: 2 },
    area: { symbol: 'ft²', si: FT ** 2, decimals: 0 },
    volume: { symbol: 'ft³', si: FT ** 3, decimals: 0 },
    slope: { symbol: 'ft/ft', si: 1, decimals: 5 },
    storage: { symbol: 'acre-ft', si: 43_560 * FT ** 3, decimals: 0 },
    acceleration: { symbol: 'ft/s²', si: FT, decimals: 2 },
    weirCoefficient: { symbol: 'ft½/s', si: FT ** 0.5, decimals: 2 },
    multiplier: { symbol: '× n', si: 1, decimals: 2 },
  },
};

export const toSi = (value: number, quantity: Quantity, system: UnitSystem): number =>
  value * UNITS[system][quantity].si;

export const fromSi = (value: number, quantity: Quantity, system: UnitSystem): number =>
  value / UNITS[system][quantity].si;
