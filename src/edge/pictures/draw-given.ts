import type { ChartData } from '../../chat/attachments/chart/chart-data.ts';
import { chartSvg } from '../../chat/attachments/chart/chart-svg.ts';
import type { ChartWords } from '../../chat/attachments/chart/chart-words.ts';
import { renderPng } from './render-png.ts';

/** What the thread that draws is given. */
export type GivenPicture =
  { readonly data: ChartData; readonly words: ChartWords } | { readonly svg: string };

/** The work of that thread. */
export function drawGiven(given: GivenPicture): Uint8Array {
  return renderPng('svg' in given ? given.svg : chartSvg(given.data, given.words));
}
