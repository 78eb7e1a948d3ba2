import { COLOURS, fonts, type Colours } from '@/components/theme/tokens';
import { textWidth } from '../geometry/textWidth';
import type { PictureSource } from './pictureContext';
import { placeLegend, type LegendEntry } from './placeLegend';

export interface Picture {
  svg: string;
  /** px at single density. */
  width: number;
  height: number;
}

interface Parts {
  title: string;
  /** Symbol of the unit of the values; left out where the drawing itself tells it. */
  unit?: string;
  /** The drawing in a sentence. */
  label: string;
  source: PictureSource;
  /** How each curve is drawn and what it is, as they stand below the drawing. */
  legend?: readonly LegendEntry[];
}

const SVG = 'http://www.w3.org/2000/svg';
const FAMILY = '"Source Sans 3", "Helvetica Neue", Arial, sans-serif';
const PAD = 16;
const TITLE = { size: 15, line: 21 };
const KEY = { size: 12.5, line: 20 };
const FOOT = { size: 11.5, line: 16 };

/** A drawing of the page as a document of its own: title and unit above it, where it comes from in the foot, light. */
export function pictureSvg(
  drawing: SVGSVGElement,
  { title, unit, label, source, legend = [] }: Parts,
): Picture {
  const inner = { width: sizeOf(drawing, 'width'), height: sizeOf(drawing, 'height') };
  const width = inner.width + 2 * PAD;
  const head = wrapped(unit ? `${title}, ${unit}` : title, inner.width, TITLE.size);
  const foot = source.foot.flatMap((text) => wrapped(text, inner.width, FOOT.size));
  const keys = placeLegend(legend, inner.width, KEY.size);
  const top = PAD + head.length * TITLE.line + 4;
  const keysTop = top + inner.height + 8;
  const footTop = keysTop + (keys.lines > 0 ? keys.lines * KEY.line + 6 : 0);
  const height = footTop + foot.length * FOOT.line + PAD;
  const { light } = COLOURS;

  const svg = element('svg', { width, height, viewBox: `0 0 ${width} ${height}`, role: 'img' });
  svg.append(text('title', {}, title), text('desc', {}, label));
  svg.append(element('rect', { width, height, fill: light.card }));
  head.forEach((line, k) =>
    svg.append(writing(line, PAD, PAD + 15 + k * TITLE.line, TITLE.size, 'strong')),
  );
  svg.append(placed(drawing, PAD, top, inner));
  for (const { swatch, words, x, line, width: wide } of keys.entries) {
    const y = keysTop + line * KEY.line;
    const size = { width: sizeOf(swatch, 'width'), height: sizeOf(swatch, 'height') };
    svg.append(placed(swatch, PAD + x, y + (KEY.line - size.height) / 2 - 1, size));
    svg.append(writing(words, PAD + x + wide, y + 14, KEY.size, 'ink'));
  }
  foot.forEach((line, k) =>
    svg.append(writing(line, PAD, footTop + 12 + k * FOOT.line, FOOT.size, 'soft')),
  );
  return { svg: inLight(new XMLSerializer().serializeToString(svg)), width, height };
}

/** A copy of the drawing with the fonts by their public names. */
function placed(
  drawing: SVGSVGElement,
  left: number,
  top: number,
  { width, height }: Size,
): Element {
  const copy = drawing.cloneNode(true) as SVGSVGElement;
  copy.removeAttribute('style');
  copy.removeAttribute('class');
  for (const [name, value] of Object.entries({ x: left, y: top, width, height }))
    copy.setAttribute(name, String(value));
  for (const node of copy.querySelectorAll<SVGTextElement>('text')) {
    const named = node.style.fontFamily || node.getAttribute('font-family') || '';
    node.removeAttribute('font-family');
    node.style.fontFamily = FAMILY;
    if (named.includes(fonts.semibold)) node.style.fontWeight = '600';
  }
  return copy;
}

interface Size {
  width: number;
  height: number;
}

function writing(
  content: string,
  x: number,
  y: number,
  size: number,
  look: 'strong' | 'ink' | 'soft',
): Element {
  const node = text('text', { x, y, 'font-size': size }, content);
  node.setAttribute('fill', look === 'soft' ? COLOURS.light.soft : COLOURS.light.ink);
  node.setAttribute(
    'style',
    `font-family: ${FAMILY}; font-weight: ${look === 'strong' ? 600 : 400}`,
  );
  return node;
}

function element(name: string, attributes: Record<string, string | number>): Element {
  const node = document.createElementNS(SVG, name);
  for (const [key, value] of Object.entries(attributes)) node.setAttribute(key, String(value));
  return node;
}

function text(name: string, attributes: Record<string, string | number>, content: string): Element {
  const node = element(name, attributes);
  node.textContent = content;
  return node;
}

const sizeOf = (drawing: Element, side: 'width' | 'height'): number =>
  Number.parseFloat(drawing.getAttribute(side) ?? '') || 0;

/** Lines no wider than they may be. */
function wrapped(content: string, width: number, size: number): string[] {
  const lines = [''];
  for (const word of content.split(' ')) {
    const last = lines.length - 1;
    const longer = lines[last] ? `${lines[last]} ${word}` : word;
    if (lines[last] && textWidth(longer, size) > width) lines.push(word);
    else lines[last] = longer;
  }
  return lines;
}

const TO_LIGHT = new Map(
  (Object.keys(COLOURS.dark) as (keyof Colours)[]).map((key) => [
    COLOURS.dark[key].toLowerCase(),
    COLOURS.light[key],
  ]),
);

/** Paper is light: what was drawn in the dark theme is told in the colours of the light one. */
const inLight = (svg: string): string =>
  svg.replace(/#[0-9a-f]{6}\b/gi, (colour) => TO_LIGHT.get(colour.toLowerCase()) ?? colour);
