import type { ShapedGrid } from './geometry/grid';
import { createParts, type Parts } from './geometry/parts';
import { writeSectionTable, TABLE_STRIDE } from './geometry/sectionTable';

/** Arrays of the workspace besides the tables, at most; each takes as much as one of a double a cell. */
const ARRAYS = 40;
/** Bytes of a page of WebAssembly's memory */
const PAGE = 65536;
/** Bytes of a cache line: each array begins on one of its own. */
const LINE = 64;

/**
 * Every typed array of a run, allocated once, out of one buffer. Cells are 1..n; 0 and n + 1 are the sections at the
 * upstream and the downstream end. Face f lies between cell f and f + 1; faces 0 and n are the ends.
 */
export interface Workspace {
  n: number;
  dx: number;
  gravity: number;
  dryDepth: number;
  /** What the arrays are views of where the fast kernel may work on them, else null. */
  memory: WebAssembly.Memory | null;

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
  /** Where sections have parts that do not flow, or a momentum coefficient; null in a plain case. */
  parts: Parts | null;
}

export const FACE_FIELDS = 6;

/** `forFast`: in memory that the fast kernel can work on. */
export function createWorkspace(
  grid: ShapedGrid,
  gravity: number,
  dryDepth: number,
  forFast = false,
): Workspace {
  const n = grid.cells;
  const size = n + 2;
  const bytes = ARRAYS * lines(8 * size) + lines(8 * size * TABLE_STRIDE);
  const memory = forFast ? createMemory(bytes) : null;
  const buffer = memory ? memory.buffer : new ArrayBuffer(bytes);
  let taken = 0;
  const take = (length: number): number => {
    const start = taken;
    taken += lines(length);
    return start;
  };
  const pool = (length = size): Float64Array => new Float64Array(buffer, take(8 * length), length);
  const counts = (): Int32Array => new Int32Array(buffer, take(4 * size), size);
  const workspace: Workspace = {
    n,
    dx: grid.dx,
    gravity,
    dryDepth,
    memory,
    area: pool(),
    flow: pool(),
    stage: pool(),
    width: pool(),
    celerity: pool(),
    reach: pool(),
    friction: pool(),
    level: counts(),
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
    lateralSums: pool(2),
    face: pool(FACE_FIELDS),
    bed: pool(),
    table: pool(size * TABLE_STRIDE),
    levels: counts(),
    parts: null,
  };
  const { bed, slopeFloor, table, levels } = workspace;
  let at = 0;
  for (const shape of grid.shapes) {
    bed[at] = shape.bed;
    levels[at] = writeSectionTable(shape, table, at * TABLE_STRIDE);
    at++;
  }
  workspace.parts = createParts(grid, table, levels);
  for (let i = 1; i <= n; i++) {
    const above = i > 1 ? bed[i - 1] : bed[i];
    const below = i < n ? bed[i + 1] : bed[i];
    slopeFloor[i] = Math.max(above, bed[i], below) + dryDepth;
  }
  return workspace;
}

/** Bytes that an array takes with the space to the next */
function lines(bytes: number): number {
  return Math.ceil(bytes / LINE) * LINE + LINE;
}

function createMemory(bytes: number): WebAssembly.Memory {
  const pages = Math.ceil(bytes / PAGE);
  return new WebAssembly.Memory({ initial: pages, maximum: pages });
}
