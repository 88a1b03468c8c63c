import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Weighed } from '../../../core/dose/totals-to-fetch.ts';
import { shownDose } from '../lines/shown-dose.ts';

/** What the line of a round has somebody measure out: the additive, or tablets and the rest of the dose as a stock. */
export function weighedOf(additive: AdditiveAtHand, answer: DoseAnswer): Weighed[] {
  if (answer.choices) return [];
  const shown = shownDose(answer);
  const each = shown.per_vessel;
  const { measure, stock } = each ?? shown;
  const count = each?.count ?? 1;
  const asStock = measure === undefined || measure.unit === 'tablets' ? stock : undefined;
  return [
    ...(measure === undefined ? [] : [{ additive, measure, count }]),
    ...(asStock === undefined
      ? []
      : [
          {
            additive: { id: asStock.additive, strength_percent: asStock.strength_percent },
            measure: asStock.measure,
            count,
          },
        ]),
  ];
}
