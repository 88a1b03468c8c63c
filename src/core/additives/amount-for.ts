import { assertBetween } from '../bounds.ts';
import type { AdditiveAtHand } from './additive-id.ts';
import { SO2ContentOf, SO2Per } from './so2-content.ts';
import type { AdditiveAmount } from './so2-in.ts';

/**
 * How much of an additive gives so much SO2: `SO2In` turned round.
 *
 * @param SO2_g g, 0 or more
 * @returns grams, millilitres or tablets in full precision; `undefined` when a strength or size is missing
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source: `SO2ContentOf`.
 *
 * @example
 * ```ts
 * amountFor(147.69, { id: 'potassium-metabisulfite' }) // => { mass_g: 256.28 }
 * amountFor(6, { id: 'sulfur-dioxide-solution', strength_percent: 6 }) // => { additive_volume_mL: 100 }
 * amountFor(10, { id: 'tablet', tablet_SO2_g: 5 }) // => { tablets: 2 }
 * ```
 */
export function amountFor(SO2_g: number, additive: AdditiveAtHand): AdditiveAmount | undefined {
  assertBetween('work out an amount', 'SO2_g', SO2_g, 0);
  const content = SO2ContentOf(additive);
  if (content === undefined) return undefined;
  const amount = SO2_g / SO2Per(content);
  if (content.per === 'g') return { mass_g: amount };
  return content.per === 'mL' ? { additive_volume_mL: amount } : { tablets: amount };
}
