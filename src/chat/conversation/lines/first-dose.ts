import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { DoseAnswer, Measure } from '../../../core/dose/answer.ts';
import type { Line } from '../../replies/reply.ts';
import { concentrationText, measureText } from '../../replies/quantity-text.ts';
import { numberText } from '../../replies/number-text.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';

/** The sentence that tells how to measure an additive. */
function sentenceFor(additive: AdditiveAtHand, measure: Measure): SentenceKey {
  if (measure.unit === 'tablets')
    return additive.tablet_salt_g === undefined ? 'dose-tablets' : 'dose-tablets-salt';
  const { kind } = ADDITIVES[additive.id];
  return kind === 'gas' ? 'dose-gas' : kind === 'solution' ? 'dose-measure' : 'dose-weigh';
}

function size(additive: AdditiveAtHand, { mark }: Manner): string {
  return numberText(additive.tablet_salt_g ?? additive.tablet_SO2_g ?? 0, 2, mark);
}

/** Whether an answer carries an amount that can be weighed, measured or counted. */
export function hasAmount({ measure, stock, per_vessel: each }: DoseAnswer): boolean {
  return (each?.measure ?? each?.stock ?? measure ?? stock) !== undefined;
}

/** The dose in one line, vessel first, and what belongs to the amount itself: all vessels, tablets, a stock. */
export function firstOfDose(
  vessel: string,
  answer: DoseAnswer,
  additive: AdditiveAtHand,
  manner: Manner,
): Line[] {
  const { mark } = manner;
  const each = answer.per_vessel;
  const { measure, stock, measure_gives_mg_L: gives } = each ?? answer;
  const values = { vessel, count: each ? 'several' : 'one' };
  const lines: Line[] = [];
  if (measure)
    lines.push(
      line('first', sentenceFor(additive, measure), {
        ...values,
        amount: measureText(measure, mark),
        additive: additive.id,
        size: size(additive, manner),
      }),
    );
  if (stock) {
    const key =
      measure === undefined
        ? 'dose-only-stock'
        : measure.unit === 'tablets'
          ? 'dose-rest-as-stock'
          : 'dose-stock';
    const strength = numberText(stock.strength_percent, 1, mark);
    lines.push(
      line('first', key, {
        ...values,
        amount: measureText(stock.measure, mark),
        strength,
        additive: stock.additive,
      }),
    );
  }
  if (gives !== undefined && stock && answer.dose_mg_L !== undefined) {
    const wanted = concentrationText(answer.dose_mg_L, mark);
    lines.push(
      line('first', 'dose-tablets-give', {
        gives: concentrationText(gives, mark),
        wanted,
        unit: manner.unit,
      }),
    );
  }
  if (each && answer.measure) {
    const amount = measureText(answer.measure, mark);
    const tablets = answer.measure.unit === 'tablets' ? 'tablets' : 'other';
    lines.push(
      line('first', 'dose-in-all', { count: numberText(each.count, 0, mark), amount, unit: tablets }),
    );
  }
  return lines;
}
