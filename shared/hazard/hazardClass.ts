/**
 * Flood-hazard classes by depth (m) and velocity (m/s) at the same moment. A place takes the lowest class whose three
 * limits all hold.
 *
 * Source: AIDR (2017), Guideline 7-3 "Flood Hazard", 2nd ed., after G. P. Smith, E. K. Davey & R. J. Cox (2014), WRL
 * Technical Report 2014/07, UNSW. Limits from memory of the guideline. Other authorities use the same letters for
 * other limits: always name the guideline beside the class.
 */
export const HAZARD_GUIDELINE = 'AIDR Guideline 7-3 (2017)';

export interface HazardClass {
  label: 'H1' | 'H2' | 'H3' | 'H4' | 'H5' | 'H6';
  /** The guideline's meaning. */
  meaning: string;
  /** Upper limits, inclusive: m²/s, m, m/s. */
  depthVelocity: number;
  depth: number;
  velocity: number;
}

export const HAZARD_CLASSES: readonly HazardClass[] = [
  {
    label: 'H1',
    meaning: 'generally safe for people, vehicles and buildings',
    depthVelocity: 0.3,
    depth: 0.3,
    velocity: 2,
  },
  {
    label: 'H2',
    meaning: 'unsafe for small vehicles',
    depthVelocity: 0.6,
    depth: 0.5,
    velocity: 2,
  },
  {
    label: 'H3',
    meaning: 'unsafe for vehicles, children and the elderly',
    depthVelocity: 0.6,
    depth: 1.2,
    velocity: 2,
  },
  {
    label: 'H4',
    meaning: 'unsafe for people and vehicles',
    depthVelocity: 1,
    depth: 2,
    velocity: 2,
  },
  {
    label: 'H5',
    meaning:
      'unsafe for people and vehicles; all building types vulnerable to damage, some less robust to failure',
    depthVelocity: 4,
    depth: 4,
    velocity: 4,
  },
  {
    label: 'H6',
    meaning: 'unsafe for people and vehicles; all building types considered vulnerable to failure',
    depthVelocity: Infinity,
    depth: Infinity,
    velocity: Infinity,
  },
];

/** Class of one moment; null where it is dry. A product of two decimals may pass its limit by round-off alone. */
export function hazardClass(depth: number, velocity: number): HazardClass | null {
  if (!(depth > 0)) return null;
  const speed = Math.abs(velocity);
  const product = depth * speed * (1 - 4 * Number.EPSILON);
  return HAZARD_CLASSES.find(
    (limit) => product <= limit.depthVelocity && depth <= limit.depth && speed <= limit.velocity,
  )!;
}

/** Worst class over a time series of depth and velocity at one place; null where it stays dry. */
export const worstHazard = (
  depth: ArrayLike<number>,
  velocity: ArrayLike<number>,
): HazardClass | null => worstMoment(depth, velocity)?.hazard ?? null;

/** The same with the index of the moment at which it is first reached. */
export function worstMoment(
  depth: ArrayLike<number>,
  velocity: ArrayLike<number>,
): { hazard: HazardClass; index: number } | null {
  let worst: { hazard: HazardClass; index: number } | null = null;
  for (let index = 0; index < depth.length; index++) {
    const hazard = hazardClass(depth[index], velocity[index]);
    if (hazard && (!worst || hazard.label > worst.hazard.label)) worst = { hazard, index };
  }
  return worst;
}
