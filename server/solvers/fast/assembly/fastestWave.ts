/** The fastest wave of all cells, as time/fastestWave.ts. */
import * as ws from './arrays';
import { add, and, at, below, both, choose, div, greater, mul, pairAt, size } from './lanes';

const KINEMATIC: f64 = 2.0 / 3.0;
const BRAKED: f64 = 0.01;

export function fastestWave(): f64 {
  const area = ws.area;
  const flow = ws.flow;
  const celerity = ws.celerity;
  const friction = ws.friction;
  const n = ws.n;
  const zero = both(0);
  const dx = both(ws.dx);
  let fastest = zero;
  let sum = zero;
  let i = 1;
  for (; i < n; i += 2) {
    const a = pairAt(area, i);
    const q = size(pairAt(flow, i));
    const u = div(q, a);
    const c = pairAt(celerity, i);
    const braked = below(mul(both(BRAKED), u), mul(mul(pairAt(friction, i), q), dx));
    const isShooting = and(below(c, mul(both(KINEMATIC), u)), braked);
    const speed = choose(mul(both(1 + KINEMATIC), u), add(u, c), isShooting);
    const counted = and(speed, f64x2.ne(a, zero));
    fastest = greater(fastest, counted);
    sum = add(sum, counted);
  }
  let most = max<f64>(f64x2.extract_lane(fastest, 0), f64x2.extract_lane(fastest, 1));
  let total = f64x2.extract_lane(sum, 0) + f64x2.extract_lane(sum, 1);
  if (i === n && at(area, i) !== 0) {
    const q = abs<f64>(at(flow, i));
    const u = q / at(area, i);
    const c = at(celerity, i);
    let speed = u + c;
    if (c < KINEMATIC * u && at(friction, i) * q * ws.dx > BRAKED * u) speed = (1 + KINEMATIC) * u;
    if (speed > most) most = speed;
    total += speed;
  }
  return total < Infinity ? most : NaN;
}
