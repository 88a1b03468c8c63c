import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { AsStock, DoseAnswer, Measure } from '../../../core/dose/answer.ts';
import type { Line } from '../../replies/reply.ts';
import { concentrationText, measureText } from '../../replies/quantity-text.ts';
import { numberText } from '../../replies/number-text.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Manner } from '../manner.ts';
import { line, listLine, part } from './line.ts';
import { measuredAmount, sumOf, unitWord } from './measured.ts';

/** The sentence that tells how to measure an additive. */
function sentenceFor(additive: AdditiveAtHand, measure: Measure): SentenceKey {
  if (measure.unit === 'tablets') return 'dose-tablets';
  const { kind } = ADDITIVES[additive.id];
  return kind === 'gas' ? 'dose-gas' : kind === 'solution' ? 'dose-measure' : 'dose-weigh';
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
  const amount = measuredAmount(answer, additive, manner);
  const lines: Line[] = [];
  if (measure && amount) lines.push(line('first', sentenceFor(additive, measure), { vessel, ...amount }));
  const size = additive.tablet_SO2_g ?? additive.tablet_salt_g;
  if (stock && !measure && size !== undefined)
    lines.push(line('first', 'dose-tablet-too-large', { vessel, count: each ? 'several' : 'one' }));
  if (stock) {
    lines.push(
      line('first', stockSentence(measure), {
        vessel,
        amount: measureText(stock.measure, mark),
        strength: numberText(stock.strength_percent, 1, mark),
        additive: stock.additive,
        count: each ? 'several' : 'one',
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
  return each ? [...lines, ...inAll(each.count, measure, stock, manner)] : lines;
}

function stockSentence(measure: Measure | undefined): SentenceKey {
  if (measure === undefined) return 'dose-only-stock';
  return measure.unit === 'tablets' ? 'dose-rest-as-stock' : 'dose-stock';
}

/** What is really used for all vessels: so often what is measured for one, and so often the rest of its tablets. */
function inAll(
  count: number,
  measure: Measure | undefined,
  stock: AsStock | undefined,
  { mark }: Manner,
): Line[] {
  const whole = measure === undefined ? undefined : sumOf(measure, count);
  const isNeeded = measure === undefined || measure.unit === 'tablets';
  const parts = [
    ...(whole
      ? [part('bare-amount', { amount: measureText(whole, mark), unit: unitWord(whole), count: 'one' })]
      : []),
    ...(stock && isNeeded
      ? [
          part('in-all-stock', {
            amount: measureText(sumOf(stock.measure, count), mark),
            strength: numberText(stock.strength_percent, 1, mark),
          }),
        ]
      : []),
  ];
  return listLine('first', 'dose-in-all', parts).map((one) => ({
    ...one,
    values: { count: numberText(count, 0, mark) },
  }));
}
