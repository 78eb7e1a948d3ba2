import type { CellTables } from '../geometry/cellTables';
import type { Workspace } from '../workspace';
import type { Boundary } from './boundary';
import { createSectionWaves } from '../geometry/sectionWaves';
import { createControlBoundary } from './controlBoundary';
import { createEndState, type End } from './endState';

/** K/A (m/s) of a section that brakes. */
const BRAKES = 1e6;
/** Cells over which the slope of the bed at the outlet is taken. */
const STRETCH = 10;

/**
 * Waves leave and nothing enters, as if the reach went on as it ends. Where its bed falls and brakes, the water beyond
 * flows uniformly on the slope of its last cells; else it is undisturbed, and the invariant u - ω that it sends back is
 * that of the first state seen, ω = ∫ c/A dA.
 */
export function createOpenBoundary(workspace: Workspace, tables: CellTables, end: End): Boundary {
  const { section } = end;
  const slope = openSlope(workspace);
  const root = Math.sqrt(Math.max(0, slope));
  const endState = createEndState(workspace, tables, end, true);
  const waves = createSectionWaves(workspace, tables);
  let isKnown = false;
  let isUniform = false;
  let invariant = 0;

  const released = (stage: number): number => {
    if (isUniform) return tables.conveyanceAt(section, stage) * root;
    const speed = invariant + tables.frontSpeedAt(section, stage);
    return speed > 0 ? speed * waves.flowAreaAt(section, stage, tables.areaAt(section, stage)) : 0;
  };
  const control = createControlBoundary(workspace, tables, end, released);

  return function openBoundary(time) {
    if (!isKnown) {
      isKnown = true;
      const { velocity, stage } = endState();
      const sample = Math.max(stage, workspace.bed[section] + 0.1);
      const brake = tables.conveyanceAt(section, sample) / tables.areaAt(section, sample);
      isUniform = slope > 0 && brake < BRAKES;
      invariant = end.outward * velocity - tables.frontSpeedAt(section, stage);
    }
    return control(time);
  };
}

/** Fall of the lowest bed over the last cells before the outlet. */
export function openSlope({ n, dx, bed }: Workspace): number {
  const cells = Math.min(STRETCH, n);
  return (bed[n + 1 - cells] - bed[n + 1]) / ((cells - 0.5) * dx);
}
