import type { ReasonBody } from '../../../shared/review/schemas';
import { returnedMessage } from '../../mail/messages/review';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { assertInCheck, named, type ChangeReview } from './changeReview';
import { told } from './sendForCheck';
import type { TellOthers } from './tellOthers';

/** Back to the modeller, with the reason. Throws `conflict` where it is not in check. */
export const buildReturnRun =
  ({ models }: Platform, change: ChangeReview, tell: TellOthers) =>
  async (run: RunModel, actor: Actor, { reason }: ReasonBody): Promise<void> => {
    const by = await models.User.findByPk(actor.id, { rejectOnEmpty: true });
    let sentBy: number | null = null;
    await change(run, async (review, transaction) => {
      assertInCheck(review, run);
      sentBy = review.sentBy;
      await review.update({ state: 'returned', returnReason: reason }, { transaction });
      return told('review.returned', `Returned: ${named(run)}: ${reason}`, run, actor);
    });
    tell.modellers(run, sentBy, ({ email: to }, link) =>
      returnedMessage({ to, run: named(run), by: by.name, link, reason }),
    );
  };
