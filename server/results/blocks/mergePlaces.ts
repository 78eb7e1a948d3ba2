import type { SectionInput } from '../../../shared/case/caseFile';
import type { ResultFile } from '../../../shared/case/resultFile';
import { bankLevels } from '../bankLevels';
import type { PlaceColumns } from './blockTypes';

/** Closer than this, a cell and a surveyed section are one place, m. */
const SAME_PLACE = 1e-6;

export interface MergedPlaces extends PlaceColumns {
  /** Index of the cell, -1 for a surveyed section. */
  cell: Int32Array;
}

interface Ref {
  chainage: number;
  cell: number;
  section: number;
}

/**
 * Cells and surveyed sections in one line by chainage. The sections are exact and win over a cell at the same place;
 * banks lie on straight lines between the surveyed ones. `wave` is left at -1 for the caller.
 */
export function mergePlaces(sections: SectionInput[], result: ResultFile): MergedPlaces {
  const refs = inOrder(result);
  const n = refs.length;
  const doubles = () => new Float64Array(n);
  const merged: MergedPlaces = {
    chainage: Float64Array.from(refs, (r) => r.chainage),
    bed: doubles(),
    ...banksAt(sections, refs),
    peakStage: doubles(),
    peakStageTime: doubles(),
    peakDepth: doubles(),
    peakFlow: doubles(),
    peakFlowTime: doubles(),
    peakVelocity: doubles(),
    arrival: doubles(),
    section: Int32Array.from(refs, (r) => r.section),
    wave: new Int32Array(n).fill(-1),
    cell: Int32Array.from(refs, (r) => r.cell),
  };
  refs.forEach((ref, i) => setPeaks(merged, i, ref, result));
  return merged;
}

function inOrder(result: ResultFile): Ref[] {
  const refs: Ref[] = result.sections.map((s, section) => {
    return { chainage: s.chainage, section, cell: -1 };
  });
  let s = 0;
  result.cells.chainage.forEach((chainage, cell) => {
    while (s < result.sections.length && result.sections[s].chainage < chainage - SAME_PLACE) s++;
    const taken =
      s < result.sections.length && Math.abs(result.sections[s].chainage - chainage) <= SAME_PLACE;
    if (!taken) refs.push({ chainage, cell, section: -1 });
  });
  return refs.sort((a, b) => a.chainage - b.chainage);
}

function setPeaks(to: MergedPlaces, i: number, ref: Ref, result: ResultFile): void {
  const { section, cell } = ref;
  if (section >= 0) {
    const { bed, peak, arrival } = result.sections[section];
    to.bed[i] = bed;
    to.peakStage[i] = peak.stage;
    to.peakStageTime[i] = peak.stageTime;
    to.peakDepth[i] = peak.depth;
    to.peakFlow[i] = peak.flow;
    to.peakFlowTime[i] = peak.flowTime;
    to.peakVelocity[i] = peak.velocity;
    to.arrival[i] = arrival ?? NaN;
    return;
  }
  const { cells } = result;
  to.bed[i] = cells.bed[cell];
  to.peakStage[i] = cells.peakStage[cell];
  to.peakStageTime[i] = cells.peakStageTime[cell];
  to.peakDepth[i] = cells.peakDepth[cell];
  to.peakFlow[i] = cells.peakFlow[cell];
  to.peakFlowTime[i] = cells.peakFlowTime[cell];
  to.peakVelocity[i] = cells.peakVelocity[cell];
  to.arrival[i] = cells.arrival[cell] ?? NaN;
}

function banksAt(sections: SectionInput[], refs: Ref[]) {
  const levels = sections.map(bankLevels);
  const leftBank = new Float64Array(refs.length);
  const rightBank = new Float64Array(refs.length);
  let s = 0;
  refs.forEach(({ chainage }, i) => {
    while (s < sections.length - 2 && sections[s + 1].chainage < chainage) s++;
    const span = sections[s + 1].chainage - sections[s].chainage;
    const t = Math.min(1, Math.max(0, (chainage - sections[s].chainage) / span));
    leftBank[i] = (1 - t) * levels[s].left + t * levels[s + 1].left;
    rightBank[i] = (1 - t) * levels[s].right + t * levels[s + 1].right;
  });
  return { leftBank, rightBank };
}
