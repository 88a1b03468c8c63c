import { bindingCovered } from '../../../core/binding/allowance.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText, shareText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre, type Manner } from '../manner.ts';
import { landingLine, rangeText } from './landing.ts';
import { line } from './line.ts';
import { afterMustLines } from './must.ts';
import { bareAmount, measureIn } from './measured.ts';

/** An allowance of half as much again covers a binding of a third (plain arithmetic). */
const THIRD_COVERED_percent = 50;

/** What a dose does and what to expect of it, with the arithmetic of a stated allowance or share. */
export function expectationLines(
  reading: Reading,
  answer: DoseAnswer,
  other: DoseAnswer | undefined,
  manner: Manner,
): Line[] {
  const { binding_allowance_percent: percent, binding_share: share } = reading.fields;
  if (percent !== undefined && percent > 0)
    return [...allowance(percent, answer, manner), ...asOther(reading, other, manner)];
  if (share !== undefined) return [...shareLost(share, answer, manner), ...asOther(reading, other, manner)];
  if (reading.fields.stage === 'must') return afterMustLines(answer, manner);
  if (reading.fields.stage === 'fermenting') return [];
  const landing = landingLine(reading, answer, manner);
  if (landing) return [landing];
  if (answer.dose_mg_L === undefined) return [];
  const dose = concentrationText(answer.dose_mg_L, manner.mark);
  return [line('effect', 'effect-raise', { dose, unit: manner.unit })];
}

function reached(answer: DoseAnswer, manner: Manner): Record<string, string> | undefined {
  const { free_after_mg_L: after, free_expected_mg_L: expected } = answer;
  if (after === undefined || expected === undefined) return undefined;
  return {
    after: concentrationText(after, manner.mark),
    unit: manner.unit,
    range: rangeText(expected, manner),
  };
}

function allowance(percent: number, answer: DoseAnswer, manner: Manner): Line[] {
  const values = {
    percent: numberText(percent, 1, manner.mark),
    factor: numberText(1 + percent / 100, 3, manner.mark),
    covers: numberText(bindingCovered(percent), 0, manner.mark),
    third: percent < THIRD_COVERED_percent ? 'more' : 'covered',
  };
  const where = reached(answer, manner);
  return [line('effect', where ? 'effect-allowance' : 'effect-allowance-bare', { ...values, ...where })];
}

function shareLost(share: number, answer: DoseAnswer, manner: Manner): Line[] {
  const where = reached(answer, manner);
  const values = { share: shareText(share, manner.mark), ...where };
  return [line('effect', where ? 'effect-share' : 'effect-share-bare', values)];
}

/** What the other arithmetic would give for the same words: a share added, or a share lost. */
function asOther(reading: Reading, other: DoseAnswer | undefined, manner: Manner): Line[] {
  const { binding_allowance_percent: percent, binding_share: share } = reading.fields;
  if (other?.dose_mg_L === undefined) return [];
  const bare = bareAmount(measureIn(other), other.per_vessel ? 'several' : 'one', manner);
  const amount = bare ?? { amount: perLitre(other.dose_mg_L, manner), unit: 'other', count: 'one' };
  const said = (value: number, decimals: number): string => numberText(value, decimals, manner.mark);
  if (percent !== undefined)
    return [
      line('effect', 'other-as-share', {
        percent: said(percent, 1),
        divisor: said(1 - percent / 100, 3),
        ...amount,
      }),
    ];
  if (share === undefined) return [];
  const values = { percent: said(share * 100, 0), factor: said(1 + share, 2), ...amount };
  return [line('effect', 'other-as-allowance', values)];
}
