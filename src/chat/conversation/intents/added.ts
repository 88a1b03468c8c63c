import { added } from '../../../core/dose/added.ts';
import type { AddedAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { buttonsFor } from '../buttons.ts';
import { statedAmount } from '../lines/amount-text.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { workingLines } from '../lines/working.ts';
import { perLitre } from '../manner.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { additiveOf, toAddedRequest } from '../to-requests.ts';
import { missing } from './missing.ts';

/** An addition that was made: what follows from it, and that nothing is kept yet. */
export function answerAdded(reading: Reading, turn: Turn): Outcome {
  if (reading.asks.length > 0) return missing(reading, turn);
  const { manner } = turn;
  const answer = added(toAddedRequest(reading));
  const first = firstOfAdded(reading, answer, turn);
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      line('condition', 'not-kept-addition'),
      line('effect', 'measure-tomorrow'),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...workingLines(answer.steps, manner),
    ],
    buttons: answer.steps.length > 0 ? buttonsFor(turn.ref, ['w', 's']) : [],
  };
}

function firstOfAdded(reading: Reading, answer: AddedAnswer, { manner }: Turn): Line {
  const vessel = vesselText(reading);
  const additive = additiveOf(reading) ?? { id: 'potassium-metabisulfite' };
  const stated = statedAmount(reading.fields, additive, manner.mark);
  const worked = statedAmount(answer, additive, manner.mark);
  const gave = answer.added_mg_L === undefined ? 'none' : perLitre(answer.added_mg_L, manner);
  if (stated) return { ...line('first', 'added', { vessel, added: gave }), list: [stated] };
  if (worked) return { ...line('first', 'added-worked', { vessel, added: gave }), list: [worked] };
  return line('first', 'added-bare', { vessel, added: gave });
}
