import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Entry, LoggedEntry } from '../../../core/cellar/entry.ts';
import type { KeptShelf } from './kept-shelf.ts';
import type { Point } from './point.ts';
import type { Standing } from './standing.ts';

/** What changes in what is derived from the log. */
export interface ProjectionChange {
  /** The waypoints of a vessel from a point on are void. They go before the new ones come. */
  readonly voidFrom: ReadonlyMap<string, Point>;
  readonly waypoints: readonly Standing[];
  /** How vessels stand now; undefined where no entry tells of one any more. */
  readonly standings: ReadonlyMap<string, Standing | undefined>;
}

/**
 * The log of one cellar and what is derived from it, as `noteEntries` and `rebuildVessels` use it; each store has one.
 * An entry counts unless it is a correction or was taken back by one.
 */
export interface Ledger {
  nextEntry(): Promise<number>;
  entry(number: number): Promise<LoggedEntry | undefined>;
  /** Those of the keys that an entry has already. */
  keysTaken(keys: readonly string[]): Promise<readonly string[]>;
  insert(entries: readonly Entry[]): Promise<void>;
  /** What counts of a vessel from a point on, in order; `before` is not included. */
  countedOf(
    vessel: string,
    range: { readonly from: Point; readonly before?: Point },
  ): Promise<readonly Entry[]>;
  /** What counts in the cellar behind a point, in order. */
  counted(after: Point | undefined, most: number): Promise<readonly Entry[]>;
  standings(vessels: readonly string[]): Promise<ReadonlyMap<string, Standing>>;
  allStandings(): Promise<readonly Standing[]>;
  lastWaypoint(vessel: string, before: Point): Promise<Standing | undefined>;
  /** The places of all waypoints. */
  waypointPlaces(): Promise<readonly WaypointPlace[]>;
  waypoint(place: WaypointPlace): Promise<Standing | undefined>;
  dropWaypoints(places: readonly WaypointPlace[]): Promise<void>;
  save(change: ProjectionChange): Promise<void>;
  /** The shelves of the chemical store. */
  shelves(): Promise<readonly KeptShelf[]>;
  /** Shelves as they are now; undefined where there is none any more. */
  saveShelves(shelves: ReadonlyMap<string, KeptShelf | undefined>): Promise<void>;
  /** What counts of the stock of an additive, and of additions of it, from a point on, in order. */
  movesOf(additive: AdditiveId, from: Point): Promise<readonly Entry[]>;
}

/** Where a waypoint lies. */
export interface WaypointPlace extends Point {
  readonly vessel: string;
}
