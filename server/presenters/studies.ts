import {
  STUDY_ACTIONS,
  type Station,
  type Study,
  type StudyAction,
  type StudyCounts,
  type StudyMember,
  type StudyRow,
} from '../../shared/studies/types';
import type { StationModel } from '../models/Station';
import type { StudyModel } from '../models/Study';
import type { StudyMemberModel } from '../models/StudyMember';
import { may } from '../policies/decide';
import type { Action } from '../policies/policies';
import type { Actor, Subject } from '../policies/subject';
import type { ListedStudy } from '../services/studies/studies';

export const presentStudyRow = ({
  study,
  surveyRevision,
  surveyStanding,
  runCount,
}: ListedStudy): StudyRow => ({
  id: study.id,
  title: study.title,
  clientName: study.clientName,
  place: study.place,
  unitSystem: study.unitSystem,
  surveyRevision,
  surveyStanding,
  runCount,
  updatedAt: study.updatedAt.toISOString(),
});

/** Of a study's surveys one may see at least a list, be it of one's own alone. */
const POLICY_OF: Partial<Record<StudyAction, Action>> = { 'survey.read': 'survey.list' };

export const allowedIn = (actor: Actor, subject: Subject): StudyAction[] =>
  STUDY_ACTIONS.filter((action) => may(actor, POLICY_OF[action] ?? (action as Action), subject));

/** Needs the study's `creator`; `counts` null for those who may not see its work. */
export const presentStudy = (
  study: StudyModel,
  allowed: StudyAction[],
  counts: StudyCounts | null,
): Study => ({
  id: study.id,
  title: study.title,
  clientName: study.clientName,
  place: study.place,
  verticalDatum: study.verticalDatum,
  coordinateSystem: study.coordinateSystem,
  unitSystem: study.unitSystem,
  purpose: study.purpose,
  createdAt: study.createdAt.toISOString(),
  updatedAt: study.updatedAt.toISOString(),
  createdBy: study.creator!.name,
  may: allowed,
  counts,
});

/** Needs the member's `user`. */
export const presentMember = ({ user, as, createdAt }: StudyMemberModel): StudyMember => ({
  userId: user!.id,
  name: user!.name,
  email: user!.email,
  as,
  since: createdAt.toISOString(),
});

export const presentStation = ({ id, name, chainage, levels }: StationModel): Station => ({
  id,
  name,
  chainage,
  levels: levels ?? [],
});
