import { mixBinding } from '../binding/learned.ts';
import type { Entry, VesselChange } from './entry.ts';
import { freshVessel } from './fresh-vessel.ts';
import { KEPT } from './kept-lengths.ts';
import { learnedOf } from './learned-of.ts';
import type { Known, KnownTraits, Vessel } from './vessel.ts';
import { withoutPH } from './with-traits.ts';
import { withoutVolume, withVolume } from './with-volume.ts';

/**
 * A vessel without its wine: what belongs to the vessel itself (capacity in litres, its usual additive) stays, and so
 * do its orders, which stay open until somebody says what went in.
 *
 * Range: any time.
 *
 * @param at since when it is empty, in milliseconds since 1970
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const full = { ...freshVessel('tank 4', { entry: 1, at: 0 }), volume_L: { value: 5200, at: 0, entry: 1 } };
 * emptied(full, 9).volume_L // => undefined
 * emptied(full, 9).empty // => 9
 * ```
 */
export function emptied(vessel: Vessel, at: number): Vessel {
  const { capacity_L, usual, unwatched, orders } = vessel;
  return {
    ...freshVessel(vessel.vessel, { entry: vessel.last_entry, at: vessel.since }),
    last_at: vessel.last_at,
    empty: at,
    orders,
    ...(capacity_L && { capacity_L }),
    ...(usual && { usual }),
    ...(unwatched && { unwatched }),
  };
}

/**
 * Whether a vessel is known to hold wine: something was measured, told or added, and it was not emptied since.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * holdsWine(freshVessel('tank 4', { entry: 1, at: 0 })) // => false
 * ```
 */
export function holdsWine(vessel: Vessel): boolean {
  if (vessel.empty !== undefined) return false;
  const { volume_L, lot, readings, additions, traits } = vessel;
  return (
    volume_L !== undefined ||
    vessel.voided.volume_L !== undefined ||
    lot !== undefined ||
    readings.length > 0 ||
    additions.length > 0 ||
    Object.keys(traits).length > 0
  );
}

/**
 * Two vessels after wine was brought from one into the other, all of it or so many litres. Into an empty vessel the
 * wine comes with all that is known of it; into another wine it makes a new one, of which only what both had in common
 * is still known, and neither pH nor SO2.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const from = { ...freshVessel('tank 4', { entry: 1, at: 0 }), ph: { value: 3.5, at: 0, entry: 1 } };
 * const move = { entry: 2, at: 5, key: 'k', noted_at: 5, by: 1, kind: 'vessel', event: 'moved', vessels: ['tank 4'], to: 'tank 9' };
 * pour(from, freshVessel('tank 9', move), move).to.ph?.value // => 3.5
 * pour(from, freshVessel('tank 9', move), move).from.empty // => 5
 * ```
 */
export function pour(
  from: Vessel,
  to: Vessel,
  change: Entry & VesselChange,
): { readonly from: Vessel; readonly to: Vessel } {
  const isBlend = change.event === 'blended' || holdsWine(to);
  return { from: left(from, change), to: isBlend ? blended(from, to, change) : filled(from, to, change) };
}

function left(from: Vessel, { at, entry, volume_L }: Entry & VesselChange): Vessel {
  if (volume_L === undefined) return emptied(from, at);
  const rest = from.volume_L === undefined ? undefined : from.volume_L.value - volume_L;
  if (rest === undefined) return { ...from, handled: { at, entry } };
  const opened = { ...from, handled: { at, entry } };
  if (rest > 0) return withVolume(opened, { value: rest, at, entry });
  return withoutVolume(opened, { event: 'moved', at });
}

function filled(from: Vessel, to: Vessel, { at, entry, volume_L }: Entry & VesselChange): Vessel {
  const { capacity_L, usual, unwatched, since } = to;
  // The first vessel's own ways do not come along with its wine; nor do orders, which name a vessel.
  const { capacity_L: _c, usual: _u, unwatched: _w, later: _l, empty: _e, ...wine } = from;
  const arrived: Vessel = {
    ...wine,
    vessel: to.vessel,
    handled: { at, entry },
    since,
    last_at: to.last_at,
    last_entry: to.last_entry,
    orders: to.orders,
    ...(capacity_L && { capacity_L }),
    ...(usual && { usual }),
    ...(unwatched && { unwatched }),
  };
  if (volume_L !== undefined) return withVolume(arrived, { value: volume_L, at, entry });
  return withoutVolume(arrived, { event: 'moved', at });
}

function blended(from: Vessel, to: Vessel, { at, entry, volume_L }: Entry & VesselChange): Vessel {
  const { free_mg_L: _free, total_mg_L: _total, lot, empty: _empty, bound_before: _bound, ...others } = to;
  const came_L = volume_L ?? from.volume_L?.value;
  const whole_L = came_L === undefined || to.volume_L === undefined ? undefined : came_L + to.volume_L.value;
  const bound_before =
    came_L === undefined || to.volume_L === undefined || came_L <= 0 || to.volume_L.value <= 0
      ? undefined
      : mixBinding([learnedOf(to), to.volume_L.value], [learnedOf(from), came_L]);
  const additions = [...to.additions, ...from.additions].toSorted((a, b) => a.at - b.at || a.entry - b.entry);
  const mixed: Vessel = {
    ...others,
    ...(lot !== undefined && lot.value === from.lot?.value && { lot }),
    traits: inCommon(to.traits, from.traits),
    additions: additions.slice(-KEPT.additions),
    unlanded: [],
    added_since_total_mg_L: 0,
    landings: [],
    changed: { at, entry },
    ...(bound_before && { bound_before }),
  };
  const unmeasured = withoutPH(mixed, 'blended', at);
  if (whole_L !== undefined) return withVolume(unmeasured, { value: whole_L, at, entry });
  return withoutVolume(unmeasured, { event: 'blended', at });
}

/** What is told of both wines alike; of two stages neither. */
function inCommon(one: KnownTraits, other: KnownTraits): KnownTraits {
  const same = Object.entries(one).filter(
    ([name, known]) => other[name as keyof KnownTraits]?.value === (known as Known<unknown>).value,
  );
  return Object.fromEntries(same);
}
