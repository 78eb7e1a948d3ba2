import type { Section } from '../../../shared/surveys/types';
import { packJson } from '../../../server/database/packedJson';
import type { Services } from '../../../server/composition';
import type { ReachModel } from '../../../server/models/Reach';
import type { StudyModel } from '../../../server/models/Study';

/** A trapezoid with floodplains, falling 1 in 1000: bed 6 m wide, banks 3 m up. SI. */
export const plainSections = (count = 4, spacing = 500): Section[] =>
  Array.from({ length: count }, (_, i) => {
    const bed = 10 - 0.001 * spacing * i;
    return {
      id: `XS-${String(i + 1).padStart(2, '0')}`,
      chainage: i * spacing,
      points: [
        [0, bed + 6],
        [10, bed + 3.2],
        [20, bed + 3],
        [26, bed],
        [32, bed],
        [38, bed + 3],
        [48, bed + 3.2],
        [58, bed + 6],
      ],
      roughness: [
        [0, 0.06],
        [20, 0.035],
        [38, 0.06],
      ],
      banks: [20, 38],
      coordinates: null,
    };
  });

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
  return models.Reach.create({
    ...extent,
    studyId: study.id,
    surveyRevisionId: survey.id,
    name: `Revision ${revision}`,
    sections: packed,
    updatedBy: study.createdBy,
  });
}
