import { applyEntry } from '../../../src/core/cellar/apply-entry.ts';
import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { touches } from '../../../src/core/cellar/touches.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';

/** What vessels are by a log, in the plainest way: all that counts, one after the other, from the beginning. By name. */
export function plainVessels(log: readonly LoggedEntry[]): readonly Vessel[] {
  const vessels = new Map<string, Vessel>();
  const counting = log.filter((entry) => entry.kind !== 'correction' && entry.struck === undefined);
  for (const entry of counting.toSorted((one, other) => one.at - other.at || one.entry - other.entry)) {
    const before = new Map([...vessels].filter(([name]) => touches(entry).includes(name)));
    for (const [name, after] of applyEntry(before, entry))
      if (after === undefined) vessels.delete(name);
      else vessels.set(name, after);
  }
  return [...vessels.values()].sort((one, other) => (one.vessel < other.vessel ? -1 : 1));
}
