import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { RoundRow } from '../../attachments/round/round-sheet.ts';
import { saidNothingToWeigh } from '../lines/nothing-needed.ts';
import { shownDose } from '../lines/shown-dose.ts';
import type { SaidInRound } from '../lines/round-foot.ts';
import { additiveOf } from '../to-requests.ts';
import { vesselsIn } from '../vessels-named.ts';
import { weighedOf } from './weighed-of.ts';

/** A line of a round on its sheet; undefined for one that asks for no dose, such as an addition that was made. */
export function rowOf({ reading, outcome, ref, name }: SaidInRound): RoundRow | undefined {
  const { intent, problems, asks, fields, assumed, volumeUnit } = reading;
  if (intent !== 'dose' && problems.length === 0) return undefined;
  const vessels = vesselsIn(fields);
  const { ph, free_mg_L, total_mg_L } = fields;
  const volume_L = fields.volume_L ?? assumed.volume_L;
  const row = {
    ref,
    name,
    vessels,
    ...(volume_L !== undefined && { volume_L }),
    ...(volumeUnit !== undefined && { volumeUnit }),
    ...(ph !== undefined && { ph }),
    ...(free_mg_L !== undefined && { free_mg_L }),
    ...(total_mg_L !== undefined && { total_mg_L }),
    lines: outcome.inRound,
  };
  const answer =
    problems.length + asks.length === 0 ? ((outcome.answer as DoseAnswer | null) ?? undefined) : undefined;
  const isSaid = outcome.inRound.some(({ key }) => key.startsWith('round-dose'));
  const additive = additiveOf(reading);
  if (answer && saidNothingToWeigh(answer)) return { ...row, is: 'nothing', weighed: [] };
  if (answer === undefined || additive === undefined || !isSaid) return { ...row, is: 'open', weighed: [] };
  const weighed = weighedOf(additive, answer);
  const shown = shownDose(answer);
  const { dose_mg_L, free_after_mg_L, isLimited } = shown;
  const { measure_gives_mg_L: gives_mg_L } = shown.per_vessel ?? shown;
  return {
    ...row,
    is: 'amount',
    weighed,
    ...(dose_mg_L !== undefined && { dose_mg_L }),
    ...(free_after_mg_L !== undefined && { free_after_mg_L }),
    ...(isLimited && { isLimited }),
    ...(gives_mg_L !== undefined && { gives_mg_L }),
    // Tablets and the rest of their dose as a stock are no one amount.
    ...(vessels.length > 0 && weighed.length === 1 && { mayBeNoted: true as const }),
  };
}
