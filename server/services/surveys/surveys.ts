import { createHash } from 'node:crypto';
import type { MatchChoice, Section, SurveyReading } from '../../../shared/surveys/types';
import { AppError, conflict } from '../../errors';
import { packJson, unpackJson } from '../../database/packedJson';
import type { StudyModel } from '../../models/Study';
import type { SurveyRefusalModel } from '../../models/SurveyRefusal';
import type { SurveyRevisionModel } from '../../models/SurveyRevision';
import type { Background } from '../../background';
import type { Mailer } from '../../mail/Mailer';
import type { Platform } from '../../platform';
import { may } from '../../policies/decide';
import type { Actor, Loaded, Subject } from '../../policies/subject';
import { studySubject } from '../studies/studySubject';
import { touchStudy } from '../studies/touchStudy';
import { readFile, type SentFile } from '../files/readFile';
import { buildDecideSurvey, decisionOf } from './decideSurvey';
import { buildTellOfSurveys } from './tellOfSurveys';

interface Sent {
  study: StudyModel;
  file: SentFile;
  choice: MatchChoice | null;
}

/** Surveys of a study: read, taken in as revisions that never change, or refused. */
export function buildSurveys(platform: Platform, mail: { background: Background; mailer: Mailer }) {
  const { audit, models, sequelize, now } = platform;
  const { Study, SurveyDecision, SurveyRefusal, SurveyRevision } = models;
  const tell = buildTellOfSurveys(platform, mail);
  const { note: noteDecision, decide } = buildDecideSurvey(platform, tell);
  const people = ['sender', { model: SurveyDecision, as: 'decisions', include: ['decider'] }];

  /** For `authorize`. */
  async function load(id: number, actor: Actor): Promise<Loaded<SurveyRevisionModel> | null> {
    const revision = await SurveyRevision.scope('withSections').findByPk(id, { include: people });
    return revision && { record: revision, subject: await subjectOf(revision, actor) };
  }

  /** For `authorize`. */
  async function loadRefusal(id: number, actor: Actor): Promise<Loaded<SurveyRefusalModel> | null> {
    const refusal = await SurveyRefusal.findByPk(id, { include: 'sender' });
    return refusal && { record: refusal, subject: await subjectOf(refusal, actor) };
  }

  async function subjectOf(
    sent: { studyId: number; sentBy: number },
    actor: Actor,
  ): Promise<Subject> {
    const study = await Study.findByPk(sent.studyId, { rejectOnEmpty: true });
    return { ...(await studySubject(models, study, actor)), ownerId: sent.sentBy };
  }

  /** What the person may read of a study's revisions and refusals, newest first. */
  async function list(study: StudyModel, actor: Actor) {
    const subject = await studySubject(models, study, actor);
    const visible = ({ sentBy }: { sentBy: number }) =>
      may(actor, 'survey.read', { ...subject, ownerId: sentBy });
    const where = { studyId: study.id };
    const [revisions, refusals] = await Promise.all([
      SurveyRevision.findAll({ where, include: people, order: [['revision', 'DESC']] }),
      SurveyRefusal.findAll({ where, include: 'sender', order: [['id', 'DESC']], limit: 50 }),
    ]);
    return { revisions: revisions.filter(visible), refusals: refusals.filter(visible) };
  }

  /** Reads and stores nothing. Throws `unreadable`, `tooLarge`, `timeout`. */
  const read = ({ study, file, choice }: Sent): Promise<SurveyReading> =>
    readFile(file, {
      kind: 'survey',
      options: {
        fileName: file.name,
        choice,
        defaultUnit: study.unitSystem === 'usCustomary' ? 'ft' : 'm',
      },
    });

  /**
   * Takes a file in as the study's next revision. Whoever may decide on surveys accepts their own with it; that of a
   * surveyor waits for an engineer. Throws as `read` does,
   * `surveyRefused` where it has faults, of which alone a note is kept, and `conflict` where it is the newest revision again.
   */
  async function accept(sent: Sent & { actor: Actor; note: string }): Promise<SurveyRevisionModel> {
    const { actor, study, file } = sent;
    const reading = await read(sent);
    const faults = reading.faults.filter(({ severity }) => severity === 'fault');
    if (faults.length > 0) return refuse(sent, reading);
    const { sections } = reading;
    const packed = await packJson(sections);
    const fileHash = createHash('sha256').update(file.bytes).digest('hex');
    const extent = {
      sectionCount: sections.length,
      firstChainage: sections[0].chainage,
      lastChainage: sections[sections.length - 1].chainage,
    };
    const subject = await studySubject(models, study, actor);
    const accepts = may(actor, 'survey.decide', { ...subject, ownerId: actor.id });
    const revision = await sequelize.transaction(async (transaction) => {
      // Numbers are counted under the study's lock, so that two that arrive at once follow each other.
      await Study.findByPk(study.id, { transaction, lock: transaction.LOCK.UPDATE });
      const newest = await SurveyRevision.scope('withSections').findOne({
        where: { studyId: study.id },
        include: 'decisions',
        order: [['revision', 'DESC']],
        transaction,
      });
      const stands = newest && decisionOf(newest)?.decision !== 'returned';
      if (stands && newest.fileHash === fileHash && newest.sections.equals(packed))
        throw conflict(
          `This file is revision ${newest.revision} already. Nothing was stored twice.`,
        );
      const revision = await SurveyRevision.create(
        {
          ...extent,
          studyId: study.id,
          revision: (newest?.revision ?? 0) + 1,
          fileName: file.name,
          fileHash,
          file: file.bytes,
          sections: packed,
          note: sent.note,
          pointCount: reading.pointCount,
          sentBy: actor.id,
          sentAt: now(),
        },
        { transaction },
      );
      if (accepts) await noteDecision(revision, actor, 'accepted', '', transaction);
      await touchStudy(platform, study.id, transaction);
      const taken = await revision.reload({ include: people, transaction });
      const words = `Revision ${revision.revision} of ${study.title} ${accepts ? 'taken in' : 'handed in'}`;
      const record = { kind: 'survey', id: revision.id };
      const action = accepts ? 'survey.accepted' : 'survey.handedIn';
      await audit.note({ action, words, record, actor }, transaction);
      return taken;
    });
    tell.handedIn(study, revision);
    return revision;
  }

  async function refuse(sent: Sent & { actor: Actor }, reading: SurveyReading): Promise<never> {
    const { faults, faultsNotListed } = reading;
    const count = faults.filter(({ severity }) => severity === 'fault').length + faultsNotListed;
    const { actor, file, study } = sent;
    await sequelize.transaction(async (transaction) => {
      const refusal = await SurveyRefusal.create(
        {
          studyId: study.id,
          fileName: file.name,
          faultCount: count,
          faults,
          sentBy: actor.id,
          sentAt: now(),
        },
        { transaction },
      );
      const words = `Survey ${file.name} for ${study.title} refused, faults: ${count}`;
      const record = { kind: 'refusal', id: refusal.id };
      const told = { action: 'survey.refused', words, record, actor, outcome: 'refused' as const };
      await audit.note(told, transaction);
    });
    throw new AppError(
      'surveyRefused',
      `Not taken in: ${count === 1 ? '1 fault' : `${count} faults`}. Nothing of the file was kept. Mend it and send it again.`,
      { details: reading },
    );
  }

  const sectionsOf = (revision: SurveyRevisionModel) => unpackJson<Section[]>(revision.sections);

  return { load, loadRefusal, list, read, accept, decide, sectionsOf };
}

export type SurveysService = ReturnType<typeof buildSurveys>;
