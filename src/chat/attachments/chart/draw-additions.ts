import type { ChartData } from './chart-data.ts';
import type { ChartFrame } from './chart-frame.ts';
import { lineFrom, textAt } from './elements.ts';
import { LAYOUT } from './layout.ts';
import { PALETTE } from './palette.ts';
import { additionSign, ARROW } from './signs.ts';

/** So many additions have a thin line up through the plot and a broad head; more of them would hide the data. */
const CROWD = 25;

/** The additions below the plot: an arrow upward each, and on it the figure, where there is room for it. */
export function drawAdditions({ additions }: ChartData, { plot, strip, x, figures }: ChartFrame): string {
  const { size } = LAYOUT.figure;
  const foot = strip.bottom - LAYOUT.strip.foot;
  const isCrowd = additions.length > CROWD;
  const guide = { stroke: PALETTE.purple, 'stroke-width': '1', 'stroke-dasharray': '1 3' };
  const guides = additions.map(({ at }) =>
    lineFrom({ x: x(at), y: plot.top }, { x: x(at), y: plot.bottom }, guide),
  );
  return [
    ...(isCrowd ? [] : guides),
    ...additions.map(({ at, added_mg_L }) =>
      additionSign({ x: x(at), y: foot }, { isKnown: added_mg_L !== undefined, isNarrow: isCrowd }),
    ),
    ...figures.flatMap((row, i) =>
      row.map(({ text, middle }) =>
        textAt({ x: middle, y: foot - ARROW - 4 - i * LAYOUT.figure.row }, text, { size, anchor: 'middle' }),
      ),
    ),
  ].join('');
}
