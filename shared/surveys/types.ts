import type { Embankment, StoragePart } from '../case/caseFile';

/** A cross-section as it is stored: SI, offsets from left to right looking downstream. */
export interface Section {
  id: string;
  /** m. */
  chainage: number;
  /** [offset, elevation], m; offset never decreasing. */
  points: [number, number][];
  /** [from offset m, Manning's n], each up to the next. */
  roughness: [number, number][];
  /** Left and right bank offset, m. */
  banks: [number, number] | null;
  /** [easting, northing] a point, in the study's own coordinate system, where the survey gave them. */
  coordinates: [number, number][] | null;
  /** Stretches that hold water but do not carry it: set by the modeller, never surveyed. */
  storage?: StoragePart[];
  /** Ground behind them stays dry until the stage is over the crest. */
  embankments?: { left?: Embankment; right?: Embankment };
}

/** What a column of the file can mean. */
export const SURVEY_FIELDS = [
  'section',
  'chainage',
  'offset',
  'elevation',
  'roughness',
  'bank',
  'easting',
  'northing',
] as const;
export type SurveyField = (typeof SURVEY_FIELDS)[number];

export const LENGTH_UNITS = ['m', 'km', 'ft', 'usft'] as const;
export type LengthUnit = (typeof LENGTH_UNITS)[number];

/** How one heading was understood. */
export interface ColumnMatch {
  /** 0-based. */
  column: number;
  heading: string;
  field: SurveyField | null;
  /** For lengths; null for the others. */
  unit: LengthUnit | null;
  /** First values of the column as they stand in the file. */
  sample: string[];
}

export interface SheetMatch {
  sheet: string;
  /** One long table, one section, or a sheet that is passed over (notes, covers). */
  layout: 'longTable' | 'section' | 'ignored';
  /** 1-based row of the headings; 0 where there are none. */
  headingRow: number;
  columns: ColumnMatch[];
}

/** A person's own choice of match, sent along with the file; columns left out are matched by their headings. */
export interface MatchChoice {
  /** Applies to every sheet with this heading at this column. */
  columns: { column: number; field: SurveyField | null; unit: LengthUnit | null }[];
  decimal: 'auto' | 'point' | 'comma';
}

/** One fault of a survey file. */
export interface SurveyFault {
  sheet: string;
  /** 1-based as a spreadsheet counts; null where the fault is of the sheet or file. */
  row: number | null;
  /** Last row where the fault spans several. */
  lastRow: number | null;
  /** Letter as a spreadsheet counts; null where the fault is of the row. */
  column: string | null;
  /** What is wrong, a headline: `Elevation is missing`. */
  title: string;
  /** Where it lies and what would be right: `Section XS-07, offset 41.2 m. Neighbours read 38.11 and 38.40.` */
  detail: string;
  /** A doubt does not refuse the file. */
  severity: 'fault' | 'doubt';
}

/** What was read of a file. Nothing of it is stored unless it was accepted. */
export interface SurveyReading {
  fileName: string;
  sheets: SheetMatch[];
  decimal: 'point' | 'comma';
  sectionCount: number;
  pointCount: number;
  faults: SurveyFault[];
  /** Faults beyond the limit that are counted but not listed. */
  faultsNotListed: number;
  /** Sections for the drawing; empty while there are faults. */
  sections: Section[];
}

/** What an engineer said of a revision that was handed in. */
export interface SurveyDecision {
  decision: 'accepted' | 'returned';
  /** For the surveyor; never empty where it was returned. */
  remarks: string;
  by: string;
  at: string;
}

/** A revision that was handed in; never changes. `GET /api/studies/:studyId/surveys`. */
export interface SurveyRevisionRow {
  id: number;
  revision: number;
  fileName: string;
  /** SHA-256 of the file as it was sent, hex. */
  fileHash: string;
  note: string;
  sectionCount: number;
  pointCount: number;
  /** m. */
  firstChainage: number;
  lastChainage: number;
  sentBy: string;
  sentAt: string;
  /** null: an engineer has not decided yet. */
  decision: SurveyDecision | null;
}
export interface SurveyRevision extends SurveyRevisionRow {
  sections: Section[];
}

/** Of a refused file only this is kept. */
export interface SurveyRefusal {
  id: number;
  fileName: string;
  sentBy: string;
  sentAt: string;
  faultCount: number;
  faults: SurveyFault[];
}

export interface SurveyList {
  revisions: SurveyRevisionRow[];
  refusals: SurveyRefusal[];
}
