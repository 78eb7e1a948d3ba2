import { memo, useCallback, useMemo, useRef } from 'react';
import { useTheme } from '@/components/theme/useTheme';
import { waterPaths } from './geometry/waterPaths';
import type { LiveTime } from './liveTime';
import { useEachFrame } from './useEachFrame';

interface Props {
  live: LiveWater;
  /** px. */
  x: ArrayLike<number>;
  /** m. */
  bed: ArrayLike<number>;
  /** Lower edge, px; the ground is drawn over the water. */
  foot: number;
  /** px of 0 m, and px a metre; keep the same object while only the water moves. */
  y: { at0: number; perMetre: number };
}

/** Water that moves by itself. */
export interface LiveWater extends LiveTime {
  /** Water surface at the places of the drawing at a time, m; may be the same row each time. */
  stageAt: (t: number) => ArrayLike<number>;
  /** The same at the chosen place, m. */
  levelAt: (t: number) => number;
}

/** The water of a long section, drawn each frame without React. Elements of the browser's own: they are written by ref. */
export const MovingWater = memo(function MovingWater({ live, x, bed, foot, y }: Props) {
  const { colours } = useTheme();
  const water = useRef<SVGPathElement>(null);
  const line = useRef<SVGPathElement>(null);
  const paths = useMemo(() => waterPaths({ x, bed, foot }, y), [x, bed, foot, y]);
  const draw = useCallback(
    (t: number) => {
      const drawn = paths(live.stageAt(t));
      water.current?.setAttribute('d', drawn.water);
      line.current?.setAttribute('d', drawn.line);
    },
    [paths, live],
  );
  useEachFrame(live, draw);
  return (
    <>
      <path ref={water} fill={colours.waterTint} />
      <path ref={line} fill="none" stroke={colours.water} strokeWidth={2} strokeLinejoin="round" />
    </>
  );
});

/** The dot on the water at the chosen place. */
export function MovingDot({ live, x, y }: Pick<Props, 'live' | 'y'> & { x: number }) {
  const { colours } = useTheme();
  const dot = useRef<SVGCircleElement>(null);
  const draw = useCallback(
    (t: number) =>
      dot.current?.setAttribute('cy', (y.at0 + y.perMetre * live.levelAt(t)).toFixed(1)),
    [live, y],
  );
  useEachFrame(live, draw);
  return <circle ref={dot} cx={x} r={5} fill={colours.card} stroke={colours.ink} strokeWidth={2} />;
}
