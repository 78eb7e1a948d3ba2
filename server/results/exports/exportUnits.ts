import { METRES_PER_FOOT, type UnitSystem } from '../../../shared/units/units';

/** A unit of an export: plain letters, since spreadsheets guess at the encoding of text files. */
export interface ExportUnit {
  symbol: string;
  /** SI value of one of it. */
  si: number;
}

interface ExportUnits {
  length: ExportUnit;
  flow: ExportUnit;
  velocity: ExportUnit;
  volume: ExportUnit;
}

const FT = METRES_PER_FOOT;

/** Chainages, stages and depths are in the base unit of length. Metric values leave as they were computed. */
export const EXPORT_UNITS: Record<UnitSystem, ExportUnits> = {
  metric: {
    length: { symbol: 'm', si: 1 },
    flow: { symbol: 'm3/s', si: 1 },
    velocity: { symbol: 'm/s', si: 1 },
    volume: { symbol: 'm3', si: 1 },
  },
  usCustomary: {
    length: { symbol: 'ft', si: FT },
    flow: { symbol: 'ft3/s', si: FT ** 3 },
    velocity: { symbol: 'ft/s', si: FT },
    volume: { symbol: 'ft3', si: FT ** 3 },
  },
};
