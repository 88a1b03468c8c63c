import { applyToShelf } from '../../core/cellar/apply-to-shelf.ts';
import type { Addition, Entry, Happening } from '../../core/cellar/entry.ts';
import { lotsLeft, type LotLeft } from '../../core/cellar/lots-left.ts';
import type { Shelf } from '../../core/cellar/shelf.ts';
import { stockMove } from '../../core/cellar/stock-move.ts';
import type { Here } from './here.ts';

/** The shelf that something stands on or is taken from, before and after it. */
export interface Drawn {
  readonly before: Shelf | undefined;
  readonly after: Shelf | undefined;
}

/**
 * What comes of a shelf by something that is about to be noted. Nothing where it happened before the shelf was counted
 * last, or before there was one.
 */
export function drawnBy(
  { happening, at }: { readonly happening: Happening; readonly at: number },
  here: Pick<Here, 'shelves' | 'nextEntry' | 'message' | 'me'>,
): Drawn | undefined {
  const move = stockMove(happening);
  if (move === undefined) return undefined;
  const before = here.shelves.find(({ shelf }) => shelf === move.shelf);
  if (before !== undefined && at < before.from_at) return undefined;
  const entry: Entry = {
    ...happening,
    entry: here.nextEntry,
    key: '',
    at,
    noted_at: here.message.at,
    by: here.me,
  };
  return { before, after: applyToShelf(before, entry) };
}

/** The shelves after something that was noted. */
export function shelvesAfter(shelves: readonly Shelf[], drawn: Drawn | undefined): readonly Shelf[] {
  const after = drawn?.after;
  if (after === undefined) return shelves;
  return [...shelves.filter(({ shelf }) => shelf !== after.shelf), after];
}

/** The lots that have something left, the oldest first. */
export function openLots(shelf: Shelf): readonly LotLeft[] {
  return lotsLeft(shelf).lots.filter(({ left }) => left > 0);
}

/** An addition with the lot that it must be of: there is only that one, and enough of it. */
export function withOnlyLot(
  note: { readonly happening: Addition; readonly at: number },
  here: Pick<Here, 'shelves' | 'nextEntry' | 'message' | 'me'>,
): Addition {
  const { happening } = note;
  const before = happening.chemical_lot === undefined ? drawnBy(note, here)?.before : undefined;
  const [only, another] = before === undefined ? [] : openLots(before);
  const amount = stockMove(happening)?.amount ?? Infinity;
  if (only?.lot === undefined || another !== undefined || only.left < amount) return happening;
  return { ...happening, chemical_lot: only.lot };
}
