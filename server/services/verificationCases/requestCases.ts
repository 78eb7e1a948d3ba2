import { conflict, invalid } from '../../errors';
import { PUBLISHED_CASES, publishedCase } from '../../verificationCases';
import type { VerificationPayload } from '../../jobs/tasks/verificationKind';
import type { Actor } from '../../policies/subject';
import type { buildTasks } from '../tasks';
import type { buildFindCases } from './findCases';

/**
 * Puts cases into the queue, all of them where none are named; those that wait or run already are left where they are. Throws
 * `invalid` for a case that is not there, `conflict` where none is left to be begun.
 */
export function buildRequestCases(
  tasks: ReturnType<typeof buildTasks>,
  { standings }: Pick<ReturnType<typeof buildFindCases>, 'standings'>,
) {
  return async (actor: Actor, caseIds: readonly string[] | undefined): Promise<void> => {
    const wanted = (caseIds ?? PUBLISHED_CASES.map(({ id }) => id)).map((id, i) => {
      const published = publishedCase(id);
      if (!published)
        throw invalid([
          {
            path: `caseIds[${i}]`,
            message: `There is no case "${id}". Take the ids of the list of cases.`,
          },
        ]);
      return published;
    });
    const found = await standings(actor.firmId);
    const left = [...new Set(wanted)].filter(({ id }) => {
      const state = found.get(id)?.task.state;
      return state !== 'queued' && state !== 'running';
    });
    if (left.length === 0)
      throw conflict('This is waiting or running already. Its result appears here by itself.');
    await tasks.create(actor, {
      kind: 'verification',
      name: left.length === 1 ? left[0].title : `${left.length} published cases`,
      settings: { caseIds: left.map(({ id }) => id) },
      input: null,
      members: left.map(({ id }) => ({
        label: id,
        payload: { caseId: id } satisfies VerificationPayload,
      })),
    });
  };
}
