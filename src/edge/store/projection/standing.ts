import type { Vessel } from '../../../core/cellar/vessel.ts';
import type { Point } from './point.ts';

/**
 * What a vessel was after an entry that touches it. `state` is absent where it is forgotten: that it once was must
 * be known, else a late entry would bring it back.
 */
export interface Standing extends Point {
  readonly vessel: string;
  readonly state: Vessel | undefined;
  /** Entries since the last waypoint; 0 where this is one. */
  readonly run: number;
}

/** A waypoint lies at least at every so many entries of a vessel: no more need be read to know a former state. */
export const WAYPOINT_EVERY = 64;

/**
 * Waypoints are standings that are kept, so that a late entry or a correction need not replay a whole log: one after
 * every entry that several vessels share, one after every 64 others.
 */
export const isWaypoint = (standing: Standing): boolean => standing.run === 0;
