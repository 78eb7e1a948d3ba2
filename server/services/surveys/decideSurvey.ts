import type { Transaction } from 'sequelize';
import type { SurveyDecisionBody } from '../../../shared/surveys/schemas';
import type { SurveyDecision } from '../../../shared/surveys/types';
import { conflict } from '../../errors';
import type { SurveyRevisionModel } from '../../models/SurveyRevision';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import type { TellOfSurveys } from './tellOfSurveys';

/** What an engineer says of a revision that was handed in. Needs its `decisions`. */
export const decisionOf = ({ decisions = [] }: SurveyRevisionModel) =>
  [...decisions].sort((a, b) => a.id - b.id).at(-1) ?? null;

/** With an acceptance a revision becomes the reach that is routed; with a return its surveyor is told what to mend. */
export function buildDecideSurvey(platform: Platform, tell: TellOfSurveys) {
  const { audit, models, sequelize, now } = platform;
  const { Reach, Study, SurveyDecision, SurveyRevision } = models;

  /** Notes the decision, and makes the reach where it is an acceptance. */
  async function note(
    revision: SurveyRevisionModel,
    actor: Pick<Actor, 'id'>,
    decision: SurveyDecision['decision'],
    remarks: string,
    transaction: Transaction,
  ): Promise<void> {
    await SurveyDecision.create(
      { surveyRevisionId: revision.id, decision, remarks, decidedBy: actor.id, decidedAt: now() },
      { transaction },
    );
    if (decision === 'returned') return;
    const { studyId, sections, sectionCount, firstChainage, lastChainage } = revision;
    await Reach.create(
      {
        ...{ studyId, sections, sectionCount, firstChainage, lastChainage },
        surveyRevisionId: revision.id,
        name: `Revision ${revision.revision}`,
        updatedBy: actor.id,
      },
      { transaction },
    );
  }

  /** Throws `conflict` where it was accepted already: work stands on it. What was returned may be accepted after all. */
  async function decide(
    { id }: SurveyRevisionModel,
    actor: Actor,
    { decision, remarks }: SurveyDecisionBody,
  ): Promise<void> {
    const revision = await sequelize.transaction(async (transaction) => {
      const lock = transaction.LOCK.UPDATE;
      const found = await SurveyRevision.scope('withSections').findByPk(id, {
        include: ['sender', 'decisions'],
        lock: { level: lock, of: SurveyRevision },
        transaction,
        rejectOnEmpty: true,
      });
      const before = decisionOf(found);
      if (before?.decision === 'accepted')
        throw conflict(`Revision ${found.revision} was accepted already; its reach may be in use.`);
      if (before && decision === 'returned')
        throw conflict(`Revision ${found.revision} was returned already.`);
      await note(found, actor, decision, remarks, transaction);
      const words = `Revision ${found.revision} ${decision}${remarks ? `: ${remarks}` : ''}`;
      const record = { kind: 'survey', id };
      await audit.note({ action: `survey.${decision}`, words, record, actor }, transaction);
      return found;
    });
    const study = await Study.findByPk(revision.studyId, { rejectOnEmpty: true });
    tell.decided(study, revision, actor, decision, remarks);
  }

  return { note, decide };
}
