import type { Noting } from './entry.ts';
import type { Vessel } from './vessel.ts';

/**
 * A vessel that was just heard of: nothing is known of it yet. Its volumes will be litres, its times milliseconds.
 *
 * @param name the vessel's name
 * Range: any time.
 *
 * @param entry the entry that names it first
 *
 * @example
 * ```ts
 * freshVessel('tank 4', { entry: 7, at: 1000 }).since // => 1000
 * ```
 */
export function freshVessel(name: string, entry: Pick<Noting, 'at'> & { readonly entry: number }): Vessel {
  return {
    vessel: name,
    since: entry.at,
    last_at: entry.at,
    last_entry: entry.entry,
    traits: {},
    voided: {},
    readings: [],
    additions: [],
    unlanded: [],
    added_since_total_mg_L: 0,
    landings: [],
    orders: [],
  };
}
