/** Rows or values in one statement: a database takes only so many, and a long statement holds everybody up. */
const MOST = 200;

/** Cuts a list into parts that one statement takes; no list, no part. */
export function* inParts<T>(list: readonly T[]): Generator<T[]> {
  for (let start = 0; start < list.length; start += MOST) yield list.slice(start, start + MOST);
}
