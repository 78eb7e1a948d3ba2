import type { RunResiduals } from '../../../shared/calibration/types';
import { buildAttempts } from '../../auth/attempts';
import type { Background } from '../../background';
import type { Mailer } from '../../mail/Mailer';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { buildConfidence } from '../confidence';
import type { buildRuns } from '../runs';
import { buildAfterSigning } from './afterSigning';
import { buildChangeReview } from './changeReview';
import { buildFindReviews } from './findReviews';
import { buildPoints } from './points';
import { buildProbeOutlet } from './probeOutlet';
import { buildQueue } from './queue';
import { buildReadReview } from './readReview';
import { buildReturnRun } from './returnRun';
import { buildSendForCheck } from './sendForCheck';
import { buildSignRun } from './signRun';
import { buildTellOthers } from './tellOthers';

interface Needs {
  background: Background;
  mailer: Mailer;
  runs: ReturnType<typeof buildRuns>;
  confidence: ReturnType<typeof buildConfidence>;
  /** Against the observed flood of its report. */
  observedOf: (run: RunModel) => Promise<RunResiduals | null>;
  /** A run was signed, or its signature withdrawn: its report is drawn and kept. */
  standingChanged: (run: RunModel) => void;
}

/** The checking of runs: from sending for check to the signature, and what is added to it. */
export function buildReviews(platform: Platform, needs: Needs) {
  const { observedOf, runs, standingChanged } = needs;
  const find = buildFindReviews(platform, runs);
  const change = buildChangeReview(platform);
  const reading = buildReadReview(platform, needs, find);
  const tell = buildTellOthers(platform, needs);
  const attempts = buildAttempts(platform);
  return {
    load: find.load,
    loadPoint: find.loadPoint,
    read: reading.read,
    signedRecord: reading.signedRecord,
    ...buildSendForCheck(platform, change, tell),
    points: buildPoints(platform, change, runs),
    giveBack: buildReturnRun(platform, change, tell),
    sign: buildSignRun(platform, {
      attempts,
      change,
      find,
      observedOf,
      reading,
      runs,
      standingChanged,
      tell,
    }),
    ...buildAfterSigning(platform, { reading, standingChanged, tell }),
    probeOutlet: buildProbeOutlet(platform, change, runs),
    queue: buildQueue(platform),
  };
}

export type ReviewsService = ReturnType<typeof buildReviews>;
