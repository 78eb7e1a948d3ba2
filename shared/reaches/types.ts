import type { Section } from '../surveys/types';
import type { MessagePart, Said } from '../units/message';

/**
 * The geometry that is routed: the sections of an accepted survey revision with the modeller's bank marks and roughness, or
 * a working copy of them in which everything may be changed. The survey itself never changes. `GET /api/studies/:studyId/reaches`.
 */
export interface ReachRow {
  id: number;
  name: string;
  surveyRevisionId: number;
  /** The reach that this working geometry was copied from; null for the one made with its survey revision. */
  copiedFrom: number | null;
  revision: number;
  sectionCount: number;
  /** m. */
  firstChainage: number;
  lastChainage: number;
  /** Grows with each change; a change that names an older one is a conflict. */
  version: number;
  updatedAt: string;
  updatedBy: string;
}

/** `GET /api/reaches/:reachId`. */
export interface Reach extends ReachRow {
  studyId: number;
  sections: ReachSection[];
  advice: Advice[];
}

/** `GET /api/reaches/:reachId/changes`, newest first. */
export interface ReachChange {
  version: number;
  /** What differs from the version before. */
  words: string;
  /** What was done, step by step, where the editor told it. */
  steps: string[];
  changedBy: string;
  changedAt: string;
}

export interface ReachSection extends Section {
  /** Lowest point, m. */
  thalweg: number;
  /** Elevation at the bank marks, or at the section's ends, m. */
  leftBank: number;
  rightBank: number;
  /** Below the lower bank (or lower end): m, m², m³/s per unit root slope. */
  bankfull: { depth: number; topWidth: number; area: number; conveyance: number };
}

export type AdviceCode =
  'spacing' | 'adverseSlope' | 'conveyanceJump' | 'noBanks' | 'roughnessRange' | 'lowEnds';

/** Something that a careful modeller would look at, with its reason and its source. */
export interface Advice extends Said {
  code: AdviceCode;
  /** Sections it is about: one, or the two of an interval. */
  sectionIds: string[];
  /** m, where it is shown on the ribbon. */
  chainage: number;
  reason: string;
  /** Of the reason, where it has quantities. */
  reasonParts?: MessagePart[];
  source: string;
}
