import { createEndSection } from '../boundaries/endSection';
import { risingRoot } from '../boundaries/rootNear';
import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import { lossArea, type LocalLosses } from '../sources/localLosses';
import type { StructureSet } from '../structures/structureSet';
import type { Workspace } from '../workspace';

/**
 * The water surface of steady flow, integrated section by section over index 0..n+1:
 *   [β Q²/A_f] + g mean(A_f) [η] + g Δx mean(A_f S) + g A_h h = 0,  S = Q|Q|/K², h lost locally (localLosses.ts),
 * first upstream from `outletStage` on the subcritical branch, with critical depth where there is none; then downstream
 * from every such control on the supercritical branch, as far as its force Q²/A + g I1 is the greater (the rest is a
 * hydraulic jump). Chow (1959), chapters 9-10 and 15. At a structure the stage above is what its flow needs. Returns stages (m); `flows` are m³/s, not negative.
 */
export function steadyProfile(
  workspace: Workspace,
  tables: CellTables,
  flows: Float64Array,
  outletStage: number,
  structures: StructureSet | null = null,
  localLosses: LocalLosses | null = null,
): Float64Array {
  const { n, dx, gravity, bed } = workspace;
  const stages = new Float64Array(n + 2);
  const critical = new Float64Array(n + 2);
  const sections = Array.from({ length: n + 2 }, (_, i) => createEndSection(workspace, tables, i));

  // Area that flows, momentum flux and friction g A S at a stage.
  const waves = createSectionWaves(workspace, tables);
  const areaAt = (i: number, eta: number): number =>
    waves.flowAreaAt(i, eta, tables.areaAt(i, eta));
  const carried = (i: number, eta: number): number =>
    workspace.parts
      ? waves.carriedAt(i, eta, tables.areaAt(i, eta), flows[i])
      : flows[i] ** 2 / tables.areaAt(i, eta);
  const braked = (i: number, eta: number): number => {
    const k = tables.conveyanceAt(i, eta);
    return (gravity * areaAt(i, eta) * flows[i] ** 2) / (k * k);
  };
  /** Force over density of the loss at the face between i and i + 1 */
  const lost = (i: number, eta: number, etaNext: number): number => {
    if (!localLosses) return 0;
    const above = areaAt(i, eta);
    const below = areaAt(i + 1, etaNext);
    const head = localLosses.headAt(i, flows[i] / above, flows[i + 1] / below, 1);
    return gravity * lossArea(above, below) * head;
  };
  const distance = (i: number): number => (i === 0 || i === n ? 0.5 * dx : dx);
  /** Residual of the balance between i and i + 1. */
  const residual = (i: number, eta: number, etaNext: number): number =>
    carried(i + 1, etaNext) -
    carried(i, eta) +
    0.5 * gravity * (areaAt(i, eta) + areaAt(i + 1, etaNext)) * (etaNext - eta) +
    lost(i, eta, etaNext) +
    0.5 * distance(i) * (braked(i, eta) + braked(i + 1, etaNext));

  for (let i = 0; i < n + 2; i++) {
    critical[i] = flows[i] > 0 ? sections[i].criticalStage(flows[i]) : bed[i];
  }
  stages[n + 1] = Math.max(outletStage, critical[n + 1]);
  for (let i = n; i >= 0; i--) {
    const next = stages[i + 1];
    const held = structures?.stageAbove(i, flows[i], next) ?? null;
    if (held !== null) stages[i] = Math.max(held, critical[i]);
    else if (flows[i] > 0 && flows[i + 1] > 0) {
      stages[i] = risingRoot((eta) => -residual(i, eta, next), critical[i], 0.1);
    } else {
      stages[i] = Math.max(next, bed[i]);
    }
  }

  let shooting = stages[0] === critical[0] && flows[0] > 0;
  if (shooting && bed[0] > bed[1]) {
    const slope = (bed[0] - bed[1]) / (0.5 * dx);
    stages[0] = Math.min(critical[0], sections[0].normalStage(flows[0], slope));
  }
  for (let i = 0; i <= n; i++) {
    shooting = shooting || stages[i] === critical[i];
    if (!shooting || !(flows[i] > 0) || !(flows[i + 1] > 0)) continue;
    const j = i + 1;
    if (structures?.holds(i)) {
      shooting = false;
      continue;
    }
    const here = stages[i];
    if (residual(i, here, critical[j]) >= 0) {
      shooting = false;
      continue;
    }
    const floor = bed[j] + 1e-6 * Math.max(critical[j] - bed[j], 1e-6);
    const fast = risingRoot((eta) => -residual(i, here, eta), floor, 0.5 * (critical[j] - floor));
    const wins =
      sections[j].forceAt(fast, flows[j]) > sections[j].forceAt(stages[j], flows[j]) ||
      stages[j] === critical[j];
    if (wins && fast < critical[j]) stages[j] = fast;
    else shooting = false;
  }
  return stages;
}
