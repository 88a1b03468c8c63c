import type { EffectAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { perLitre } from '../manner.ts';
import type { Outcome, Turn } from '../outcome.ts';

/** Someone wants to stop a fermentation with SO2: what that amount is, that it does not, whom to ask; no dose. */
export function fermentStop(reading: Reading, answer: EffectAnswer | null, turn: Turn): Outcome {
  const adds = answer?.adds_mg_L === undefined ? 'none' : perLitre(answer.adds_mg_L, turn.manner);
  const first = line('first', 'ferment-stop', { adds });
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      line('effect', 'ferment-stop-more'),
      ...factLines(reading, turn.manner),
      ...assumedLines(reading, turn.manner),
    ],
    buttons: [],
  };
}
