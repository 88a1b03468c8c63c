import type { Entry } from '../../../core/cellar/entry.ts';
import { touches } from '../../../core/cellar/touches.ts';
import { fold } from './fold.ts';
import type { Ledger, ProjectionChange, WaypointPlace } from './ledger.ts';
import { comparePoints } from './point.ts';
import { replay } from './replay.ts';
import { isWaypoint, type Standing } from './standing.ts';

/** Brings what is derived from the log up to entries that were just put into it. */
export async function projectEntries(ledger: Ledger, entries: readonly Entry[]): Promise<void> {
  const inOrder = entries.toSorted(comparePoints);
  if (!inOrder.some((entry) => entry.kind === 'correction')) {
    const names = new Set(inOrder.flatMap((entry) => touches(entry)));
    const standings = new Map(await ledger.standings([...names]));
    if (inOrder.every((entry) => comesLast(entry, standings))) {
      await ledger.save(goOn(standings, inOrder));
      return;
    }
  }
  await ledger.save(await replay(ledger, await changedPlaces(ledger, inOrder)));
}

const comesLast = (entry: Entry, standings: ReadonlyMap<string, Standing>): boolean =>
  touches(entry).every((name) => {
    const standing = standings.get(name);
    return standing === undefined || comparePoints(standing, entry) < 0;
  });

/** The usual case: nothing was known that is later. */
function goOn(standings: Map<string, Standing>, inOrder: readonly Entry[]): ProjectionChange {
  const waypoints = inOrder.flatMap((entry) => fold(standings, entry).filter(isWaypoint));
  return { voidFrom: new Map(), waypoints, standings };
}

/** Where the history of a vessel is another now: at each new entry, and at each that was taken back. */
async function changedPlaces(ledger: Ledger, entries: readonly Entry[]): Promise<readonly WaypointPlace[]> {
  const places: WaypointPlace[] = [];
  for (const entry of entries) {
    const changed = entry.kind === 'correction' ? await ledger.entry(entry.corrects) : entry;
    if (changed === undefined) continue;
    for (const vessel of touches(changed)) places.push({ vessel, at: changed.at, entry: changed.entry });
  }
  return places;
}
