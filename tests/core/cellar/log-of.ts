import { applyEntry } from '../../../src/core/cellar/apply-entry.ts';
import type { Entry, Happening } from '../../../src/core/cellar/entry.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';

/** A day in milliseconds. */
export const DAY_ms = 86_400_000;

/** Entries a day apart, in their order. */
export function logOf(...happenings: readonly Happening[]): Entry[] {
  return happenings.map((one, place) => {
    const at = place * DAY_ms;
    return { ...one, entry: place + 1, key: `k${place}`, at, noted_at: at, by: 1 };
  });
}

/** The vessels that a log leads to. */
export function vesselsOf(log: readonly Entry[]): ReadonlyMap<string, Vessel> {
  const vessels = new Map<string, Vessel>();
  for (const entry of log) {
    for (const [name, after] of applyEntry(vessels, entry)) {
      if (after === undefined) vessels.delete(name);
      else vessels.set(name, after);
    }
  }
  return vessels;
}
