import type { CaseFile } from '../../../shared/case/caseFile';
import { LIMITS } from '../../../shared/limits';
import { conflict } from '../../errors';
import type { RunModel } from '../../models/Run';
import type { Platform } from '../../platform';
import type { Actor } from '../../policies/subject';
import { assertRouted } from '../runs/readResults';
import type { buildRuns } from '../runs';
import { named, type ChangeReview } from './changeReview';
import { changeOutlet } from './changeOutlet';
import { told } from './sendForCheck';

const SUFFIX = ', outlet changed';

/**
 * Asks for a second run of the same case with a changed outlet; the checklist compares the two. Throws `conflict` where
 * one is asked for already, or the end is closed.
 */
export const buildProbeOutlet =
  ({ models }: Platform, change: ChangeReview, runs: ReturnType<typeof buildRuns>) =>
  async (run: RunModel, actor: Actor): Promise<void> => {
    assertRouted(run);
    const caseFile = JSON.parse((await runs.exports.caseFile(run)).toString('utf8')) as CaseFile;
    const changed = changeOutlet(caseFile);
    if (!changed)
      throw conflict('The downstream end is closed; there is no outlet condition to change.');
    await change(run, async (review, transaction) => {
      const before = review.outletProbeRunId;
      const earlier = before === null ? null : await models.Run.findByPk(before);
      if (earlier && earlier.state !== 'failed' && earlier.state !== 'cancelled')
        throw conflict(`Run ${earlier.number} tries the outlet already.`);
      const { reachId, scenarioId, startsAt, studyId } = run;
      const scenarioName = `${run.scenarioName.slice(0, LIMITS.textShort - SUFFIX.length)}${SUFFIX}`;
      const probe = await runs.requestCase(
        actor,
        { studyId, scenarioId, reachId, scenarioName, startsAt },
        changed,
      );
      await review.update({ outletProbeRunId: probe.id }, { transaction });
      const words = `Second run for the outlet, run ${probe.number}: ${named(run)}`;
      return told('review.probed', words, run, actor);
    });
  };
