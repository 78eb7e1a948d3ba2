import type { CaseFile } from '../../../shared/case/caseFile';
import { ARRIVAL_RISE, type SectionResult } from '../../../shared/case/resultFile';
import { createCellTables } from '../geometry/cellTables';
import { needsReference } from '../geometry/needsReference';
import { createParts } from '../geometry/parts';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Grid } from '../geometry/grid';
import { sectionShape } from '../geometry/sectionProperties';
import { LEVEL_FIELDS, TABLE_STRIDE, writeSectionTable } from '../geometry/sectionTable';
import type { Workspace } from '../workspace';
import { placeOf } from './places';
import { waterVelocity } from './waterVelocity';

/** Follows the surveyed sections: their series at output times, their peaks and arrivals at every step. */
export interface SectionRecorder {
  follow(time: number): void;
  output(): void;
  results(): SectionResult[];
}

export function createSectionRecorder(
  caseFile: CaseFile,
  workspace: Workspace,
  grid: Grid,
): SectionRecorder {
  const { sections, numerics } = caseFile;
  const { stage, flow: cellFlow, bed: cellBed, faceFlow, gravity, dryDepth } = workspace;
  const count = sections.length;
  const table = new Float64Array(count * TABLE_STRIDE);
  const levels = new Int32Array(count);
  const level = new Int32Array(count);
  const bed = new Float64Array(count);
  const shapes = sections.map(sectionShape);
  shapes.forEach((shape, k) => {
    bed[k] = shape.bed;
    levels[k] = writeSectionTable(shape, table, k * TABLE_STRIDE);
  });
  const isCompound = numerics.momentum === 'compound';
  const isParted = needsReference(caseFile);
  const parts = createParts({ shapes, isCompound, isParted }, table, levels);
  const surveyed = { table, levels, level, gravity, parts, area: new Float64Array(count) };
  const tables = createCellTables(surveyed);
  const waves = createSectionWaves(surveyed, tables);
  const places = sections.map((section) => placeOf(section, grid));

  const now = { stage: 0, flow: 0, area: 0, velocity: 0 };
  const initial = new Float64Array(count).fill(NaN);
  const results: SectionResult[] = sections.map(({ id, chainage }, k) => ({
    id,
    chainage,
    bed: bed[k],
    stage: [],
    depth: [],
    flow: [],
    area: [],
    velocity: [],
    froude: [],
    peak: { stage: -Infinity, stageTime: 0, flow: 0, flowTime: 0, depth: 0, velocity: 0 },
    arrival: null,
  }));

  /** Stage, flow, area and velocity of section k at this moment, into `now`. */
  function look(k: number): void {
    const { left, right, weight, face, faceWeight } = places[k];
    const leftWet = stage[left] - cellBed[left] > dryDepth;
    const rightWet = stage[right] - cellBed[right] > dryDepth;
    now.stage = bed[k];
    now.flow = 0;
    now.area = 0;
    now.velocity = 0;
    // Beside dry ground the water stands level.
    const eta =
      leftWet && rightWet
        ? (1 - weight) * stage[left] + weight * stage[right]
        : leftWet
          ? stage[left]
          : rightWet
            ? stage[right]
            : bed[k];
    if (eta - bed[k] <= dryDepth) return;
    now.stage = eta;
    now.flow = (1 - faceWeight) * faceFlow[face] + faceWeight * faceFlow[face + 1];
    level[k] = (tables.rowAtStage(k, eta) - k * TABLE_STRIDE) / LEVEL_FIELDS;
    now.area = tables.areaAt(k, eta);
    const inCells = (1 - weight) * cellFlow[left] + weight * cellFlow[right];
    now.velocity = waterVelocity(now.flow, inCells, waves.flowAreaAt(k, eta, now.area));
  }

  /** 1 where a wave against the flow stands. */
  function froude(k: number): number {
    const { stage: eta, area, velocity } = now;
    if (!(area > 0)) return 0;
    const q = velocity * waves.flowAreaAt(k, eta, area);
    const drift = parts ? waves.driftAt(k, eta, area, q) : velocity;
    return Math.abs(drift) / waves.celerityAt(k, eta, area, q);
  }

  return {
    follow(time) {
      for (let k = 0; k < count; k++) {
        look(k);
        const result = results[k];
        const peak = result.peak;
        if (Number.isNaN(initial[k])) initial[k] = now.stage;
        if (now.stage > peak.stage) {
          peak.stage = now.stage;
          peak.stageTime = time;
        }
        if (Math.abs(now.flow) > Math.abs(peak.flow)) {
          peak.flow = now.flow;
          peak.flowTime = time;
        }
        if (Math.abs(now.velocity) > Math.abs(peak.velocity)) peak.velocity = now.velocity;
        if (result.arrival === null && now.stage - initial[k] >= ARRIVAL_RISE) {
          result.arrival = time;
        }
      }
    },
    output() {
      for (let k = 0; k < count; k++) {
        look(k);
        const result = results[k];
        const { velocity } = now;
        result.stage.push(now.stage);
        result.depth.push(now.stage - bed[k]);
        result.flow.push(now.flow);
        result.area.push(now.area);
        result.velocity.push(velocity);
        result.froude.push(froude(k));
      }
    },
    results() {
      for (const { peak, bed: lowest } of results) peak.depth = peak.stage - lowest;
      return results;
    },
  };
}
