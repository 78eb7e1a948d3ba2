import type { ReviewPoint, SignOff } from '../../shared/review/types';
import type { IssueModel } from '../models/Issue';
import type { ReviewPointModel } from '../models/ReviewPoint';
import type { SignOffModel } from '../models/SignOff';
import type { WithdrawalModel } from '../models/Withdrawal';
import { showCode } from '../services/review/verificationCode';

/** Needs the point's `raiser` and its `entries` with their `writer`. */
export const presentPoint = (point: ReviewPointModel): ReviewPoint => ({
  id: point.id,
  chainage: point.chainage,
  time: point.time,
  text: point.text,
  state: point.state,
  raisedBy: { id: point.raiser!.id, name: point.raiser!.name },
  raisedAt: point.raisedAt.toISOString(),
  entries: point.entries!.map(({ at, kind, text, writer }) => ({
    by: writer!.name,
    at: at.toISOString(),
    kind,
    text,
  })),
});

/** What was written since a signature. */
interface Since {
  issue: IssueModel | null;
  /** With its `withdrawer`. */
  withdrawal: WithdrawalModel | null;
  supersedesRunNumber: number | null;
  supersededByRunNumber: number | null;
}

export const presentSignOff = (signOff: SignOffModel, since: Since): SignOff => ({
  by: { id: signOff.signedBy, name: signOff.signerName },
  qualification: signOff.qualification,
  registrationNumber: signOff.registrationNumber,
  statement: signOff.statement,
  at: signOff.at.toISOString(),
  caseHash: signOff.caseHash,
  solverVersion: signOff.solverVersion,
  verificationCode: showCode(signOff.verificationCode),
  supersedesRunNumber: since.supersedesRunNumber,
  supersededByRunNumber: since.supersededByRunNumber,
  issuedAt: since.issue?.at.toISOString() ?? null,
  withdrawal: since.withdrawal && {
    by: since.withdrawal.withdrawer!.name,
    at: since.withdrawal.at.toISOString(),
    reason: since.withdrawal.reason,
  },
});
