import type { Entry } from './entry.ts';
import { isLot, lotKey, lotsLeft, type LotLeft } from './lots-left.ts';
import type { LotKept, Shelf } from './shelf.ts';
import { stockMove, type StockMove } from './stock-move.ts';

/**
 * A shelf after an entry, or before one that is taken away (`times` −1). A shelf begins when something is received or
 * counted: what went out before was never reckoned with. Undefined where there is none yet. Amounts in thousandths of
 * grams, millilitres or tablets.
 *
 * @param times 1 to apply it; −1 takes back what came in or went out (never a count)
 *
 * @example
 * ```ts
 * const noting = { at: 5, noted_at: 5, key: 'k', by: 1, vessels: [], additive: 'potassium-metabisulfite' };
 * const shelf = applyToShelf(undefined, { ...noting, entry: 1, kind: 'stock', event: 'received', mass_g: 25000 });
 * shelf?.lots[0]?.received // => 25000000
 * applyToShelf(shelf, { ...noting, entry: 2, kind: 'addition', mass_g: 256 })?.out // => { '': 256000 }
 * ```
 */
export function applyToShelf(before: Shelf | undefined, entry: Entry, times: 1 | -1 = 1): Shelf | undefined {
  const move = stockMove(entry);
  if (move === undefined || (before !== undefined && before.shelf !== move.shelf)) return before;
  if (move.does === 'out') return before && withOut(before, move, times);
  const shelf = before ?? emptyShelf(move, entry);
  if (move.does === 'in') return times === 1 ? withLot(shelf, lotOf(entry, move)) : withoutLot(shelf, entry);
  return counted(shelf, move, entry);
}

function emptyShelf({ shelf, kind, unit }: StockMove, { at, entry }: Entry): Shelf {
  return { shelf, kind, unit, from_at: at, from_entry: entry, lots: [], out: {} };
}

function withOut(before: Shelf, { lot, amount }: StockMove, times: 1 | -1): Shelf {
  const name = lotKey(lot);
  const { [name]: sum = 0, ...others } = before.out;
  const now = sum + amount * times;
  return { ...before, out: now === 0 ? others : { ...others, [name]: now } };
}

function lotOf(entry: Entry, { amount, lot }: StockMove): LotKept {
  const supplier = entry.kind === 'stock' ? entry.supplier : undefined;
  return {
    entry: entry.entry,
    at: entry.at,
    ...(lot !== undefined && { lot }),
    ...(supplier !== undefined && { supplier }),
    received: amount,
    held: amount,
  };
}

function withLot(before: Shelf, lot: LotKept): Shelf {
  const lots = [...before.lots, lot].sort((one, other) => one.at - other.at || one.entry - other.entry);
  return { ...before, lots };
}

function withoutLot(before: Shelf, { entry }: Entry): Shelf {
  return { ...before, lots: before.lots.filter((lot) => lot.entry !== entry) };
}

/** What was counted is what there is: all of it, or of the lot that was named. */
function counted(before: Shelf, move: StockMove, entry: Entry): Shelf {
  const now = lotsLeft(before).lots.map(({ left, ...lot }): LotKept => ({ ...lot, held: left }));
  const name = move.lot;
  const isMeant = (lot: LotKept): boolean => name === undefined || isLot(lot, name);
  const meant = spread(now.filter(isMeant), move, entry);
  const lots = [...now.filter((lot) => !isMeant(lot)), ...meant]
    .filter(({ held }) => held > 0)
    .sort((one, other) => one.at - other.at || one.entry - other.entry);
  const { at: from_at, entry: from_entry } = entry;
  return { ...before, from_at, from_entry, counted_at: from_at, lots, out: {} };
}

/** Less than the log says is missing of the oldest; more fills up the newest, and what none can hold is a lot of its own. */
function spread(lots: readonly LotKept[], move: StockMove, entry: Entry): LotKept[] {
  const there = lots.reduce((sum, { held }) => sum + held, 0);
  if (move.amount < there) return lotsLeft({ lots, out: { '': there - move.amount } }).lots.map(withLeft);
  let more = move.amount - there;
  const filled = lots.toReversed().map((lot): LotKept => {
    const part = Math.min(more, Math.max(0, lot.received - lot.held));
    more -= part;
    return { ...lot, held: lot.held + part };
  });
  return more > 0 ? [...filled, lotOf(entry, { ...move, amount: more })] : filled;
}

const withLeft = ({ left, ...lot }: LotLeft): LotKept => ({ ...lot, held: left });
