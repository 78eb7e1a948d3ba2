import type { Transaction } from 'sequelize';
import type { AuditEntry } from '../../audit/buildAudit';
import { conflict } from '../../errors';
import type { ReviewModel } from '../../models/Review';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';

/** What is done under the lock answers what the audit trail says of it. */
export type ReviewChange = (review: ReviewModel, transaction: Transaction) => Promise<AuditEntry>;

/** Everything that changes a check goes through here: one at a time a run, told in the audit trail, never once it is signed. */
export function buildChangeReview({ audit, models, sequelize }: Platform) {
  /** A check that nothing was sent of yet. */
  const begin = (runId: number) =>
    models.Review.bulkCreate(
      [
        {
          runId,
          state: 'draft',
          sentBy: null,
          sentTo: null,
          sentAt: null,
          method: '',
          assumptions: '',
          limits: '',
          answers: {},
          returnReason: null,
          outletProbeRunId: null,
        },
      ],
      { ignoreDuplicates: true },
    );

  /** Throws `conflict` where the run was signed. */
  async function change(run: RunModel, work: ReviewChange): Promise<void> {
    // Outside of the transaction: inserts that find their row there would wait for each other in a circle.
    await begin(run.id);
    await sequelize.transaction(async (transaction) => {
      const review = await models.Review.findOne({
        where: { runId: run.id },
        lock: transaction.LOCK.UPDATE,
        transaction,
        rejectOnEmpty: true,
      });
      if (await models.SignOff.findOne({ where: { runId: run.id }, transaction }))
        throw conflict(
          `Run ${run.number} is signed; nothing of it changes. Ask for a new run, which replaces it when it is signed.`,
        );
      await audit.note(await work(review, transaction), transaction);
    });
  }

  return change;
}

export type ChangeReview = ReturnType<typeof buildChangeReview>;

/** How the audit trail and mails call a run. */
export const named = ({ number, scenarioName, study }: RunModel): string =>
  `run ${number}, ${scenarioName}, of ${study!.title}`;

/** Throws `conflict` where the run is not with the checker. */
export function assertInCheck({ state }: ReviewModel, run: RunModel): void {
  if (state !== 'inCheck')
    throw conflict(
      `Run ${run.number} is not in check: ${state === 'returned' ? 'it was returned to the modeller' : 'it was not sent for checking'}.`,
    );
}
