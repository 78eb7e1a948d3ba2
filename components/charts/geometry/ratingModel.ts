import { fromSi, type UnitSystem } from '@/shared/units/units';
import { extentOf, makeFrame, roomyExtent, type Frame } from './frame';
import { linePath, project } from './paths';
import { valueTicks } from './ticks';

/** Stage against flow through a flood at one place; SI. */
export interface RatingSeries {
  times: ArrayLike<number>;
  stage: ArrayLike<number>;
  flow: ArrayLike<number>;
}

export interface RatingModel {
  frame: Frame;
  flowTicks: number[];
  stageTicks: number[];
  /** Up to the highest stage, and from there on. */
  rising: string;
  falling: string;
  /** Small heads that point the way of time: px and degrees, clockwise from right. */
  arrows: { x: number; y: number; turn: number }[];
  xOf: (flow: number) => number;
  yOf: (stage: number) => number;
}

const MARGINS = { top: 10, right: 18, bottom: 30, left: 52 };
/** px of the curve between two heads. */
const ARROW_EVERY = 90;

export function ratingModel(
  size: { width: number; height: number },
  { stage, flow }: RatingSeries,
  unitSystem: UnitSystem,
): RatingModel {
  const flowIn = (value: number) => fromSi(value, 'flow', unitSystem);
  const stageIn = (value: number) => fromSi(value, 'elevation', unitSystem);
  const [q0, q1] = extentOf(flow, [0]) ?? [0, 1];
  const [h0, h1] = extentOf(stage) ?? [0, 1];
  const x = roomyExtent([flowIn(q0), flowIn(q1)], flowIn(1), 5);
  const y = roomyExtent([stageIn(h0), stageIn(h1)], stageIn(0.2), 4);
  const frame = makeFrame(size, MARGINS, x, y);
  const xOf = (value: number) => frame.x(flowIn(value));
  const yOf = (value: number) => frame.y(stageIn(value));
  const px = project(flow, xOf);
  const py = project(stage, yOf);
  let top = 0;
  for (let k = 1; k < stage.length; k++) if (stage[k] > stage[top]) top = k;
  return {
    frame,
    flowTicks: valueTicks(x, frame.right - frame.left, 70),
    stageTicks: valueTicks(y, frame.bottom - frame.top, 26),
    rising: linePath(px.subarray(0, top + 1), py.subarray(0, top + 1)),
    falling: linePath(px.subarray(top), py.subarray(top)),
    arrows: arrowsAlong(px, py),
    xOf,
    yOf,
  };
}

function arrowsAlong(px: ArrayLike<number>, py: ArrayLike<number>): RatingModel['arrows'] {
  const arrows: RatingModel['arrows'] = [];
  let walked = ARROW_EVERY / 2;
  for (let k = 1; k < px.length; k++) {
    const [dx, dy] = [px[k] - px[k - 1], py[k] - py[k - 1]];
    walked += Math.hypot(dx, dy);
    if (walked < ARROW_EVERY) continue;
    walked = 0;
    arrows.push({ x: px[k], y: py[k], turn: (Math.atan2(dy, dx) * 180) / Math.PI });
  }
  return arrows;
}
