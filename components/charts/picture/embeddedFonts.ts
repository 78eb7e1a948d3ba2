import { fonts } from '@/components/theme/tokens';
import type { Picture } from './pictureSvg';

/** A picture sees no font of the page and is opened where there is none: it carries the two weights of the drawings. */
export async function withFonts(picture: Picture): Promise<Picture> {
  const rules = await embeddedFonts();
  const svg = picture.svg.replace('<desc', () => `<style>${rules}</style><desc`);
  return { ...picture, svg };
}

async function embeddedFonts(): Promise<string> {
  const wanted: [string, number][] = [
    [fonts.regular, 400],
    [fonts.semibold, 600],
  ];
  const rules = await Promise.all(
    wanted.map(async ([family, weight]) => {
      const address = addressOf(family);
      if (!address) return '';
      const url = await asDataUrl(await (await fetch(address)).blob());
      return `@font-face{font-family:"Source Sans 3";font-weight:${weight};src:url(${url})}`;
    }),
  );
  return rules.join('');
}

/** Where the page has a font from; null where it has none of the name. */
function addressOf(family: string): string | null {
  for (const sheet of document.styleSheets)
    for (const rule of sheet.cssRules) {
      if (!rule.cssText.startsWith('@font-face')) continue;
      const { style } = rule as CSSFontFaceRule;
      if (!style.getPropertyValue('font-family').includes(family)) continue;
      const found = style.getPropertyValue('src').match(/url\(["']?([^"')]+)/);
      if (found) return new URL(found[1], sheet.href ?? document.baseURI).href;
    }
  return null;
}

const asDataUrl = (blob: Blob): Promise<string> =>
  new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as string);
    reader.onerror = () => reject(reader.error ?? new Error('The font could not be read.'));
    reader.readAsDataURL(blob);
  });
