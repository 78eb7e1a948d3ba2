import { crossSectionModel } from '../../../components/charts/geometry/crossSectionModel';
import { sectionWater } from '../../../components/charts/geometry/sectionWater';
import type { SectionInput } from '../../../shared/case/caseFile';
import { formatNumber, formatWithUnit } from '../../../shared/units/format';
import { UNITS, type UnitSystem } from '../../../shared/units/units';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';
import { axes, numberAxis, strokePath } from './axes';

/** The surveyed ground with its bank marks and roughness, and the highest water in it. */
export const crossSection = (
  section: SectionInput,
  peakStage: number,
  system: UnitSystem,
): Drawing => ({
  alt:
    `Cross-section ${section.id} at chainage ${formatWithUnit(section.chainage, 'chainage', system)}, ` +
    `highest water at ${formatWithUnit(peakStage, 'elevation', system)}.`,
  draw(doc, size) {
    const model = crossSectionModel(
      { width: size.width, height: size.height - TITLE },
      section,
      peakStage,
      system,
    );
    doc.save().translate(0, TITLE);
    const { frame, px, py } = model;
    const { length, elevation } = UNITS[system];
    axes(
      doc,
      frame,
      numberAxis(model.xTicks, `offset (${length.symbol})`),
      numberAxis(model.yTicks, `elevation (${elevation.symbol})`),
    );
    doc.path(model.groundFill).fill(COLOUR.earthTint);
    for (const ring of sectionWater(section.points, peakStage))
      doc.polygon(...ring.map(([x, z]): [number, number] => [px(x), py(z)])).fill(COLOUR.waterTint);
    strokePath(doc, model.groundLine, { colour: COLOUR.ink, width: 0.9 });
    for (const { x, y } of model.banks)
      doc
        .moveTo(x, y - 1)
        .lineTo(x - 3, y - 6)
        .lineTo(x + 3, y - 6)
        .fill(COLOUR.earth);
    doc.font(FONT.regular).fontSize(6.5).fillColor(COLOUR.soft);
    for (const { n, from, to } of model.zones) {
      const word = `n ${formatNumber(n, 3)}`;
      if (doc.widthOfString(word) > to - from - 2) continue;
      doc.text(word, from, frame.bottom - 9, {
        width: to - from,
        align: 'center',
        lineBreak: false,
      });
    }
    doc.restore();
    doc.font(FONT.semibold).fontSize(8.5).fillColor(COLOUR.ink);
    const at = formatWithUnit(section.chainage, 'chainage', system);
    doc.text(`${section.id}, chainage ${at}`, 46, 0, {
      width: size.width - 46,
      lineBreak: false,
      ellipsis: true,
    });
  },
});

const TITLE = 24;
