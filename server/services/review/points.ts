import type { PointBody, PointEntryBody } from '../../../shared/review/schemas';
import { formatDuration } from '../../../shared/units/format';
import { q, say, sayIn } from '../../../shared/units/message';
import { conflict, invalid } from '../../errors';
import type { ReviewPointModel } from '../../models/ReviewPoint';
import type { ReviewPointEntryModel } from '../../models/ReviewPointEntry';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import type { buildRuns } from '../runs';
import { assertInCheck, named, type ChangeReview } from './changeReview';
import { told } from './sendForCheck';

type Kind = ReviewPointEntryModel['kind'];

/** From which states a point is moved by an entry, and to which. */
const MOVES: Record<Kind, { from: ReviewPointModel['state'][]; to: ReviewPointModel['state'] }> = {
  answer: { from: ['open', 'answered'], to: 'answered' },
  closed: { from: ['open', 'answered'], to: 'closed' },
  reopened: { from: ['answered', 'closed'], to: 'open' },
};
const ACTIONS: Record<Kind, string> = {
  answer: 'point.answered',
  closed: 'point.closed',
  reopened: 'point.reopened',
};

/** Points of a check: raised, answered, closed, reopened. */
export function buildPoints(
  { models, now }: Platform,
  change: ChangeReview,
  { results }: ReturnType<typeof buildRuns>,
) {
  const { ReviewPoint, ReviewPointEntry } = models;

  /** Throws `invalid` off the reach or the time of the run, `conflict` where it is not in check. */
  async function raise(run: RunModel, actor: Actor, body: PointBody): Promise<void> {
    await assertOnRun(run, body);
    await change(run, async (review, transaction) => {
      assertInCheck(review, run);
      const { chainage, time, text } = body;
      const point = await ReviewPoint.create(
        {
          reviewId: review.id,
          chainage,
          time,
          text,
          state: 'open',
          raisedBy: actor.id,
          raisedAt: now(),
        },
        { transaction },
      );
      return {
        ...told('point.raised', `Point raised on ${named(run)}: ${text}`, run, actor),
        record: { kind: 'point', id: point.id },
      };
    });
  }

  async function assertOnRun(run: RunModel, { chainage, time }: PointBody): Promise<void> {
    const { sections } = await results.open(run).facts();
    const [from, to] = [sections[0].chainage, sections[sections.length - 1].chainage];
    if (chainage !== null && (chainage < from || chainage > to))
      throw invalid([
        {
          path: 'chainage',
          message: sayIn(
            run.study!.unitSystem,
            say`The reach goes from chainage ${q(from, 'chainage')} to ${q(to, 'chainage')}.`,
          ),
        },
      ]);
    if (time !== null && time > run.duration)
      throw invalid([
        { path: 'time', message: `The run ends after ${formatDuration(run.duration)}.` },
      ]);
  }

  /** Throws `invalid` for an empty answer, `conflict` where the point or the check is past it. */
  async function write(
    { point: { id }, run }: { point: ReviewPointModel; run: RunModel },
    actor: Actor,
    kind: Kind,
    { text }: PointEntryBody,
  ): Promise<void> {
    if (kind === 'answer' && !text) throw invalid([{ path: 'text', message: 'Write the answer.' }]);
    if (kind === 'reopened' && !text)
      throw invalid([{ path: 'text', message: 'Say what is still open.' }]);
    await change(run, async (_review, transaction) => {
      const point = await ReviewPoint.findByPk(id, {
        lock: transaction.LOCK.UPDATE,
        transaction,
        rejectOnEmpty: true,
      });
      const { from, to } = MOVES[kind];
      if (!from.includes(point.state))
        throw conflict(`This point is ${point.state} already. Load the page again.`);
      const entry = { pointId: id, kind, text, writtenBy: actor.id, at: now() };
      await ReviewPointEntry.create(entry, { transaction });
      await point.update({ state: to }, { transaction });
      const words = `Point on ${named(run)} ${kind === 'answer' ? 'answered' : kind}`;
      return { ...told(ACTIONS[kind], words, run, actor), record: { kind: 'point', id } };
    });
  }

  return { raise, write };
}
