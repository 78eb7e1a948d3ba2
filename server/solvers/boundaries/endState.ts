import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';

/** What the inside of the reach brings to one of its ends, on the section there. */
export interface EndState {
  stage: number;
  area: number;
  flow: number;
  velocity: number;
  celerity: number;
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

/**
 * Extrapolates the state of the last cell over its half to the section at the end. Where that section differs abruptly
 * from the cell's at equal stage (a steep or a stepped bed), the area of the cell is taken along instead of its stage.
 * The returned function fills and returns one object.
 */
export function createEndState(workspace: Workspace, tables: CellTables, end: End): () => EndState {
  const { area, flow, stage, slopeStage, slopeFlow, bed, gravity, dryDepth } = workspace;
  const { section, cell, outward } = end;
  const state: EndState = { stage: 0, area: 0, flow: 0, velocity: 0, celerity: 0 };

  return function endState() {
    const etaCell = stage[cell];
    state.stage = etaCell;
    state.area = 0;
    state.flow = 0;
    state.velocity = 0;
    state.celerity = 0;
    if (etaCell - bed[cell] <= dryDepth) return state;

    const level = tables.areaAt(section, etaCell);
    const own = area[cell];
    const ratio = level > 0 ? Math.max(level / own, own / level) : Infinity;
    const mix = Math.min(1, Math.max(0, (ratio - 1.5) / 1.5));
    let a = 0;
    let q = 0;
    if (mix < 1) {
      state.stage = etaCell + 0.5 * outward * slopeStage[cell];
      a = (1 - mix) * tables.areaAt(section, state.stage);
      q = (1 - mix) * (flow[cell] + 0.5 * outward * slopeFlow[cell]);
    }
    if (mix > 0) {
      const leaving = outward * flow[cell] > 0;
      const taken = leaving ? Math.min(own, level) : Math.max(own, level);
      a += mix * taken;
      q += mix * (leaving ? (taken / own) * flow[cell] : flow[cell]);
      state.stage = tables.stageOf(section, a);
    }
    if (a <= 0) {
      state.stage = etaCell;
      return state;
    }
    state.area = a;
    state.flow = q;
    state.velocity = q / a;
    state.celerity = Math.sqrt((gravity * a) / tables.widthAt(section, state.stage));
    return state;
  };
}
