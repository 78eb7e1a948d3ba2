import type { KeyboardEvent, ReactNode } from 'react';
import { View, type StyleProp, type ViewProps, type ViewStyle } from 'react-native';
import { DragSurface } from './DragSurface';
import { nextStop } from './geometry/nextStop';

interface Props {
  /** Name of what it sets. */
  label: string;
  /** Where it may rest by key, rising. */
  stops: readonly number[];
  /** Stops that Page Up and Page Down pass. */
  page?: number;
  value: number;
  /** The value in words, with its unit. */
  valueText: string;
  onChange: (value: number) => void;
  onDrag: (x: number) => void;
  onDragEnd?: () => void;
  style?: StyleProp<ViewStyle>;
  children: ReactNode;
}

/** A drawing that is a slider: arrows, Page Up and Down, Home and End; press and drag. */
export function SliderSurface(props: Props) {
  const { label, stops, page, value, valueText, onChange, onDrag, onDragEnd, style } = props;
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const next = nextStop(stops, value, event.key, page);
    if (next === null) return;
    event.preventDefault();
    onChange(next);
  };
  const keys = { onKeyDown } as unknown as ViewProps;
  return (
    <View
      {...keys}
      style={style}
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={stops[0]}
      aria-valuemax={stops[stops.length - 1]}
      aria-valuenow={value}
      aria-valuetext={valueText}
      aria-orientation="horizontal"
    >
      <DragSurface onDrag={onDrag} onEnd={onDragEnd}>
        {props.children}
      </DragSurface>
    </View>
  );
}
