import { Resvg } from '@resvg/resvg-js';
import { expect, test } from 'vitest';
import { textWidth } from '../../../src/chat/attachments/chart/text-width.ts';
import { fontFiles } from '../../../src/edge/pictures/font-files.ts';

const SIZE = 100;

/** How wide what draws makes a text, between two bars that it is told beside. */
function drawnWidth(text: string): number {
  const widthOf = (what: string): number => {
    const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="9000" height="200"><text xml:space="preserve" x="0" y="150" font-size="${SIZE}" font-family="Noto Sans">${what}</text></svg>`;
    const font = { loadSystemFonts: false, fontFiles: fontFiles(), defaultFontFamily: 'Noto Sans' };
    return new Resvg(svg, { font }).getBBox()?.width ?? 0;
  };
  return widthOf(`|${text}|`) - widthOf('||');
}

test.each([
  'Free 40.5 (8 Dec)',
  'Bound: the gap between',
  '0123456789',
  '10\u202f000',
  '+22.5',
  'Größe, Fût n° 7, Año, Água, perché',
  'OLD WEST CELLAR — TANK “17B”…',
  '1 Sept',
])('a label is as wide as it is reckoned: %s', (text) => {
  const [reckoned, drawn] = [textWidth(text, SIZE), drawnWidth(text)];
  expect(reckoned / drawn).toBeGreaterThan(0.99);
  expect(reckoned / drawn).toBeLessThan(1.05);
});

test.each(['Ξύλινο', 'Щёлковский', '酒罐', '🍷'])(
  'letters that are not in the list have more room than they need: %s',
  (text) => {
    expect(textWidth(text, SIZE)).toBeGreaterThan(drawnWidth(text));
  },
);
