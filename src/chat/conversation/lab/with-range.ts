import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { line } from '../lines/line.ts';
import { rangeLines } from '../lines/range.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { rangeOf } from './range-of.ts';

/** The answer to a dose with its range, where that was asked for, or where its high end passes a limit that it keeps. */
export function withRange(reading: Reading, outcome: Outcome, { settings, manner }: Turn): Outcome {
  const answer = outcome.answer as DoseAnswer | null;
  if (answer?.dose_mg_L === undefined || answer.capped) return outcome;
  if (reading.marks.wantsRange !== true && !isNearLimit(answer)) return outcome;
  const found = rangeOf(reading, settings);
  if (
    found === undefined ||
    (reading.marks.wantsRange !== true && !passesLimit(answer, found.range.plus_minus_mg_L))
  )
    return outcome;
  if (found.data.dose_mg_L[1] === 0) return outcome;
  const all = rangeLines(reading, found.data, manner, 'effect');
  // Unasked it says only what it is about: `range` tells the rest.
  const lines = reading.marks.wantsRange === true ? all : [...all.slice(0, 1), line('effect', 'range-limit')];
  const at = outcome.lines.findIndex(({ room }) => room !== 'first' && room !== 'condition');
  const place = at < 0 ? outcome.lines.length : at;
  return {
    ...outcome,
    answer: { ...answer, range: found.data },
    lines: [...outcome.lines.slice(0, place), ...lines, ...outcome.lines.slice(place)],
  };
}

/** Only so near a limit, in mg/L, it is looked whether the dose may be off by enough to pass it (own threshold). */
const NEAR_mg_L = 30;

const isNearLimit = ({ limit, total_after_mg_L }: DoseAnswer): boolean =>
  limit !== undefined && total_after_mg_L !== undefined && limit.limit_mg_L - total_after_mg_L < NEAR_mg_L;

function passesLimit({ limit, total_after_mg_L }: DoseAnswer, plus_minus_mg_L: number): boolean {
  if (limit === undefined || total_after_mg_L === undefined) return false;
  return total_after_mg_L <= limit.limit_mg_L && total_after_mg_L + plus_minus_mg_L > limit.limit_mg_L;
}
