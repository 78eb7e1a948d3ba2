import { fn, col } from 'sequelize';
import type { StudyBody } from '../../../shared/studies/schemas';
import type { StudyCounts, SurveyStanding } from '../../../shared/studies/types';
import type { StudyModel } from '../../models/Study';
import type { Platform } from '../../platform';
import { may } from '../../policies/decide';
import type { Actor, Loaded } from '../../policies/subject';
import { studySubject } from './studySubject';
import { surveyStandings } from './surveyStandings';

/** A study in a list, with what the person may know of its work. */
export interface ListedStudy {
  study: StudyModel;
  surveyRevision: number | null;
  surveyStanding: SurveyStanding | null;
  runCount: number | null;
}

export function buildStudies({ audit, models, sequelize }: Platform) {
  const { Study, StudyMember, Scenario, Run } = models;

  /** For `authorize`; also of everything that belongs to a study. */
  async function load(id: number, actor: Actor): Promise<Loaded<StudyModel> | null> {
    const study = await Study.findByPk(id, { include: 'creator' });
    return study && { record: study, subject: await studySubject(models, study, actor) };
  }

  /** What the person may read, newest work first. */
  async function list(actor: Actor): Promise<ListedStudy[]> {
    const studies = await Study.findAll({
      where: { firmId: actor.firmId },
      order: [
        ['updatedAt', 'DESC'],
        ['id', 'DESC'],
      ],
    });
    const memberships = await StudyMember.findAll({ where: { userId: actor.id } });
    const memberAs = new Map(memberships.map((member) => [member.studyId, member.as]));
    const visible = studies.filter(({ id, firmId }) =>
      may(actor, 'study.read', { firmId, memberAs: memberAs.get(id) ?? null }),
    );
    const ids = visible.map(({ id }) => id);
    const surveyed = ids.filter((id) => memberAs.get(id) === 'surveyor');
    const [surveys, own, runs] = await Promise.all([
      surveyStandings(models, ids),
      surveyStandings(models, surveyed, actor.id),
      runCounts(ids),
    ]);
    return visible.map((study) => {
      const seesWork = may(actor, 'reach.read', { firmId: study.firmId });
      return {
        study,
        surveyRevision: seesWork ? (surveys.get(study.id)?.accepted?.revision ?? null) : null,
        surveyStanding: seesWork
          ? (surveys.get(study.id)?.standing ?? 'none')
          : surveyed.includes(study.id)
            ? (own.get(study.id)?.standing ?? 'none')
            : null,
        runCount: seesWork ? (runs.get(study.id) ?? 0) : null,
      };
    });
  }

  async function create(actor: Actor, body: StudyBody): Promise<StudyModel> {
    const study = await sequelize.transaction(async (transaction) => {
      const values = { ...body, firmId: actor.firmId, createdBy: actor.id };
      const made = await Study.create(values, { transaction });
      const record = { kind: 'study', id: made.id };
      const words = `Study made: ${made.title}`;
      await audit.note({ action: 'study.made', words, record, actor }, transaction);
      return made;
    });
    return study.reload({ include: 'creator' });
  }

  const change = (study: StudyModel, body: StudyBody): Promise<StudyModel> =>
    sequelize.transaction(async (transaction) => {
      await study.update(body, { transaction });
      const record = { kind: 'study', id: study.id };
      const words = `Study changed: ${study.title}`;
      await audit.note({ action: 'study.changed', words, record }, transaction);
      return study;
    });

  /** What stands in the study; for those who may see its work. */
  async function counts({ id: studyId }: StudyModel): Promise<StudyCounts> {
    const [surveys, scenarios, runs] = await Promise.all([
      surveyStandings(models, [studyId]),
      Scenario.count({ where: { studyId } }),
      Run.count({ where: { studyId } }),
    ]);
    const { accepted = null, waiting = 0 } = surveys.get(studyId) ?? {};
    return {
      surveyRevision: accepted?.revision ?? null,
      surveysWaiting: waiting,
      sections: accepted?.sectionCount ?? null,
      scenarios,
      runs,
    };
  }

  async function runCounts(studyIds: number[]): Promise<Map<number, number>> {
    const rows = await Run.unscoped().findAll({
      where: { studyId: studyIds },
      attributes: ['studyId', [fn('COUNT', col('id')), 'number']],
      group: ['studyId'],
    });
    return new Map(rows.map((row) => [row.studyId, Number(row.number)]));
  }

  return { load, list, create, change, counts };
}

export type StudiesService = ReturnType<typeof buildStudies>;
