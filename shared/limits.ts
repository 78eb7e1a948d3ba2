/** Bounds that client and server hold to alike. */
export const LIMITS = {
  upload: {
    bytes: 20 * 1024 * 1024,
    /** What an XLSX may unpack to; more is taken for a decompression bomb. */
    unpackedBytes: 200 * 1024 * 1024,
    sections: 500,
    pointsPerSection: 2000,
    sheets: 520,
    parseSeconds: 30,
    /** Faults reported of one file; the rest is counted. */
    faults: 500,
    /** Bytes of a file that travel at a time. */
    partBytes: 256 * 1024,
    /** Of one person, under way at once. */
    openPerUser: 10,
    /** After which an upload that nobody goes on with is forgotten. */
    keptHours: 24,
  },
  hydrographPoints: 20_000,
  laterals: 50,
  roughnessFactors: 50,
  localLosses: 50,
  structures: 50,
  structureName: 60,
  stationsPerStudy: 100,
  levelsPerStation: 10,
  /** Sets of tasks of a firm that wait or run. */
  openTaskSets: 20,
  textShort: 120,
  textLong: 4000,
  password: { min: 12, max: 200 },
  roles: 5,
} as const;
