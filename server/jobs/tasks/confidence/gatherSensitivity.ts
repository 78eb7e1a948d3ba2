import type {
  ConfidenceInput,
  ConfidencePayload,
  MemberSummary,
  SensitivityResult,
  SensitivitySide,
} from '../../../../shared/confidence/types';
import type { GatheredMember } from '../taskKind';

type Member = GatheredMember<ConfidencePayload, MemberSummary>;

/** What each input does to the stations when it alone is lower and higher. */
export function gatherSensitivity(members: Member[], input: ConfidenceInput): SensitivityResult {
  const base = members.find(({ payload }) => payload.role.kind === 'base')?.result;
  if (!base)
    throw new Error('The base case did not come to a result; there is nothing to compare with.');
  const rows = new Map<string, Partial<SensitivityResult['rows'][number]>>();
  for (const { payload, result } of members) {
    const { role } = payload;
    if (role.kind !== 'side') continue;
    const side: SensitivitySide = { value: role.value, stations: result?.stations ?? null };
    rows.set(role.parameter, {
      ...rows.get(role.parameter),
      parameter: role.parameter,
      [role.side]: side,
    });
  }
  return {
    kind: 'sensitivity',
    cellSize: base.cellSize,
    stations: input.stations,
    base: base.stations,
    rows: [...rows.values()] as SensitivityResult['rows'],
  };
}
