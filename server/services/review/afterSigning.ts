import type { IssueBody, ReasonBody } from '../../../shared/review/schemas';
import { conflict, invalid } from '../../errors';
import { issuedMessage, withdrawnMessage } from '../../mail/messages/review';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { named } from './changeReview';
import type { ReadReview } from './readReview';
import { told } from './sendForCheck';
import type { TellOthers } from './tellOthers';

interface Needs {
  reading: ReadReview;
  standingChanged: (run: RunModel) => void;
  tell: TellOthers;
}

/** What is added to a signature: that it was issued, that it was withdrawn. The signature itself never changes. */
export function buildAfterSigning(platform: Platform, { reading, standingChanged, tell }: Needs) {
  const { audit, models, now, sequelize } = platform;
  const { Issue, Run, SignOff, Withdrawal } = models;

  /** Throws `invalid` (stations), `conflict` where it is not signed, issued already, or withdrawn. */
  async function issue(run: RunModel, actor: Actor, body: IssueBody): Promise<void> {
    const record = await reading.signedRecord(run.id);
    if (!record) throw conflict(`Run ${run.number} is not signed; only signed runs are issued.`);
    const stationIds = [...new Set(body.stationIds)];
    const known = new Set(record.stations.map(({ id }) => id));
    if (stationIds.some((id) => !known.has(id)))
      throw invalid([
        { path: 'stationIds', message: 'Choose among the stations that the run was signed with.' },
      ]);
    const signOff = await SignOff.findOne({ where: { runId: run.id }, rejectOnEmpty: true });
    await sequelize.transaction(async (transaction) => {
      await Run.findByPk(run.id, { lock: transaction.LOCK.UPDATE, transaction });
      const where = { runId: run.id };
      if (await Withdrawal.findOne({ where, transaction }))
        throw conflict(`The signature of run ${run.number} was withdrawn.`);
      if (await Issue.findOne({ where, transaction }))
        throw conflict(`Run ${run.number} is issued already.`);
      await Issue.create(
        { runId: run.id, issuedBy: actor.id, at: now(), stationIds, message: body.message },
        { transaction },
      );
      await audit.note(told('run.issued', `Issued: ${named(run)}`, run, actor), transaction);
    });
    const { firmName, study } = record;
    tell.clients(run, ({ email: to }, link) =>
      issuedMessage({
        to,
        run: named(run),
        by: signOff.signerName,
        link,
        studyTitle: study.title,
        firmName,
        message: body.message,
      }),
    );
  }

  /** Keeps the record, and tells whoever was told of it. Throws `conflict` where it is not signed, or withdrawn already. */
  async function withdraw(run: RunModel, actor: Actor, { reason }: ReasonBody): Promise<void> {
    const by = await models.User.findByPk(actor.id, { rejectOnEmpty: true });
    const issued = await sequelize.transaction(async (transaction) => {
      await Run.findByPk(run.id, { lock: transaction.LOCK.UPDATE, transaction });
      const where = { runId: run.id };
      if (!(await SignOff.findOne({ where, transaction })))
        throw conflict(`Run ${run.number} is not signed; there is nothing to withdraw.`);
      if (await Withdrawal.findOne({ where, transaction }))
        throw conflict(`The signature of run ${run.number} was withdrawn already.`);
      const found = await Issue.findOne({ where, transaction });
      await Withdrawal.create(
        { runId: run.id, withdrawnBy: actor.id, at: now(), reason },
        { transaction },
      );
      const words = `Signature withdrawn: ${named(run)}: ${reason}`;
      await audit.note(told('run.withdrawn', words, run, actor), transaction);
      return found !== null;
    });
    standingChanged(run);
    const about = { run: named(run), by: by.name, studyTitle: run.study!.title, reason };
    const review = await models.Review.findOne({ where: { runId: run.id } });
    tell.modellers(run, review?.sentBy ?? null, ({ email: to }, link) =>
      withdrawnMessage({ ...about, to, link }),
    );
    if (issued)
      tell.clients(run, ({ email: to }, link) => withdrawnMessage({ ...about, to, link }));
  }

  return { issue, withdraw };
}
