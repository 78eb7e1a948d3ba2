import { useMemo, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Circle, ClipPath, Defs, G, Line, Path, Rect } from 'react-native-svg';
import { PlaceAxis } from '@/components/charts/PlaceAxis';
import { SectionParts } from '@/components/charts/SectionParts';
import { useWidth } from '@/components/charts/useWidth';
import { ValueAxis } from '@/components/charts/ValueAxis';
import { touch } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { useUnitSystem } from '@/components/ui/unitSystem';
import { groundAt } from '@/shared/reaches/sectionGeometry';
import type { Section } from '@/shared/surveys/types';
import { formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import {
  editDrawingModel,
  groundPaths,
  pointNear,
  type EditDrawingModel,
  type Window,
} from './editDrawingModel';
import { keyStep } from './keyStep';

interface SectionDrawingProps {
  section: Section;
  /** The ground as it was surveyed, dashed behind. */
  surveyed?: Section;
  window: Window;
  chosen: number;
  onChoose: (index: number) => void;
  /** A point was moved to [offset, elevation], m; one gesture has one mark. */
  onMove: (index: number, to: [number, number], gesture: string) => void;
  /** Points in which something is wrong. */
  faulty: ReadonlySet<number>;
  height?: number;
  initialWidth?: number;
}

let gestures = 0;

/** The ground of a section to be drawn upon: a point is chosen and moved by mouse, finger or arrow keys. */
export function SectionDrawing(props: SectionDrawingProps) {
  const { section, window, chosen, onChoose, onMove, height = 280, initialWidth } = props;
  const { colours } = useTheme();
  const system = useUnitSystem();
  const { width, measured } = useWidth(initialWidth);
  const { points } = section;
  const [held, setHeld] = useState<{ model: EditDrawingModel; gesture: string } | null>(null);
  const keyGesture = useRef({ index: -1, name: '' });
  const fresh = useMemo(() => {
    const crests = Object.values(section.embankments ?? {}).map(({ crest }) => crest);
    return editDrawingModel({ width, height }, points, window, crests, system);
  }, [width, height, section, points, window, system]);
  // While a point is held the scales stand still, else the ground would run away under the hand.
  const model = held?.model ?? fresh;
  if (!points[chosen]) return null;
  const [offset, elevation] = points[chosen];

  const placeOf = (event: PointerEvent<HTMLElement>): [number, number] => {
    const box = event.currentTarget.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };
  const press = (event: PointerEvent<HTMLElement>) => {
    if (event.button !== 0) return;
    const place = placeOf(event);
    const isMouse = event.pointerType === 'mouse';
    const near = pointNear(points, model, place, isMouse ? 14 : 30);
    if (near === null) return;
    onChoose(near);
    // A finger that lands elsewhere may be scrolling; it drags only the point that is chosen already.
    if (!isMouse && near !== chosen) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    setHeld({ model, gesture: `drag ${++gestures}` });
  };
  const drag = (event: PointerEvent<HTMLElement>) => {
    if (!held) return;
    const { frame } = held.model;
    const [x, y] = placeOf(event);
    const to = held.model.at(
      Math.min(Math.max(x, frame.left), frame.right),
      Math.min(Math.max(y, frame.top), frame.bottom),
    );
    onMove(chosen, to.map(rounded) as [number, number], held.gesture);
  };
  const key = (event: KeyboardEvent) => {
    const step = keyStep(event, chosen, points.length);
    if (!step) return;
    event.preventDefault();
    if (step.kind === 'choose') return onChoose(step.index);
    if (keyGesture.current.index !== chosen)
      keyGesture.current = { index: chosen, name: `keys ${++gestures}` };
    const unit = UNITS[system];
    const to: [number, number] = [
      offset + step.across * unit.length.si,
      elevation + step.up * unit.elevation.si,
    ];
    onMove(chosen, to.map(rounded) as [number, number], keyGesture.current.name);
  };
  return (
    <View {...measured} style={[styles.box, { height }]}>
      <div
        role="slider"
        tabIndex={0}
        aria-label={`Points of ${section.id}`}
        aria-valuemin={1}
        aria-valuemax={points.length}
        aria-valuenow={chosen + 1}
        aria-valuetext={`Point ${chosen + 1} of ${points.length}: offset ${formatWithUnit(offset, 'length', system)}, elevation ${formatWithUnit(elevation, 'elevation', system)}`}
        onKeyDown={key}
        onPointerDown={press}
        onPointerMove={drag}
        onPointerUp={() => setHeld(null)}
        onPointerCancel={() => setHeld(null)}
        style={{
          position: 'absolute',
          inset: 0,
          touchAction: 'pan-y',
          cursor: held ? 'grabbing' : 'crosshair',
          userSelect: 'none',
        }}
      >
        {width > 0 ? (
          <Svg width={width} height={height}>
            <Ground {...props} model={model} />
          </Svg>
        ) : null}
        <div
          style={{
            position: 'absolute',
            left: model.px(offset) - touch / 2,
            top: model.py(elevation) - touch / 2,
            width: touch,
            height: touch,
            borderRadius: touch / 2,
            border: `1.5px solid ${colours.ink}`,
            boxSizing: 'border-box',
            // Here a finger moves the point; everywhere else on the drawing it scrolls the page.
            touchAction: 'none',
            cursor: held ? 'grabbing' : 'grab',
            display:
              model.px(offset) < model.frame.left - 1 || model.px(offset) > model.frame.right + 1
                ? 'none'
                : undefined,
          }}
        />
      </div>
    </View>
  );
}

/** To the centimetre: finer than a hand, and no tail of digits to look at. */
const rounded = (metres: number) => Math.round(metres * 100) / 100;

function Ground(props: SectionDrawingProps & { model: EditDrawingModel }) {
  const { section, surveyed, chosen, faulty, model } = props;
  const { colours } = useTheme();
  const { frame, px, py } = model;
  const { points, banks } = section;
  const ground = useMemo(() => groundPaths(points, model), [points, model]);
  const before = useMemo(
    () => (surveyed ? groundPaths(surveyed.points, model).line : null),
    [surveyed, model],
  );
  const clip = `clip-${frame.width}`;
  return (
    <>
      <Defs>
        <ClipPath id={clip}>
          <Rect
            x={frame.left - 6}
            y={0}
            width={frame.right - frame.left + 12}
            height={frame.bottom}
          />
        </ClipPath>
      </Defs>
      <ValueAxis frame={frame} ticks={model.yTicks} />
      <G clipPath={`url(#${clip})`}>
        <Path d={ground.fill} fill={colours.earthTint} />
        {before ? (
          <Path
            d={before}
            fill="none"
            stroke={colours.soft}
            strokeWidth={1.25}
            strokeDasharray="4 3"
          />
        ) : null}
        <Path
          d={ground.line}
          fill="none"
          stroke={colours.earth}
          strokeWidth={1.5}
          strokeLinejoin="round"
        />
        {(banks ?? []).map((y) => (
          <Line
            key={y}
            x1={px(y)}
            x2={px(y)}
            y1={py(groundAt(section, y)) - 16}
            y2={py(groundAt(section, y)) + 2}
            stroke={colours.ink}
            strokeWidth={1.25}
          />
        ))}
        <SectionParts {...{ section, frame, px, py }} />
        {points.map(([y, z], i) => (
          <Circle
            key={i}
            cx={px(y)}
            cy={py(z)}
            r={i === chosen ? 5 : 3.25}
            fill={faulty.has(i) ? colours.brick : i === chosen ? colours.ink : colours.card}
            stroke={faulty.has(i) ? colours.brick : i === chosen ? colours.ink : colours.earth}
            strokeWidth={1.5}
          />
        ))}
      </G>
      <PlaceAxis frame={frame} ticks={model.xTicks} />
    </>
  );
}

const styles = StyleSheet.create({ box: { alignSelf: 'stretch' } });
