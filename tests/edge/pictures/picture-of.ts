import { Resvg } from '@resvg/resvg-js';
import { chartOf } from '../../../src/chat/attachments/chart/chart-of.ts';
import type { ChartData } from '../../../src/chat/attachments/chart/chart-data.ts';
import type { ChartManner } from '../../../src/chat/attachments/chart/chart-manner.ts';
import { chartSvg } from '../../../src/chat/attachments/chart/chart-svg.ts';
import { chartWords } from '../../../src/chat/attachments/chart/chart-words.ts';
import type { Language } from '../../../src/chat/reader/understood.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { fontFiles } from '../../../src/edge/pictures/font-files.ts';
import { MANNER, OPTIONS } from '../../chat/attachments/chart/chart-cases.ts';
import type { ChartCase } from '../../chat/attachments/chart/chart-cases.ts';

/** The sentences as the program says them. */
export const say = makeSay(loadLocales());

/** The data of a case, and how they are told. */
export function givenOf({ entries, options, manner }: ChartCase): { data: ChartData; manner: ChartManner } {
  const data = chartOf(entries, { ...OPTIONS, ...options });
  if (data === undefined) throw new TypeError('The case has nothing to draw');
  return { data, manner: { ...MANNER, ...manner } };
}

/** The picture of a case as SVG, with the words of the program in its language or another. */
export function svgOf(one: ChartCase, said?: Language): string {
  const { data, manner: own } = givenOf(one);
  const language = said ?? own.telling.language;
  const manner = { ...own, telling: { ...own.telling, language } };
  return chartSvg(
    data,
    chartWords(data, manner, (line) => say({ language, lines: [line], buttons: [] }).text),
  );
}

/** The points of an image, by place: red, green, blue from 0 to 255. */
export interface Points {
  readonly width: number;
  readonly height: number;
  readonly colourAt: (x: number, y: number) => readonly [number, number, number];
}

/** The points of a PNG, as another picture that shows it has them. */
export function pointsOf(png: Uint8Array): Points {
  const view = Buffer.from(png);
  const [width, height] = [view.readUInt32BE(16), view.readUInt32BE(20)];
  const image = `<image width="${width}" height="${height}" href="data:image/png;base64,${view.toString('base64')}"/>`;
  const { pixels } = new Resvg(
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}">${image}</svg>`,
    { font: { loadSystemFonts: false } },
  ).render();
  return {
    width,
    height,
    colourAt(x, y) {
      const start = (y * width + x) * 4;
      return [pixels[start] ?? 0, pixels[start + 1] ?? 0, pixels[start + 2] ?? 0];
    },
  };
}

/** A text of a picture with the rectangle that its letters really cover, in units of the picture. */
export interface DrawnText {
  readonly text: string;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Every text of a picture, measured by what draws it. */
export function textsOf(svg: string): DrawnText[] {
  const head = /^<svg[^>]*>/.exec(svg)?.[0] ?? '';
  return [...svg.matchAll(/<text[^>]*>([^<]*)<\/text>/g)].map(([element, text = '']) => {
    const box = new Resvg(`${head}${element}</svg>`, {
      font: { loadSystemFonts: false, fontFiles: fontFiles(), defaultFontFamily: 'Noto Sans' },
    }).getBBox();
    if (box === undefined) throw new TypeError(`Nothing is drawn of "${text}"`);
    return { text, left: box.x, right: box.x + box.width, top: box.y, bottom: box.y + box.height };
  });
}
