import type { AnswersBody, SendForCheckBody } from '../../../shared/review/schemas';
import { conflict, invalid } from '../../errors';
import { sentConfirmedMessage, sentForCheckMessage } from '../../mail/messages/review';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { assertRouted } from '../runs/readResults';
import { named, type ChangeReview } from './changeReview';
import type { TellOthers } from './tellOthers';

/** What the modeller does: sends a run for checking, and answers the checklist. */
export function buildSendForCheck(
  { models, now }: Platform,
  change: ChangeReview,
  tell: TellOthers,
) {
  const { Review, User } = models;

  /** Throws `invalid` (recipient), `conflict` where it is not routed, in check already, or signed. */
  async function send(run: RunModel, actor: Actor, body: SendForCheckBody): Promise<void> {
    assertRouted(run);
    if (await Review.findOne({ where: { outletProbeRunId: run.id } }))
      throw conflict(
        `Run ${run.number} only tries the outlet of another run; it is not checked itself.`,
      );
    await assertRecipient(run, actor, body.sentTo);
    const by = await User.findByPk(actor.id, { rejectOnEmpty: true });
    await change(run, async (review, transaction) => {
      if (review.state === 'inCheck') throw conflict(`Run ${run.number} is in check already.`);
      const { sentTo, method, assumptions, limits } = body;
      await review.update(
        {
          state: 'inCheck',
          sentBy: actor.id,
          sentTo,
          sentAt: now(),
          method,
          assumptions,
          limits,
          returnReason: null,
        },
        { transaction },
      );
      return told('review.sent', `Sent for checking: ${named(run)}`, run, actor);
    });
    const about = { run: named(run), by: by.name };
    tell.seniors(run, body.sentTo, ({ email: to }, link) =>
      sentForCheckMessage({ ...about, to, link }),
    );
    tell.modellers(run, actor.id, ({ email: to }, link) =>
      sentConfirmedMessage({ ...about, to, link }),
    );
  }

  async function assertRecipient(run: RunModel, actor: Actor, sentTo: number | null) {
    if (sentTo === null) return;
    const { firmId } = actor;
    const person = await User.findOne({ where: { id: sentTo, firmId, active: true } });
    if (!person?.roles.includes('seniorEngineer') || person.id === run.requestedBy)
      throw invalid([
        {
          path: 'sentTo',
          message: 'Choose a senior engineer of your firm who did not ask for this run.',
        },
      ]);
  }

  /** Words of the modeller on the checklist; an empty answer takes one back. */
  async function answer(run: RunModel, actor: Actor, { answers }: AnswersBody): Promise<void> {
    assertRouted(run);
    await change(run, async (review, transaction) => {
      const given = Object.fromEntries(answers.map(({ id, answer: words }) => [id, words]));
      await review.update({ answers: { ...review.answers, ...given } }, { transaction });
      return told('review.answered', `Checklist answered: ${named(run)}`, run, actor);
    });
  }

  return { send, answer };
}

/** A row of the audit trail about a run. */
export const told = (action: string, words: string, { id }: RunModel, actor: Actor) => ({
  action,
  words,
  record: { kind: 'run', id },
  actor,
});
