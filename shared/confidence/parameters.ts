import type { CaseFile } from '../case/caseFile';
import { q, say, type Said } from '../units/message';
import type { Distribution } from './distributions';

export const PARAMETER_KEYS = [
  'roughness',
  'peakFlow',
  'outletSlope',
  'outletStage',
  'breachWidth',
  'breachTime',
] as const;
export type ParameterKey = (typeof PARAMETER_KEYS)[number];

/** Something of a case that is not known for certain, and by how much it is varied unless the modeller says otherwise. */
export interface Parameter {
  key: ParameterKey;
  label: string;
  /** What a value does: multiplies, or is added (in metres, stored). */
  measure: 'factor' | 'metres';
  /** The value that changes nothing. */
  neutral: number;
  /** Lower and upper value of the sensitivity. */
  sides: readonly [number, number];
  distribution: Distribution;
  /** Why so much. */
  reason: Said;
}

const WAHL =
  'T. L. Wahl (2001), uncertainty of embankment dam breach parameter predictions, table 1: 95 % of the true values lie between';

export const PARAMETERS: Record<ParameterKey, Parameter> = {
  roughness: {
    key: 'roughness',
    label: "Manning's n",
    measure: 'factor',
    neutral: 1,
    sides: [0.8, 1.2],
    distribution: { kind: 'lognormal', median: 1, spread: 1.2 },
    reason: say`Manning's n that is judged and not calibrated is off by about a fifth, more often upwards (common practice).`,
  },
  peakFlow: {
    key: 'peakFlow',
    label: 'Peak of the inflow',
    measure: 'factor',
    neutral: 1,
    sides: [0.9, 1.1],
    distribution: { kind: 'normal', mean: 1, deviation: 0.1 },
    reason: say`Flood peaks from a rating curve are known to about a tenth (common practice); those from rainfall are known less well.`,
  },
  outletSlope: {
    key: 'outletSlope',
    label: 'Slope at the outlet',
    measure: 'factor',
    neutral: 1,
    sides: [0.5, 2],
    distribution: { kind: 'triangular', low: 0.5, mode: 1, high: 2 },
    reason: say`The slope of the water surface below the last section is seldom known to better than a factor of two (common practice).`,
  },
  outletStage: {
    key: 'outletStage',
    label: 'Stage at the outlet',
    measure: 'metres',
    neutral: 0,
    sides: [-0.5, 0.5],
    distribution: { kind: 'triangular', low: -0.5, mode: 0, high: 0.5 },
    reason: say`${q(0.5, 'depth')} either way (common practice where the water below is not gauged).`,
  },
  breachWidth: {
    key: 'breachWidth',
    label: 'Width of the breach',
    measure: 'factor',
    neutral: 1,
    sides: [0.4, 2.4],
    distribution: { kind: 'lognormal', median: 0.98, spread: 1.58 },
    reason: say`${WAHL} 0.40 and 2.4 times the prediction of Froehlich (1995); the lognormal distribution has these as its 2.5 and 97.5 % values.`,
  },
  breachTime: {
    key: 'breachTime',
    label: 'Formation time of the breach',
    measure: 'factor',
    neutral: 1,
    sides: [0.38, 7.3],
    distribution: { kind: 'lognormal', median: 1.67, spread: 2.13 },
    reason: say`${WAHL} 0.38 and 7.3 times the prediction of Froehlich (1995); the lognormal distribution has these as its 2.5 and 97.5 % values.`,
  },
};

/** Those that the case has something to vary for. */
export function parametersOf(caseFile: CaseFile): Parameter[] {
  const { upstream, downstream, laterals, structures, sections } = caseFile;
  const breaches = structures.filter(({ kind }) => kind === 'breach');
  const has: Record<ParameterKey, boolean> = {
    roughness: sections.some(({ roughness }) => roughness.some(([, n]) => n > 0)),
    peakFlow: upstream.kind === 'inflow' || upstream.kind === 'reservoir' || laterals.length > 0,
    outletSlope: downstream.kind === 'normalDepth',
    outletStage: downstream.kind === 'stage' || downstream.kind === 'rating',
    breachWidth: breaches.some((breach) => breach.kind === 'breach' && breach.bottomWidth > 0),
    breachTime: breaches.some((breach) => breach.kind === 'breach' && breach.formationTime > 0),
  };
  return PARAMETER_KEYS.filter((key) => has[key]).map((key) => PARAMETERS[key]);
}
