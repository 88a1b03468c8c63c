import { additiveOf, applyAddition, shareOf } from './apply-addition.ts';
import { applyChange } from './apply-change.ts';
import { applyReading } from './apply-reading.ts';
import type { Entry, Order, VesselChange } from './entry.ts';
import { freshVessel } from './fresh-vessel.ts';
import { KEPT } from './kept-lengths.ts';
import { pour } from './pour.ts';
import { touches } from './touches.ts';
import type { Vessel } from './vessel.ts';

/**
 * What the vessels that an entry touches are after it; `undefined` for one that is forgotten. Entries come in the order
 * of their time (`at`, milliseconds) and, at one moment, of their number; corrections and the entries they take back
 * are left out.
 *
 * @param vessels the vessels that it touches, as they were before; a name that is not in it was never heard of
 *
 * @example
 * ```ts
 * const noting = { entry: 1, key: 'a', at: 0, noted_at: 0, by: 1 };
 * applyEntry(new Map(), { ...noting, kind: 'reading', vessels: ['tank 4'], ph: 3.58 }).get('tank 4')?.ph?.value // => 3.58
 * ```
 */
export function applyEntry(
  vessels: ReadonlyMap<string, Vessel>,
  entry: Entry,
): ReadonlyMap<string, Vessel | undefined> {
  const { at, entry: number } = entry;
  const before = touches(entry).map((name): Vessel => {
    const known = vessels.get(name) ?? freshVessel(name, entry);
    return { ...known, last_at: at, last_entry: number };
  });
  if (entry.kind === 'vessel' && entry.to !== undefined) return poured(before, entry);
  return new Map(before.map((vessel) => [vessel.vessel, applyOne(vessel, entry)]));
}

function applyOne(vessel: Vessel, entry: Entry): Vessel | undefined {
  switch (entry.kind) {
    case 'addition':
      return applyAddition(vessel, entry);
    case 'reading':
      return applyReading(vessel, entry);
    case 'vessel':
      return applyChange(vessel, entry);
    case 'order':
      return withOrder(vessel, entry);
    case 'other':
    case 'stock':
    case 'correction':
      return vessel;
  }
}

function withOrder(vessel: Vessel, order: Entry & Order): Vessel {
  const { entry, at, by } = order;
  const open = { entry, at, by, ...additiveOf(order), ...shareOf(order, order.vessels.length) };
  return { ...vessel, orders: [...vessel.orders, open].slice(-KEPT.orders) };
}

/** Wine of each vessel that is named goes into the one it is brought to, one after the other. */
function poured(before: readonly Vessel[], change: Entry & VesselChange): ReadonlyMap<string, Vessel> {
  const after = new Map(before.map((vessel) => [vessel.vessel, vessel]));
  for (const name of change.vessels) {
    const from = after.get(name);
    const to = after.get(change.to ?? name);
    if (from === undefined || to === undefined || from === to) continue;
    const both = pour(from, to, change);
    after.set(name, both.from).set(to.vessel, both.to);
  }
  return after;
}
