import { scaleLinear } from 'd3-scale';
import type { ChartColumns } from './chart-columns.ts';
import type { Box } from './elements.ts';
import { LAYOUT } from './layout.ts';
import type { Scale } from './scale.ts';

/** Where things stand in a picture: the plot, the strip of additions below it, the two scales. */
export interface ChartFrame extends ChartColumns {
  readonly plot: Box;
  readonly strip: Box;
  readonly y: Scale;
}

/**
 * The frame of a picture.
 *
 * @param top where the plot begins, in units of the picture
 */
export function chartFrame(columns: ChartColumns, top: number): ChartFrame {
  const { plot, strip, figure } = LAYOUT;
  const { left, right, most_mg_L, figures } = columns;
  const bottom = top + plot.height;
  const y = scaleLinear([0, most_mg_L], [bottom, top]);
  const end = bottom + (figures.length > 0 ? strip.arrows + figures.length * figure.row : 0);
  return {
    ...columns,
    plot: { left, right, top, bottom },
    strip: { left, right, top: bottom, bottom: end },
    y: (value) => y(value),
  };
}
