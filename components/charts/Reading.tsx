import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import { placeLabel, type Box, type Obstacles } from './geometry/placeLabel';
import { textWidth } from './geometry/textWidth';

const LINE = 16;

export interface ReadingText {
  text: string;
  strong?: boolean;
}

/** Box that a reading takes, placed beside a point and off the lines. */
export function readingBox(
  texts: readonly ReadingText[],
  point: { x: number; y: number },
  bounds: Box,
  obstacles: Obstacles,
  gap?: number,
): Box {
  const size = {
    width: Math.max(...texts.map(({ text }) => textWidth(text, CHART_TEXT_SIZE))),
    height: texts.length * LINE,
  };
  return placeLabel(point, size, bounds, obstacles, gap);
}

/** One or more lines of a reading in the box that was found for them, written from the side of their point. */
export function Reading(props: { texts: readonly ReadingText[]; box: Box; from: number }) {
  const { texts, box, from } = props;
  const leftOfPoint = box.x + box.width <= from;
  return texts.map(({ text, strong }, i) => (
    <ChartText
      key={i}
      x={leftOfPoint ? box.x + box.width : box.x}
      y={box.y + LINE * i + 12}
      anchor={leftOfPoint ? 'end' : 'start'}
      tone={strong ? 'ink' : 'soft'}
      strong={strong}
      halo
    >
      {text}
    </ChartText>
  ));
}
