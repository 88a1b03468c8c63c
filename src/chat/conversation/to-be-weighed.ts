import type { AdditiveAtHand } from '../../core/additives/additive-id.ts';
import type { AdditiveNoted, AmountNoted } from '../../core/cellar/entry.ts';
import { added } from '../../core/dose/added.ts';
import type { DoseAnswer, Measure } from '../../core/dose/answer.ts';
import type { Reading } from '../reader/understood.ts';
import { sumOf } from './lines/measured.ts';
import { shownDose } from './lines/shown-dose.ts';
import type { Plan } from './plan.ts';
import { additiveOf } from './to-requests.ts';

/**
 * What a dose has somebody weigh, measure or count, for all vessels of the reading or for each of them, as the log would
 * note it: with the rounding of the instrument, and its own mg/L. Undefined where the dose has no one amount: a choice, or
 * tablets with the rest as a stock.
 */
export function toBeWeighed(
  reading: Reading,
  answer: DoseAnswer,
  share: 'all' | 'each' = 'all',
): Omit<Plan, 'ref' | 'chat' | 'at'> | undefined {
  const additive = additiveOf(reading);
  const given = shownDose(answer);
  const each = given.per_vessel;
  const { measure, stock } = each ?? given;
  if (additive === undefined || given.dose_mg_L === undefined || answer.choices) return undefined;
  const isMixed = measure?.unit === 'tablets' && stock !== undefined;
  const shown = measure ?? stock?.measure;
  if (shown === undefined || isMixed) return undefined;
  const used: AdditiveAtHand =
    measure === undefined && stock
      ? { id: stock.additive, strength_percent: stock.strength_percent }
      : additive;
  const count = each?.count ?? 1;
  const parts = share === 'each' ? count : 1;
  const amount = amountOf(sumOf(shown, count / parts), used);
  const all_L = reading.fields.volume_L ?? reading.assumed.volume_L;
  const volume_L = all_L === undefined ? undefined : all_L / parts;
  const { SO2_g, added_mg_L } = added({
    ...amount,
    additive: used,
    ...(volume_L !== undefined && { volume_L }),
  });
  return {
    ...notedOf(used),
    ...amount,
    ...(SO2_g !== undefined && { SO2_g }),
    ...(added_mg_L !== undefined && { added_mg_L }),
    ...(volume_L !== undefined && { volume_L }),
    planned_mg_L: given.dose_mg_L,
    ...(given.free_after_mg_L !== undefined && { planned_free_mg_L: given.free_after_mg_L }),
  };
}

/** An additive as the log keeps it. */
export function notedOf({ id, ...more }: AdditiveAtHand): AdditiveNoted {
  return { additive: id, ...more };
}

/** What an instrument shows as an amount of the log; effervescent tablets are kept as the SO2 that they give. */
function amountOf({ value, unit }: Measure, { tablet_SO2_g }: AdditiveAtHand): AmountNoted {
  switch (unit) {
    case 'g':
      return { mass_g: value };
    case 'kg':
      return { mass_g: value * 1000 };
    case 'mL':
      return { additive_volume_mL: value };
    case 'L':
      return { additive_volume_mL: value * 1000 };
    case 'tablets':
      return tablet_SO2_g === undefined ? { tablets: value } : { mass_g: value * tablet_SO2_g };
  }
}
