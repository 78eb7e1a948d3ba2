import { canonical } from '../../../shared/case/canonical';
import { CONFIDENCE_KINDS, type ConfidenceKind } from '../../../shared/confidence/schemas';
import type {
  ConfidenceInput,
  ConfidencePayload,
  ConfidenceResult,
  ConvergenceResult,
} from '../../../shared/confidence/types';
import { varyCase } from '../../../shared/confidence/varyCase';
import { notFound } from '../../errors';
import type { TaskSetModel } from '../../models/TaskSet';
import type { buildTasks } from '../tasks';

/** A finished set of a case with its result. */
export interface ConfidenceSet {
  set: TaskSetModel;
  total: number;
  failed: number;
  result: ConfidenceResult;
}

const isConfidence = (kind: string): kind is ConfidenceKind =>
  (CONFIDENCE_KINDS as readonly string[]).includes(kind);

export function buildReadConfidence({ find }: ReturnType<typeof buildTasks>) {
  /** Throws `notFound` for a set of another kind, `conflict` where it has no result. */
  const result = async (set: TaskSetModel): Promise<ConfidenceResult> => {
    if (!isConfidence(set.kind)) throw notFound();
    return find.result<ConfidenceResult>(set);
  };
  return {
    result,

    /** Finished sets of a case of the firm, newest first, with what they found. */
    async ofCase(firmId: number, caseHash: string): Promise<ConfidenceSet[]> {
      const sets = (await find.list({ firmId, caseHash, state: 'finished' })).filter(({ set }) =>
        isConfidence(set.kind),
      );
      return Promise.all(
        sets.map(async ({ set, counts: { failed, total } }) => ({
          set,
          total,
          failed,
          result: await result(set),
        })),
      );
    },

    /** The latest finished convergence set of a case of the firm; null where there is none. */
    async latestConvergence(firmId: number, caseHash: string) {
      const [found] = await find.list({
        firmId,
        caseHash,
        kind: 'convergence',
        state: 'finished',
      });
      if (!found) return null;
      const { set } = found;
      return { set, result: await find.result<ConvergenceResult>(set) };
    },

    /** The case of one member, canonical JSON: it can be routed again without the server. Throws `notFound`. */
    async memberCase(set: TaskSetModel, taskId: number): Promise<{ label: string; text: string }> {
      const payload = await find.payload<ConfidencePayload>(set, taskId);
      if (!isConfidence(set.kind) || !payload) throw notFound('This member');
      const { caseFile } = await find.input<ConfidenceInput>(set);
      return {
        label: payload.label,
        text: canonical(varyCase(caseFile, payload.payload.variation)),
      };
    },
  };
}
