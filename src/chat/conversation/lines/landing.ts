import { riseExpected } from '../../../core/binding/free-expected.ts';
import { FREE_LOW_mg_L } from '../../../core/binding/free-expected.ts';
import type { DoseAnswer, EffectAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';

type Landing = Pick<
  DoseAnswer & EffectAnswer,
  'free_after_mg_L' | 'free_expected_mg_L' | 'molecular_after_mg_L' | 'molecular_mg_L'
>;

/** A rise in mg/L that no reading of free SO2 tells from none (own threshold). */
const READING_ERROR_mg_L = 1;

/** Two ends as a range, or one figure where they read alike. */
export function rangeText([low, high]: readonly [number, number], { mark }: Manner): string {
  const ends = new Set([concentrationText(low, mark), concentrationText(high, mark)]);
  return [...ends].join('–');
}

/** How far free SO2 rises with an addition to a wine whose readings are unknown. */
export function riseLine(dose_mg_L: number, manner: Manner): Line {
  return line('effect', 'effect-rise', {
    range: rangeText(riseExpected(dose_mg_L), manner),
    unit: manner.unit,
  });
}

/** Where the wine lands if nothing binds, and what to expect instead; never promised. */
export function landingLine(reading: Reading, answer: Landing, manner: Manner): Line | undefined {
  const { free_mg_L } = reading.fields;
  const { free_after_mg_L, free_expected_mg_L } = answer;
  if (free_mg_L === undefined || free_after_mg_L === undefined || free_expected_mg_L === undefined)
    return undefined;
  const values = {
    now: numberText(free_mg_L, 1, manner.mark),
    after: concentrationText(free_after_mg_L, manner.mark),
    unit: manner.unit,
    range: rangeText(free_expected_mg_L, manner),
  };
  if (free_after_mg_L - free_mg_L < READING_ERROR_mg_L) return line('effect', 'effect-land-small', values);
  if (free_mg_L < FREE_LOW_mg_L) return line('effect', 'effect-land-low', values);
  if (answer.molecular_after_mg_L === undefined) return line('effect', 'effect-land', values);
  const molecular = molecularText(answer.molecular_after_mg_L, manner.mark);
  if (answer.molecular_mg_L === undefined)
    return line('effect', 'effect-land-to-molecular', { ...values, molecular });
  const molecularNow = molecularText(answer.molecular_mg_L, manner.mark);
  return line('effect', 'effect-land-molecular', { ...values, molecularNow, molecular });
}
