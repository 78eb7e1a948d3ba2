import type { ReviewModel } from '../../models/Review';
import type { ReviewPointModel } from '../../models/ReviewPoint';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor, Loaded } from '../../policies/subject';
import type { buildRuns } from '../runs';

/** A point with the run that it was raised on. */
export interface PointOfRun {
  point: ReviewPointModel;
  run: RunModel;
  /** For the audit trail. */
  scenarioName: string;
  number: number;
}

/** Checks by run, and points by id. */
export function buildFindReviews({ models }: Platform, { find }: ReturnType<typeof buildRuns>) {
  /** A run for `authorize`, owned by who asked for it: nobody signs their own. */
  async function load(runId: number, actor: Actor): Promise<Loaded<RunModel> | null> {
    const loaded = await find.load(runId, actor);
    return (
      loaded && { ...loaded, subject: { ...loaded.subject, ownerId: loaded.record.requestedBy } }
    );
  }

  /** For `authorize`. */
  async function loadPoint(pointId: number, actor: Actor): Promise<Loaded<PointOfRun> | null> {
    const point = await models.ReviewPoint.findByPk(pointId);
    const review = point && (await models.Review.findByPk(point.reviewId));
    const loaded = review && (await load(review.runId, actor));
    if (!loaded) return null;
    const { record: run, subject } = loaded;
    const { scenarioName, number } = run;
    return { record: { point, run, scenarioName, number }, subject };
  }

  const of = ({ id: runId }: RunModel): Promise<ReviewModel | null> =>
    models.Review.findOne({ where: { runId }, include: ['sender', 'recipient', 'outletProbe'] });

  const pointsOf = (reviewId: number): Promise<ReviewPointModel[]> =>
    models.ReviewPoint.findAll({
      where: { reviewId },
      include: ['raiser', { association: 'entries', include: ['writer'] }],
      order: [
        ['id', 'ASC'],
        ['entries', 'id', 'ASC'],
      ],
    });

  return { load, loadPoint, of, pointsOf };
}

export type FindReviews = ReturnType<typeof buildFindReviews>;
