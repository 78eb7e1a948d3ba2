import type { CaseFile } from '../../shared/case/caseFile';
import { buildGrid, type RunOutput } from '../solvers';
import { evenly } from '../results/blocks/evenly';
import type { LiveSurface } from './workerMessages';

const LIVE_PLACES = 300;

/** Picks from each output the places that a screen draws while the run goes on. */
export function liveSurface(caseFile: CaseFile): (output: RunOutput) => LiveSurface {
  const grid = buildGrid(caseFile);
  const cells = evenly(grid.chainage.length, LIVE_PLACES);
  const pick = (values: ArrayLike<number>) =>
    Array.from(cells, (cell) => toMillimetres(values[cell]));
  const chainages = pick(grid.chainage);
  const bed = pick(grid.bed);
  return ({ time, stage }) => ({ time, chainages, bed, stage: pick(stage) });
}

const toMillimetres = (value: number): number => Math.round(value * 1000) / 1000;
