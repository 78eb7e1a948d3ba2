import { CONFIDENCE_KINDS, type ConfidenceKind } from '../../../shared/confidence/schemas';
import { settingFacts } from '../../../shared/confidence/settingWords';
import type { UnitSystem } from '../../../shared/units/units';
import type { ConfidenceFacts } from '../../reports/types';
import type { ConfidenceSet } from '../confidence/readConfidence';

/** Of each kind the latest set, in the order of the kinds; of a signed run only what was finished when it was signed. */
export function confidenceFacts(
  sets: ConfidenceSet[],
  system: UnitSystem,
  signedAt: string | null,
): ConfidenceFacts[] {
  const seen = sets.filter(
    ({ set }) => signedAt === null || set.finishedAt!.getTime() <= Date.parse(signedAt),
  );
  return CONFIDENCE_KINDS.flatMap((kind: ConfidenceKind) => {
    const latest = seen.find(({ set }) => set.kind === kind);
    if (!latest) return [];
    const { failed, result, set, total } = latest;
    return [
      {
        name: set.name,
        kind,
        finishedAt: set.finishedAt!.toISOString(),
        total,
        failed,
        settings: settingFacts(set, system),
        result,
      },
    ];
  });
}
