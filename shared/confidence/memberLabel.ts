import type { UnitSystem } from '../units/units';
import { sideLabel } from './planMembers';
import type { SensitivitySettings } from './schemas';

/** What a member of a set is called in these units; `label` as it was stored, in SI. */
export function memberLabel(
  { kind, settings }: { kind: string; settings: unknown },
  { position, label }: { position: number; label: string },
  system: UnitSystem,
): string {
  if (kind !== 'sensitivity' || system === 'metric') return label;
  // The base case comes first, then two sides of each input.
  const { parameters } = settings as SensitivitySettings;
  const parameter = parameters[Math.floor((position - 1) / 2)] as
    SensitivitySettings['parameters'][number] | undefined;
  if (!parameter) return label;
  const { key, low, high } = parameter;
  return sideLabel(key, position % 2 === 1 ? low : high, system);
}
