import type { CaseFile } from '../../../shared/case/caseFile';
import type { RunWarning } from '../../../shared/case/resultFile';
import { q, say } from '../../../shared/units/message';
import type { Boundary } from '../boundaries/boundary';
import { risingRoot } from '../boundaries/rootNear';
import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Grid } from '../geometry/grid';
import type { Workspace } from '../workspace';
import { createStructure } from './createStructure';
import { createLevelPool, type LevelPool } from './levelPool';
import type { Release } from './release';
import { createReservoirBoundary } from './reservoirBoundary';
import { createSpillway } from './spillway';
import type { Structure, Water } from './structure';
import { createStructureFace, type StructureFace } from './structureFace';

/** A stage this far above the bed (m) and no structure can be meant to need it. */
const HIGHEST = 500;

/** Structures side by side at one face. */
export interface StructureGroup {
  face: number;
  structures: readonly Structure[];
  release: Release;
}

/** All structures of a run, and the reservoir at its head. */
export interface StructureSet {
  readonly groups: readonly StructureGroup[];
  readonly pool: LevelPool | null;
  /** The upstream end where there is a reservoir */
  readonly boundary: Boundary | null;
  slopes(): void;
  /** After the fluxes between cells; returns the fastest wave at a structure (m/s). */
  fluxes(time: number): number;
  /** At the start of every step */
  follow(time: number): void;
  /** Stage (m) that steady `flow` (m³/s) needs above face `face` for a stage below it; null where no structure stands or
   *  none lets so much through at any stage. */
  stageAbove(face: number, flow: number, stageBelow: number): number | null;
  /** A structure that at the start lets less through than these flows (m³/s) however high the water stands; null where
   *  there is none. Flows and stages (m) as of a profile, index 0..n+1. */
  holdsUp(flows: Float64Array, stages: Float64Array): Structure | null;
  /** Whether structures stand at a face between cells */
  holds(face: number): boolean;
  /** Stage (m) up to which still water stays behind the structures at a face between cells; -Infinity without any */
  keepsBack(face: number): number;
  /** Release (m³/s) of the reservoir at the start for a stage (m) below it */
  firstRelease(stageBelow: number): number;
}

/** null where a case has neither structures nor a reservoir. */
export function createStructureSet(
  { structures, upstream }: CaseFile,
  workspace: Workspace,
  tables: CellTables,
  grid: Grid,
  warn: (warning: RunWarning) => void,
): StructureSet | null {
  if (structures.length === 0 && upstream.kind !== 'reservoir') return null;
  const { n, area, stage, bed, gravity } = workspace;
  const waves = createSectionWaves(workspace, tables);
  const byFace = new Map<number, Structure[]>();
  for (const input of structures) {
    const isHead = upstream.kind === 'reservoir' && input.chainage === grid.start;
    const nearest = Math.round((input.chainage - grid.start) / grid.dx);
    const face = isHead ? 0 : Math.min(n - 1, Math.max(1, nearest));
    const chainage = grid.start + face * grid.dx;
    if (Math.abs(chainage - input.chainage) > 1e-6 * grid.dx)
      warnMoved(input.id, input.chainage, chainage);
    const list = byFace.get(face) ?? [];
    list.push(createStructure(input, chainage, workspace, tables));
    byFace.set(face, list);
  }

  const pool = upstream.kind === 'reservoir' ? createLevelPool(upstream) : null;
  const atHead = byFace.get(0) ?? [];
  byFace.delete(0);
  if (upstream.kind === 'reservoir' && upstream.spillway) {
    atHead.push(createSpillway(upstream.spillway, grid.start));
  }
  const head = pool ? createReservoirBoundary(workspace, tables, pool, atHead) : null;
  const faces: StructureFace[] = [...byFace]
    .sort(([a], [b]) => a - b)
    .map(([face, list]) => createStructureFace(workspace, tables, face, list));
  const groups: StructureGroup[] = [
    ...(head ? [{ face: 0, structures: atHead, release: head.release }] : []),
    ...faces,
  ];

  function warnMoved(id: string, from: number, to: number): void {
    warn({
      code: 'structureMoved',
      ...say`${id} stands at chainage ${q(from, 'chainage', { decimals: 2 })}; the nearest boundary between cells is at ${q(to, 'chainage', { decimals: 2 })}, where it is computed. Choose a cell size that divides the distance if that matters.`,
      chainage: to,
      time: null,
    });
  }

  function lowestOf(list: readonly Structure[]): number {
    return Math.min(...list.map((structure) => structure.lowest()));
  }

  function steadyFlow(list: readonly Structure[], water: Water): number {
    return list.reduce((sum, structure) => sum + structure.flow(water), 0);
  }

  /** What a group passes more than a flow (m³/s), by the stage above it (m) */
  function surplusOf(
    { face, structures: list }: StructureFace,
    flow: number,
    stageBelow: number,
  ): (eta: number) => number {
    return (eta) => {
      const a = waves.flowAreaAt(face, eta, tables.areaAt(face, eta));
      const velocityHead = a > 0 ? (flow / a) ** 2 / (2 * gravity) : 0;
      const deepest = (0.5 * a) / Math.max(tables.widthAt(face, eta), 1e-9);
      const water: Water = {
        stageUp: eta,
        energyUp: eta + Math.min(velocityHead, deepest),
        stageDown: stageBelow,
        cellUp: face,
        cellDown: face + 1,
        isForward: true,
        time: 0,
      };
      return steadyFlow(list, water) - flow;
    };
  }

  return {
    groups,
    pool,
    boundary: head?.boundary ?? null,
    slopes() {
      for (const face of faces) face.slopes();
    },
    fluxes(time) {
      let fastest = 0;
      for (const face of faces) fastest = Math.max(fastest, face.fluxes(time));
      return fastest;
    },
    follow(time) {
      for (const { face, structures: list } of groups) {
        const above = face === 0 && pool ? pool.stage() : area[face] > 0 ? stage[face] : -Infinity;
        for (const structure of list) structure.follow?.(above, time);
      }
    },
    stageAbove(face, flow, stageBelow) {
      const group = faces.find((one) => one.face === face);
      if (!group) return null;
      const floor = Math.max(stageBelow, bed[face]);
      if (!(flow > 0)) {
        // What is shut holds any water: there is none to say how much.
        const lowest = lowestOf(group.structures);
        return lowest < Infinity ? Math.max(floor, lowest) : floor;
      }
      const surplus = surplusOf(group, flow, stageBelow);
      return surplus(bed[face] + HIGHEST) < 0 ? null : risingRoot(surplus, floor, 0.1);
    },
    holdsUp(flows, stages) {
      const group = faces.find(
        (one) =>
          flows[one.face] > 0 &&
          surplusOf(one, flows[one.face], stages[one.face + 1])(bed[one.face] + HIGHEST) < 0,
      );
      return group ? group.structures[0] : null;
    },
    holds: (face) => faces.some((one) => one.face === face),
    keepsBack(face) {
      const group = faces.find((one) => one.face === face);
      return group ? lowestOf(group.structures) : -Infinity;
    },
    firstRelease(stageBelow) {
      if (!pool) return 0;
      const eta = pool.stage();
      if (stageBelow >= eta) return 0;
      return steadyFlow(atHead, {
        stageUp: eta,
        energyUp: eta,
        stageDown: stageBelow,
        cellUp: 0,
        cellDown: 1,
        isForward: true,
        time: 0,
      });
    },
  };
}
