/** The only door of the solver: SI numbers in and out; nothing of the server is known here. */
export { caseHash } from './caseHash';
export { buildGrid, type Grid } from './geometry/grid';
export {
  sectionProperties,
  sectionShape,
  type SectionProperties,
} from './geometry/sectionProperties';
export type { SectionShape } from './geometry/sectionShape';
export { criticalDepth, normalDepth } from './geometry/uniformFlow';
export { routeCase } from './routeCase';
export type { RouteOptions, RunOutput, RunProgress } from './routeOptions';
export { RunCancelled, RunFailed } from './runErrors';
export { outputTimes } from './time/outputTimes';
export { SOLVER_VERSION } from './version';
