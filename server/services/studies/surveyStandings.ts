import type { SurveyStanding } from '../../../shared/studies/types';
import type { Models } from '../../models';

export interface StudySurveys {
  /** Newest accepted revision. */
  accepted: { revision: number; sectionCount: number } | null;
  /** Revisions that wait for an engineer. */
  waiting: number;
  /** Of the newest that counts. */
  standing: SurveyStanding;
}

/** How the surveys of studies stand; `sentBy` alone where it is given. Without an entry nothing was handed in. */
export async function surveyStandings(
  { SurveyRevision }: Models,
  studyIds: number[],
  sentBy?: number,
): Promise<Map<number, StudySurveys>> {
  if (studyIds.length === 0) return new Map();
  const revisions = await SurveyRevision.unscoped().findAll({
    where: { studyId: studyIds, ...(sentBy !== undefined && { sentBy }) },
    attributes: ['id', 'studyId', 'revision', 'sectionCount'],
    include: { association: 'decisions', attributes: ['id', 'decision'] },
    order: [['revision', 'ASC']],
  });
  const found = new Map<number, StudySurveys>();
  for (const { studyId, revision, sectionCount, decisions = [] } of revisions) {
    const before = found.get(studyId) ?? { accepted: null, waiting: 0, standing: 'none' };
    // An acceptance is final.
    const isAccepted = decisions.some(({ decision }) => decision === 'accepted');
    const waits = decisions.length === 0;
    found.set(studyId, {
      accepted: isAccepted ? { revision, sectionCount } : before.accepted,
      waiting: before.waiting + (waits ? 1 : 0),
      standing: isAccepted ? 'accepted' : waits ? 'waiting' : 'returned',
    });
  }
  return found;
}
