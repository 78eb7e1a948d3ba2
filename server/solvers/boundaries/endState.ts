import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { Workspace } from '../workspace';

/** What the inside of the reach brings to one of its ends, on the section there. */
export interface EndState {
  stage: number;
  area: number;
  flow: number;
  /** Waves run at velocity ± celerity: Q/A where all of the section flows evenly, else β Q/A_f */
  velocity: number;
  celerity: number;
  /** Share of the pressure along the half cell at the end that its cell is to feel: 1 but on steep, shallow flow */
  path: number;
}

export interface End {
  /** 0 or n + 1: the section at the end */
  section: number;
  /** The cell beside it */
  cell: number;
  /** The face, 0 or n */
  face: number;
  /** +1 downstream, -1 upstream: the sign of outgoing flow */
  outward: 1 | -1;
}

export function upstreamEnd(): End {
  return { section: 0, cell: 1, face: 0, outward: -1 };
}

export function downstreamEnd(n: number): End {
  return { section: n + 1, cell: n, face: n, outward: 1 };
}

/** A cell can be sloped without doubt where its surface clears the beds around it by this share of its depth. */
const CLEARLY = 0.03;

/**
 * Extrapolates the state of the last cell over its half to the section at the end. Where that section differs abruptly
 * from the cell's at equal stage (a steep or a stepped bed) and the water is fast, the area of the cell is taken along
 * instead of its stage. Where a cell cannot be sloped, the face between two cells gives the whole fall to the lower
 * one: so must the ends, by `path`. At a free outlet slow water falls over an abrupt end as well; elsewhere it must be
 * able to stand level. The returned function fills and returns one object.
 */
export function createEndState(
  workspace: Workspace,
  tables: CellTables,
  end: End,
  isFree = false,
): () => EndState {
  const { n, area, flow, stage, celerity, slopeStage, slopeFlow, slopeFloor } = workspace;
  const { bed, dryDepth } = workspace;
  const { section, cell, outward } = end;
  const waves = createSectionWaves(workspace, tables);
  const { cellFlowArea } = waves;
  const inner = Math.min(n, Math.max(1, cell - outward));
  const state: EndState = { stage: 0, area: 0, flow: 0, velocity: 0, celerity: 0, path: 1 };

  return function endState() {
    const etaCell = stage[cell];
    state.stage = etaCell;
    state.area = 0;
    state.flow = 0;
    state.velocity = 0;
    state.celerity = 0;
    state.path = 1;
    if (etaCell - bed[cell] <= dryDepth) return state;

    const own = area[cell];
    const level = tables.areaAt(section, etaCell);
    const froude = Math.abs(flow[cell]) / (cellFlowArea[cell] * celerity[cell]);
    const clear = Math.min(etaCell, stage[inner]) - Math.max(slopeFloor[cell], slopeFloor[inner]);
    const flat = Math.min(1, Math.max(0, 1 - clear / (CLEARLY * (etaCell - bed[cell]))));
    const ratio = level > 0 ? Math.max(level / own, own / level) : Infinity;
    const mix = Math.max(flat, Math.min(1, Math.max(0, (ratio - 1.5) / 1.5)));
    state.path = 1 - flat * outward * Math.min(1, Math.max(0, 2 * froude - 1));
    let a = 0;
    let q = 0;
    if (mix < 1) {
      state.stage = etaCell + 0.5 * outward * slopeStage[cell];
      a = (1 - mix) * tables.areaAt(section, state.stage);
      q = (1 - mix) * (flow[cell] + 0.5 * outward * slopeFlow[cell]);
    }
    if (mix > 0) {
      const leaves = isFree || outward * flow[cell] > 0;
      const falls = leaves ? own < level : own > level;
      const share = isFree ? Math.max(froude, (ratio - 1.5) / 1.5) : froude;
      const taken = falls ? level + Math.min(1, share) * (own - level) : level;
      a += mix * taken;
      q += mix * (leaves && !falls ? (taken / own) * flow[cell] : flow[cell]);
      state.stage = mix === 1 && !falls ? etaCell : tables.stageOf(section, a);
    }
    if (a <= 0) {
      state.stage = etaCell;
      return state;
    }
    state.area = a;
    state.flow = q;
    state.velocity = waves.driftAt(section, state.stage, a, q);
    state.celerity = waves.celerityAt(section, state.stage, a, q);
    return state;
  };
}
