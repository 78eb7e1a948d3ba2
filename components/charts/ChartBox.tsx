import { useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg from 'react-native-svg';
import { PictureButton } from './picture/PictureButton';
import { usePictureSource } from './picture/pictureContext';
import { useWidth } from './useWidth';

interface Props {
  /** What the drawing shows, in a sentence: all that a screen reader is told of it. */
  label: string;
  /** Symbol of the values' unit, for its picture; left out where the drawing itself tells it. */
  unit?: string;
  height: number;
  /** Width until the layout is known, px. */
  initialWidth?: number;
  /** Drawn as SVG. */
  children: (size: ChartSize) => ReactNode;
  /** Laid over the drawing, e.g. what catches the hand. */
  over?: (size: ChartSize) => ReactNode;
  /** What can be reached by keys on the drawing: beside the image, whose parts a screen reader does not see. */
  controls?: (size: ChartSize) => ReactNode;
  /** Below the drawing: a list of how each curve is drawn and what it is. */
  legend?: ReactNode;
}

export interface ChartSize {
  width: number;
  height: number;
}

/** A drawing as wide as the place it is given; under it, where its source is known, a picture of it to take away. */
export function ChartBox(props: Props) {
  const { label, unit, height, initialWidth, children, over, controls, legend } = props;
  const { width, measured } = useWidth(initialWidth);
  const source = usePictureSource();
  const outer = useRef<View>(null);
  const size = { width, height };
  return (
    <View ref={outer} style={styles.outer}>
      <View style={styles.outer}>
        <View style={[styles.box, { height }]} {...measured} role="img" aria-label={label}>
          {width > 0 ? (
            <Svg width={width} height={height} style={styles.drawing}>
              {children(size)}
            </Svg>
          ) : null}
          {width > 0 ? over?.(size) : null}
        </View>
        {width > 0 ? controls?.(size) : null}
      </View>
      {legend}
      {source ? (
        <PictureButton
          {...{ label, unit, source }}
          box={() => outer.current as unknown as Element | null}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  outer: { alignSelf: 'stretch' },
  box: { alignSelf: 'stretch' },
  // Out of the flow, so that the drawing never holds its box open when the window narrows.
  drawing: { position: 'absolute', left: 0, top: 0 },
});
