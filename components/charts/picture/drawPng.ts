import type { Picture } from './pictureSvg';

/** Sharp on paper and on dense screens. */
const DENSITY = 2;

/** The picture as PNG at twice its size; it draws with the fonts that the picture carries. */
export async function drawPng({ svg, width, height }: Picture): Promise<Blob> {
  const image = new Image(width * DENSITY, height * DENSITY);
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svg)}`;
  await image.decode();
  const canvas = document.createElement('canvas');
  canvas.width = Math.round(width * DENSITY);
  canvas.height = Math.round(height * DENSITY);
  const pen = canvas.getContext('2d');
  if (!pen) throw new Error('This browser cannot draw the picture. Take the SVG instead.');
  pen.drawImage(image, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) =>
    canvas.toBlob((blob) => {
      if (blob) resolve(blob);
      else reject(new Error('This browser cannot write PNG. Take the SVG instead.'));
    }, 'image/png'),
  );
}
