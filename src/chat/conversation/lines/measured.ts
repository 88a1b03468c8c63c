import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { DoseAnswer, Measure } from '../../../core/dose/answer.ts';
import { numberText } from '../../replies/number-text.ts';
import { measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';

/** What is measured of an answer: of each vessel where there are several, else of the whole. */
export type Measured = Pick<DoseAnswer, 'measure' | 'per_vessel'>;

/** What one weighs, measures or counts; undefined where there is nothing to. */
export function measureIn({ measure, per_vessel: each }: Measured): Measure | undefined {
  return each ? each.measure : measure;
}

/** An amount as values of `bare-amount`: its text, whether it is tablets or one tablet, whether it is for each. */
export function bareAmount(
  measure: Measure | undefined,
  count: 'one' | 'several',
  { mark }: Manner,
): Line['values'] | undefined {
  if (measure === undefined) return undefined;
  return { amount: measureText(measure, mark), unit: unitWord(measure), count };
}

/** An amount of an additive as values of `measured`, with the strength of a solution and the size of a tablet. */
export function measuredAmount(
  answer: Measured,
  additive: AdditiveAtHand,
  manner: Manner,
): Line['values'] | undefined {
  const bare = bareAmount(measureIn(answer), answer.per_vessel ? 'several' : 'one', manner);
  if (bare === undefined) return undefined;
  const isSolution = ADDITIVES[additive.id].kind === 'solution';
  return {
    ...bare,
    ...(isSolution && { unit: 'solution' }),
    additive: additive.id,
    size: numberText(additive.tablet_salt_g ?? additive.tablet_SO2_g ?? 0, 2, manner.mark),
    strength: numberText(additive.strength_percent ?? 0, 2, manner.mark),
  };
}

/** What is used in all where each of several vessels gets what was measured for it. */
export function sumOf({ value, unit }: Measure, count: number): Measure {
  const sum = Number((value * count).toFixed(3));
  if (sum < 1000 || (unit !== 'g' && unit !== 'mL')) return { value: sum, unit };
  return { value: Number((sum / 1000).toFixed(5)), unit: unit === 'g' ? 'kg' : 'L' };
}

/** `tablet` up to one, `tablets` above, else `other`. */
export function unitWord({ value, unit }: Measure): 'tablet' | 'tablets' | 'other' {
  if (unit !== 'tablets') return 'other';
  return value <= 1 ? 'tablet' : 'tablets';
}
