import type { Role } from '../accounts/roles';
import type { UnitSystem } from '../units/units';
import type { StationLevel } from './stationLevels';

/** Nothing handed in, waiting for an engineer, or what became of it. */
export type SurveyStanding = 'none' | 'waiting' | 'returned' | 'accepted';

/** `GET /api/studies`: what a person may see of, newest work first. */
export interface StudyRow {
  id: number;
  title: string;
  clientName: string;
  place: string;
  unitSystem: UnitSystem;
  /** Latest accepted revision; null before the first. Null too for those who may not see the survey. */
  surveyRevision: number | null;
  /** Of the newest survey that one may see: for surveyors their own. null for those who may see none. */
  surveyStanding: SurveyStanding | null;
  runCount: number | null;
  updatedAt: string;
}

/** `GET /api/studies/:studyId`. */
export interface Study {
  id: number;
  title: string;
  clientName: string;
  place: string;
  verticalDatum: string;
  /** Name of what eastings and northings refer to; '' where it is not named. */
  coordinateSystem: string;
  unitSystem: UnitSystem;
  purpose: string;
  createdAt: string;
  updatedAt: string;
  createdBy: string;
  /** What the person asking may do here: the client shows no button that the server would refuse. */
  may: StudyAction[];
  counts: StudyCounts | null;
}

export interface StudyCounts {
  /** Newest accepted revision. */
  surveyRevision: number | null;
  /** Revisions that wait for an engineer. */
  surveysWaiting: number;
  sections: number | null;
  scenarios: number;
  runs: number;
}

export const STUDY_ACTIONS = [
  'study.read',
  'study.change',
  'study.share',
  'survey.read',
  'survey.send',
  'survey.decide',
  'reach.read',
  'reach.change',
  'scenario.read',
  'scenario.change',
  'run.read',
  'run.request',
] as const;
export type StudyAction = (typeof STUDY_ACTIONS)[number];

/** Surveyors and clients see only the studies that they are members of. `GET /api/studies/:studyId/members`. */
export interface StudyMember {
  userId: number;
  name: string;
  email: string;
  as: Extract<Role, 'surveyor' | 'client'>;
  since: string;
}

/** A named place on the reach: bridge, gauge, house. `GET /api/studies/:studyId/stations`, by chainage. */
export interface Station {
  id: number;
  name: string;
  /** m. */
  chainage: number;
  /** What the water is held against there. Left out in signatures that were given before there was any. */
  levels?: StationLevel[];
}
