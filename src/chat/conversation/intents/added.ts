import { added } from '../../../core/dose/added.ts';
import type { AddedAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { additionOf } from '../addition-of.ts';
import { buttonsFor } from '../buttons.ts';
import { statedAmount } from '../lines/amount-text.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { underLines } from '../lines/warnings.ts';
import { workingLines } from '../lines/working.ts';
import { perLitre } from '../manner.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { additiveOf } from '../to-requests.ts';
import { addedRequestOf } from '../added-request-of.ts';
import { whenOf } from '../when.ts';
import { addedEach } from './added-each.ts';
import { missing } from './missing.ts';
import { whenIsUnclear } from './when-unclear.ts';
import { notedAddition } from './noted-addition.ts';

/**
 * An addition that was made is a fact: it is noted at once, with what is odd about it. Only an amount that had to be
 * worked out is confirmed first.
 */
export function answerAdded(reading: Reading, turn: Turn): Outcome {
  if (reading.asks.length > 0) return missing(reading, turn);
  const unsaid = whenIsUnclear(reading, turn);
  if (unsaid) return unsaid;
  const when = whenOf(reading, turn.here);
  const answer = added(addedRequestOf(reading, turn.here));
  if (isWorkedOut(reading)) return confirmed(reading, answer, turn);
  const below = [
    ...(when.is === 'noon' ? [line('assumed', 'when-noon')] : []),
    ...factLines(reading, turn.manner),
    ...assumedLines(reading, turn.manner),
  ];
  if ((reading.fields.vessels?.length ?? 1) > 1) return addedEach(reading, answer, below, turn);
  const addition = additionOf(reading, answer, turn.here);
  const noted = notedAddition({ happening: addition, at: when.at }, turn);
  const { manner } = turn;
  return {
    ...noted,
    answer,
    lines: [
      ...noted.lines.slice(0, 1),
      ...underLines(
        answer.warnings.filter(({ values }) => values['rule'] !== addition.over_rule),
        manner,
      ),
      ...noted.lines.slice(1),
      ...below,
      ...workingLines(answer.steps, manner),
    ],
  };
}

/** Only mg/L were said: what that is in grams or millilitres is our figure and not theirs. */
function isWorkedOut({ fields }: Reading): boolean {
  const { mass_g, additive_volume_mL, tablets } = fields;
  return mass_g === undefined && additive_volume_mL === undefined && tablets === undefined;
}

function confirmed(reading: Reading, answer: AddedAnswer, turn: Turn): Outcome {
  const { manner } = turn;
  const additive = additiveOf(reading) ?? { id: 'potassium-metabisulfite' };
  const worked = statedAmount(answer, additive, manner.mark);
  const gave = answer.added_mg_L === undefined ? 'none' : perLitre(answer.added_mg_L, manner);
  const values = { vessel: vesselText(reading), added: gave };
  const first = worked
    ? { ...line('first', 'added-confirm', values), list: [worked] }
    : line('first', 'added-confirm-bare', values);
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      ...underLines(answer.warnings, manner),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...workingLines(answer.steps, manner),
    ],
    buttons: buttonsFor(turn.ref, ['n', 'w']),
  };
}
