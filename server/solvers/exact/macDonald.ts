import { prescribedDepth, type DepthPiece, type PrescribedDepth } from './prescribedDepth';
import { trapezoid } from './prismaticSection';

/** Four steady flows with Manning friction in a rectangle 10 m wide, Q = 20 m³/s, bed made to fit:
 *
 *    A subcritical            n 0.03   1000 m        C through a jump, super- to subcritical   n 0.02  1000 m
 *    B sub- to supercritical  n 0.02   1000 m        D sub-, supercritical, jump               n 0.03   100 m
 *
 *  C enters supercritical, and a case file gives no depth at the inlet. An approach of 200 m, its depth a
 *  polynomial that joins C with equal depth, slope and curvature, therefore leads from slow to fast.
 *
 *  Source: I. MacDonald et al. (1997), ASCE J. Hydraul. Eng. 123(11), 1041-1045, and (1995) Univ. of Reading
 *  Num. Anal. Report 3/95. Constants from memory; the sequent depth at the jumps confirms them to 1e-6 m. */
export interface MacDonaldFlow extends PrescribedDepth {
  width: number;
  manning: number;
  /** m³/s */
  flow: number;
  jumpAt: number | null;
}

export type MacDonaldCase = 'A' | 'B' | 'C' | 'D';

const WIDTH = 10;
const FLOW = 20;

export function macDonald(name: MacDonaldCase, gravity: number): MacDonaldFlow {
  const manning = { A: 0.03, B: 0.02, C: 0.02, D: 0.03 }[name];
  const jumpAt = { A: null, B: null, C: 500, D: 200 / 3 }[name];
  const pieces = PIECES[name](Math.cbrt(4 / gravity));
  return {
    width: WIDTH,
    manning,
    flow: FLOW,
    jumpAt,
    ...prescribedDepth(trapezoid(WIDTH, 0), gravity, manning, FLOW, pieces),
  };
}

/** Depth functions; k is the critical depth of 2 m²/s. */
const PIECES: Record<MacDonaldCase, (k: number) => DepthPiece[]> = {
  A: (k) => [
    {
      from: 0,
      to: 1000,
      depth: (x) => k * (1 + 0.5 * Math.exp(-16 * (x / 1000 - 0.5) ** 2)),
    },
  ],
  B: (k) => [
    { from: 0, to: 500, depth: (x) => k * (1 - Math.tanh(3 * (x / 1000 - 0.5)) / 3) },
    { from: 500, to: 1000, depth: (x) => k * (1 - Math.tanh(6 * (x / 1000 - 0.5)) / 6) },
  ],
  C: (k) => [
    { from: -200, to: 0, depth: (x) => k * approach(x / 200) },
    { from: 0, to: 500, depth: (x) => k * (0.9 - Math.exp(-x / 250) / 6) },
    {
      from: 500,
      to: 1000,
      depth: (x) => {
        const r = Math.exp(-20 * (x / 1000 - 0.5));
        const series = r * (-0.348427 + r * (0.552264 - r * 0.55558));
        return k * (1 + series + 0.8 * Math.exp(x / 1000 - 1));
      },
    },
  ],
  D: (k) => [
    {
      from: 0,
      to: 200 / 3,
      depth: (x) => k * (4 / 3 - x / 100) - ((9 * x) / 1000) * (x / 100 - 2 / 3),
    },
    {
      from: 200 / 3,
      to: 100,
      depth: (x) => {
        const r = x / 100 - 2 / 3;
        return k * (1.4305 + r * (14.492 + r * (-21.7112 + r * 0.674202 * (1 + r))));
      },
    },
  ],
};

/** A quartic in s = x/200 from 1.25 (level) at s = -1 to the value, slope and curvature of C at s = 0. */
function approach(s: number): number {
  const value = 0.9 - 1 / 6;
  const slope = 200 / 250 / 6;
  const curvature = -(200 * 200) / (250 * 250) / 6;
  const cubic = 4 * value - 3 * slope + curvature - 5;
  const quartic = cubic + 1.25 - value + slope - curvature / 2;
  return value + s * (slope + s * (curvature / 2 + s * (cubic + s * quartic)));
}
