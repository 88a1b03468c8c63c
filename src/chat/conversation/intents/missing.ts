import type { Reading } from '../../reader/understood.ts';
import { missingInRound } from '../lines/missing-in-round.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { asking } from './asking.ts';

/** Nothing can be said yet: the one question comes first, then how the rest was read. */
export function missing(reading: Reading, turn: Turn): Outcome {
  const { question, buttons, waits } = asking(reading, turn, 'first');
  return {
    answer: null,
    inRound: [missingInRound(reading, turn.manner)],
    lines: [...question, ...factLines(reading, turn.manner), ...assumedLines(reading, turn.manner)],
    buttons,
    ...(waits !== undefined && { waits }),
  };
}
