import { Resvg } from '@resvg/resvg-js';
import { fontFiles } from './font-files.ts';

/** Points of the image for one unit of the picture: screens of phones have two and more. */
export const POINTS_PER_UNIT = 2;

/** A picture as PNG. It takes some 50 ms, so whoever answers people has it done in another thread. */
export function renderPng(svg: string): Uint8Array {
  const image = new Resvg(svg, {
    font: { loadSystemFonts: false, fontFiles: fontFiles(), defaultFontFamily: 'Noto Sans' },
    fitTo: { mode: 'zoom', value: POINTS_PER_UNIT },
  });
  return image.render().asPng();
}
