import type { PrismaticSection } from './prismaticSection';
import { integrate } from './tools/integrate';
import { manningConveyance } from './uniformFlow';

/** A channel whose bed is made so that steady flow has a depth chosen beforehand. With the specific energy
 *  E = h + Q²/(2 g A²) and S_f = Q²/K², steady flow is E_x = S_0 - S_f, so on every piece where h is smooth
 *
 *    z(x) = z(end) + E(h(end)) - E(h(x)) + ∫ S_f dx      (from x to the end of the piece)
 *
 *  and the bed is continuous from piece to piece; at a jump h leaps (to the sequent depth), z does not.
 *
 *  Source: I. MacDonald, M. J. Baines, N. K. Nichols, P. G. Samuels (1997), ASCE J. Hydraul. Eng. 123(11),
 *  1041-1045. */
export interface DepthPiece {
  from: number;
  to: number;
  /** Smooth on the closed piece, m. */
  depth(x: number): number;
}

export interface PrescribedDepth {
  from: number;
  to: number;
  depth(x: number): number;
  /** Bed elevation above the bed at the downstream end, m. */
  bed(x: number): number;
}

const PANELS_PER_PIECE = 200;

export function prescribedDepth(
  section: PrismaticSection,
  gravity: number,
  manning: number,
  flow: number,
  pieces: readonly DepthPiece[],
): PrescribedDepth {
  const energy = (h: number) => h + (flow / section.area(h)) ** 2 / (2 * gravity);
  const frictionSlope = (h: number) => (flow / manningConveyance(section, manning, h)) ** 2;

  /** Fall of the bed from x to the end of the panel-wise table of one piece. */
  const tabulate = (piece: DepthPiece) => {
    const width = (piece.to - piece.from) / PANELS_PER_PIECE;
    const friction = (x: number) => frictionSlope(piece.depth(x));
    const lost = new Float64Array(PANELS_PER_PIECE + 1);
    for (let i = PANELS_PER_PIECE - 1; i >= 0; i--) {
      const start = piece.from + i * width;
      lost[i] = lost[i + 1] + integrate(friction, start, start + width, 1);
    }
    return (x: number) => {
      const i = Math.min(PANELS_PER_PIECE - 1, Math.max(0, Math.floor((x - piece.from) / width)));
      const head = integrate(friction, x, piece.from + (i + 1) * width, 1) + lost[i + 1];
      return energy(piece.depth(piece.to)) - energy(piece.depth(x)) + head;
    };
  };

  const falls = pieces.map(tabulate);
  const ends = pieces.map(() => 0);
  for (let i = pieces.length - 2; i >= 0; i--) {
    ends[i] = ends[i + 1] + falls[i + 1](pieces[i + 1].from);
  }
  const pieceAt = (x: number) => {
    const i = pieces.findIndex((piece) => x <= piece.to);
    return i < 0 ? pieces.length - 1 : i;
  };
  return {
    from: pieces[0].from,
    to: pieces[pieces.length - 1].to,
    depth: (x) => pieces[pieceAt(x)].depth(x),
    bed: (x) => ends[pieceAt(x)] + falls[pieceAt(x)](x),
  };
}
