import { applyEntry } from '../../../core/cellar/apply-entry.ts';
import type { Entry } from '../../../core/cellar/entry.ts';
import { touches } from '../../../core/cellar/touches.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { WAYPOINT_EVERY, type Standing } from './standing.ts';

/** Brings the vessels that an entry touches up to it, in `standings` itself; gives back how these stand then. */
export function fold(standings: Map<string, Standing>, entry: Entry): readonly Standing[] {
  const names = new Set(touches(entry));
  const before = new Map<string, Vessel>();
  for (const name of names) {
    const state = standings.get(name)?.state;
    if (state !== undefined) before.set(name, state);
  }
  const after = applyEntry(before, entry);
  return Array.from(names, (vessel) => {
    const run = (standings.get(vessel)?.run ?? 0) + 1;
    const standing = {
      vessel,
      at: entry.at,
      entry: entry.entry,
      state: after.has(vessel) ? after.get(vessel) : before.get(vessel),
      run: names.size > 1 || run === WAYPOINT_EVERY ? 0 : run,
    };
    standings.set(vessel, standing);
    return standing;
  });
}
