import type { ChartData } from '../../chat/attachments/chart/chart-data.ts';
import { chartSvg } from '../../chat/attachments/chart/chart-svg.ts';
import type { ChartWords } from '../../chat/attachments/chart/chart-words.ts';
import { renderPng } from './render-png.ts';

/** What the thread that draws is given. */
export interface GivenPicture {
  readonly data: ChartData;
  readonly words: ChartWords;
}

/** The work of that thread. */
export function drawGiven({ data, words }: GivenPicture): Uint8Array {
  return renderPng(chartSvg(data, words));
}
