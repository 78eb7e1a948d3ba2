import type { ChecklistItem, Review, ReviewPoint } from '../../../shared/review/types';
import type { ReviewModel } from '../../models/Review';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { reviewStateOf } from '../../presenters/reviewState';
import { presentPoint, presentSignOff } from '../../presenters/reviews';
import { buildGatherFacts, type FactsNeeds } from './checklist/gatherFacts';
import { checklistItems } from './checklist/items';
import type { FindReviews } from './findReviews';
import { readSignedRecord } from './readSignedRecord';
import type { SignedRecord } from './signedRecord';
import { allowedNow, obstaclesOf, signerObstacles } from './standing';

/** The check of a run as it stands, or as it was fixed by the signature. */
export function buildReadReview(
  platform: Platform,
  { confidence, observedOf, runs }: FactsNeeds,
  find: FindReviews,
) {
  const { models } = platform;
  const gather = buildGatherFacts(platform, { confidence, observedOf, runs });

  /** Empty before the run is routed. */
  async function checklistOf(run: RunModel, review: ReviewModel | null): Promise<ChecklistItem[]> {
    if (run.state !== 'routed') return [];
    const answers = review?.answers ?? {};
    return checklistItems(await gather(run, review), run.study!.unitSystem).map((item) => ({
      ...item,
      answer: answers[item.id] || null,
    }));
  }

  /** What was fixed by the signature; null before it. */
  async function signedRecord(runId: number): Promise<SignedRecord | null> {
    return (await readSignedRecord(models, runId))?.record ?? null;
  }

  async function signOffOf({ id: runId }: RunModel): Promise<Review['signOff']> {
    const signOff = await models.SignOff.findOne({ where: { runId } });
    if (!signOff) return null;
    const [issue, withdrawal, supersedes, supersededBy] = await Promise.all([
      models.Issue.findOne({ where: { runId } }),
      models.Withdrawal.findOne({ where: { runId }, include: 'withdrawer' }),
      signOff.supersedesRunId === null ? null : models.Run.findByPk(signOff.supersedesRunId),
      models.SignOff.findOne({ where: { supersedesRunId: runId }, include: 'run' }),
    ]);
    return presentSignOff(signOff, {
      issue,
      withdrawal,
      supersedesRunNumber: supersedes?.number ?? null,
      supersededByRunNumber: supersededBy?.run!.number ?? null,
    });
  }

  async function readsOf({ id: runId }: RunModel): Promise<Review['reads']> {
    const reads = await models.ClientRead.findAll({ where: { runId }, include: 'reader' });
    return reads.map(({ reader, at }) => ({ by: reader!.name, at: at.toISOString() }));
  }

  /** Needs a run read by `find.load`. */
  async function read(run: RunModel, actor: Actor): Promise<Review> {
    const [review, probed, record, signOff, issue, reads, person] = await Promise.all([
      find.of(run),
      models.Review.findOne({ where: { outletProbeRunId: run.id }, include: 'run' }),
      signedRecord(run.id),
      signOffOf(run),
      models.Issue.findOne({ where: { runId: run.id } }),
      readsOf(run),
      models.User.findByPk(actor.id, { rejectOnEmpty: true }),
    ]);
    const state = reviewStateOf(run);
    const points: ReviewPoint[] =
      record?.points ?? (review ? (await find.pointsOf(review.id)).map(presentPoint) : []);
    const checklist = record?.checklist ?? (await checklistOf(run, review));
    const subject = { firmId: run.study!.firmId, ownerId: run.requestedBy };
    const standing = {
      runNumber: run.number,
      routed: run.state === 'routed',
      state,
      checklist,
      points,
    };
    const obstacles = obstaclesOf(standing);
    const may = run.state === 'routed' && !probed ? allowedNow(actor, subject, state) : [];
    return {
      runId: run.id,
      state,
      requestedBy: run.requester!.name,
      sentTo: review?.recipient ? { id: review.recipient.id, name: review.recipient.name } : null,
      sentAt: review?.sentAt?.toISOString() ?? null,
      method: review?.method ?? '',
      assumptions: review?.assumptions ?? '',
      limits: review?.limits ?? '',
      checklist,
      points,
      returnReason: review?.returnReason ?? null,
      signOff,
      clientStationIds: issue?.stationIds ?? [],
      reads,
      triesOutletOf: probed?.run!.number ?? null,
      outletProbe: review?.outletProbe
        ? { runId: review.outletProbe.id, state: review.outletProbe.state }
        : null,
      may,
      obstacles: may.includes('review.sign')
        ? [...obstacles, ...signerObstacles(person, run.requestedBy)]
        : obstacles,
    };
  }

  return { read, checklistOf, signedRecord };
}

export type ReadReview = ReturnType<typeof buildReadReview>;
