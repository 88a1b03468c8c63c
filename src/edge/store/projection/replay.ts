import type { Entry } from '../../../core/cellar/entry.ts';
import { touches } from '../../../core/cellar/touches.ts';
import { fold } from './fold.ts';
import type { Ledger, ProjectionChange, WaypointPlace } from './ledger.ts';
import { comparePoints, type Point } from './point.ts';
import { standingBefore } from './standing-before.ts';
import { isWaypoint, type Standing } from './standing.ts';

/**
 * Derives vessels anew from the places on where their history changed: an entry came late, or no longer counts. A
 * vessel that shares an entry with one of them joins there, for what it is from then on may be another too. What lies
 * before stays as it is, so that the cost is that of what happened since, however long the log.
 */
export async function replay(ledger: Ledger, starts: readonly WaypointPlace[]): Promise<ProjectionChange> {
  const voidFrom = new Map<string, Point>();
  const standings = new Map<string, Standing>();
  const waypoints: Standing[] = [];
  const toStart = starts.toSorted(comparePoints);
  const queued = new Set<number>();
  // The next one last, for taking from the end costs nothing.
  let queue: Entry[] = [];

  const join = async (vessel: string, from: Point): Promise<void> => {
    if (voidFrom.has(vessel)) return;
    voidFrom.set(vessel, from);
    const before = await standingBefore(ledger, vessel, from);
    if (before !== undefined) standings.set(vessel, before);
    const later = (await ledger.countedOf(vessel, { from })).filter(({ entry }) => !queued.has(entry));
    for (const { entry } of later) queued.add(entry);
    queue = [...queue, ...later].sort((one, other) => comparePoints(other, one));
  };

  for (;;) {
    const entry = queue.at(-1);
    const start = toStart[0];
    if (start !== undefined && (entry === undefined || comparePoints(start, entry) <= 0)) {
      toStart.shift();
      await join(start.vessel, start);
    } else if (entry !== undefined) {
      queue.pop();
      for (const vessel of touches(entry)) await join(vessel, entry);
      waypoints.push(...fold(standings, entry).filter(isWaypoint));
    } else break;
  }
  const joined = Array.from(voidFrom.keys(), (vessel) => [vessel, standings.get(vessel)] as const);
  return { voidFrom, waypoints, standings: new Map(joined) };
}
