import type { DoseAnswer } from '../../../core/dose/answer.ts';
import { afterMust } from '../../../core/dose/after-must.ts';
import {
  MUST_RANGES,
  mustRangesFor,
  type FruitState,
  type MustRange,
} from '../../../core/dose/must-ranges.ts';
import { SOURCES } from '../../../core/sources.ts';
import type { Reading } from '../../reader/understood.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { line, part } from './line.ts';

function rangePart(
  { state, style, low_mg_L, high_mg_L }: MustRange,
  { mark, unit }: Manner,
): Omit<Line, 'room'> {
  const [low, high] = [concentrationText(low_mg_L, mark), concentrationText(high_mg_L, mark)];
  return part('must-range', {
    state,
    style: style ?? 'any',
    range: low === high ? low : `${low}–${high}`,
    unit,
  });
}

/**
 * What was published for must of grapes in that state, a line a source; of every state where none is told. Of other
 * fruit and honey none is on file.
 */
export function mustRangeLines({ fields, marks }: Reading, manner: Manner): Line[] {
  const { fruitState: state } = marks;
  if (fields.product !== undefined)
    return [line('effect', 'must-none-published', { product: fields.product })];
  const ranges =
    state === undefined
      ? MUST_RANGES.filter(({ style }) => [undefined, fields.style ?? style].includes(style))
      : inState(state, fields.style);
  const sources = [...new Set(ranges.map(({ source }) => source))];
  return sources.map((source) => ({
    ...line('effect', 'must-published', {
      source: SOURCES[source].title,
      read: SOURCES[source].read ? 'read' : 'memory',
    }),
    list: ranges.filter((one) => one.source === source).map((one) => rangePart(one, manner)),
  }));
}

/** Of fruit in that state; where none was published for its colour, that of another, which the line names. */
function inState(state: FruitState, style: string | undefined): readonly MustRange[] {
  const own = mustRangesFor(state, style);
  return own.length > 0 ? own : mustRangesFor(state);
}

/** What an addition to must does not do, what comes back of it, and when the yeast goes in. */
export function afterMustLines(answer: Pick<DoseAnswer, 'after_must'>, { mark, unit }: Manner): Line[] {
  const { before_yeast_h, malolactic_unharmed_mg_L, total_back_mg_L } = answer.after_must ?? afterMust(0);
  const [least, most] = before_yeast_h;
  return [
    line('effect', 'effect-must'),
    ...(answer.after_must === undefined
      ? []
      : [line('effect', 'must-comes-back', { total: concentrationText(total_back_mg_L, mark), unit })]),
    line('effect', 'must-yeast', { least: String(least), most: String(most) }),
    line('effect', 'must-malolactic', { most: concentrationText(malolactic_unharmed_mg_L, mark), unit }),
  ];
}
