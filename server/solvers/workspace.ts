import type { ShapedGrid } from './geometry/grid';
import { writeSectionTable, TABLE_STRIDE } from './geometry/sectionTable';

/**
 * Every typed array of a run, allocated once. Cells are 1..n; 0 and n + 1 are the sections at the upstream and the
 * downstream end. Face f lies between cell f and f + 1; faces 0 and n are the ends.
 */
export interface Workspace {
  n: number;
  dx: number;
  gravity: number;
  dryDepth: number;

  /** State: wetted area (m²), flow (m³/s), stage (m). Index 0 and n + 1 hold what the boundaries impose. */
  area: Float64Array;
  flow: Float64Array;
  stage: Float64Array;

  /** Of the state: top width (m), celerity (m/s), A/(4B) (m), friction factor g/(A V²) (1/m³). */
  width: Float64Array;
  celerity: Float64Array;
  reach: Float64Array;
  friction: Float64Array;

  /** The active level of each cell's table, copied out so that the loops need neither search nor gather. */
  level: Int32Array;
  levelZ: Float64Array;
  levelArea: Float64Array;
  /** Area at which the active level ends */
  levelEnd: Float64Array;
  levelB0: Float64Array;
  levelB1: Float64Array;
  levelV0: Float64Array;
  levelV1: Float64Array;
  levelV2: Float64Array;

  /** Limited differences over a cell of stage (m) and flow (m³/s). */
  slopeStage: Float64Array;
  slopeFlow: Float64Array;
  /** Stage that a cell and both its neighbours must exceed to be sloped (m). */
  slopeFloor: Float64Array;

  /** Fluxes at faces: volume (m³/s); momentum as the left and the right cell feel it (m⁴/s²). */
  fluxArea: Float64Array;
  fluxLeft: Float64Array;
  fluxRight: Float64Array;
  /** Volume flux of the second stage of the last step, and the flow past each face to report (m³/s): diagnostics/faceFlow.ts. */
  lateFlux: Float64Array;
  faceFlow: Float64Array;

  /** Kept from the start of a step: area, and the parts of the corrector that are known then. */
  oldArea: Float64Array;
  halfFlow: Float64Array;
  implicitShare: Float64Array;

  /** Lateral inflow of each cell (m³/s), and what a half step took of it: see time/stepLoops.ts. */
  lateralRate: Float64Array;
  lateralSums: Float64Array;

  /** Areas and thrusts of one face that had to be taken from the tables: see riemann/faceAreas.ts. */
  face: Float64Array;

  /** Bed of cells and end sections (m). */
  bed: Float64Array;
  /** Tables: TABLE_STRIDE numbers a section, of which the first `levels[i]` levels count. */
  table: Float64Array;
  levels: Int32Array;
}

export const FACE_FIELDS = 6;

export function createWorkspace(grid: ShapedGrid, gravity: number, dryDepth: number): Workspace {
  const n = grid.cells;
  const size = n + 2;
  const pool = pooledArrays(size, 29);
  const workspace: Workspace = {
    n,
    dx: grid.dx,
    gravity,
    dryDepth,
    area: pool(),
    flow: pool(),
    stage: pool(),
    width: pool(),
    celerity: pool(),
    reach: pool(),
    friction: pool(),
    level: new Int32Array(size),
    levelZ: pool(),
    levelArea: pool(),
    levelEnd: pool(),
    levelB0: pool(),
    levelB1: pool(),
    levelV0: pool(),
    levelV1: pool(),
    levelV2: pool(),
    slopeStage: pool(),
    slopeFlow: pool(),
    slopeFloor: pool(),
    fluxArea: pool(),
    fluxLeft: pool(),
    fluxRight: pool(),
    lateFlux: pool(),
    faceFlow: pool(),
    oldArea: pool(),
    halfFlow: pool(),
    implicitShare: pool(),
    lateralRate: pool(),
    lateralSums: new Float64Array(2),
    face: new Float64Array(FACE_FIELDS),
    bed: pool(),
    table: new Float64Array(size * TABLE_STRIDE),
    levels: new Int32Array(size),
  };
  const { bed, slopeFloor, table, levels } = workspace;
  for (let i = 0; i < size; i++) {
    bed[i] = grid.shapes[i].bed;
    levels[i] = writeSectionTable(grid.shapes[i], table, i * TABLE_STRIDE);
  }
  for (let i = 1; i <= n; i++) {
    const above = i > 1 ? bed[i - 1] : bed[i];
    const below = i < n ? bed[i + 1] : bed[i];
    slopeFloor[i] = Math.max(above, bed[i], below) + dryDepth;
  }
  return workspace;
}

/** Arrays of one size out of one buffer, each on a cache line of its own. */
function pooledArrays(size: number, count: number): () => Float64Array {
  const stride = Math.ceil(size / 8) * 8 + 8;
  const buffer = new ArrayBuffer(stride * count * 8);
  let taken = 0;
  return () => new Float64Array(buffer, 8 * stride * taken++, size);
}
