/** A place in the order in which entries count: by their time and, at one moment, by their number. */
export interface Point {
  readonly at: number;
  readonly entry: number;
}

/** Sorts points, and entries, into that order. */
export const comparePoints = (one: Point, other: Point): number =>
  one.at - other.at || one.entry - other.entry;

/** Before all entries. */
export const BEGINNING: Point = { at: Number.MIN_SAFE_INTEGER, entry: 0 };
