import type { RunResiduals } from '../../shared/calibration/types';
import type { ConfidenceKind } from '../../shared/confidence/schemas';
import type { ConfidenceResult } from '../../shared/confidence/types';
import type { Review, SignOff } from '../../shared/review/types';
import type { Station } from '../../shared/studies/types';
import type { UnitSystem } from '../../shared/units/units';
import type { Section, SurveyRevisionRow } from '../../shared/surveys/types';

/** Of the checking, what is fixed by the signature: nothing in it moves afterwards. */
export type ReviewFacts = Pick<
  Review,
  'method' | 'assumptions' | 'limits' | 'checklist' | 'points'
> & { sentAt: string | null };

/** Of the signature, what never changes. */
export type SignOffFacts = Pick<
  SignOff,
  | 'qualification'
  | 'registrationNumber'
  | 'statement'
  | 'at'
  | 'verificationCode'
  | 'supersedesRunNumber'
> & { by: string };

/** A finished set of the run's frozen case. */
export interface ConfidenceFacts {
  name: string;
  kind: ConfidenceKind;
  finishedAt: string;
  total: number;
  failed: number;
  /** What was chosen, in words. */
  settings: [string, string | null][];
  result: ConfidenceResult;
}

export type WithdrawalFacts = NonNullable<SignOff['withdrawal']>;

/**
 * What a report says beside the frozen case and the stored results. Plain data: it travels to a worker thread, and it is
 * kept with the signed report, so that a later drawing of it tells the same.
 */
export interface ReportFacts {
  firmName: string;
  study: {
    title: string;
    clientName: string;
    place: string;
    verticalDatum: string;
    purpose: string;
    unitSystem: UnitSystem;
  };
  survey: Omit<SurveyRevisionRow, 'id' | 'decision'>;
  /** Sections of that revision, to tell what was routed from what was surveyed. */
  surveyed: Section[];
  run: {
    number: number;
    scenarioName: string;
    requestedBy: string;
    requestedAt: string;
    finishedAt: string;
    /** Clock time of t = 0, ISO 8601; null where there is none. */
    startsAt: string | null;
    caseHash: string;
    solverVersion: string;
  };
  stations: Station[];
  /** The latest finished set of each kind of this very case; of a signed run those that its signature saw. */
  confidence: ConfidenceFacts[];
  /** Against the observed flood that was chosen; null: none was. */
  observed: RunResiduals | null;
  /** null: never sent for checking. */
  review: ReviewFacts | null;
  /** null: preliminary. */
  signOff: SignOffFacts | null;
  /** null: it stands. */
  withdrawal: WithdrawalFacts | null;
  /** Where the public page of the code is; the code itself is added. */
  verificationAddress: string;
}

export type Standing = 'preliminary' | 'signed' | 'withdrawn';

export const standingOf = ({ signOff, withdrawal }: ReportFacts): Standing =>
  withdrawal ? 'withdrawn' : signOff ? 'signed' : 'preliminary';
