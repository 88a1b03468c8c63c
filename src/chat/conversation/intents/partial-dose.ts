import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { DoseRequest } from '../../../core/dose/request.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { missingInRound } from '../lines/missing-in-round.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { basisLines } from '../lines/basis.ts';
import { bottledLines } from '../lines/bottled.ts';
import { line } from '../lines/line.ts';
import { knownSoFar } from '../lines/known-so-far.ts';
import { underLines, warningLines } from '../lines/warnings.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { asking } from './asking.ts';

/** What can be said of an incomplete reading, and the one question for what is missing. */
export function partialDose(reading: Reading, request: DoseRequest, answer: DoseAnswer, turn: Turn): Outcome {
  const { manner } = turn;
  const known = knownSoFar(reading, request, answer, manner);
  const says = known.length > 0;
  const under = underLines(answer.warnings, manner);
  const condition: Line[] =
    says && reading.assumed.stage !== undefined ? [line('condition', 'condition-stage')] : [];
  const { question, buttons, waits } = asking(reading, turn, says ? 'question' : 'first');
  return {
    answer: says ? answer : null,
    inRound: [missingInRound(reading, manner)],
    lines: [
      ...(says ? [...bottledLines(reading), ...known.slice(0, 1), ...under, ...known.slice(1)] : question),
      ...condition,
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
