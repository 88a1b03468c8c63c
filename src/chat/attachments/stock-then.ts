import { applyToShelf } from '../../core/cellar/apply-to-shelf.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { lotsLeft } from '../../core/cellar/lots-left.ts';
import type { Shelf } from '../../core/cellar/shelf.ts';
import { stockMove } from '../../core/cellar/stock-move.ts';

/**
 * What was left in the chemical store after each entry that did something to it, by the entry's number: in grams,
 * millilitres or tablets, as that additive is counted. It follows from the entries alone, so they must begin where the
 * cellar's log does; what was taken back did nothing.
 */
export function stockThen(entries: readonly LoggedEntry[]): ReadonlyMap<number, number> {
  const shelves = new Map<string, Shelf>();
  const then = new Map<number, number>();
  for (const entry of entries.toSorted((a, b) => a.at - b.at || a.entry - b.entry)) {
    const name = entry.struck === undefined ? stockMove(entry)?.shelf : undefined;
    const after = name === undefined ? undefined : applyToShelf(shelves.get(name), entry);
    if (after === undefined) continue;
    shelves.set(after.shelf, after);
    then.set(entry.entry, lotsLeft(after).balance / 1000);
  }
  return then;
}
