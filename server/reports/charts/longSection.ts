import {
  longSectionFrame,
  wetSurface,
  withRoomFor,
  type LongProfile,
  type ObservedLevel,
} from '../../../components/charts/geometry/longProfile';
import { bandPath, linePath, project } from '../../../components/charts/geometry/paths';
import { fromSi, UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';
import {
  axes,
  legend,
  numberAxis,
  penSample,
  strokePath,
  type LegendEntry,
  type Pen,
} from './axes';
import { crossEntry, crosses } from './crosses';

const PENS = {
  peak: { colour: COLOUR.water, width: 1.4 },
  start: { colour: COLOUR.water, width: 0.8, dash: [4, 3] },
  bed: { colour: COLOUR.ink, width: 1 },
  leftBank: { colour: COLOUR.earth, width: 0.8, dash: [6, 2] },
  rightBank: { colour: COLOUR.earth, width: 0.8, dash: [1.5, 2] },
} satisfies Record<string, Pen>;

export interface LongSectionContent extends LongProfile {
  /** Water surface at the start; null: the survey alone is drawn. */
  startStage: ArrayLike<number> | null;
  stations: readonly { name: string; chainage: number }[];
  /** Levels that a flood was seen at. */
  observed?: readonly ObservedLevel[];
  system: UnitSystem;
  alt: string;
}

/** Bed, banks and, where there is a result, the water at the start and the highest that it came to. */
export const longSection = (content: LongSectionContent): Drawing => ({
  alt: content.alt,
  draw(doc, size) {
    const { system, bed, chainages, peakStage, startStage } = content;
    const observed = onReach(content);
    const frame = longSectionFrame(size, withRoomFor(content, [], observed), system);
    const { chainage, elevation } = UNITS[system];
    const xs = project(chainages, (m) => frame.x(fromSi(m, 'chainage', system)));
    const line = (row: ArrayLike<number>) =>
      project(row, (m) => frame.y(fromSi(m, 'elevation', system)));
    axes(
      doc,
      frame,
      numberAxis(frame.xTicks, `chainage (${chainage.symbol}), downstream to the right`),
      numberAxis(frame.yTicks, `elevation (${elevation.symbol})`),
    );
    const ground = line(bed);
    doc.path(bandPath(xs, ground, frame.bottom)).fill(COLOUR.earthTint);
    const shown: LegendEntry[] = [];
    const stroke = (word: string, row: ArrayLike<number>, pen: Pen) => {
      strokePath(doc, linePath(xs, line(row)), pen);
      shown.push({ word, sample: penSample(pen) });
    };
    if (peakStage) {
      const water = line(wetSurface(bed, peakStage));
      doc.path(bandPath(xs, water, ground) || 'M0,0').fill(COLOUR.waterTint);
      stroke('highest water', wetSurface(bed, peakStage), PENS.peak);
    }
    if (startStage) stroke('water at the start', wetSurface(bed, startStage), PENS.start);
    stroke('bed', bed, PENS.bed);
    if (content.leftBank) stroke('left bank', content.leftBank, PENS.leftBank);
    if (content.rightBank) stroke('right bank', content.rightBank, PENS.rightBank);
    if (observed.length > 0) {
      const px = observed.map((mark) => frame.x(fromSi(mark.chainage, 'chainage', system)));
      const py = (m: number) => frame.y(fromSi(m, 'elevation', system));
      crosses(doc, {
        x: px,
        y: observed.map(({ level }) => py(level)),
        bars: observed.map(({ level, tolerance }) => [
          py(level + tolerance),
          py(level - tolerance),
        ]),
      });
      shown.push(crossEntry);
    }
    legend(doc, frame.right, 6, shown);
    stationMarks(doc, frame, content);
  },
});

const onReach = ({ observed = [], chainages }: LongSectionContent) =>
  observed.filter(
    ({ chainage }) => chainage >= chainages[0] && chainage <= chainages[chainages.length - 1],
  );

/** Names stand upright at the foot; one too near to the one before is left to the table. */
function stationMarks(
  doc: PDFKit.PDFDocument,
  frame: ReturnType<typeof longSectionFrame>,
  { stations, system }: LongSectionContent,
): void {
  let last = -Infinity;
  for (const { name, chainage } of stations) {
    const x = frame.x(fromSi(chainage, 'chainage', system));
    strokePath(doc, `M${x},${frame.top}L${x},${frame.bottom}`, {
      colour: COLOUR.soft,
      width: 0.5,
      dash: [1, 2],
    });
    if (x - last < 9) continue;
    last = x;
    doc.font(FONT.regular).fontSize(7).fillColor(COLOUR.ink);
    doc.save().rotate(-90, { origin: [x, frame.bottom - 3] });
    doc.text(name, x, frame.bottom - 3 - 10, { lineBreak: false });
    doc.restore();
  }
}
