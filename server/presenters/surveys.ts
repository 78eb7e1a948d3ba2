import type {
  Section,
  SurveyDecision,
  SurveyRefusal,
  SurveyRevision,
  SurveyRevisionRow,
} from '../../shared/surveys/types';
import type { SurveyRefusalModel } from '../models/SurveyRefusal';
import type { SurveyRevisionModel } from '../models/SurveyRevision';
import { decisionOf } from '../services/surveys/decideSurvey';

/** Needs the revision's `sender` and its `decisions` with their `decider`. */
export const presentRevisionRow = (revision: SurveyRevisionModel): SurveyRevisionRow => ({
  id: revision.id,
  revision: revision.revision,
  fileName: revision.fileName,
  fileHash: revision.fileHash,
  note: revision.note,
  sectionCount: revision.sectionCount,
  pointCount: revision.pointCount,
  firstChainage: revision.firstChainage,
  lastChainage: revision.lastChainage,
  sentBy: revision.sender!.name,
  sentAt: revision.sentAt.toISOString(),
  decision: presentDecision(revision),
});

function presentDecision(revision: SurveyRevisionModel): SurveyDecision | null {
  const held = decisionOf(revision);
  if (!held) return null;
  const { decision, remarks, decider, decidedAt } = held;
  return { decision, remarks, by: decider!.name, at: decidedAt.toISOString() };
}

export const presentRevision = (
  revision: SurveyRevisionModel,
  sections: Section[],
): SurveyRevision => ({ ...presentRevisionRow(revision), sections });

/** Needs the refusal's `sender`. */
export const presentRefusal = (refusal: SurveyRefusalModel): SurveyRefusal => ({
  id: refusal.id,
  fileName: refusal.fileName,
  sentBy: refusal.sender!.name,
  sentAt: refusal.sentAt.toISOString(),
  faultCount: refusal.faultCount,
  faults: refusal.faults,
});
