import { scaleLinear } from 'd3-scale';
import { useMemo } from 'react';
import { Line, Rect } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { ChartBox } from './ChartBox';
import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import { textWidth } from './geometry/textWidth';
import { tornadoModel, type TornadoBar } from './geometry/tornadoModel';

interface Props {
  /** What is changed, where, from which value. */
  label: string;
  bars: readonly TornadoBar[];
  /** A change with its sign and unit. */
  format: (change: number) => string;
  initialWidth?: number;
}

/** Height of an input: its name, and its two bars below it. */
const ROW = 58;
const BAR = 12;
const TOP = 6;

/**
 * What each input changes by itself, the largest first: from the line of the base case a hatched-edged bar for the lower value of the input, a
 * full one for the upper. Told apart by fill and place, and both are named.
 */
export function Tornado({ label, bars, format, initialWidth }: Props) {
  const { rows, extent } = useMemo(() => tornadoModel(bars), [bars]);
  const { colours } = useTheme();
  const spoken = rows.map(
    ({ label: name, low, high }) =>
      `${name}: ${low.words} ${told(low.change, format)}, ${high.words} ${told(high.change, format)}`,
  );
  return (
    <ChartBox
      label={`${label}. ${spoken.join('; ')}`}
      height={TOP + ROW * rows.length + 4}
      initialWidth={initialWidth}
    >
      {({ width }) => {
        const words = rows.flatMap(({ low, high }) => [
          endText(low, format),
          endText(high, format),
        ]);
        const room = 12 + Math.max(...words.map((text) => textWidth(text, CHART_TEXT_SIZE)));
        const x = scale(extent, width, room);
        return (
          <>
            {rows.map((row, k) => {
              const y = TOP + ROW * k;
              return [
                <ChartText key={`${row.label} name`} x={0} y={y + 14} tone="ink" strong>
                  {row.label}
                </ChartText>,
                ...[row.low, row.high].map((side, s) => {
                  const top = y + 20 + s * (BAR + 4);
                  const change = side.change ?? 0;
                  const [from, to] = [x(Math.min(0, change)), x(Math.max(0, change))];
                  const leftwards = change < 0;
                  return [
                    <Rect
                      key={`${row.label} bar ${s}`}
                      x={from}
                      y={top}
                      width={Math.max(1, to - from)}
                      height={BAR}
                      fill={s === 0 ? colours.card : colours.water}
                      stroke={colours.water}
                      strokeWidth={1.25}
                    />,
                    <ChartText
                      key={`${row.label} end ${s}`}
                      x={leftwards ? from - 6 : to + 6}
                      y={top + 10}
                      anchor={leftwards ? 'end' : 'start'}
                    >
                      {endText(side, format)}
                    </ChartText>,
                  ];
                }),
              ];
            })}
            <Line
              x1={x(0)}
              x2={x(0)}
              y1={TOP + 18}
              y2={TOP + ROW * rows.length}
              stroke={colours.ink}
              strokeWidth={1.25}
            />
          </>
        );
      }}
    </ChartBox>
  );
}

const told = (change: number | null, format: Props['format']): string =>
  change === null ? 'no result' : format(change);

const endText = (side: TornadoBar['low'], format: Props['format']): string =>
  `${side.words}: ${told(side.change, format)}`;

/** Room for the words is kept on the sides that bars point to. */
function scale([low, high]: [number, number], width: number, room: number) {
  const left = low < 0 ? room : 4;
  const right = Math.max(left + 20, width - room);
  return scaleLinear(low === high ? [0, 1] : [low, high], [left, right]);
}
