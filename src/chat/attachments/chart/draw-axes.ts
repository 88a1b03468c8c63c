import { dayText } from '../../replies/moment-text.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { localTimeOf } from '../../../core/time/local-time-of.ts';
import type { ChartFrame } from './chart-frame.ts';
import type { ChartManner } from './chart-manner.ts';
import { element, at as written, lineFrom, textAt } from './elements.ts';
import { LAYOUT } from './layout.ts';
import { INK } from './palette.ts';
import { textWidth } from './text-width.ts';
import { TICK_STEPS, timeTicks } from './time-ticks.ts';

interface TimeLabel {
  readonly x: number; // in units of the picture
  readonly day: string;
  readonly year: string;
}

/** The grid and what stands beside it: mg/L on the left, days below, each as many as have room. */
export function drawAxes(frame: ChartFrame, manner: ChartManner): string {
  const { plot, strip, y, levels } = frame;
  const { axis } = LAYOUT;
  const labels = timeLabels(frame, manner);
  const grid = { stroke: INK.grid, 'stroke-width': '1' };
  const isStrip = strip.bottom > strip.top;
  return [
    ...(isStrip ? [stripGround(frame)] : []),
    ...labels.map(({ x }) => lineFrom({ x, y: plot.top }, { x, y: strip.bottom + 4 }, grid)),
    ...levels.map(({ value_mg_L }) => {
      const level = y(value_mg_L);
      return lineFrom({ x: plot.left, y: level }, { x: plot.right, y: level }, grid);
    }),
    ...[plot.bottom, strip.bottom].map((level) =>
      lineFrom({ x: plot.left, y: level }, { x: plot.right, y: level }, { ...grid, stroke: INK.aside }),
    ),
    ...levels.map(({ value_mg_L, label }) =>
      textAt({ x: plot.left - axis.aside, y: y(value_mg_L) + axis.size * 0.36 }, label, {
        size: axis.size,
        anchor: 'end',
      }),
    ),
    ...labels.flatMap(({ x, day, year }, i) => {
      const look = { size: axis.size, anchor: 'middle' } as const;
      const isNew = year !== labels[i - 1]?.year;
      return [
        textAt({ x, y: strip.bottom + axis.day }, day, look),
        ...(isNew ? [textAt({ x, y: strip.bottom + axis.year }, year, { ...look, colour: INK.aside })] : []),
      ];
    }),
  ].join('');
}

function stripGround({ strip: { left, right, top, bottom } }: ChartFrame): string {
  return element('rect', {
    x: written(left),
    y: written(top),
    width: written(right - left),
    height: written(bottom - top),
    fill: INK.strip,
  });
}

/** The narrowest step whose labels have room. */
function timeLabels({ span, x }: ChartFrame, { telling }: ChartManner): TimeLabel[] {
  const { axis, width, margin } = LAYOUT;
  // The year stands below, so each day is told as one of its own year.
  const labelOf = (at: number): TimeLabel => ({
    x: x(at),
    day: dayText(at, { ...telling, now: at }),
    year: String(localTimeOf(at, telling.zone).year),
  });
  const halfOf = ({ day, year }: TimeLabel): number =>
    Math.max(textWidth(day, axis.size), textWidth(year, axis.size)) / 2;
  const isApart = (label: TimeLabel, before: TimeLabel | undefined): boolean =>
    before === undefined || label.x - halfOf(label) - (before.x + halfOf(before)) >= axis.gap;
  for (const step of TICK_STEPS) {
    if (isTooMany(span.to - span.from, step)) continue;
    const labels = timeTicks(span, step, telling.zone)
      .map(labelOf)
      .filter(
        (label) => label.x + halfOf(label) <= width - margin / 2 && label.x - halfOf(label) >= margin / 2,
      );
    if (labels.every((label, i) => isApart(label, labels[i - 1]))) return labels;
  }
  return [];
}

/** Spares the work for steps that are far too narrow. */
function isTooMany(span_ms: number, step: (typeof TICK_STEPS)[number]): boolean {
  const days = 'days' in step ? step.days : step.months * 28;
  return span_ms / (days * DAY_ms) > LAYOUT.width / LAYOUT.axis.gap;
}
