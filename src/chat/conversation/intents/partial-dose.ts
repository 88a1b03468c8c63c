import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { DoseRequest } from '../../../core/dose/request.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { missingInRound } from '../lines/missing-in-round.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { basisLines } from '../lines/basis.ts';
import { bottlingLines } from '../lines/bottling.ts';
import { bottledLines } from '../lines/bottled.ts';
import { cappedFirst, isCapped, keptLine, limitValues, type Capped } from '../lines/capped.ts';
import { givenAnswer } from '../lines/given-answer.ts';
import { line } from '../lines/line.ts';
import type { Manner } from '../manner.ts';
import { knownSoFar } from '../lines/known-so-far.ts';
import { underLines, warningLines } from '../lines/warnings.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { asking } from './asking.ts';

/** What can be said of an incomplete reading, and the one question for what is missing. */
export function partialDose(reading: Reading, request: DoseRequest, full: DoseAnswer, turn: Turn): Outcome {
  const { manner } = turn;
  const answer = givenAnswer(full);
  const atLimit = isCapped(full) && full.capped.dose_mg_L === 0 ? full : undefined;
  const known = atLimit
    ? [line('first', 'dose-at-limit', limitValues(reading, atLimit, manner))]
    : knownSoFar(reading, request, answer, manner);
  const kept = isCapped(full) && known.length > 0 ? cappedPartly(known, reading, full, manner) : known;
  const says = known.length > 0;
  const under = underLines(answer.warnings, manner);
  const condition: Line[] =
    says && reading.assumed.stage !== undefined ? [line('condition', 'condition-stage')] : [];
  const { question, buttons, waits } = asking(reading, turn, says ? 'question' : 'first');
  return {
    answer: says ? full : null,
    inRound: [missingInRound(reading, manner)],
    lines: [
      ...(says ? [...bottledLines(reading), ...kept.slice(0, 1), ...under, ...kept.slice(1)] : question),
      ...condition,
      ...(says && answer.bottling ? bottlingLines(reading, answer, turn) : []),
      ...(says ? question : []),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...(says ? basisLines(reading, answer, manner) : []),
      ...warningLines(answer.warnings, manner, 'warning', ['no-dose-at-this-stage']),
    ],
    buttons,
    ...(waits !== undefined && { waits }),
  };
}

/** The rate of a smaller dose with the rule that it keeps, and how much is kept below the limit. */
function cappedPartly(
  [first, ...more]: readonly Line[],
  reading: Reading,
  answer: Capped,
  manner: Manner,
): Line[] {
  const isRate = first !== undefined && first.key.startsWith('dose-rate');
  if (first === undefined || (!isRate && first.key !== 'dose-at-limit')) return first ? [first, ...more] : [];
  const head = isRate ? cappedFirst(first, reading, answer, manner) : first;
  return [head, keptLine(reading, answer, manner), ...more];
}
