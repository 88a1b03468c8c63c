import { scaleLinear } from 'd3-scale';
import { DAY_ms } from '../../../core/time/durations.ts';
import type { TimeRange } from '../../../core/time/local-time.ts';
import { numberText } from '../../replies/number-text.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import { additionFigures } from './addition-figures.ts';
import type { AdditionFigure } from './addition-figures.ts';
import type { ChartData } from './chart-data.ts';
import { LAYOUT } from './layout.ts';
import type { Scale } from './scale.ts';
import { textWidth } from './text-width.ts';

/** A mark of the upright axis. */
export interface LevelTick {
  readonly value_mg_L: number;
  readonly label: string;
}

/** What stands where from left to right, however far down it will be. */
export interface ChartColumns {
  readonly left: number; // of the plot, in units of the picture
  readonly right: number; // in units of the picture
  readonly span: TimeRange;
  readonly x: Scale;
  /** The highest figure of the upright axis. */
  readonly most_mg_L: number;
  readonly levels: readonly LevelTick[];
  /** Row by row, the lowest first. */
  readonly figures: readonly (readonly AdditionFigure[])[];
}

/** The axis goes a little beyond the highest figure, so that its sign has room. */
const HEADROOM = 1.07;
/** What the axis shows of a wine whose figures are all 0. */
const EMPTY_mg_L = 10;
/** So many levels are marked, more or less. */
const LEVELS = 5;
/** So much time is shown at least, so that one reading has days around it. */
const LEAST_SPAN_ms = 3 * DAY_ms;

/** The columns of a picture: as broad as its largest figures need, as long as its data. Limits count as data do. */
export function chartColumns(data: ChartData, mark: DecimalMark): ChartColumns {
  const { width, margin, plot, axis } = LAYOUT;
  const most_mg_L = Math.max(...levelsOf(data)) * HEADROOM || EMPTY_mg_L;
  const levels = scaleLinear([0, most_mg_L], [0, 1])
    .ticks(LEVELS)
    .map((value) => ({ value_mg_L: value, label: numberText(value, 3, mark) }));
  const left = margin + Math.max(...levels.map(({ label }) => textWidth(label, axis.size))) + axis.aside;
  const right = width - margin - 2;
  const span = spanOf(data);
  const scale = scaleLinear([span.from, span.to], [left + plot.inner, right - plot.inner]);
  const x: Scale = (at) => scale(at);
  return { left, right, span, x, most_mg_L, levels, figures: additionFigures(data, { x, left, mark }) };
}

function levelsOf({ readings, needed, limit_mg_L }: ChartData): number[] {
  return [
    ...readings.flatMap(({ free_mg_L = 0, total_mg_L = 0 }) => [free_mg_L, total_mg_L]),
    ...needed.flatMap((step) => ('ph' in step ? [step.needed_mg_L] : [])),
    ...(limit_mg_L === undefined ? [] : [limit_mg_L]),
  ];
}

function spanOf({ readings, additions, needed, blended }: ChartData): TimeRange {
  const moments = [
    ...readings.map(({ at }) => at),
    ...additions.map(({ at }) => at),
    ...needed.flatMap((step) => ('ph' in step ? [step.at] : [])),
    ...blended,
  ];
  const [from, to] = [Math.min(...moments), Math.max(...moments)];
  const lacking = Math.max(0, LEAST_SPAN_ms - (to - from)) / 2;
  return { from: from - lacking, to: to + lacking };
}
