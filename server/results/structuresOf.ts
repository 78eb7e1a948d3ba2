import type { CaseFile } from '../../shared/case/caseFile';
import type { ResultFile, StructureResult } from '../../shared/case/resultFile';
import type { RunReservoir, RunStructure } from '../../shared/runs/types';
import { structureMarks, type StructureMark } from '../../shared/structures/structureMarks';

/** What is told first of each structure, and of the spillway of a reservoir among them, in the order of the result: its peaks of every step, and when the water passed it in another way. */
export function structuresOf({ structures }: CaseFile, result: ResultFile): RunStructure[] {
  return (result.structures ?? []).map((of) => {
    const given = structures.find(({ id, kind }) => id === of.id && kind === of.kind);
    const mark: StructureMark = given
      ? structureMarks([given])[0]
      : { id: 'Spillway', kind: 'spillway', chainage: of.chainage, foot: null, top: null };
    return {
      ...mark,
      note: given?.note ?? '',
      peak: of.peak,
      regimes: changesOf(of, result.times),
      ...(of.breach && { breach: breachOf(of.breach, result.times) }),
    };
  });
}

/** The first entry is the start; each holds until the next. */
function changesOf({ regime }: StructureResult, times: number[]): RunStructure['regimes'] {
  return regime.flatMap((now, k) =>
    k > 0 && now === regime[k - 1] ? [] : [{ time: times[k], regime: now }],
  );
}

function breachOf(
  { width, bottom }: NonNullable<StructureResult['breach']>,
  times: number[],
): NonNullable<RunStructure['breach']> {
  const begun = bottom.findIndex((level, k) => width[k] > 0 || level < bottom[0]);
  const last = times.length - 1;
  return {
    begins: begun < 0 ? null : times[Math.max(0, begun - 1)],
    width: width[last],
    bottom: bottom[last],
  };
}

/** Peaks at the output times. null where the upstream end is no reservoir. */
export function reservoirOf({ reservoir, times }: ResultFile): RunReservoir | null {
  if (!reservoir) return null;
  const { stage, release, balance } = reservoir;
  const [highest, greatest] = [stage, release].map((row) => row.indexOf(Math.max(...row)));
  return {
    peakStage: stage[highest],
    peakStageTime: times[highest],
    peakRelease: release[greatest],
    peakReleaseTime: times[greatest],
    balance,
  };
}
