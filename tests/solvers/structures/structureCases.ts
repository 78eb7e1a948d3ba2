import type { CaseFile } from '@/shared/case/caseFile';
import type { StructureInput } from '@/shared/case/structures';
import { buildCase, buildSections, trapezoidPoints } from '../../helpers/solvers/caseBuilders';

/** A straight rectangular channel 20 m wide, 1 km long, its bed falling `fall` m, deep enough for any of the tests. */
export function channel(
  structures: StructureInput[],
  parts: Partial<CaseFile> = {},
  { width = 20, fall = 0.5, length = 1000, bed = 0 } = {},
): CaseFile {
  return buildCase({
    sections: buildSections(0, length, 2, 0.03, (x) =>
      trapezoidPoints(width, 0, bed + fall * (1 - x / length), 40),
    ),
    upstream: { kind: 'wall' },
    downstream: { kind: 'wall' },
    initial: { kind: 'still', stage: 2 },
    numerics: { cellSize: 20, duration: 1800, outputInterval: 300 },
    structures,
    ...parts,
  });
}

export const last = <T>(values: readonly T[]): T => values[values.length - 1];
