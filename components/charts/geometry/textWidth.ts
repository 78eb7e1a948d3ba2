/** Width that a text takes in the type of the charts, px: a little more than it needs, so that nothing is cut. */
export function textWidth(text: string, size: number): number {
  let ems = 0;
  for (const sign of text) ems += NARROW.has(sign) ? 0.28 : WIDE.has(sign) ? 0.8 : 0.53;
  return ems * size;
}

const NARROW = new Set(" .,:;'il|jtfrI()");
const WIDE = new Set('mwMW');
