/** What a sluice gate passes per width, and how. */
export interface GateFlow {
  /** m²/s */
  q: number;
  isDrowned: boolean;
}

/**
 * From this share of the sequent depth on the drowned relation has a solution beside the free one: it folds back there, by
 * 0.5 to 1.4 % of the sequent depth for openings from a tenth to nine tenths of the depth above.
 */
const BOTH = 0.985;

/**
 * Flow per width (m²/s) under a gate of opening `a` (m) between depths above its sill, up > down, into `out`.
 *
 * Free: energy between `up` and the vena contracta C_c a, q = C_c a sqrt(2g up/(1 + C_c a/up)).
 * Drowned: energy from `up` to a depth y over the jet C_c a, momentum from there to `down`,
 *   q² = 2g (up - y)/(1/j² - 1/up²),  y² = down² - (2q²/g)(1/j - 1/down),  j = C_c a;
 * it holds where y > j, which is where `down` is beyond the sequent depth of the free jet. Henderson (1966), Open
 * Channel Flow, section 6.6; Henry (1950). There y stands at once well above j, so the flow would fall by 3 to 30 %. Just below
 * both states satisfy the equations, and which one it is hangs on where the water comes from (hysteresis: Defina and
 * Susin 2003, Phys. Fluids 15, 2541-2548, from memory): over that range the flow goes linearly from the one to the
 * other. Where the gate is clear of the water it is no gate: call it not.
 */
export function gateFlow(
  out: GateFlow,
  up: number,
  down: number,
  a: number,
  contraction: number,
  gravity: number,
): void {
  const j = contraction * a;
  out.isDrowned = false;
  out.q = 0;
  if (!(j > 0) || !(up > 0) || down >= up) {
    out.isDrowned = down >= up && up > 0;
    return;
  }
  const free = j * Math.sqrt((2 * gravity * up) / (1 + j / up));
  const sequent = 0.5 * j * (Math.sqrt(1 + (8 * free * free) / (gravity * j * j * j)) - 1);
  out.q = free;
  if (down <= BOTH * sequent) return;

  // With q² = m (up - y) the momentum is y² + k m (up - y) = tail², k = (2/g)(1/j - 1/tail): the root nearer to `up`.
  out.isDrowned = down > sequent;
  const m = (2 * gravity) / (1 / (j * j) - 1 / (up * up));
  const tail = Math.max(down, sequent);
  const km = (2 / gravity) * (1 / j - 1 / tail) * m;
  const y = 0.5 * (km + Math.sqrt(Math.max(0, km * km - 4 * (km * up - tail * tail))));
  const other = km - y;
  const depth = y <= up ? y : other;
  const drowned = Math.min(free, Math.sqrt(Math.max(0, m * (up - depth))));
  const share = Math.min(1, (down / sequent - BOTH) / (1 - BOTH));
  out.q = free + share * (drowned - free);
}
