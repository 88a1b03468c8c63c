import type { Entry } from '../../../core/cellar/entry.ts';
import { stockMove } from '../../../core/cellar/stock-move.ts';
import { foldShelf, type KeptShelf } from './kept-shelf.ts';
import type { Ledger } from './ledger.ts';
import { BEGINNING, comparePoints, type Point } from './point.ts';

/** What comes newly to a shelf, and what no longer counts. */
export interface ShelfChange {
  readonly news: Entry[];
  readonly gone: Entry[];
}

/**
 * A shelf after a change. What comes in and goes out only sums up: it is added or taken away, in whatever order it is
 * noted. For a count what lies behind it is read; for what lies before the last count, what lies behind that. Only what
 * changes two counts back or more asks for the whole log of the additive.
 */
export async function changedShelf(
  ledger: Ledger,
  before: KeptShelf | undefined,
  { news, gone }: ShelfChange,
): Promise<KeptShelf | undefined> {
  const all = [...news, ...gone];
  const [first] = all.toSorted(comparePoints);
  const move = first && stockMove(first);
  const additive = move?.kind.additive;
  if (first === undefined || additive === undefined) return before;
  const movesFrom = async (from: Point): Promise<readonly Entry[]> =>
    (await ledger.movesOf(additive, from)).filter((entry) => stockMove(entry)?.shelf === move?.shelf);

  // What went out before there was a shelf is not reckoned with.
  if (before === undefined)
    return all.every(isOut) ? undefined : foldShelf(undefined, await movesFrom(first));
  const from = { at: before.from_at, entry: before.from_entry };
  const early = all.filter((entry) => comparePoints(entry, from) < 0);
  if (comparePoints(first, from) > 0) {
    if (!all.some(isCount)) return withSums(before, { news, gone });
    if (gone.length === 0) return withCount(before, news, await movesFrom(first));
  } else if (before.before === null) {
    return early.length === all.length && all.every(isOut)
      ? before
      : foldShelf(undefined, await movesFrom(first));
  } else if (before.before !== undefined && !early.some(isCount)) {
    const former = { at: before.before.from_at, entry: before.before.from_entry };
    if (early.every((entry) => comparePoints(entry, former) > 0)) {
      const isEarly = (entry: Entry): boolean => early.includes(entry);
      const base = withSums(before.before, { news: news.filter(isEarly), gone: gone.filter(isEarly) });
      return foldShelf(base, await movesFrom(from));
    }
  }
  return foldShelf(undefined, await movesFrom(BEGINNING));
}

const isOut = (entry: Entry): boolean => stockMove(entry)?.does === 'out';
const isCount = (entry: Entry): boolean => stockMove(entry)?.does === 'count';
const isIn = (list: readonly Entry[], { entry }: Entry): boolean => list.some((one) => one.entry === entry);

/** What a turn has noted and taken back itself was never summed up. */
function withSums(before: KeptShelf, { news, gone }: ShelfChange): KeptShelf | undefined {
  const fresh = news.filter((entry) => !isIn(gone, entry));
  const struck = gone.filter((entry) => !isIn(news, entry));
  return foldShelf(foldShelf(before, struck, -1), fresh);
}

/** What lies behind the first new entry is taken away, and comes again behind it. */
function withCount(
  before: KeptShelf,
  news: readonly Entry[],
  later: readonly Entry[],
): KeptShelf | undefined {
  const known = later.filter((entry) => !isIn(news, entry));
  return foldShelf(foldShelf(before, known, -1), later);
}
