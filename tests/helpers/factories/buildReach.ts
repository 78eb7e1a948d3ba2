import type { Section } from '../../../shared/surveys/types';
import { plainSections } from '../plainSections';
import { packJson } from '../../../server/database/packedJson';
import type { Services } from '../../../server/composition';
import type { ReachModel } from '../../../server/models/Reach';
import type { StudyModel } from '../../../server/models/Study';

/** An accepted revision with its reach, stored as they are when a file is taken in. */
export async function buildReach(
  { models }: Services,
  study: StudyModel,
  sections: Section[] = plainSections(),
): Promise<ReachModel> {
  const packed = await packJson(sections);
  const extent = {
    sectionCount: sections.length,
    firstChainage: sections[0].chainage,
    lastChainage: sections[sections.length - 1].chainage,
  };
  const revision = (await models.SurveyRevision.count({ where: { studyId: study.id } })) + 1;
  const survey = await models.SurveyRevision.create({
    ...extent,
    studyId: study.id,
    revision,
    fileName: 'survey.xlsx',
    fileHash: '0'.repeat(64),
    file: Buffer.from('file'),
    sections: packed,
    note: '',
    pointCount: sections.reduce((sum, { points }) => sum + points.length, 0),
    sentBy: study.createdBy,
    sentAt: new Date(),
  });
  await models.SurveyDecision.create({
    surveyRevisionId: survey.id,
    decision: 'accepted',
    remarks: '',
    decidedBy: study.createdBy,
    decidedAt: new Date(),
  });
  return models.Reach.create({
    ...extent,
    studyId: study.id,
    surveyRevisionId: survey.id,
    name: `Revision ${revision}`,
    sections: packed,
    updatedBy: study.createdBy,
  });
}
