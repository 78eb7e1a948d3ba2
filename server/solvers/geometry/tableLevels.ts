import type { SectionShape } from './sectionShape';
import { markedStages } from './zoneRules';

/** Most levels that a section's table can have. */
export const MAX_LEVELS = 76;

const BASE = 40;
const KINKS = 15;
/** Just above the strongest kinks the conveyance bends most: levels there too, at these shares of the spacing. */
const STRONGEST = 5;
const ABOVE_KINK = [0.12, 0.4];
/** Levels for kinks and marks together. */
const MARKS = KINKS + STRONGEST * ABOVE_KINK.length;
const ABOVE = 10;
const GROWTH = 1.45;

/**
 * Elevations (m, ascending, the first at the bed) of the levels of a section's table: graded towards the bed up to the
 * top of the survey, moved onto the elevations where the top width jumps or bends most, and continued above the survey
 * to some forty times its height, where only the vertical extension is left. Where rules or factors of the section change
 * with stage there are levels too, in place of the weaker kinks.
 */
export function tableLevels(shape: SectionShape): number[] {
  const { z, bed } = shape;
  let top = bed;
  for (const elevation of z) if (elevation > top) top = elevation;
  const height = Math.max(top - bed, 0.5);
  const spacing = height / BASE;
  const marks = ruleStages(shape, spacing);
  const kinks = withKinks(shape, marks, bed + height, spacing);

  const levels: number[] = [bed];
  let next = 0;
  for (let k = 1; k <= BASE; k++) {
    const level = k === BASE ? bed + height : bed + height * (k / BASE) ** 1.5;
    const step = level - (bed + height * ((k - 1) / BASE) ** 1.5);
    while (next < kinks.length && kinks[next] < level) levels.push(kinks[next++]);
    const nearBelow = level - levels[levels.length - 1] < 0.3 * step && levels.length > 1;
    const nearAbove = next < kinks.length && kinks[next] - level < 0.3 * step;
    if (k === BASE || !(nearBelow || nearAbove)) levels.push(level);
  }
  for (let k = 1; k <= ABOVE; k++) levels.push(bed + height * GROWTH ** k);
  const beyond = marks.filter((mark) => mark > bed + height);
  if (beyond.length === 0) return levels;
  return [...levels, ...beyond]
    .sort((a, b) => a - b)
    .filter((level, k, all) => k === 0 || level - all[k - 1] > 1e-6 * height);
}

/** Stages above the bed where rules or factors change, the most telling first, as many as the table can take. */
function ruleStages({ bed, rules, roughness }: SectionShape, spacing: number): number[] {
  const wanted = [...(rules ? markedStages(rules) : []), ...(roughness?.stages ?? [])];
  const marks: number[] = [];
  for (const mark of wanted) {
    if (marks.length === MARKS) break;
    const clear = [bed, ...marks].every((other) => Math.abs(other - mark) > 0.02 * spacing);
    if (clear && mark > bed) marks.push(mark);
  }
  return marks;
}

/** Marks below `top` (m) and, as far as there is room, the strongest kinks; ascending. */
function withKinks(shape: SectionShape, marks: number[], top: number, spacing: number): number[] {
  const kinks = strongestKinks(shape, spacing, MARKS - marks.length);
  if (marks.length === 0) return kinks;
  const apart = 0.02 * spacing;
  const clear = kinks.filter((kink) => marks.every((mark) => Math.abs(mark - kink) > apart));
  return [...marks.filter((mark) => mark < top - apart), ...clear].sort((a, b) => a - b);
}

/** Elevations where B(η) jumps or bends most and some just above the strongest, ascending, none closer than 2 % of `spacing` to another or to the ends, at most `room`. */
function strongestKinks(shape: SectionShape, spacing: number, room: number): number[] {
  const { x, z, bed } = shape;
  const at: number[] = [];
  const jump: number[] = [];
  const bend: number[] = [];
  const reach: number[] = [];
  const add = (elevation: number, widthJump: number, slope: number, dx: number): void => {
    at.push(elevation);
    jump.push(widthJump);
    bend.push(slope);
    reach.push(dx);
  };
  let top = bed;
  for (let k = 0; k + 1 < z.length; k++) {
    const dx = x[k + 1] - x[k];
    const low = Math.min(z[k], z[k + 1]);
    const high = Math.max(z[k], z[k + 1]);
    top = Math.max(top, high);
    if (dx <= 0) continue;
    if (high === low) add(low, dx, 0, 0);
    else {
      add(low, 0, dx / (high - low), dx);
      add(high, 0, -dx / (high - low), dx);
    }
  }
  const order = at.map((_, k) => k).sort((a, b) => at[a] - at[b]);
  const found: { elevation: number; weight: number }[] = [];
  for (let m = 0; m < order.length;) {
    const elevation = at[order[m]];
    let widthJump = 0;
    let slope = 0;
    let dx = 0;
    for (; m < order.length && at[order[m]] === elevation; m++) {
      widthJump += jump[order[m]];
      slope += bend[order[m]];
      dx += reach[order[m]];
    }
    found.push({ elevation, weight: widthJump + Math.min(Math.abs(slope) * spacing, dx) });
  }
  const least = 1e-4 * (x[x.length - 1] - x[0]);
  const apart = 0.02 * spacing;
  const chosen: number[] = [];
  const strong: number[] = [];
  const wide = 0.05 * (x[x.length - 1] - x[0]);
  for (const { elevation, weight } of found.sort((a, b) => b.weight - a.weight)) {
    if (chosen.length === Math.min(KINKS, room) || weight <= least) break;
    const clear = chosen.every((other) => Math.abs(other - elevation) > apart);
    if (!clear || elevation <= bed + apart || elevation >= top - apart) continue;
    chosen.push(elevation);
    if (weight > wide && strong.length < STRONGEST) strong.push(elevation);
  }
  for (const elevation of strong) {
    for (const share of ABOVE_KINK) {
      const level = elevation + share * spacing;
      const clear = chosen.every((other) => Math.abs(other - level) > apart);
      if (clear && level < top - apart && chosen.length < room) chosen.push(level);
    }
  }
  return chosen.sort((a, b) => a - b);
}
