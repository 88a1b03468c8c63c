import type { Addition, AdditiveNoted, AmountNoted, Entry } from './entry.ts';
import { KEPT } from './kept-lengths.ts';
import type { AdditionKept, Vessel } from './vessel.ts';

/**
 * A vessel after an addition: its own share of it where several shared it (g, mL, tablets, litres), which has not
 * landed until free SO2 is measured again. An order that it carries out is no longer open.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const added = { entry: 2, at: 5, key: 'k', noted_at: 5, by: 1, kind: 'addition', vessels: ['B1', 'B2'], mass_g: 24 };
 * applyAddition(freshVessel('B1', added), added).additions[0]?.mass_g // => 12
 * ```
 */
export function applyAddition(before: Vessel, addition: Entry & Addition): Vessel {
  const { entry, at, by, added_mg_L = 0, planned_mg_L, planned_free_mg_L } = addition;
  const kept: AdditionKept = {
    entry,
    at,
    by,
    ...additiveOf(addition),
    ...shareOf(addition, addition.vessels.length),
    ...(planned_mg_L !== undefined && { planned_mg_L }),
    ...(planned_free_mg_L !== undefined && { planned_free_mg_L }),
  };
  return {
    ...before,
    additions: [...before.additions, kept].slice(-KEPT.additions),
    unlanded: [...before.unlanded, entry],
    added_since_total_mg_L: before.added_since_total_mg_L + added_mg_L,
    orders: before.orders.filter((order) => order.entry !== addition.order),
  };
}

/**
 * The additive of an entry without the rest of it; strength in %, tablet sizes in grams.
 *
 * @example
 * ```ts
 * additiveOf({ additive: 'tablet', tablet_SO2_g: 5, mass_g: 10 }) // => { additive: 'tablet', tablet_SO2_g: 5 }
 * ```
 */
export function additiveOf(noted: AdditiveNoted): AdditiveNoted {
  const { additive, strength_percent, strength_of, tablet_SO2_g, tablet_salt_g, chemical_lot } = noted;
  return {
    ...(additive !== undefined && { additive }),
    ...(strength_percent !== undefined && { strength_percent }),
    ...(strength_of !== undefined && { strength_of }),
    ...(tablet_SO2_g !== undefined && { tablet_SO2_g }),
    ...(tablet_salt_g !== undefined && { tablet_salt_g }),
    ...(chemical_lot !== undefined && { chemical_lot }),
  };
}

/**
 * One vessel's part of an amount (g, mL, tablets, litres) that `count` equal ones share; mg/L are the same in each.
 *
 * @param count how many vessels, at least 1 (range: as many as an entry names)
 *
 * @example
 * ```ts
 * shareOf({ mass_g: 24, added_mg_L: 30, volume_L: 450 }, 2) // => { mass_g: 12, added_mg_L: 30, volume_L: 225 }
 * ```
 */
export function shareOf(amount: AmountNoted, count: number): AmountNoted {
  const { mass_g, additive_volume_mL, tablets, SO2_g, added_mg_L, volume_L } = amount;
  return {
    ...(mass_g !== undefined && { mass_g: mass_g / count }),
    ...(additive_volume_mL !== undefined && { additive_volume_mL: additive_volume_mL / count }),
    ...(tablets !== undefined && { tablets: tablets / count }),
    ...(SO2_g !== undefined && { SO2_g: SO2_g / count }),
    ...(added_mg_L !== undefined && { added_mg_L }),
    ...(volume_L !== undefined && { volume_L: volume_L / count }),
  };
}
