import { applyToShelf } from '../../../core/cellar/apply-to-shelf.ts';
import type { Entry } from '../../../core/cellar/entry.ts';
import type { Shelf } from '../../../core/cellar/shelf.ts';
import { stockMove } from '../../../core/cellar/stock-move.ts';

/**
 * A shelf as a store keeps it: with what it was just before it was counted last, so that a count can be taken back, and
 * something noted late from before it, without reading the log. Null where it began then; absent where it is not known.
 */
export interface KeptShelf extends Shelf {
  readonly before?: Shelf | null;
}

/** The shelf alone. */
export function shelfOf({ before: _before, ...shelf }: KeptShelf): Shelf {
  return shelf;
}

/** A shelf after entries one by one, or before sums that are taken away (`times` −1). */
export function foldShelf(
  before: KeptShelf | undefined,
  entries: readonly Entry[],
  times: 1 | -1 = 1,
): KeptShelf | undefined {
  let shelf = before;
  for (const entry of entries) {
    const after = applyToShelf(shelf, entry, times);
    const isStart = shelf === undefined || stockMove(entry)?.does === 'count';
    shelf = after !== undefined && isStart ? { ...after, before: shelf ? shelfOf(shelf) : null } : after;
  }
  return shelf;
}
