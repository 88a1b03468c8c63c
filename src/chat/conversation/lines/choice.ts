import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { DoseAnswer, DoseChoice } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, measureText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre, type Manner } from '../manner.ts';
import { shownChoices } from '../shown-choices.ts';
import { line } from './line.ts';

/** The first lines where a usual target would need so much free SO2 that a person has to choose. */
export function choiceLines(
  reading: Reading,
  vessel: string,
  answer: DoseAnswer,
  additive: AdditiveId | undefined,
  manner: Manner,
): Line[] {
  const { choices = [], target_free_mg_L, target_molecular_mg_L } = answer;
  const head = line('first', 'choice-head', {
    vessel,
    ph: numberText(reading.fields.ph ?? 0, 2, manner.mark),
    target: molecularText(target_molecular_mg_L ?? 0, manner.mark),
    free: perLitre(target_free_mg_L ?? 0, manner),
  });
  const ways = shownChoices(choices).map(({ choice }, at) =>
    optionLine(choice, String(at + 1), additive, manner),
  );
  return [head, ...ways, line('first', 'ways-out')];
}

function optionLine(
  choice: DoseChoice,
  mark: string,
  additive: AdditiveId | undefined,
  manner: Manner,
): Line {
  const values = {
    mark,
    free: concentrationText(choice.free_mg_L, manner.mark),
    molecular: molecularText(choice.molecular_mg_L, manner.mark),
  };
  if (choice.target === undefined) return line('first', 'choice-leave', values);
  if (choice.measure !== undefined && additive !== undefined) {
    const amount = measureText(choice.measure, manner.mark);
    return line('first', 'choice-to', { ...values, amount, additive });
  }
  return line('first', 'choice-no-amount', values);
}
