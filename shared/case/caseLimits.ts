/** The largest case that is accepted. */
export const CASE_LIMITS = {
  sections: 500,
  pointsPerSection: 2000,
  roughnessZonesPerSection: 2000,
  storagePartsPerSection: 10,
  cells: 50_000,
  laterals: 500,
  roughnessFactors: 200,
  factorDepths: 50,
  localLosses: 200,
  structures: 200,
  crestPoints: 500,
  /** Characters said of a structure. */
  note: 5000,
  seriesLength: 100_000,
  outputTimes: 20_000,
  /** Numbers kept in the result of all sections: sections × output times. */
  outputValues: 2_000_000,
  /** Thirty years in seconds. */
  duration: 9.5e8,
} as const;
