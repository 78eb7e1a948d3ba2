import { Faults } from '../../case/validate/faults';
import { checkEmbankments, checkStorage } from '../../case/validate/sectionPartFaults';
import type { Section } from '../../surveys/types';
import { partsOf, say } from '../../units/message';
import type { Findings } from './Findings';

/** Sections that can be routed: two or more, each with roughness everywhere and banks within. */
export function checkReachOf(sections: readonly Section[], findings: Findings) {
  if (sections.length < 2) findings.fault('reachId', 'The reach needs two sections or more.');
  const bare = sections.filter(({ roughness }) => roughness.length === 0);
  if (bare.length > 0)
    findings.fault(
      'reachId',
      `${named(bare)} no roughness yet. Set Manning's n under Reach, for many sections at once if you like.`,
    );
  const late = sections.filter(({ roughness, points }) => roughness[0]?.[0] > points[0][0]);
  if (late.length > 0)
    findings.fault('reachId', `${named(late)} no roughness at the left end. Mend it under Reach.`);
  for (const section of sections) checkParts(section, findings);
}

/** Storage parts and embankments by the rules of the solver itself. */
function checkParts({ id, points, banks, storage, embankments }: Section, findings: Findings) {
  const faults = new Faults();
  const ground = { points, banks };
  if (storage) checkStorage(faults, 'storage', storage, ground, embankments);
  if (embankments) checkEmbankments(faults, 'embankments', embankments, ground);
  for (const { path, ...said } of faults.list)
    findings.fault('reachId', say`Section ${id}, ${path}: ${partsOf(said)}. Mend it under Reach.`);
}

function named(sections: readonly Section[]): string {
  const ids = sections.slice(0, 3).map(({ id }) => id);
  if (sections.length === 1) return `Section ${ids[0]} has`;
  const rest = sections.length > ids.length ? ` and ${sections.length - ids.length} more` : '';
  return `Sections ${ids.join(', ')}${rest} have`;
}
