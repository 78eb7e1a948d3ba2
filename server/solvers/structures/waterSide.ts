import { risingRoot } from '../boundaries/rootNear';
import type { CellTables } from '../geometry/cellTables';
import { createSectionWaves } from '../geometry/sectionWaves';
import { oneSided } from '../reconstruction/limitedSlopes';
import type { Workspace } from '../workspace';

/** A structure that would raise the area beside it more than so many times sends a bore. */
const BORE = 1.25;

/** The water on one side of a structure, and how its stage answers to the flow through the structure. */
export interface WaterSide {
  /** Gives the cell slopes that know nothing of what lies beyond the structure. */
  slope(): void;
  /** Reads the state of the cell. */
  look(): void;
  /** Whether it has water to give */
  isWet(): boolean;
  /** Stage (m) at the structure if this flow (m³/s, positive downstream) passes it */
  stageAt(flow: number): number;
  /** Most (m³/s) that its section carries to the structure at a stage (m): critical flow, or as fast as it comes */
  mostAt(stage: number): number;
  /** Velocity head (m) of water at that stage that approaches with that flow; 0 if it leaves the structure */
  velocityHead(flow: number): number;
  /** Writes the momentum flux that the cell feels; returns |u| + c (m/s). */
  enter(flow: number): number;
}

/**
 * Cell `cell` beside face `face`. The stage follows from the characteristic that runs from the cell to the structure,
 * A = A_c - s (Q - Q_c)/(c - s u), s = +1 above the structure and -1 below: the rise of water that is stopped, the fall of
 * water that is let go. Thus the flow is found together with the stages that it makes, whatever the step.
 *
 * The cell feels β Q²/A_f and the pressure g ∫ A dη between its middle and the structure, as at a wall where Q = 0. Water that
 * leaves the structure faster than it could stand there enters at critical depth.
 */
export function createWaterSide(
  workspace: Workspace,
  tables: CellTables,
  face: number,
  cell: number,
): WaterSide {
  const { n, area, flow, stage, bed, celerity, reach, slopeFloor, dryDepth, gravity } = workspace;
  const waves = createSectionWaves(workspace, tables);
  const { cellFlowArea } = waves;
  const { slopeStage, slopeFlow, fluxLeft, fluxRight } = workspace;
  const outward = cell === face ? 1 : -1;
  const flux = outward === 1 ? fluxLeft : fluxRight;
  const inner = cell - outward;
  let wet = false;
  let faceStage = 0;
  let faceArea = 0;
  let faceFlow = 0;
  let speed = 0;
  let approach = 0;
  let shooting = false;

  /** A trace of water at the bed has no width to be fast over. */
  const waveSpeed = (a: number, eta: number, q: number): number =>
    tables.widthAt(cell, eta) > 0 ? waves.celerityAt(cell, eta, a, q) : 0;
  const criticalFlow = (eta: number): number =>
    tables.widthAt(cell, eta) > 0 ? waves.criticalFlowAt(cell, eta) : 0;
  let wanted = 0;
  const shortOfWanted = (eta: number): number => criticalFlow(eta) - wanted;

  /** The slope towards the structure comes from the side of the cell alone. */
  function slope(): void {
    slopeStage[cell] = 0;
    slopeFlow[cell] = 0;
    if (inner < 1 || inner > n) return;
    if (Math.min(stage[cell], stage[inner]) <= Math.max(slopeFloor[cell], slopeFloor[inner]))
      return;
    const most = 4 * reach[cell];
    const s = oneSided(outward * (stage[cell] - stage[inner]), slopeStage[inner]);
    slopeStage[cell] = Math.max(-most, Math.min(most, s));
    slopeFlow[cell] = oneSided(outward * (flow[cell] - flow[inner]), slopeFlow[inner]);
  }

  function stageAt(q: number): number {
    const change = q - faceFlow;
    if (change === 0 || !wet || (shooting && outward * change < 0)) return faceStage;
    return tables.stageOf(cell, areaWith(q));
  }

  /** Area (m²) at the structure if a flow passes it. */
  function areaWith(q: number): number {
    const change = outward * (q - faceFlow);
    let a = faceArea - change / speed;
    if (a <= BORE * faceArea) return Math.max(0, a);
    // A bore runs with the mean of the waves before and behind it: those of a film before it alone would pile it up.
    for (let k = 0; k < 4; k++) {
      const behind = waveSpeed(a, tables.stageOf(cell, a), q) - (outward * q) / a;
      a = faceArea - change / Math.max(0.5 * (speed + behind), 0.5 * speed);
    }
    return a;
  }

  return {
    look() {
      wet = stage[cell] - bed[cell] > dryDepth;
      faceStage = wet ? stage[cell] + 0.5 * outward * slopeStage[cell] : stage[cell];
      faceArea = slopeStage[cell] === 0 ? area[cell] : tables.areaAt(cell, faceStage);
      faceFlow = wet ? flow[cell] + 0.5 * outward * slopeFlow[cell] : 0;
      const c = celerity[cell];
      const towards =
        faceArea > 0 ? outward * waves.driftAt(cell, faceStage, faceArea, faceFlow) : 0;
      approach = Math.max(0, towards);
      // Fast water is stopped by a bore that runs up against it, not by a wave of its own celerity.
      speed = Math.max(c - towards, 0.5 * (c + towards), 0.25 * c);
      shooting = towards <= -c;
    },
    isWet: () => wet,
    stageAt,
    mostAt(eta) {
      const a = waves.flowAreaAt(cell, eta, tables.areaAt(cell, eta));
      return Math.max(criticalFlow(eta), approach * a);
    },
    velocityHead(q) {
      if (!(outward * q > 0) || !wet) return 0;
      const whole = Math.max(faceArea - (outward * (q - faceFlow)) / speed, 0);
      // No flow approaches with more than the critical velocity head.
      const most = 0.5 * waves.flowAreaAt(cell, faceStage, tables.areaAt(cell, faceStage));
      const a = workspace.parts
        ? waves.flowAreaAt(cell, tables.stageOf(cell, whole), whole)
        : whole;
      const u2 = a > 0 ? (q / a) ** 2 : Infinity;
      return Math.min(u2 / (2 * gravity), most / Math.max(tables.widthAt(cell, faceStage), 1e-9));
    },
    enter(q) {
      let eta = stageAt(q);
      const leaves = outward * q < 0;
      if (leaves && (!wet || shooting || criticalFlow(eta) < Math.abs(q))) {
        wanted = Math.abs(q);
        eta = risingRoot(shortOfWanted, bed[cell], 0.1);
      }
      const a = eta === stage[cell] ? area[cell] : tables.areaAt(cell, eta);
      const carried = waves.carriedAt(cell, eta, a, q);
      const flows = eta === stage[cell] ? cellFlowArea[cell] : waves.flowAreaAt(cell, eta, a);
      flux[face] = carried + 0.5 * gravity * (eta - stage[cell]) * (cellFlowArea[cell] + flows);
      // A trickle that does not lift the stage off the bed has no velocity to be told.
      if (!(a > 0) || eta - bed[cell] <= 1e-3 * dryDepth) return 0;
      return Math.abs(waves.driftAt(cell, eta, a, q)) + waveSpeed(a, eta, q);
    },
    slope,
  };
}
