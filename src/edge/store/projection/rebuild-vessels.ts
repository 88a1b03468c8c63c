import { isDeepStrictEqual } from 'node:util';
import { fold } from './fold.ts';
import type { Ledger, WaypointPlace } from './ledger.ts';
import type { Point } from './point.ts';
import { shelfOf, type KeptShelf } from './kept-shelf.ts';
import { foldShelves } from './project-shelves.ts';
import { isWaypoint, type Standing } from './standing.ts';

/** What was derived anew, and the vessels (and shelves) of which something else had been kept. */
export interface Rebuilt {
  readonly vessels: number;
  readonly differed: readonly string[];
}

/** Entries between two pauses: others get their turn. */
const AT_ONCE = 500;

/**
 * Derives all vessels anew from the log and keeps that in place of what was kept.
 *
 * @param apart runs one part of it as a write set of its own: waypoints are true each by itself, so that a rebuild
 * that breaks off has mended some and spoilt none
 */
export async function rebuildVessels(
  ledger: Ledger,
  apart: (work: () => Promise<void>) => Promise<void>,
): Promise<Rebuilt> {
  const standings = new Map<string, Standing>();
  const shelves = new Map<string, KeptShelf>();
  const differed = new Set<string>();
  const leftOver = new Map((await ledger.waypointPlaces()).map((place) => [nameOf(place), place]));

  const mend = async (waypoint: Standing): Promise<void> => {
    const kept = leftOver.delete(nameOf(waypoint)) ? await ledger.waypoint(waypoint) : undefined;
    if (isSame(waypoint, kept)) return;
    differed.add(waypoint.vessel);
    await ledger.save({ voidFrom: new Map(), standings: new Map(), waypoints: [waypoint] });
  };

  let after: Point | undefined;
  for (;;) {
    const entries = await ledger.counted(after, AT_ONCE);
    after = entries.at(-1);
    if (after === undefined) break;
    await apart(async () => {
      for (const entry of entries) {
        foldShelves(shelves, entry);
        for (const standing of fold(standings, entry)) if (isWaypoint(standing)) await mend(standing);
      }
    });
  }

  await apart(async () => {
    for (const { vessel } of leftOver.values()) differed.add(vessel);
    await ledger.dropWaypoints([...leftOver.values()]);
    const kept = new Map((await ledger.allStandings()).map((standing) => [standing.vessel, standing]));
    const changed = [...new Set([...kept.keys(), ...standings.keys()])].filter(
      (vessel) => !isSame(standings.get(vessel), kept.get(vessel)),
    );
    for (const vessel of changed) differed.add(vessel);
    const now = new Map(changed.map((vessel) => [vessel, standings.get(vessel)]));
    await ledger.save({ voidFrom: new Map(), waypoints: [], standings: now });
    for (const shelf of await mendShelves(ledger, shelves)) differed.add(shelf);
  });
  const vessels = [...standings.values()].filter(({ state }) => state !== undefined).length;
  return { vessels, differed: [...differed].toSorted() };
}

/** Keeps the shelves as they follow from the log; gives back those of which something else had been kept. */
async function mendShelves(
  ledger: Ledger,
  shelves: ReadonlyMap<string, KeptShelf>,
): Promise<readonly string[]> {
  const kept = new Map((await ledger.shelves()).map((shelf) => [shelf.shelf, shelf]));
  const names = [...new Set([...kept.keys(), ...shelves.keys()])];
  const changed = names.filter((name) => !isSame(bare(shelves.get(name)), bare(kept.get(name))));
  if (changed.length > 0) await ledger.saveShelves(new Map(changed.map((name) => [name, shelves.get(name)])));
  return changed;
}

/** What a shelf was before its last count need not be known. */
const bare = (shelf: KeptShelf | undefined): unknown => shelf && shelfOf(shelf);

const nameOf = ({ vessel, at, entry }: WaypointPlace): string => JSON.stringify([vessel, at, entry]);

/** Compared as they are kept: a field that is undefined is not kept. */
const isSame = <T>(derived: T | undefined, kept: T | undefined): boolean =>
  isDeepStrictEqual(asKept(derived), asKept(kept));

const asKept = (derived: unknown): unknown =>
  derived === undefined ? undefined : JSON.parse(JSON.stringify(derived));
