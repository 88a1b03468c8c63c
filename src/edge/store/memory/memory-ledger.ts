import { stockMove } from '../../../core/cellar/stock-move.ts';
import type { KeptShelf } from '../projection/kept-shelf.ts';
import type { Ledger, WaypointPlace } from '../projection/ledger.ts';
import { comparePoints, type Point } from '../projection/point.ts';
import type { Standing } from '../projection/standing.ts';
import { counts, entryOf, inOrder, loggedOf, noted, vesselsOf, type MemoryCellar } from './memory-cellar.ts';
import type { Undoable } from './undoable.ts';

/** The log of a cellar in memory, and what is derived from it; `change` remembers what was changed. */
export function createMemoryLedger(cellar: MemoryCellar, change: Undoable): Ledger {
  const places = (): WaypointPlace[] => Array.from(cellar.waypoints.keys(), placeOf);
  return {
    nextEntry: async () => cellar.log.length + 1,
    entry: async (number) => {
      const one = cellar.log[number - 1];
      return one && loggedOf(cellar, one);
    },
    keysTaken: async (keys) => keys.filter((key) => cellar.byKey.has(key)),
    insert: async (entries) => {
      for (const entry of entries) {
        const one = noted(entry);
        change.push(cellar.log, one);
        change.set(cellar.byKey, one.key, one);
        if (one.corrects !== undefined) change.set(cellar.corrections, one.corrects, one);
        for (const vessel of vesselsOf(entry)) {
          if (!cellar.byVessel.has(vessel)) change.set(cellar.byVessel, vessel, []);
          change.push(cellar.byVessel.get(vessel) ?? [], one);
        }
      }
    },
    countedOf: async (vessel, { from, before }) => {
      const within = (cellar.byVessel.get(vessel) ?? []).filter(
        (one) =>
          counts(cellar, one) &&
          comparePoints(one, from) >= 0 &&
          (before === undefined || comparePoints(one, before) < 0),
      );
      return inOrder(within).map(entryOf);
    },
    counted: async (after, most) => {
      const behind = cellar.log.filter(
        (one) => counts(cellar, one) && (after === undefined || comparePoints(one, after) > 0),
      );
      return inOrder(behind).slice(0, most).map(entryOf);
    },
    standings: async (vessels) => {
      const found = vessels.flatMap((vessel) => cellar.standings.get(vessel) ?? []).map(toStanding);
      return new Map(found.map((standing) => [standing.vessel, standing]));
    },
    allStandings: async () => Array.from(cellar.standings.values(), toStanding),
    lastWaypoint: async (vessel, before) => {
      const earlier = places().filter((place) => place.vessel === vessel && comparePoints(place, before) < 0);
      const last = earlier.toSorted(comparePoints).at(-1);
      return last && toStanding(cellar.waypoints.get(nameOf(last)));
    },
    waypointPlaces: async () => places(),
    waypoint: async (place) => {
      const text = cellar.waypoints.get(nameOf(place));
      return text === undefined ? undefined : toStanding(text);
    },
    dropWaypoints: async (gone) => {
      for (const place of gone) change.remove(cellar.waypoints, nameOf(place));
    },
    save: async ({ voidFrom, waypoints, standings }) => {
      const isVoid = (place: WaypointPlace): boolean => {
        const from: Point | undefined = voidFrom.get(place.vessel);
        return from !== undefined && comparePoints(place, from) >= 0;
      };
      if (voidFrom.size > 0)
        for (const place of places().filter(isVoid)) change.remove(cellar.waypoints, nameOf(place));
      for (const waypoint of waypoints)
        change.set(cellar.waypoints, nameOf(waypoint), JSON.stringify(waypoint));
      for (const [vessel, standing] of standings)
        if (standing === undefined) change.remove(cellar.standings, vessel);
        else change.set(cellar.standings, vessel, JSON.stringify(standing));
    },
    shelves: async () => Array.from(cellar.shelves.values(), (text) => JSON.parse(text) as KeptShelf),
    saveShelves: async (shelves) => {
      for (const [name, shelf] of shelves)
        if (shelf === undefined) change.remove(cellar.shelves, name);
        else change.set(cellar.shelves, name, JSON.stringify(shelf));
    },
    movesOf: async (additive, from) => {
      const since = cellar.log.filter((one) => counts(cellar, one) && comparePoints(one, from) >= 0);
      return inOrder(since)
        .map(entryOf)
        .filter((entry) => stockMove(entry)?.kind.additive === additive);
    },
  };
}

const nameOf = ({ vessel, at, entry }: WaypointPlace): string => JSON.stringify([vessel, at, entry]);

function placeOf(name: string): WaypointPlace {
  const [vessel, at, entry] = JSON.parse(name) as [string, number, number];
  return { vessel, at, entry };
}

/** As it was kept; the state of a vessel that is forgotten is not in the text. */
function toStanding(text: string | undefined): Standing {
  const kept = JSON.parse(text ?? '{}') as Standing;
  return { ...kept, state: kept.state };
}
