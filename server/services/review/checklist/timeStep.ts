import { CASE_DEFAULTS } from '../../../../shared/case/caseFile';
import { q, say } from '../../../../shared/units/message';
import { counted, type ChecklistRule } from './types';

/** The steps are chosen by the Courant limit throughout the run; an explicit scheme is unstable above 1. */
export const timeStep: ChecklistRule = ({ caseFile, run, places }) => {
  const { courant = CASE_DEFAULTS.courant, duration } = caseFile.numerics;
  const gravity = caseFile.gravity ?? CASE_DEFAULTS.gravity;
  let fastest = 0;
  for (let k = 0; k < places.chainage.length; k++) {
    const celerity = Math.sqrt(gravity * Math.max(0, places.peakDepth[k]));
    fastest = Math.max(fastest, Math.abs(places.peakVelocity[k]) + celerity);
  }
  const mean = duration / Math.max(1, run.steps);
  const shortest = fastest > 0 ? (courant * run.cellSize) / fastest : mean;
  return {
    id: 'timeStep',
    title: 'Courant number and time steps',
    outcome: courant <= 1 ? 'good' : 'bad',
    finding: say`${counted(run.steps, 'step')} held to a Courant number of ${courant}, ${mean.toPrecision(3)} s on average. With the greatest depth and velocity of each place together it would be ${shortest.toPrecision(3)} s on cells of ${q(run.cellSize, 'length', { figures: 4 })}.`,
    rule: 'At most 1 for an explicit scheme (Courant, Friedrichs & Lewy 1928).',
  };
};
