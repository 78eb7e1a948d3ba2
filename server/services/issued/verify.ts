import { setTimeout as wait } from 'node:timers/promises';
import { QueryTypes } from 'sequelize';
import type { Verification } from '../../../shared/review/types';
import { notFound } from '../../errors';
import type { SignOffModel } from '../../models/SignOff';
import type { Platform } from '../../platform';
import type { ReviewsService } from '../review';
import { readCode } from '../review/verificationCode';

/** No answer comes sooner, so that its time does not tell whether a code exists. */
const ANSWER_MILLISECONDS = 200;

/** What the public page tells of a code from a report. Throws `notFound`. */
export function buildVerify({ models, sequelize }: Platform, reviews: ReviewsService) {
  return async (typed: string): Promise<Verification> => {
    const [found] = await Promise.all([look(typed), wait(ANSWER_MILLISECONDS)]);
    if (!found) throw notFound('This code');
    return found;
  };

  async function look(typed: string): Promise<Verification | null> {
    const verificationCode = readCode(typed) ?? '';
    const signOff = await models.SignOff.findOne({ where: { verificationCode } });
    return signOff && tell(signOff);
  }

  async function tell({
    at,
    qualification,
    runId,
    signerName,
  }: SignOffModel): Promise<Verification> {
    const [record, issue, withdrawal, successor, reportHashes] = await Promise.all([
      reviews.signedRecord(runId),
      models.Issue.findOne({ where: { runId } }),
      models.Withdrawal.findOne({ where: { runId } }),
      models.SignOff.findOne({ where: { supersedesRunId: runId } }),
      hashesOf(runId),
    ]);
    return {
      standing: withdrawal ? 'withdrawn' : successor ? 'superseded' : issue ? 'issued' : 'signed',
      signedBy: signerName,
      qualification,
      firmName: record!.firmName,
      signedAt: at.toISOString(),
      withdrawnAt: withdrawal?.at.toISOString() ?? null,
      supersededAt: successor?.at.toISOString() ?? null,
      reportHash: reportHashes[0] ?? null,
      reportHashes,
    };
  }

  /** Of the signed report, in every paper size that it was made in; those with an annex last. */
  async function hashesOf(runId: number): Promise<string[]> {
    const rows = await sequelize.query<{ hash: string }>(
      "SELECT hash FROM reports WHERE run_id = ? AND standing = 'signed' ORDER BY annex, paper",
      { replacements: [runId], type: QueryTypes.SELECT },
    );
    return rows.map(({ hash }) => hash);
  }
}
