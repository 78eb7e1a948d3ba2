import type { Workspace } from '../workspace';
import type { CellTables } from './cellTables';
import { emptyPart, LEAST_SPREAD, readPart, spreadOf, type Parts } from './parts';

/** No stage carries more critical flow than this many times what it would at an unchanging β. */
const MOST_CRITICAL = 2;

/**
 * What the momentum of a flow (m³/s) at a stage (m) is made of, for ends, structures and initial states; `area` is the
 * whole wetted area (m²) there. Where all of a section flows evenly it is Q²/A, u = Q/A and c = sqrt(g A/B); else see
 * parts.ts. Waves run at drift ± celerity.
 */
export interface SectionWaves {
  /** Area that flows, A_f (m²) */
  flowAreaAt(i: number, stage: number, area: number): number;
  /** β Q²/A_f (m⁴/s²) */
  carriedAt(i: number, stage: number, area: number, flow: number): number;
  /** β Q/A_f (m/s) */
  driftAt(i: number, stage: number, area: number, flow: number): number;
  /** m/s; of still water where no flow is given */
  celerityAt(i: number, stage: number, area: number, flow?: number): number;
  /** The flow that is critical at a stage */
  criticalFlowAt(i: number, stage: number): number;
  /** Of the state of a cell: A_f */
  cellFlowArea: Float64Array;
}

type Surveyed = Pick<Workspace, 'gravity' | 'area' | 'table' | 'parts'>;

export function createSectionWaves(workspace: Surveyed, tables: CellTables): SectionWaves {
  return workspace.parts
    ? partedWaves(workspace, tables, workspace.parts)
    : evenWaves(workspace, tables);
}

function evenWaves({ gravity, area: cellArea }: Surveyed, tables: CellTables): SectionWaves {
  const celerityAt = (i: number, stage: number, area: number): number =>
    area > 0 ? Math.sqrt((gravity * area) / tables.widthAt(i, stage)) : 0;
  return {
    flowAreaAt: (_i, _stage, area) => area,
    carriedAt: (_i, _stage, area, flow) => (area > 0 ? (flow * flow) / area : 0),
    driftAt: (_i, _stage, area, flow) => flow / area,
    celerityAt,
    criticalFlowAt(i, stage) {
      const area = tables.areaAt(i, stage);
      return area * celerityAt(i, stage, area);
    },
    cellFlowArea: cellArea,
  };
}

function partedWaves({ gravity, table }: Surveyed, tables: CellTables, parts: Parts): SectionWaves {
  const part = emptyPart();
  const { sqrt, max } = Math;
  /** Reads section i at a stage into `part`; tells whether there is water. */
  function look(i: number, stage: number): boolean {
    const row = tables.rowAtStage(i, stage);
    const s = stage - table[row];
    if (s < 0) return false;
    readPart(parts, i, row, s, part);
    return part.area > 0;
  }

  return {
    flowAreaAt: (i, stage, area) => (area > 0 && look(i, stage) ? part.area : 0),
    carriedAt: (i, stage, area, flow) =>
      area > 0 && look(i, stage) ? (part.beta * flow * flow) / part.area : 0,
    driftAt: (i, stage, area, flow) =>
      area > 0 && look(i, stage) ? (part.beta * flow) / part.area : 0,
    celerityAt(i, stage, area, flow = 0) {
      if (!(area > 0) || !look(i, stage)) return 0;
      const topWidth = tables.widthAt(i, stage);
      const c2 = (gravity * part.area) / topWidth;
      const v = flow / part.area;
      return sqrt(max(LEAST_SPREAD * c2, c2 + v * v * spreadOf(part, topWidth)));
    },
    criticalFlowAt(i, stage) {
      if (!look(i, stage)) return 0;
      const { area, width, beta, betaRise } = part;
      const rise = beta * width;
      const least = rise / (MOST_CRITICAL * MOST_CRITICAL);
      return area * sqrt((gravity * area) / max(rise - area * betaRise, least));
    },
    cellFlowArea: parts.flowArea,
  };
}
