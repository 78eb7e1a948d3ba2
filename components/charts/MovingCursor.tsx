import { useCallback, useRef } from 'react';
import { useTheme } from '@/components/theme/useTheme';
import type { LiveTime } from './liveTime';
import { useEachFrame } from './useEachFrame';

interface Props {
  live: LiveTime;
  /** Point of the curve at a time, px; keep the same functions while only time moves. */
  xOf: (t: number) => number;
  yOf: (t: number) => number;
  /** Upper and lower end of the line through it, px; left out for a dot alone. */
  line?: { top: number; bottom: number };
}

/** The cursor on a curve, moved each frame without React. Elements of the browser's own: they are written by ref. */
export function MovingCursor({ live, xOf, yOf, line }: Props) {
  const { colours } = useTheme();
  const upright = useRef<SVGLineElement>(null);
  const dot = useRef<SVGCircleElement>(null);
  const draw = useCallback(
    (t: number) => {
      const x = xOf(t).toFixed(1);
      upright.current?.setAttribute('x1', x);
      upright.current?.setAttribute('x2', x);
      dot.current?.setAttribute('cx', x);
      dot.current?.setAttribute('cy', yOf(t).toFixed(1));
    },
    [xOf, yOf],
  );
  useEachFrame(live, draw);
  return (
    <>
      {line ? (
        <line
          ref={upright}
          y1={line.top}
          y2={line.bottom}
          stroke={colours.ink}
          strokeWidth={1.25}
        />
      ) : null}
      <circle ref={dot} r={3.5} fill={colours.card} stroke={colours.ink} strokeWidth={1.5} />
    </>
  );
}
