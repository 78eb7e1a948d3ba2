import type { LocalLoss } from '../../../shared/case/caseFile';
import type { Grid } from '../geometry/grid';
import { createSectionWaves } from '../geometry/sectionWaves';
import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';

/**
 * Head lost where the river narrows or widens: at every face of a stretch h = C |v_j² - v_i²|/2g, with the velocity of
 * what flows in the cells on both sides and the coefficient of contraction where the water gains velocity on its way, of
 * expansion where it loses it. It acts as the force g A h (lossArea) against the flow, half on either cell. Over a transition
 * the losses of its faces sum to C times the whole change of velocity head, whatever the cells. Still water feels nothing.
 * Where stretches overlap their coefficients add.
 */
export interface LocalLosses {
  /** After all fluxes of the present state */
  apply(): void;
  /** h (m) at face f for velocities (m/s) in the cells above and below it and a flow of that sign; 0 off the stretches */
  headAt(f: number, above: number, below: number, direction: number): number;
}

/**
 * Area (m²) on which a loss between two cells acts: the harmonic mean of theirs, so that fast water in a nearly dry cell
 * cannot push the water of a full one.
 */
export function lossArea(above: number, below: number): number {
  return above > 0 && below > 0 ? (2 * above * below) / (above + below) : 0;
}

/** null where a case has none. `holds`: faces at which structures stand have losses of their own. */
export function createLocalLosses(
  losses: readonly LocalLoss[],
  workspace: Workspace,
  tables: CellTables,
  grid: Grid,
  holds: (face: number) => boolean,
): LocalLosses | null {
  const { n, area, flow, stage, bed, dryDepth, gravity } = workspace;
  const { fluxArea, fluxLeft, fluxRight } = workspace;
  const { cellFlowArea } = createSectionWaves(workspace, tables);
  const contraction = new Float64Array(n + 1);
  const expansion = new Float64Array(n + 1);
  const faces: number[] = [];
  for (let f = 1; f < n; f++) {
    const at = grid.start + f * grid.dx;
    const here = losses.filter(({ from, to }) => from <= at && at <= to);
    if (here.length === 0 || holds(f)) continue;
    faces.push(f);
    for (const loss of here) {
      contraction[f] += loss.contraction;
      expansion[f] += loss.expansion;
    }
  }
  if (faces.length === 0) return null;

  function headAt(f: number, above: number, below: number, direction: number): number {
    const gain = direction * (below * below - above * above);
    const loss = gain > 0 ? contraction[f] * gain : -expansion[f] * gain;
    return loss / (2 * gravity);
  }

  return {
    headAt,
    apply() {
      for (let k = 0; k < faces.length; k++) {
        const i = faces[k];
        const j = i + 1;
        const passing = fluxArea[i];
        if (passing === 0 || !(area[i] > 0) || !(area[j] > 0)) continue;
        if (stage[i] - bed[i] <= dryDepth || stage[j] - bed[j] <= dryDepth) continue;
        const direction = passing > 0 ? 1 : -1;
        const head = headAt(i, flow[i] / cellFlowArea[i], flow[j] / cellFlowArea[j], direction);
        const half = 0.5 * direction * gravity * lossArea(cellFlowArea[i], cellFlowArea[j]) * head;
        fluxLeft[i] += half;
        fluxRight[i] -= half;
      }
    },
  };
}
