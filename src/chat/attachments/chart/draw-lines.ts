import { curveStepAfter, line } from 'd3-shape';
import type { ChartData, NeededStep } from './chart-data.ts';
import type { ChartFrame } from './chart-frame.ts';
import { element, lineFrom } from './elements.ts';
import { BLENDED_LOOK, LIMIT_LOOK, NEEDED_LOOK } from './signs.ts';

/** The lines that data are held against: what free SO2 is needed, in steps, the limit of total, and blends. */
export function drawLines({ needed, blended, limit_mg_L }: ChartData, frame: ChartFrame): string {
  const { plot, x, y } = frame;
  const isAsked = needed.some((step) => 'ph' in step);
  return [
    ...blended.map((at) => lineFrom({ x: x(at), y: plot.top }, { x: x(at), y: plot.bottom }, BLENDED_LOOK)),
    ...(limit_mg_L === undefined
      ? []
      : [lineFrom({ x: plot.left, y: y(limit_mg_L) }, { x: plot.right, y: y(limit_mg_L) }, LIMIT_LOOK)]),
    ...(isAsked ? [element('path', { d: stepPath(needed, frame), ...NEEDED_LOOK })] : []),
  ].join('');
}

interface StepPoint {
  readonly x: number; // in units of the picture
  readonly y: number | undefined; // in units of the picture
}

/** Each step lasts until the next one, the last to the edge; where nothing is asked there is no line. */
function stepPath(needed: readonly NeededStep[], { plot, x, y }: ChartFrame): string {
  const points = needed.flatMap((step, i): StepPoint[] => {
    const next = needed[i + 1];
    const level = 'ph' in step ? y(step.needed_mg_L) : undefined;
    const end = next === undefined ? plot.right : x(next.at);
    return [
      { x: Math.max(plot.left, x(step.at)), y: level },
      { x: Math.max(plot.left, end), y: level },
    ];
  });
  const path = line<StepPoint>(
    (point) => point.x,
    (point) => point.y ?? 0,
  )
    .defined((point) => point.y !== undefined)
    .curve(curveStepAfter)
    .digits(2);
  return path(points) ?? '';
}
