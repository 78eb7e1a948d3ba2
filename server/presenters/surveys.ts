import type {
  Section,
  SurveyRefusal,
  SurveyRevision,
  SurveyRevisionRow,
} from '../../shared/surveys/types';
import type { SurveyRefusalModel } from '../models/SurveyRefusal';
import type { SurveyRevisionModel } from '../models/SurveyRevision';

/** Needs the revision's `sender`. */
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
});

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
