import type { SignBody } from '../../../shared/review/schemas';
import { signStatement } from '../../../shared/review/statement';
import type { Attempts } from '../../auth/attempts';
import { fitsPassword } from '../../auth/passwords';
import { packJson } from '../../database/packedJson';
import { conflict, forbidden, invalid } from '../../errors';
import { signedMessage } from '../../mail/messages/review';
import type { RunModel } from '../../models/Run';
import type { UserModel } from '../../models/User';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { presentPoint } from '../../presenters/reviews';
import type { buildRuns } from '../runs';
import { assertInCheck, named, type ChangeReview } from './changeReview';
import type { FindReviews } from './findReviews';
import type { ReadReview } from './readReview';
import { told } from './sendForCheck';
import type { SignedRecord } from './signedRecord';
import { obstaclesOf, signerObstacles } from './standing';
import type { TellOthers } from './tellOthers';
import { makeCode } from './verificationCode';

interface Needs {
  attempts: Attempts;
  change: ChangeReview;
  find: FindReviews;
  /** Against the observed flood of its report. */
  observedOf: (run: RunModel) => Promise<SignedRecord['observed']>;
  reading: ReadReview;
  runs: ReturnType<typeof buildRuns>;
  standingChanged: (run: RunModel) => void;
  tell: TellOthers;
}

/**
 * Fixes run, case hash, solver version, checklist, points, statement and time under a name. Throws `forbidden` for one's
 * own run, `conflict` with every obstacle, `invalid` for another statement or a wrong password, and `tooMany`.
 */
export function buildSignRun(platform: Platform, needs: Needs) {
  const { audit, models, now } = platform;
  const { attempts, change, find, observedOf, reading, runs, standingChanged, tell } = needs;

  return async (run: RunModel, actor: Actor, body: SignBody): Promise<void> => {
    const signer = await models.User.findByPk(actor.id, { rejectOnEmpty: true });
    if (actor.id === run.requestedBy)
      throw forbidden(
        'You asked for this run; another senior engineer of your firm has to sign it.',
      );
    const own = signerObstacles(signer, run.requestedBy);
    if (own.length > 0) throw cannot(own);
    const { title: studyTitle } = run.study!;
    const { scenarioName, number } = run;
    if (body.statement !== signStatement({ studyTitle, scenarioName, number }))
      throw invalid([
        {
          path: 'statement',
          message: 'This is not the statement of this run. Load the page again and read it.',
        },
      ]);
    await assertPassword(signer, body.password, run);

    const firm = await models.Firm.findByPk(signer.firmId, { rejectOnEmpty: true });
    const stations = await runs.results.stations(run.studyId);
    const observed = await observedOf(run);
    let sentBy: number | null = null;
    await change(run, async (review, transaction) => {
      assertInCheck(review, run);
      sentBy = review.sentBy;
      const [checklist, points] = [
        await reading.checklistOf(run, review),
        (await find.pointsOf(review.id)).map(presentPoint),
      ];
      const obstacles = obstaclesOf({
        runNumber: number,
        routed: run.state === 'routed',
        state: 'inCheck',
        checklist,
        points,
      });
      if (obstacles.length > 0) throw cannot(obstacles);
      const sender = await models.User.findByPk(review.sentBy!, { rejectOnEmpty: true });
      const { clientName, place, purpose, title, unitSystem, verticalDatum } = run.study!;
      const record: SignedRecord = {
        firmName: firm.name,
        study: { title, clientName, place, verticalDatum, unitSystem, purpose },
        stations,
        sentBy: sender.name,
        sentAt: review.sentAt!.toISOString(),
        method: review.method,
        assumptions: review.assumptions,
        limits: review.limits,
        checklist,
        points,
        observed,
      };
      const at = now();
      await models.SignOff.create(
        {
          runId: run.id,
          reviewId: review.id,
          signedBy: actor.id,
          signerName: signer.name,
          qualification: signer.qualification!,
          registrationNumber: signer.registrationNumber!,
          statement: body.statement,
          at,
          caseHash: run.caseHash,
          solverVersion: run.solverVersion,
          verificationCode: makeCode(),
          supersedesRunId: await replacedBy(run),
          record: await packJson(record),
        },
        { transaction },
      );
      return told('run.signed', `Signed: ${named(run)}, case ${run.caseHash}`, run, actor);
    });
    standingChanged(run);
    tell.modellers(run, sentBy, ({ email: to }, link) =>
      signedMessage({ to, run: named(run), by: signer.name, link }),
    );
  };

  /** Whoever found a device unlocked may not try passwords here faster than at the door. */
  async function assertPassword(signer: UserModel, password: string, run: RunModel): Promise<void> {
    await attempts.begin(signer.email);
    if (!(await fitsPassword(signer.passwordHash, password))) {
      const words = `Signing refused, wrong password: ${named(run)}`;
      await audit.note({ ...told('run.signed', words, run, signer), outcome: 'refused' });
      throw invalid([
        { path: 'password', message: 'This is not your password. Nothing was signed.' },
      ]);
    }
    await attempts.forget(signer.email);
  }

  /** The newest signed run of the same scenario that was not withdrawn or replaced already. */
  async function replacedBy({ id, scenarioId }: RunModel): Promise<number | null> {
    const signed = await models.SignOff.findAll({
      include: [{ association: 'run', where: { scenarioId }, attributes: ['id'] }],
      order: [['id', 'DESC']],
    });
    const others = signed.filter(({ runId }) => runId !== id).map(({ runId }) => runId);
    const withdrawn = await models.Withdrawal.findAll({ where: { runId: others } });
    return others.find((runId) => !withdrawn.some((row) => row.runId === runId)) ?? null;
  }
}

const cannot = (obstacles: string[]) =>
  conflict(`It cannot be signed yet. ${obstacles.join(' ')}`, { obstacles });
