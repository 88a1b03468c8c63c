import type { DoseAnswer } from '../../../core/dose/answer.ts';
import { dose } from '../../../core/dose/dose.ts';
import { SO2_PER_OXYGEN_MEASURED } from '../../../core/dose/oxygen-loss.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre } from '../manner.ts';
import type { Turn } from '../outcome.ts';
import { toDoseRequest } from '../to-requests.ts';
import { line } from './line.ts';
import { bareAmount, measureIn } from './measured.ts';

/**
 * What is aimed at when the wine is bottled against what has to be there now, and what the oxygen is reckoned to take;
 * where no oxygen is stated, that none is counted.
 */
export function bottlingLines(reading: Reading, answer: DoseAnswer, turn: Turn): Line[] {
  const { marks } = reading;
  const { manner } = turn;
  if (marks.bottling !== true) return [];
  const { bottling, target_free_mg_L: now } = answer;
  if (bottling === undefined) return [line('condition', 'bottling-no-oxygen')];
  const { mark, unit } = manner;
  const said = (mg_L: number): string => concentrationText(mg_L, mark);
  const values = {
    unit,
    oxygen: numberText(bottling.oxygen_mg_L, 2, mark),
    loss: said(bottling.counted_mg_L),
    each: marks.SO2_mg_per_mg_O2 === undefined ? 'formula' : numberText(marks.SO2_mg_per_mg_O2, 1, mark),
  };
  const after = bottling.free_at_bottling_mg_L;
  if (after === undefined || now === undefined) return [line('condition', 'bottling-takes', values)];
  return [
    line('condition', 'bottling-target', { ...values, after: said(after), now: said(now) }),
    // Of several ways out each would take another amount.
    ...(answer.choices === undefined ? measuredLines(reading, turn) : []),
  ];
}

/** What would do if oxygen takes no more than trade figures have it. */
function measuredLines(reading: Reading, { manner, settings }: Turn): Line[] {
  const request = toDoseRequest(reading, settings);
  if (request.oxygen_mg_L === 0 || request.SO2_mg_per_mg_O2 !== undefined) return [];
  const measured = dose({ ...request, SO2_mg_per_mg_O2: SO2_PER_OXYGEN_MEASURED });
  const { dose_mg_L, bottling } = measured;
  if (dose_mg_L === undefined || bottling === undefined) return [];
  const bare = bareAmount(measureIn(measured), measured.per_vessel ? 'several' : 'one', manner);
  const amount = bare ?? { amount: `+ ${perLitre(dose_mg_L, manner)}`, unit: 'other', count: 'one' };
  const each = numberText(SO2_PER_OXYGEN_MEASURED, 1, manner.mark);
  return [
    line('condition', dose_mg_L === 0 ? 'bottling-measured-none' : 'bottling-measured', {
      ...amount,
      each,
      oxygen: numberText(bottling.oxygen_mg_L, 2, manner.mark),
    }),
  ];
}
