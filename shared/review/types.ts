import type { LevelResult } from '../runs/levelResult';
/** States of the checking of a routed run, as stored. A run that was never sent has none. */
export const REVIEW_STATES = ['inCheck', 'returned', 'signed', 'issued', 'withdrawn'] as const;
export type ReviewState = (typeof REVIEW_STATES)[number];

export const REVIEW_STATE_WORDS: Record<ReviewState, string> = {
  inCheck: 'In check',
  returned: 'Returned',
  signed: 'Signed',
  issued: 'Issued',
  withdrawn: 'Withdrawn',
};

/** What the machine found, by itself, of one item of the checklist. */
export interface ChecklistItem {
  id: string;
  title: string;
  /** `good`, worth a look, or against the rule; `asked` waits for the modeller's words. */
  outcome: 'good' | 'look' | 'bad' | 'asked';
  /** What was found, with its numbers and units. */
  finding: string;
  /** The rule it is held to, and where that comes from. */
  rule: string;
  /** The modeller's words: on what was asked, or on a finding. */
  answer: string | null;
}

/** A point raised by the checker: on the run, on a place, or on a place at a time. */
export interface ReviewPoint {
  id: number;
  /** m; null: on the run as a whole. */
  chainage: number | null;
  /** s from start; null: not at one moment. */
  time: number | null;
  text: string;
  state: 'open' | 'answered' | 'closed';
  raisedBy: { id: number; name: string };
  raisedAt: string;
  /** Answers, closings and reopenings in their order. */
  entries: { by: string; at: string; kind: 'answer' | 'closed' | 'reopened'; text: string }[];
}

export interface SignOff {
  by: { id: number; name: string };
  qualification: string;
  registrationNumber: string;
  statement: string;
  at: string;
  caseHash: string;
  solverVersion: string;
  /** Printed on the report; the public page tells its standing. */
  verificationCode: string;
  supersedesRunNumber: number | null;
  supersededByRunNumber: number | null;
  issuedAt: string | null;
  withdrawal: { by: string; at: string; reason: string } | null;
}

/** `GET /api/runs/:runId/review`; `state: null` before it was sent. */
export interface Review {
  runId: number;
  state: ReviewState | null;
  requestedBy: string | null;
  sentTo: { id: number; name: string } | null;
  sentAt: string | null;
  method: string;
  assumptions: string;
  limits: string;
  checklist: ChecklistItem[];
  points: ReviewPoint[];
  returnReason: string | null;
  signOff: SignOff | null;
  /** Station ids that the client sees, chosen before issuing. */
  clientStationIds: number[];
  /** Clients who confirmed that they read what was issued. */
  reads: { by: string; at: string }[];
  /** Number of the run whose outlet this one tries; such a run is not checked itself. null: an ordinary run. */
  triesOutletOf: number | null;
  /** Second run that shows how far the outlet condition reaches; null: not asked for. */
  outletProbe: { runId: number; state: string } | null;
  may: (
    | 'review.send'
    | 'review.answer'
    | 'review.raise'
    | 'review.close'
    | 'review.return'
    | 'review.sign'
    | 'review.issue'
    | 'review.withdraw'
  )[];
  /** Why it cannot be signed, a line each; empty: it can. */
  obstacles: string[];
}

/** `GET /api/reviews/queue`: a senior engineer's, oldest first. */
export interface QueueRow {
  runId: number;
  runNumber: number;
  studyId: number;
  studyTitle: string;
  scenarioName: string;
  sentBy: string;
  sentAt: string;
  openPoints: number;
  mine: boolean;
}

/** `GET /api/reviews/recipients`: senior engineers of the firm that may sign this modeller's runs. */
export interface Recipient {
  id: number;
  name: string;
}

/** Public: `GET /api/verification/:code`. No more than this. */
export interface Verification {
  standing: 'signed' | 'issued' | 'superseded' | 'withdrawn';
  signedBy: string;
  qualification: string;
  firmName: string;
  signedAt: string;
  withdrawnAt: string | null;
  supersededAt: string | null;
  /** SHA-256 of the signed report, hex; the browser compares a dropped PDF with it. */
  reportHash: string | null;
  /** The same of each paper size that it was made in: a dropped PDF is the very one where its hash is among them. */
  reportHashes: string[];
}

/** What a client sees of an issued run: `GET /api/studies/:studyId/issued`. */
export interface IssuedResult {
  runId: number;
  title: string;
  signedBy: string;
  qualification: string;
  signedAt: string;
  issuedAt: string;
  withdrawn: { at: string; reason: string } | null;
  startsAt: string | null;
  sections: { id: string; chainage: number }[];
  stations: IssuedStation[];
  hazardGuideline: string;
  /** When the client confirmed having read it; null: not yet. */
  readAt: string | null;
}
export interface IssuedStation {
  stationId: number;
  name: string;
  chainage: number;
  times: number[];
  stage: number[];
  depth: number[];
  flow: number[];
  peakStage: number;
  peakStageTime: number;
  peakFlow: number;
  peakFlowTime: number;
  arrival: number | null;
  /** s; when the water is back within the banks; null: it never left them, or is out to the end. */
  withinBanksAgain: number | null;
  leavesBanks: boolean;
  hazard: { label: string; meaning: string } | null;
  /** As they were when it was signed. */
  levels: LevelResult[];
}
