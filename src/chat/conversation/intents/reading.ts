import { landingOf } from '../../../core/cellar/landing-of.ts';
import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factsOf } from '../lines/facts.ts';
import { landedLines } from '../lines/landed.ts';
import { line, listLine } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { volumeDiffersLines } from '../lines/volume-differs.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { whenOf } from '../when.ts';
import { missing } from './missing.ts';

/** Readings to keep: where the last addition landed, and the figures as they were read. */
export function answerReading(reading: Reading, turn: Turn): Outcome {
  if (reading.asks.length > 0) return missing(reading, turn);
  const { here, manner } = turn;
  const when = whenOf(reading, here);
  const values = { vessel: vesselText(reading), when: momentText(when.at, tellingOf(here)) };
  const key = reading.marks.conditional ? 'reading-read' : 'reading-kept';
  const kept = listLine('first', key, factsOf(reading, manner)).map((one) => ({ ...one, values }));
  return {
    answer: null,
    inRound: kept,
    lines: [
      ...landed(reading, when.at, turn),
      ...kept,
      ...volumeDiffersLines(reading, manner),
      ...(when.is === 'noon' ? [line('assumed', 'when-noon')] : []),
      ...assumedLines(reading, manner),
    ],
    buttons: [],
  };
}

function landed({ fields }: Reading, at: number, turn: Turn): Line[] {
  const { here } = turn;
  const vessel = fields.vessel === undefined ? undefined : here.vessels.get(fields.vessel);
  if (vessel === undefined || fields.free_mg_L === undefined) return [];
  const landing = landingOf(vessel, { entry: here.nextEntry, at, free_mg_L: fields.free_mg_L });
  return landing ? landedLines(vessel.vessel, landing, turn) : [];
}
