import type { StructureInput } from '../../case/structures';
import { Faults } from '../../case/validate/faults';
import { checkStructures as checkCaseStructures } from '../../case/validate/structureFaults';
import { buildStructure } from '../structures/buildStructure';
import type { StructureBody } from '../structures/schemas';
import type { ScenarioBody } from '../schemas';
import { topWidthAt } from '../../reaches/sectionGeometry';
import { sectionNear } from '../../structures/crests';
import type { Findings } from './Findings';
import type { ReachFacts } from './reachFacts';
import { checkBreach } from './structures/checkBreach';
import { checkBridge } from './structures/checkBridge';
import { checkCulvert } from './structures/checkCulvert';
import { checkSluice } from './structures/checkSluice';
import { checkWeir } from './structures/checkWeir';
import { partsOf, q, say } from '../../units/message';

/** A crest shorter than this share of the section is worth a second look: water cannot pass beside it. */
const SHORT = 0.5;

export function checkStructures(body: ScenarioBody, reach: ReachFacts, findings: Findings) {
  const structures = body.structures ?? [];
  const before = findings.faults.length;
  const names = new Map<string, number>();
  structures.forEach((structure, i) => {
    const path = `structures[${i}]`;
    const first = names.get(structure.id);
    if (!structure.id.trim())
      findings.fault(`${path}.id`, 'Name it: a letter or a number will do.');
    else if (first !== undefined)
      findings.fault(`${path}.id`, `Structure ${first + 1} has this name already. Choose another.`);
    else names.set(structure.id, i);
    checkPlace(structure, path, body, reach, findings);
    checkKind(structure, path, body, reach, findings);
  });
  if (findings.faults.length === before && structures.length > 0)
    checkAsCase(structures, body, reach, findings);
}

function checkPlace(
  { chainage }: StructureBody,
  path: string,
  { upstream }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  const at = `${path}.chainage`;
  if (!findings.number(at, chainage, 'Give the chainage where it stands.')) return;
  if (chainage === reach.first && upstream.kind !== 'reservoir')
    findings.fault(
      at,
      'At the first section only the dam of a reservoir can stand. Move it downstream, or choose a reservoir as the upstream end.',
    );
  else if (chainage! < reach.first || chainage! >= reach.last)
    findings.fault(at, 'It stands within the reach, between its first and its last section.');
}

function checkKind(
  structure: StructureBody,
  path: string,
  body: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  switch (structure.kind) {
    case 'weir':
      checkWeir(structure, path, findings);
      checkSpan(structure, path, reach, findings);
      break;
    case 'sluice':
      checkSluice(structure, path, findings);
      break;
    case 'culvert':
      checkCulvert(structure, path, findings);
      if (structure.offsets.length === 0)
        findings.doubt(
          `${path}.offsets`,
          'Water never flows over it: it stands as a wall above the barrels.',
        );
      break;
    case 'bridge':
      checkBridge(structure, path, findings);
      break;
    case 'breach':
      checkBreach(structure, path, findings, body, reach);
      checkSpan(structure, path, reach, findings);
  }
}

/** All water at a structure passes through it; a crest that leaves much of the section out is a wall there. */
function checkSpan(
  { offsets, levels, chainage }: { offsets: number[]; levels: number[]; chainage: number | null },
  path: string,
  reach: ReachFacts,
  findings: Findings,
) {
  if (offsets.length < 2 || chainage === null || chainage <= reach.first) return;
  const section = sectionNear(reach.sections, chainage);
  const width = topWidthAt(section, Math.max(...levels));
  if (offsets[offsets.length - 1] - offsets[0] < SHORT * width)
    findings.doubt(
      `${path}.offsets`,
      say`The section is ${q(width, 'length', { decimals: 0 })} wide at the level of the crest: beside the crest it stands as a wall.`,
    );
}

/** What the solver would refuse and nothing above has said: nothing reaches the queue to fail there. */
function checkAsCase(
  structures: readonly StructureBody[],
  { upstream, numerics }: ScenarioBody,
  reach: ReachFacts,
  findings: Findings,
) {
  const built = structures.map((structure, i): StructureInput =>
    buildStructure(structure, `structures[${i}]`),
  );
  const faults = new Faults();
  checkCaseStructures(faults, { structures: built, upstream, numerics }, [reach.first, reach.last]);
  for (const { path, ...said } of faults.list)
    findings.fault(formPath(path), say`It ${partsOf(said)}.`);
}

/** `structures[0].crest[2][1]` of the case is `structures[0].levels[2]` of the form. */
function formPath(path: string): string {
  return path
    .replace(/\.(crest|deck)\[(\d+)\](\[\d\])?$/, '.offsets[$2]')
    .replace(/\.(crest|deck)$/, '.offsets')
    .replace('.trigger.time', '.triggerTime')
    .replace('.trigger.stage', '.triggerStage');
}
