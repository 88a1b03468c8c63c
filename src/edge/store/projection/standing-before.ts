import { touches } from '../../../core/cellar/touches.ts';
import { fold } from './fold.ts';
import type { Ledger } from './ledger.ts';
import { BEGINNING, comparePoints, type Point } from './point.ts';
import type { Standing } from './standing.ts';

/** How a vessel stood just before a point: from its last waypoint and the few entries since. */
export async function standingBefore(
  ledger: Ledger,
  vessel: string,
  before: Point,
): Promise<Standing | undefined> {
  const now = (await ledger.standings([vessel])).get(vessel);
  if (now === undefined || comparePoints(now, before) < 0) return now;
  const waypoint = await ledger.lastWaypoint(vessel, before);
  const standings = new Map<string, Standing>();
  if (waypoint !== undefined) standings.set(vessel, waypoint);
  for (const entry of await ledger.countedOf(vessel, { from: waypoint ?? BEGINNING, before })) {
    if (waypoint !== undefined && comparePoints(entry, waypoint) <= 0) continue;
    // There is a waypoint after each entry that vessels share, so none of these needs another vessel.
    if (touches(entry).some((name) => name !== vessel))
      throw new Error(`no waypoint after entry ${entry.entry}: the vessels must be derived anew`);
    fold(standings, entry);
  }
  return standings.get(vessel);
}
