import { chartColumns } from './chart-columns.ts';
import type { ChartColumns } from './chart-columns.ts';
import type { ChartData } from './chart-data.ts';
import { chartFrame } from './chart-frame.ts';
import type { ChartWord, ChartWords } from './chart-words.ts';
import { drawAdditions } from './draw-additions.ts';
import { drawAxes } from './draw-axes.ts';
import { drawLegend } from './draw-legend.ts';
import { drawLines } from './draw-lines.ts';
import { drawReadings } from './draw-readings.ts';
import { at, element, textAt } from './elements.ts';
import { LAYOUT } from './layout.ts';
import { INK } from './palette.ts';
import { fitText, textWidth } from './text-width.ts';

/**
 * The picture of a vessel as SVG, made for a phone: free SO2 as dots over time, what is bound as the gap up to the
 * total, each addition as an arrow, what free SO2 is needed as a line in steps, the limit of total as a line. The same
 * data and words always make the same text.
 */
export function chartSvg(data: ChartData, words: ChartWords): string {
  const { width, plot, axis } = LAYOUT;
  const columns = chartColumns(data, words.manner.mark);
  const legend = drawLegend(words, hiddenWord(data, columns));
  const frame = chartFrame(columns, legend.bottom + plot.above);
  const readings = drawReadings(data, frame);
  const height = Math.ceil(frame.strip.bottom + axis.year + axis.below);
  const drawing = [
    element('rect', { width: at(width), height: at(height), fill: INK.paper }),
    titleOf(words),
    legend.drawing,
    drawAxes(frame, words.manner),
    readings.gaps,
    drawLines(data, frame),
    drawAdditions(data, frame),
    readings.dots,
  ].join('');
  const size = `width="${width}" height="${height}" viewBox="0 0 ${width} ${height}"`;
  return `<svg xmlns="http://www.w3.org/2000/svg" ${size} font-family="Noto Sans">${drawing}</svg>`;
}

/** Of the two words for additions the one that is not true: every one of them has a figure, or not. */
function hiddenWord({ additions }: ChartData, { figures }: ChartColumns): ChartWord {
  return figures.flat().length < additions.length ? 'added' : 'added-thinned';
}

/** The name of the vessel, and on the right what is measured. */
function titleOf({ vessel, words: { unit = '' } }: ChartWords): string {
  const { width, margin, title, legend } = LAYOUT;
  const room = width - 2 * margin - textWidth(unit, legend.size) - legend.gap;
  const look = { size: legend.size, anchor: 'end', colour: INK.aside } as const;
  return (
    textAt({ x: margin, y: title.baseline }, fitText(vessel, { size: title.size, room }), title) +
    textAt({ x: width - margin, y: title.baseline }, unit, look)
  );
}
