import type { DecimalMark } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { ChartData } from './chart-data.ts';
import { labelRows } from './label-rows.ts';
import type { RowLabel } from './label-rows.ts';
import { LAYOUT } from './layout.ts';
import type { Scale } from './scale.ts';
import { textWidth } from './text-width.ts';

/** The figure on an addition. */
export interface AdditionFigure extends RowLabel {
  readonly text: string;
}

/** Where times stand in the picture, where the plot begins, and how numbers are written. */
export interface FigureRoom {
  readonly x: Scale;
  readonly left: number; // in units of the picture
  readonly mark: DecimalMark;
}

/**
 * The figures on the additions, in the rows in which they have room: the lower one first. Where many additions are
 * close together some have none.
 */
export function additionFigures(
  { additions }: Pick<ChartData, 'additions'>,
  { x, left, mark }: FigureRoom,
): readonly (readonly AdditionFigure[])[] {
  const { size, gap, rows } = LAYOUT.figure;
  const figures = additions.map(({ at, added_mg_L }) => {
    const text = added_mg_L === undefined ? '?' : `+${concentrationText(added_mg_L, mark)}`;
    const width = textWidth(text, size);
    // One at the edge is drawn in, so that nothing of it is cut off.
    const middle = Math.min(Math.max(x(at), left + width / 2), LAYOUT.width - LAYOUT.margin / 2 - width / 2);
    return { text, width, middle };
  });
  return labelRows(figures, { count: rows, gap });
}
