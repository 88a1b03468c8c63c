import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import type { DoseAnswer, DoseChoice } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre, type Manner } from '../manner.ts';
import { redFigures, redValues } from './condition.ts';
import { line } from './line.ts';
import { measuredAmount } from './measured.ts';

/** The limit of a wine as a text, `none` where we know of none, and whose law it is. */
export function limitNamed(
  { limit }: Pick<DoseAnswer, 'limit'>,
  manner: Manner,
): { readonly limit: string; readonly region: string } {
  return {
    limit: limit === undefined ? 'none' : perLitre(limit.limit_mg_L, manner),
    region: limit?.region ?? 'oiv',
  };
}

/** The first lines where a usual target would need so much free SO2 that a person has to choose. */
export function choiceLines(
  reading: Reading,
  vessel: string,
  answer: DoseAnswer,
  additive: AdditiveAtHand | undefined,
  manner: Manner,
): Line[] {
  const { choices = [], target_free_mg_L, target_molecular_mg_L } = answer;
  const head = line('first', 'choice-head', {
    vessel,
    ph: numberText(reading.fields.ph ?? 0, 2, manner.mark),
    target: molecularText(target_molecular_mg_L ?? 0, manner.mark),
    free: perLitre(target_free_mg_L ?? 0, manner),
  });
  const ways = choices.map((choice, at) =>
    optionLine(choice, String(at + 1), reading, answer, additive, manner),
  );
  return [head, ...redLine(answer, manner), ...ways, line('first', 'ways-out')];
}

/** For a red the full target is another one, with a figure and an amount of its own. */
function redLine(answer: DoseAnswer, manner: Manner): Line[] {
  const red = redFigures(answer);
  const free = red?.['target_free_mg_L'];
  if (red === undefined || typeof free !== 'number') return [];
  const values = { ...redValues(red, manner), free: concentrationText(free, manner.mark) };
  return [line('first', 'choice-red', { ...values, ...limitNamed(answer, manner) })];
}

function optionLine(
  choice: DoseChoice,
  mark: string,
  reading: Reading,
  answer: DoseAnswer,
  additive: AdditiveAtHand | undefined,
  manner: Manner,
): Line {
  const values = {
    mark,
    free: concentrationText(choice.free_mg_L, manner.mark),
    molecular: molecularText(choice.molecular_mg_L, manner.mark),
  };
  if (choice.target === undefined) return line('first', 'choice-leave', values);
  const amount = additive && measuredAmount(choice, additive, manner);
  if (amount)
    return line('first', 'choice-to', { ...values, ...amount, total: totalFor(choice, reading, answer) });
  return line('first', 'choice-no-amount', { ...values, ...limitNamed(answer, manner) });
}

/** An unknown total matters where free SO2 alone would be more than half of the limit. */
function totalFor(
  { free_mg_L }: DoseChoice,
  { fields }: Reading,
  { limit }: DoseAnswer,
): 'known' | 'unknown' {
  if (fields.total_mg_L !== undefined || limit === undefined) return 'known';
  return free_mg_L > limit.limit_mg_L / 2 ? 'unknown' : 'known';
}
