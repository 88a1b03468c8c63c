import type { Entry } from './entry.ts';
import type { Vessel } from './vessel.ts';

/**
 * What the vessels that an entry touches are after it; `undefined` for one that is forgotten. Entries come in the order
 * of their time (`at`) and, at one moment, of their number; corrections and the entries they take back are left out.
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
  void vessels;
  throw new Error(`not written yet: ${entry.kind}`);
}
