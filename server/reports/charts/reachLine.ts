import { reachCurve } from '../../../components/charts/geometry/reachCurve';
import { COLOUR } from '../pdf/colours';
import type { Drawing } from '../pdf/figure';
import { FONT } from '../pdf/sheet';
import { strokePath } from './axes';

/** The reach as one winding line with the named places on it: a drawing, not a map. */
export const reachLine = (
  extent: readonly [number, number],
  places: readonly { name: string; chainage: number }[],
): Drawing => ({
  alt: `The reach from upstream, left, to downstream, right, with ${places.map((p) => p.name).join(', ')}.`,
  draw(doc, { width, height }) {
    const middle = height * 0.4;
    const curve = reachCurve(0, width, middle, height * 0.22);
    strokePath(doc, curve.path, { colour: COLOUR.waterTint, width: 7 });
    strokePath(doc, curve.path, { colour: COLOUR.water, width: 1.6 });
    const span = extent[1] - extent[0] || 1;
    let free = -Infinity;
    doc.font(FONT.regular).fontSize(8);
    for (const { name, chainage } of places) {
      const x = (width * (chainage - extent[0])) / span;
      doc.circle(x, curve.yAt(x), 3.2).fillAndStroke('#FFFFFF', COLOUR.ink);
      const length = doc.widthOfString(name);
      const at = Math.max(0, Math.min(width - length, x - length / 2));
      if (at < free) continue;
      free = at + length + 8;
      doc.fillColor(COLOUR.ink).text(name, at, height - 14, { lineBreak: false });
    }
  },
});
