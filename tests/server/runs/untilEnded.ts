import type { Services } from '../../../server/composition';
import type { RunModel } from '../../../server/models/Run';

/** Waits until a run has ended, whatever its end. */
export async function untilEnded(
  { models }: Pick<Services, 'models'>,
  runId: number,
  seconds = 60,
): Promise<RunModel> {
  const deadline = Date.now() + 1000 * seconds;
  for (;;) {
    const run = await models.Run.findByPk(runId, { rejectOnEmpty: true });
    if (run.state !== 'queued' && run.state !== 'running') return run;
    if (Date.now() > deadline) throw new Error(`Run ${runId} is still ${run.state}.`);
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}
