import type { Reading } from '../../reader/understood.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { asking } from './asking.ts';

/** Nothing can be said yet: the one question comes first, then how the rest was read. */
export function missing(reading: Reading, turn: Turn): Outcome {
  const { question, buttons, waits } = asking(reading, turn, 'first');
  return {
    answer: null,
    inRound: [
      line('first', 'round-missing', { vessel: vesselText(reading), field: reading.asks[0] ?? 'none' }),
    ],
    lines: [...question, ...factLines(reading, turn.manner), ...assumedLines(reading, turn.manner)],
    buttons,
    ...(waits !== undefined && { waits }),
  };
}
