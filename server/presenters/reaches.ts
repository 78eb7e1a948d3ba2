import type { Reach, ReachChange, ReachRow } from '../../shared/reaches/types';
import type { Section } from '../../shared/surveys/types';
import type { ReachModel } from '../models/Reach';
import type { ReachChangeModel } from '../models/ReachChange';
import { adviseReach } from '../services/reaches/advice/adviseReach';
import { describeSection } from '../services/reaches/describeSection';

/** Needs the reach's `survey` and `updater`. */
export const presentReachRow = (reach: ReachModel): ReachRow => ({
  id: reach.id,
  name: reach.name,
  surveyRevisionId: reach.surveyRevisionId,
  copiedFrom: reach.copiedFrom,
  revision: reach.survey!.revision,
  sectionCount: reach.sectionCount,
  firstChainage: reach.firstChainage,
  lastChainage: reach.lastChainage,
  version: reach.version,
  updatedAt: reach.updatedAt.toISOString(),
  updatedBy: reach.updater!.name,
});

export function presentReach(reach: ReachModel, sections: Section[]): Reach {
  const described = sections.map(describeSection);
  return {
    ...presentReachRow(reach),
    studyId: reach.studyId,
    sections: described,
    advice: adviseReach(described),
  };
}

/** Needs the change's `changer`. */
export const presentReachChange = (change: ReachChangeModel): ReachChange => ({
  version: change.version,
  words: change.words,
  steps: change.steps,
  changedBy: change.changer!.name,
  changedAt: change.changedAt.toISOString(),
});
