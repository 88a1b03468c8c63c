import type { Reading } from '../../reader/understood.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factsOf } from '../lines/facts.ts';
import { line, listLine } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { missing } from './missing.ts';

/** Readings to keep: said again as they were read, and that nothing is kept yet. */
export function answerReading(reading: Reading, turn: Turn): Outcome {
  if (reading.asks.length > 0) return missing(reading, turn);
  const first = listLine('first', 'reading-read', factsOf(reading, turn.manner)).map((one) => ({
    ...one,
    values: { vessel: vesselText(reading) },
  }));
  return {
    answer: null,
    inRound: first,
    lines: [...first, line('condition', 'not-kept-reading'), ...assumedLines(reading, turn.manner)],
    buttons: [],
  };
}
