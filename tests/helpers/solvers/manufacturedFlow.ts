import type { SectionInput } from '@/shared/case/caseFile';

/** An unsteady flow chosen beforehand in a river whose channel, banks and plains vary all along it, and the sources that make
 *  it a solution of the equations (P. J. Roache, 2002, Code verification by the method of manufactured solutions, J. Fluids
 *  Eng. 124, 4-10):
 *
 *    q = A_t + Q_x,   S = Q_t + (Q²/A)_x + g A η_x + g A Q|Q|/K² - min(q, 0) Q/A
 *
 *  The last term is what a withdrawal takes along. Geometry is taken from the exact polygons, ∂A/∂x at constant stage by a
 *  central difference over 1 m. */
export const LENGTH = 4000;

const WAVE = (2 * Math.PI) / LENGTH;
const OMEGA = (2 * Math.PI) / 6000;
const SLOPE = 0.0008;
const HALF_STEP = 0.5;

export interface ManufacturedFlow {
  section(x: number): SectionInput;
  stage(x: number, time: number): Varying;
  flow(x: number, time: number): Varying;
  area(x: number, time: number): number;
  /** The sources at fixed places (m), q (m²/s) and S (m³/s²) by place and time. */
  sourcesAt(
    places: readonly number[],
    gravity: number,
  ): (place: number, time: number) => { lateral: number; momentum: number };
}

interface Varying {
  value: number;
  byX: number;
  byTime: number;
}

/** `bankHeight`: mean height of the banks over the bed (m), where the water is 3.2 m deep in the mean. `gain`: mean lateral
 *  flow (m²/s), of 60 m³/s at the end that has less. */
export function manufacturedFlow(bankHeight: number, gain: number): ManufacturedFlow {
  const section = (x: number) => sectionAt(x, bankHeight);
  const hydraulicsOf = (x: number) => createHydraulics(section(x));
  const stage = (x: number, time: number): Varying => {
    const angle = WAVE * x - OMEGA * time;
    return {
      value: SLOPE * (LENGTH - x) + 3.2 + 0.3 * Math.sin(angle),
      byX: -SLOPE + 0.3 * WAVE * Math.cos(angle),
      byTime: -0.3 * OMEGA * Math.cos(angle),
    };
  };
  const flow = (x: number, time: number): Varying => {
    const angle = 2 * WAVE * x - OMEGA * time + 1;
    return {
      value: 60 + gain * (gain > 0 ? x : x - LENGTH) + 5 * Math.cos(angle),
      byX: gain - 10 * WAVE * Math.sin(angle),
      byTime: 5 * OMEGA * Math.sin(angle),
    };
  };
  const area = (x: number, time: number) => {
    const out = new Float64Array(3);
    hydraulicsOf(x)(stage(x, time).value, out);
    return out[AREA];
  };

  function sourcesAt(places: readonly number[], gravity: number) {
    const hydraulics = places.map((x) => [x - HALF_STEP, x, x + HALF_STEP].map(hydraulicsOf));
    const [before, here, after] = [0, 0, 0].map(() => new Float64Array(3));
    return (i: number, time: number) => {
      const eta = stage(places[i], time);
      const q = flow(places[i], time);
      hydraulics[i][0](eta.value, before);
      hydraulics[i][1](eta.value, here);
      hydraulics[i][2](eta.value, after);
      const areaByX = (after[AREA] - before[AREA]) / (2 * HALF_STEP) + here[TOP_WIDTH] * eta.byX;
      const velocity = q.value / here[AREA];
      const lateral = here[TOP_WIDTH] * eta.byTime + q.byX;
      const advection = velocity * (2 * q.byX - velocity * areaByX);
      const friction = (q.value * Math.abs(q.value)) / here[CONVEYANCE] ** 2;
      const pressure = gravity * here[AREA] * (eta.byX + friction);
      const taken = Math.min(lateral, 0) * velocity;
      return { lateral, momentum: q.byTime + advection + pressure - taken };
    };
  }

  return { section, stage, flow, area, sourcesAt };
}

function sectionAt(x: number, bankHeight: number): SectionInput {
  const bed = SLOPE * (LENGTH - x) + 0.15 * Math.sin(2 * WAVE * x);
  const width = 30 + 5 * Math.sin(WAVE * x);
  const bank = bankHeight + 0.25 * Math.cos(WAVE * x);
  const plain = 60 + 15 * Math.cos(WAVE * x + 1);
  const left = 4 + plain;
  const right = left + width;
  return {
    id: `M${x}`,
    chainage: x,
    points: [
      [0, bed + bank + 8],
      [4, bed + bank + 1.2],
      [left, bed + bank],
      [left + 0.2 * width, bed + 0.6],
      [left + 0.5 * width, bed],
      [left + 0.85 * width, bed + 0.9],
      [right, bed + bank],
      [right + 0.8 * plain, bed + bank + 1],
      [right + 0.8 * plain + 5, bed + bank + 8],
    ],
    roughness: [
      [0, 0.07],
      [left, 0.035],
      [right, 0.06],
    ],
    banks: [left, right],
  };
}

const [AREA, TOP_WIDTH, CONVEYANCE] = [0, 1, 2];

/** Area (m²), top width (m) and conveyance (m³/s) of a section by stage, from its straight lines, into `out`. */
function createHydraulics({
  points,
  roughness,
  banks,
}: SectionInput): (stage: number, out: Float64Array) => void {
  const lines = points.slice(1).map(([offset, level], i) => {
    const [from, start] = points[i];
    const zone = from < banks![0] ? 0 : from < banks![1] ? 1 : 2;
    const [low, high] = [Math.min(start, level), Math.max(start, level)];
    return { width: offset - from, low, high, length: Math.hypot(offset - from, high - low), zone };
  });
  const area = new Float64Array(3);
  const perimeter = new Float64Array(3);
  return (stage, out) => {
    area.fill(0);
    perimeter.fill(0);
    let topWidth = 0;
    for (const { width, low, high, length, zone } of lines) {
      if (stage <= low) continue;
      const share = stage < high ? (stage - low) / (high - low) : 1;
      topWidth += share * width;
      perimeter[zone] += share * length;
      area[zone] += width * (stage < high ? (share * (stage - low)) / 2 : stage - (low + high) / 2);
    }
    out[AREA] = area[0] + area[1] + area[2];
    out[TOP_WIDTH] = topWidth;
    out[CONVEYANCE] = 0;
    for (let k = 0; k < 3; k++) {
      if (area[k] === 0) continue;
      out[CONVEYANCE] += (area[k] * Math.cbrt(area[k] / perimeter[k]) ** 2) / roughness[k][1];
    }
  };
}
