import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { ChartData } from './chart-data.ts';
import type { ChartManner } from './chart-manner.ts';
import { boundOf, isOdd, lastKnown } from './last-known.ts';

/** What a picture tells in words: its corner, and beside each sign what it stands for. */
export const CHART_WORDS = [
  'unit',
  'free',
  'total',
  'bound',
  'odd',
  'needed',
  'limit',
  'added',
  'added-thinned',
  'added-unknown',
  'blended',
] as const;
/** The name of one of them. */
export type ChartWord = (typeof CHART_WORDS)[number];

/** A picture's words as they are said; a sign that the picture does not show has none. */
export interface ChartWords {
  /** The name of the vessel as people write it. */
  readonly vessel: string;
  readonly words: Readonly<Partial<Record<ChartWord, string>>>;
  readonly manner: ChartManner;
}

/** The lines that say the words of a picture, each with its last figure. */
export function chartWordLines(
  data: ChartData,
  manner: ChartManner,
): Readonly<Partial<Record<ChartWord, Line>>> {
  const { mark, telling, unit } = manner;
  const { readings, additions, limit_mg_L } = data;
  const said = (value: number): string => numberText(value, 2, mark);
  const [free, total] = [lastKnown(data, 'free_mg_L'), lastKnown(data, 'total_mg_L')];
  const needed = data.needed.at(-1);
  const has = (is: (one: (typeof additions)[number]) => boolean): boolean => additions.some(is);
  return {
    unit: wordLine('unit', { unit }),
    ...(free && { free: wordLine('free', { free: said(free.value_mg_L), day: dayText(free.at, telling) }) }),
    ...(total && {
      total: wordLine('total', { total: said(total.value_mg_L), day: dayText(total.at, telling) }),
    }),
    ...(readings.some((one) => boundOf(one) !== undefined) && { bound: wordLine('bound') }),
    ...(readings.some(isOdd) && { odd: wordLine('odd') }),
    ...(data.needed.some((step) => 'ph' in step) && {
      needed: wordLine(
        'needed',
        needed === undefined || 'nothing' in needed
          ? { ph: needed?.nothing ?? 'no-ph', needed: '' }
          : { ph: said(needed.ph), needed: concentrationText(needed.needed_mg_L, mark) },
      ),
    }),
    ...(limit_mg_L !== undefined && { limit: wordLine('limit', { limit: said(limit_mg_L) }) }),
    ...(has(({ added_mg_L }) => added_mg_L !== undefined) && {
      added: wordLine('added'),
      'added-thinned': wordLine('added-thinned'),
    }),
    ...(has(({ added_mg_L }) => added_mg_L === undefined) && { 'added-unknown': wordLine('added-unknown') }),
    ...(data.blended.length > 0 && { blended: wordLine('blended') }),
  };
}

/** The words of a picture, said. */
export function chartWords(data: ChartData, manner: ChartManner, say: (line: Line) => string): ChartWords {
  const lines = Object.entries(chartWordLines(data, manner));
  const words = Object.fromEntries(lines.map(([word, line]) => [word, say(line)]));
  return { vessel: vesselName(data.vessel), words, manner };
}

function wordLine(word: ChartWord, values: Line['values'] = {}): Line {
  return { room: 'first', key: `picture-${word}`, values };
}
