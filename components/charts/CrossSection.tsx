import { memo, useMemo } from 'react';
import { Line, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { formatNumber, formatWithUnit } from '@/shared/units/format';
import { fromSi, UNITS, type UnitSystem } from '@/shared/units/units';
import { ChartBox, type ChartSize } from './ChartBox';
import { ChartText, CHART_TEXT_SIZE } from './ChartText';
import { crossSectionModel, type SectionShape } from './geometry/crossSectionModel';
import { sectionWater } from './geometry/sectionWater';
import { textWidth } from './geometry/textWidth';
import { PlaceAxis } from './PlaceAxis';
import { SectionParts } from './SectionParts';
import { ValueAxis } from './ValueAxis';

export interface CrossSectionProps {
  /** What is drawn, e.g. `Section XS-15`. */
  label: string;
  /** Ground, roughness zones and banks, SI. Keep the same object while only the water moves. */
  section: SectionShape;
  /** Water level, m; null for the bare ground. */
  stage?: number | null;
  /** Highest water of the run, m, dotted. */
  peakStage?: number | null;
  unitSystem: UnitSystem;
  height?: number;
  initialWidth?: number;
}

/** A cross-section looking downstream, with the water that stands in it. */
export const CrossSection = memo(function CrossSection(props: CrossSectionProps) {
  const { height = 200, initialWidth } = props;
  return (
    <ChartBox
      label={sentence(props)}
      unit={`elevation and offset in ${UNITS[props.unitSystem].length.symbol}`}
      {...{ height, initialWidth }}
    >
      {(size) => <Drawing {...props} size={size} />}
    </ChartBox>
  );
});

function Drawing(props: CrossSectionProps & { size: ChartSize }) {
  const { section, stage = null, peakStage = null, unitSystem, size } = props;
  const { width, height } = size;
  const { colours } = useTheme();
  const model = useMemo(
    () => crossSectionModel({ width, height }, section, peakStage, unitSystem),
    [width, height, section, peakStage, unitSystem],
  );
  const { frame, px, py } = model;
  const ring = (points: readonly (readonly [number, number])[]) =>
    `M${points.map(([x, y]) => `${px(x).toFixed(1)},${py(y).toFixed(1)}`).join('L')}Z`;
  const water = stage === null ? [] : sectionWater(section.points, stage);
  return (
    <>
      <ValueAxis frame={frame} ticks={model.yTicks} />
      <Path d={model.groundFill} fill={colours.earthTint} />
      {water.map((each, i) => (
        <Path key={i} d={ring(each)} fill={colours.waterTint} />
      ))}
      <Path
        d={model.groundLine}
        fill="none"
        stroke={colours.earth}
        strokeWidth={1.5}
        strokeLinejoin="round"
      />
      {peakStage === null
        ? null
        : sectionWater(section.points, peakStage).map((each, i) => (
            <Line
              key={i}
              x1={px(each[0][0])}
              x2={px(each[each.length - 1][0])}
              y1={py(peakStage)}
              y2={py(peakStage)}
              stroke={colours.water}
              strokeWidth={1.25}
              strokeDasharray="3 3"
            />
          ))}
      {water.map((each, i) => (
        <Line
          key={i}
          x1={px(each[0][0])}
          x2={px(each[each.length - 1][0])}
          y1={py(stage ?? 0)}
          y2={py(stage ?? 0)}
          stroke={colours.water}
          strokeWidth={2}
        />
      ))}
      <SectionParts {...{ section, frame, px, py }} />
      {model.banks.map(({ x, y }) => (
        <Line
          key={x}
          x1={x}
          x2={x}
          y1={y - 12}
          y2={y + 2}
          stroke={colours.ink}
          strokeWidth={1.25}
        />
      ))}
      {model.zones.map(({ n, from, to }) => {
        const text = `n ${formatNumber(n, 3)}`;
        return textWidth(text, CHART_TEXT_SIZE) < to - from ? (
          <ChartText
            key={from}
            x={(from + to) / 2}
            y={frame.bottom - 5}
            anchor="middle"
            tone="earth"
          >
            {text}
          </ChartText>
        ) : null;
      })}
      {model.zones.slice(1).map(({ from }) => (
        <Line
          key={from}
          x1={from}
          x2={from}
          y1={frame.bottom - 18}
          y2={frame.bottom}
          stroke={colours.earth}
          strokeWidth={1}
        />
      ))}
      <PlaceAxis frame={frame} ticks={model.xTicks} />
    </>
  );
}

function sentence({ label, section, stage, peakStage, unitSystem }: CrossSectionProps): string {
  const elevation = (si: number) => formatWithUnit(si, 'elevation', unitSystem);
  const bed = Math.min(...section.points.map(([, ground]) => ground));
  const parts = [`${label}, looking downstream`, `lowest ground ${elevation(bed)}`];
  if (stage != null) parts.push(stage > bed ? `water at ${elevation(stage)}` : 'dry at this time');
  if (peakStage != null) parts.push(`highest water ${elevation(peakStage)}`);
  if (section.banks) {
    const [left, right] = section.banks.map((m) =>
      formatNumber(fromSi(m, 'length', unitSystem), 1),
    );
    parts.push(`banks at ${left} and ${right} ${UNITS[unitSystem].length.symbol}`);
  }
  if (section.storage?.length) parts.push(`storage parts: ${section.storage.length}`);
  for (const [side, post] of Object.entries(section.embankments ?? {}))
    parts.push(`${side} embankment up to ${elevation(post.crest)}`);
  return parts.join('; ');
}
